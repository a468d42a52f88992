import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  changeStandardError,
  leftOutFit,
  leftOutPoll,
  levelBands,
  waveToWaveVariance,
  type FitPoll,
} from '@/lib/stats';
import { denseGls, sumZero } from './dense-gls';
import { housesOf, isClose, LAST_DAY, polls, stateVariance } from './generators';

const days = { firstDay: 1, lastDay: LAST_DAY };

describe('a poll left out', () => {
  test('is expected where dense least squares on the others puts it', () => {
    fc.assert(
      fc.property(polls, stateVariance, fc.nat(), (list, q, seed) => {
        const index = seed % list.length;
        const poll = list[index]!;
        const others = list.filter((_, place) => place !== index);
        const answer = leftOutPoll(list, index, 0.95, { ...days, stateVariancePerDay: q });
        if (answer.kind === 'cannot-be-predicted') {
          expect(others.some(({ house }) => house === poll.house)).toBe(false);
          expect(answer.reason).toBe('no-other-poll-of-house');
          return;
        }
        const dense = denseGls(others, q, sumZero(housesOf(others))).expected(poll.day, poll.house);
        expect(isClose(answer.mean, dense.mean, 1)).toBe(true);
        expect(isClose(answer.standardError ** 2, dense.variance + poll.variance)).toBe(true);
        expect(isClose(answer.z, (poll.value - dense.mean) / answer.standardError, 10)).toBe(true);
        expect(isClose(answer.interval[1] - answer.mean, 1.959963984540054 * answer.standardError)).toBe(
          true,
        );
      }),
      { numRuns: 60 },
    );
  });

  test('is judged without pulling the level towards itself', () => {
    const list = [
      { day: 1, value: 0.4, variance: 2e-4 },
      { day: 1, value: 0.42, variance: 2e-4 },
      { day: 2, value: 0.46, variance: 3e-4 },
    ];
    const answer = leftOutPoll(list, 2, 0.95, { firstDay: 1, lastDay: 2, stateVariancePerDay: 0 });
    expect(answer).toMatchObject({ kind: 'predicted', mean: 0.41000000000000003 });
    expect(answer.kind === 'predicted' && answer.z).toBeCloseTo(2.5, 12);
    expect(answer.kind === 'predicted' && answer.p).toBeCloseTo(0.012419330651552, 12);
  });

  test('alone cannot be predicted', () => {
    const answer = leftOutPoll([{ day: 1, value: 0.4, variance: 2e-4 }], 0, 0.95, {
      ...days,
      stateVariancePerDay: 0,
    });
    expect(answer).toEqual({ kind: 'cannot-be-predicted', reason: 'no-other-poll' });
  });
});

describe('a poll left out of a fit', () => {
  const steady = [0.41, 0.44, 0.42, 0.43, 0.43, 0.42, 0.53].map((value, index): FitPoll => ({
    day: 1 + 5 * index,
    value,
    house: index % 2 === 0 ? 'Kelmouth' : 'Norwater',
    sampling: { kind: 'share', n: 1000, deff: 1.4 },
  }));
  const plain = steady.map(({ day, value, sampling }) => ({ day, value, sampling }));
  const options = { firstDay: 1, lastDay: 31 };

  test('stands out when it is far from the others, and an ordinary one does not', () => {
    const answer = leftOutFit(plain, 6, 0.95, options);
    expect(answer.kind).toBe('predicted');
    expect(answer.kind === 'predicted' && answer.p).toBeLessThan(0.005);
    const ordinary = leftOutFit(plain.slice(0, 6), 2, 0.95, options);
    expect(ordinary.kind === 'predicted' && ordinary.p).toBeGreaterThan(0.2);
  });

  test('is expected with the effect of its house', () => {
    const answer = leftOutFit(steady, 5, 0.95, options);
    expect(answer.kind === 'predicted' && answer.standardError).toBeGreaterThan(0.018);
  });

  test('cannot be predicted from too few others, nor from other houses alone', () => {
    expect(leftOutFit(plain.slice(0, 4), 0, 0.95, options)).toEqual({
      kind: 'cannot-be-predicted',
      reason: 'too-few-polls',
    });
    const newcomer = [...steady, { ...steady[0]!, house: 'Quillon' }];
    expect(leftOutFit(newcomer, 7, 0.95, options)).toEqual({
      kind: 'cannot-be-predicted',
      reason: 'no-other-poll-of-house',
    });
  });
});

describe('the band of a level', () => {
  test('adds the floor in squares', () => {
    const [[low, high] = [0, 0]] = levelBands([0.4], [0.0009], 0.95, 0.04);
    expect(high - 0.4).toBeCloseTo(0.05 * 1.959963984540054, 14);
    expect(0.4 - low).toBeCloseTo(high - 0.4, 14);
  });

  test('without floor and variance is a point', () => {
    expect(levelBands([0.4, 0.5], [0, 0], 0.95, 0)).toEqual([
      [0.4, 0.4],
      [0.5, 0.5],
    ]);
  });
});

describe('wave-to-wave variance', () => {
  const waves = [0.41, 0.43, 0.42, 0.45, 0.44, 0.44, 0.41, 0.42];

  test('is the mean square of successive differences', () => {
    const result = waveToWaveVariance(waves);
    const squares = [4, 1, 9, 1, 0, 9, 1].map((square) => square * 1e-4);
    const mean = squares.reduce((sum, one) => sum + one, 0) / 7;
    expect(result.kind === 'estimated' && result.variance).toBeCloseTo(mean, 15);
  });

  test('needs eight waves', () => {
    expect(waveToWaveVariance(waves.slice(1))).toEqual({ kind: 'too-few-waves', waves: 7 });
    expect(changeStandardError(0.001, waves.slice(1))).toEqual({ standardError: 0.001, rule: 'sampling' });
  });

  test('rules where it is larger than sampling error, and only there', () => {
    const own = Math.sqrt(25e-4 / 7);
    expect(changeStandardError(0.01, waves).rule).toBe('wave-to-wave');
    expect(changeStandardError(0.01, waves).standardError).toBeCloseTo(own, 14);
    expect(changeStandardError(0.03, waves)).toEqual({ standardError: 0.03, rule: 'sampling' });
  });

  test('of a series that never moves is 0, and sampling error rules', () => {
    const still = new Array<number>(9).fill(0.4);
    expect(waveToWaveVariance(still)).toEqual({ kind: 'estimated', waves: 9, variance: 0 });
    expect(changeStandardError(0.02, still).rule).toBe('sampling');
  });
});

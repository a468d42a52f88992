import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { smoothLevel, type LevelPoll } from '@/lib/stats';
import { denseGls, sumZero } from './dense-gls';
import { isClose, LAST_DAY, polls, stateVariance } from './generators';

const days = { firstDay: 1, lastDay: LAST_DAY };
const smooth = (list: readonly LevelPoll[], stateVariancePerDay: number) =>
  smoothLevel(list, { ...days, stateVariancePerDay });

describe('the level through time', () => {
  test('is what dense generalized least squares finds, on every day, and so is its likelihood', () => {
    fc.assert(
      fc.property(polls, stateVariance, (list, q) => {
        const level = smooth(list, q);
        const dense = denseGls(
          list.map(({ day, value, variance }) => ({ day, value, variance })),
          q,
          sumZero(['none']),
        );
        level.days.forEach((day, index) => {
          const { mean, variance } = dense.level(day);
          expect(isClose(level.smoothedMean[index]!, mean)).toBe(true);
          expect(isClose(level.smoothedVariance[index]!, variance)).toBe(true);
        });
        expect(isClose(level.logLikelihoodFlat, dense.logLikelihoodFlat, 10)).toBe(true);
      }),
      { numRuns: 60 },
    );
  });

  test('as filtered is the smoothed level of the polls so far', () => {
    fc.assert(
      fc.property(polls, stateVariance, fc.integer({ min: 1, max: LAST_DAY }), (list, q, day) => {
        const level = smooth(list, q);
        const soFar = list.filter((poll) => poll.day <= day);
        if (soFar.length === 0) {
          expect(level.filteredMean[day - 1]).toBeNull();
          expect(level.filteredVariance[day - 1]).toBeNull();
          return;
        }
        const then = smooth(soFar, q);
        expect(isClose(level.filteredMean[day - 1]!, then.smoothedMean[day - 1]!)).toBe(true);
        expect(isClose(level.filteredVariance[day - 1]!, then.smoothedVariance[day - 1]!)).toBe(true);
      }),
    );
  });

  test('does not depend on the order of the polls', () => {
    fc.assert(
      fc.property(polls, stateVariance, (list, q) => {
        const level = smooth(list, q);
        const turned = smooth([...list].reverse(), q);
        level.days.forEach((_, index) => {
          expect(isClose(turned.smoothedMean[index]!, level.smoothedMean[index]!)).toBe(true);
          expect(isClose(turned.smoothedVariance[index]!, level.smoothedVariance[index]!)).toBe(true);
        });
        expect(isClose(turned.logLikelihoodFlat, level.logLikelihoodFlat, 10)).toBe(true);
      }),
    );
  });

  test('moves with a constant added to all polls, and keeps its variance and likelihood', () => {
    fc.assert(
      fc.property(polls, stateVariance, fc.double({ min: -5, max: 5, noNaN: true }), (list, q, shift) => {
        const level = smooth(list, q);
        const moved = smooth(
          list.map((poll) => ({ ...poll, value: poll.value + shift })),
          q,
        );
        level.days.forEach((_, index) => {
          expect(isClose(moved.smoothedMean[index]!, level.smoothedMean[index]! + shift, 10)).toBe(true);
        });
        expect(moved.smoothedVariance).toEqual(level.smoothedVariance);
        expect(isClose(moved.logLikelihoodFlat, level.logLikelihoodFlat, 10)).toBe(true);
      }),
    );
  });

  test('scales with its unit', () => {
    fc.assert(
      fc.property(polls, stateVariance, fc.double({ min: 0.01, max: 1e4, noNaN: true }), (list, q, unit) => {
        const level = smooth(list, q);
        const scaled = smooth(
          list.map((poll) => ({
            day: poll.day,
            value: poll.value * unit,
            variance: poll.variance * unit ** 2,
          })),
          q * unit ** 2,
        );
        level.days.forEach((_, index) => {
          expect(isClose(scaled.smoothedMean[index]!, level.smoothedMean[index]! * unit)).toBe(true);
          expect(isClose(scaled.smoothedVariance[index]!, level.smoothedVariance[index]! * unit ** 2)).toBe(
            true,
          );
        });
        const expected = level.logLikelihoodFlat - (list.length - 1) * Math.log(unit);
        expect(isClose(scaled.logLikelihoodFlat, expected, 100)).toBe(true);
      }),
    );
  });

  test('is known at least as well from all polls as from those so far', () => {
    fc.assert(
      fc.property(polls, stateVariance, (list, q) => {
        const level = smooth(list, q);
        level.smoothedVariance.forEach((variance, index) => {
          expect(variance).toBeGreaterThan(0);
          const filtered = level.filteredVariance[index] ?? Infinity;
          expect(variance).toBeLessThanOrEqual(filtered * (1 + 1e-12));
        });
      }),
    );
  });

  test('that does not move is the mean weighted by precision', () => {
    fc.assert(
      fc.property(polls, (list) => {
        const precision = list.reduce((sum, poll) => sum + 1 / poll.variance, 0);
        const mean = list.reduce((sum, poll) => sum + poll.value / poll.variance, 0) / precision;
        const level = smooth(list, 0);
        level.days.forEach((_, index) => {
          expect(isClose(level.smoothedMean[index]!, mean)).toBe(true);
          expect(isClose(level.smoothedVariance[index]!, 1 / precision)).toBe(true);
        });
      }),
    );
  });

  test('keeps its last value after the last poll and widens by the state variance each day', () => {
    const level = smoothLevel([{ day: 2, value: 0.41, variance: 4e-4 }], {
      firstDay: 0,
      lastDay: 4,
      stateVariancePerDay: 1e-5,
    });
    expect(level.days).toEqual([0, 1, 2, 3, 4]);
    expect(level.smoothedMean).toEqual([0.41, 0.41, 0.41, 0.41, 0.41]);
    [2, 1, 0, 1, 2].forEach((gap, index) => {
      expect(level.smoothedVariance[index]).toBeCloseTo(4e-4 + gap * 1e-5, 15);
    });
    expect(level.filteredMean).toEqual([null, null, 0.41, 0.41, 0.41]);
    expect(Math.abs(level.logLikelihoodFlat)).toBeLessThan(1e-12);
  });

  test('takes days before 0 and leaves frozen polls as they were', () => {
    const list = Object.freeze([
      Object.freeze({ day: -7, value: 0.4, variance: 2e-4 }),
      Object.freeze({ day: -9, value: 0.42, variance: 2e-4 }),
    ]);
    const options = Object.freeze({ firstDay: -9, lastDay: -7, stateVariancePerDay: 1e-5 });
    const level = smoothLevel(list, options);
    expect(level.days).toEqual([-9, -8, -7]);
    expect(level.smoothedMean[1]).toBeCloseTo(0.41, 14);
    expect(list[0]).toEqual({ day: -7, value: 0.4, variance: 2e-4 });
  });
});

describe('the change of the level over a span', () => {
  const span = fc.record({
    from: fc.integer({ min: 1, max: LAST_DAY }),
    to: fc.integer({ min: 1, max: LAST_DAY }),
  });

  test('has the standard error of dense least squares, correlation of its ends counted', () => {
    fc.assert(
      fc.property(polls, stateVariance, span, (list, q, { from, to }) => {
        const [change] = smoothLevel(list, {
          ...days,
          stateVariancePerDay: q,
          changes: [{ from, to }],
        }).changes;
        const dense = denseGls(
          list.map(({ day, value, variance }) => ({ day, value, variance })),
          q,
          sumZero(['none']),
        ).change(from, to);
        expect(isClose(change!.change, dense.mean, 1)).toBe(true);
        expect(isClose(change!.standardError ** 2, Math.max(0, dense.variance), 1e-3)).toBe(true);
      }),
      { numRuns: 60 },
    );
  });

  test('turns its sign with its ends and is 0 for a level that does not move', () => {
    const list = [
      { day: 1, value: 0.4, variance: 2e-4 },
      { day: 9, value: 0.45, variance: 2e-4 },
    ];
    const changes = [
      { from: 1, to: 9 },
      { from: 9, to: 1 },
      { from: 5, to: 5 },
    ];
    const moving = smoothLevel(list, { ...days, stateVariancePerDay: 1e-5, changes }).changes;
    expect(moving[1]!.change).toBe(-moving[0]!.change);
    expect(moving[1]!.standardError).toBe(moving[0]!.standardError);
    expect(moving[2]).toEqual({ from: 5, to: 5, change: 0, standardError: 0 });
    const standing = smoothLevel(list, { ...days, stateVariancePerDay: 0, changes }).changes;
    expect(standing[0]!.standardError).toBe(0);
  });
});

describe('the prediction of a further poll', () => {
  test('is the level of its day, without the sampling error', () => {
    const level = smoothLevel([{ day: 2, value: 0.41, variance: 4e-4 }], {
      firstDay: 1,
      lastDay: 5,
      stateVariancePerDay: 1e-5,
      predictions: [{ day: 5 }],
    });
    expect(level.predictions).toEqual([
      { day: 5, mean: level.smoothedMean[4], variance: level.smoothedVariance[4] },
    ]);
  });
});

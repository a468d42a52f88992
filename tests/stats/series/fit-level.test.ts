import { describe, expect, test } from 'vitest';
import { fitLevel, smoothLevel, smoothLevelWithHouses, type FitPoll } from '@/lib/stats';
import { randomNumbers } from './generators';

type World = {
  readonly polls: number;
  readonly days: number;
  readonly stateSd: number;
  readonly extraSd: number;
};

/** Invented polls of a known world: a random walk, two or more houses, sampling error, extra error. */
function simulate(world: World, seed: number, houses: readonly string[] = []) {
  const { uniform, normal } = randomNumbers(seed);
  let level = 0.45;
  const levels = Array.from({ length: world.days }, () => (level += normal() * world.stateSd));
  const effects = houses.map(() => normal() * 0.012);
  const mean = effects.reduce((sum, one) => sum + one, 0) / (houses.length || 1);
  const polls = Array.from({ length: world.polls }, (_, index): FitPoll => {
    const day = 1 + Math.floor(uniform() * world.days);
    const house = index % (houses.length || 1);
    const n = Math.round(500 + uniform() * 1000);
    const truth = levels[day - 1]!;
    const error = normal() * Math.sqrt((1.3 * truth * (1 - truth)) / n + world.extraSd ** 2);
    const sampling = { kind: 'share', n, deff: 1.3 } as const;
    if (houses.length === 0) return { day, value: truth + error, sampling };
    return { day, value: truth + effects[house]! - mean + error, house: houses[house]!, sampling };
  });
  return { polls, levels, effects: effects.map((one) => one - mean) };
}

const world: World = { polls: 400, days: 300, stateSd: 0.003, extraSd: 0.01 };
const days = { firstDay: 1, lastDay: 300 };

describe('the level with unknown variances', () => {
  test('finds the variances of a simulated world, and its bands hold the level as often as they say', () => {
    const { polls, levels } = simulate(world, 41);
    const fit = fitLevel(polls, days);
    expect(Math.sqrt(fit.estimated.stateVariancePerDay)).toBeGreaterThan(0.002);
    expect(Math.sqrt(fit.estimated.stateVariancePerDay)).toBeLessThan(0.0045);
    expect(Math.sqrt(fit.estimated.extraVariance)).toBeGreaterThan(0.007);
    expect(Math.sqrt(fit.estimated.extraVariance)).toBeLessThan(0.013);
    const inside = levels.filter(
      (level, day) => Math.abs(level - fit.mean[day]!) < 1.96 * Math.sqrt(fit.variance[day]!),
    );
    expect(inside.length / levels.length).toBeGreaterThan(0.85);
  });

  test('finds house effects within their errors', () => {
    const houses = ['Kelmouth', 'Norwater', 'Quillon'];
    const { polls, effects } = simulate(world, 7, houses);
    const fit = fitLevel(polls, { ...days, houses });
    fit.houseEffects.forEach(({ effect, standardError }, index) => {
      expect(standardError).toBeGreaterThan(0);
      expect(Math.abs(effect - effects[index]!)).toBeLessThan(4 * standardError);
    });
    expect(Math.abs(fit.houseEffects.reduce((sum, one) => sum + one.effect, 0))).toBeLessThan(1e-12);
  });

  test('gives the same answer each time', () => {
    const { polls } = simulate({ ...world, polls: 60 }, 5);
    expect(fitLevel(polls, days)).toEqual(fitLevel(polls, days));
  });

  test('does not depend on the order of the polls', () => {
    const { polls } = simulate({ ...world, polls: 60 }, 6, ['Kelmouth', 'Norwater']);
    const fit = fitLevel(polls, days);
    const turned = fitLevel([...polls].reverse(), days);
    fit.mean.forEach((mean, day) => expect(turned.mean[day]).toBeCloseTo(mean, 9));
    expect(turned.averaged.extraVariance / fit.averaged.extraVariance).toBeCloseTo(1, 6);
  });

  test('whose likelihood is largest at 0 still has bands that allow for movement', () => {
    const polls = [0.41, 0.44, 0.42, 0.43, 0.43, 0.42].map((value, index): FitPoll => ({
      day: 1 + 5 * index,
      value,
      sampling: { kind: 'share', n: 1000, deff: 1.4 },
    }));
    const fit = fitLevel(polls, { firstDay: 1, lastDay: 40 });
    expect(fit.estimated.stateVariancePerDay).toBe(0);
    expect(fit.estimated.extraVariance).toBe(0);
    const still = smoothLevel(
      polls.map(({ day, value }) => ({ day, value, variance: (1.4 * 0.425 * 0.575) / 1000 })),
      { firstDay: 1, lastDay: 40, stateVariancePerDay: 0 },
    );
    fit.variance.forEach((variance, day) => {
      expect(variance).toBeGreaterThan(1.2 * still.smoothedVariance[day]!);
    });
    expect(fit.variance[39]).toBeGreaterThan(fit.variance[15]!);
  });

  test('has grid weights that sum to 1 and average to what it reports', () => {
    const { polls } = simulate({ ...world, polls: 80 }, 9);
    const { grid, averaged, estimated } = fitLevel(polls, days);
    const mean = (pick: (node: (typeof grid)[number]) => number) =>
      grid.reduce((sum, node) => sum + node.weight * pick(node), 0);
    expect(mean(() => 1)).toBeCloseTo(1, 12);
    expect(mean((node) => node.extraVariance) / averaged.extraVariance).toBeCloseTo(1, 3);
    expect(mean((node) => node.stateVariancePerDay) / averaged.stateVariancePerDay).toBeCloseTo(1, 3);
    const states = grid.map((node) => node.stateVariancePerDay);
    expect(Math.max(...states)).toBeGreaterThan(estimated.stateVariancePerDay);
  });

  test('has the largest restricted likelihood at its estimate', () => {
    const houses = ['Kelmouth', 'Norwater'];
    const { polls } = simulate({ ...world, polls: 120 }, 11, houses);
    const given = polls.map((poll): FitPoll => ({ ...poll, sampling: { kind: 'given', variance: 3e-4 } }));
    const { estimated } = fitLevel(given, { ...days, houses });
    const at = (stateVariancePerDay: number, extra: number) =>
      smoothLevelWithHouses(
        polls.map(({ day, value, house = '' }) => ({ day, value, house, variance: 3e-4 + extra })),
        { ...days, houses, stateVariancePerDay },
      ).logLikelihoodFlat;
    const { stateVariancePerDay, extraVariance, logLikelihoodFlat } = estimated;
    expect(at(stateVariancePerDay, extraVariance)).toBeCloseTo(logLikelihoodFlat, 9);
    for (const [state, extra] of [
      [1.1, 1],
      [0.9, 1],
      [1, 1.1],
      [1, 0.9],
    ] as const) {
      expect(at(stateVariancePerDay * state, extraVariance * extra)).toBeLessThan(logLikelihoodFlat);
    }
  });

  test('scales with the unit of given variances, far from 0 to 1 too', () => {
    const { polls } = simulate({ ...world, polls: 60 }, 13);
    const given = (unit: number) =>
      polls.map(({ day, value }): FitPoll => ({
        day,
        value: value * unit,
        sampling: { kind: 'given', variance: 3e-4 * unit ** 2 },
      }));
    const one = fitLevel(given(1), days);
    const large = fitLevel(given(1000), days);
    expect(large.mean[100]! / one.mean[100]!).toBeCloseTo(1000, 5);
    expect(large.averaged.stateVariancePerDay / one.averaged.stateVariancePerDay / 1e6).toBeCloseTo(1, 6);
  });

  test('answers for a series of leads, its sampling error at the smoothed lead', () => {
    const polls = [0.05, 0.07, 0.04, 0.06, 0.05, 0.08, 0.06].map((value, index): FitPoll => ({
      day: 1 + 4 * index,
      value,
      sampling: { kind: 'lead', n: 1000, deff: 1.4, sum: 0.9 },
    }));
    const lead = fitLevel(polls, { firstDay: 1, lastDay: 25 });
    const variance = (1.4 * (0.9 - 0.0585 ** 2)) / 1000;
    const given = fitLevel(
      polls.map((poll) => ({ ...poll, sampling: { kind: 'given', variance } })),
      { firstDay: 1, lastDay: 25 },
    );
    lead.variance.forEach((one, day) => expect(one / given.variance[day]!).toBeCloseTo(1, 2));
  });

  test('averages changes and predictions as it does the days', () => {
    const houses = ['Kelmouth', 'Norwater'];
    const { polls } = simulate({ ...world, polls: 60 }, 17, houses);
    const fit = fitLevel(polls, {
      ...days,
      houses,
      changes: [{ from: 20, to: 250 }],
      predictions: [{ day: 250, house: 'Norwater' }],
    });
    expect(fit.changes[0]!.change).toBeCloseTo(fit.mean[249]! - fit.mean[19]!, 12);
    expect(fit.predictions[0]!.mean).toBeCloseTo(fit.mean[249]! + fit.houseEffects[1]!.effect, 12);
    const apart = Math.sqrt(fit.variance[249]! + fit.variance[19]!);
    expect(fit.changes[0]!.standardError).toBeGreaterThan(0.3 * apart);
    expect(fit.changes[0]!.standardError).toBeLessThan(1.5 * apart);
  });

  test('measures effects from a certified result', () => {
    const { polls } = simulate({ ...world, polls: 80 }, 19, ['Kelmouth', 'Norwater']);
    const fit = fitLevel(polls, { ...days, results: [{ day: 300, value: 0.5, variance: 0 }] });
    expect(fit.mean[299]).toBeCloseTo(0.5, 14);
    expect(fit.variance[299]).toBeLessThan(1e-15);
  });

  test('leaves frozen polls as they were', () => {
    const { polls } = simulate({ ...world, polls: 20 }, 23);
    const frozen = Object.freeze(
      polls.map((poll) => Object.freeze({ ...poll, sampling: Object.freeze(poll.sampling) })),
    );
    expect(fitLevel(frozen, Object.freeze({ ...days })).days).toHaveLength(300);
    expect(frozen[0]).toEqual(polls[0]);
  });
});

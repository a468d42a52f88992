import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { smoothLevel, smoothLevelWithHouses, type HouseEffect, type HousePoll } from '@/lib/stats';
import { denseGls, ownColumns, sumZero } from './dense-gls';
import { housesOf, isClose, LAST_DAY, polls, stateVariance } from './generators';

const days = { firstDay: 1, lastDay: LAST_DAY };
const byName = (effects: readonly HouseEffect[], house: string) => {
  const found = effects.find((one) => one.house === house);
  if (!found) throw new Error(`no effect of ${house}`);
  return found;
};

/** Every figure of the linear-time route beside the dense one. */
function expectSame(
  level: ReturnType<typeof smoothLevelWithHouses>,
  dense: ReturnType<typeof denseGls>,
  houses: readonly string[],
) {
  level.days.forEach((day, index) => {
    const { mean, variance } = dense.level(day);
    expect(isClose(level.smoothedMean[index]!, mean, 1)).toBe(true);
    expect(isClose(level.smoothedVariance[index]!, variance, 1e-3)).toBe(true);
  });
  houses.forEach((house) => {
    const { mean, variance } = dense.effect(house);
    const { effect, standardError } = byName(level.houseEffects, house);
    expect(isClose(effect, mean, 1)).toBe(true);
    expect(isClose(standardError ** 2, variance, Math.max(variance, 1e-3))).toBe(true);
  });
}

describe('house effects that sum to 0', () => {
  test('are what dense generalized least squares finds, with the level and the likelihood', () => {
    fc.assert(
      fc.property(polls, stateVariance, (list, q) => {
        const houses = housesOf(list);
        const level = smoothLevelWithHouses(list, { ...days, stateVariancePerDay: q });
        const dense = denseGls(list, q, sumZero(houses));
        expectSame(level, dense, houses);
        expect(isClose(level.logLikelihoodFlat, dense.logLikelihoodFlat, 10)).toBe(true);
        expect(Math.abs(level.houseEffects.reduce((sum, one) => sum + one.effect, 0))).toBeLessThan(1e-12);
      }),
      { numRuns: 60 },
    );
  });

  test('over a reference set agree with dense least squares, and the likelihood stays as it was', () => {
    fc.assert(
      fc.property(polls, stateVariance, fc.nat(), (list, q, seed) => {
        const houses = housesOf(list);
        const reference = houses.slice(0, 1 + (seed % houses.length));
        const options = { ...days, stateVariancePerDay: q };
        const level = smoothLevelWithHouses(list, { ...options, reference });
        expectSame(level, denseGls(list, q, sumZero(houses, reference)), houses);
        const sum = reference.reduce((total, house) => total + byName(level.houseEffects, house).effect, 0);
        expect(Math.abs(sum)).toBeLessThan(1e-12);
        const all = smoothLevelWithHouses(list, options);
        expect(isClose(level.logLikelihoodFlat, all.logLikelihoodFlat, 10)).toBe(true);
      }),
      { numRuns: 60 },
    );
  });

  test('do not depend on the order of the polls', () => {
    fc.assert(
      fc.property(polls, stateVariance, (list, q) => {
        const options = { ...days, stateVariancePerDay: q };
        const level = smoothLevelWithHouses(list, options);
        const turned = smoothLevelWithHouses([...list].reverse(), options);
        level.days.forEach((_, index) => {
          expect(isClose(turned.smoothedMean[index]!, level.smoothedMean[index]!)).toBe(true);
          expect(isClose(turned.smoothedVariance[index]!, level.smoothedVariance[index]!)).toBe(true);
        });
        level.houseEffects.forEach(({ house, effect }) => {
          expect(isClose(byName(turned.houseEffects, house).effect, effect, 1)).toBe(true);
        });
      }),
    );
  });

  test('are the same under other names, in the order that is asked for', () => {
    fc.assert(
      fc.property(polls, stateVariance, (list, q) => {
        const options = { ...days, stateVariancePerDay: q };
        const houses = housesOf(list);
        const level = smoothLevelWithHouses(list, { ...options, houses });
        const renamed = list.map((poll) => ({ ...poll, house: `House ${houses.indexOf(poll.house)}` }));
        const names = houses.map((_, index) => `House ${index}`);
        const again = smoothLevelWithHouses(renamed, { ...options, houses: names });
        expect(again.smoothedMean).toEqual(level.smoothedMean);
        expect(again.smoothedVariance).toEqual(level.smoothedVariance);
        expect(again.houseEffects).toEqual(
          level.houseEffects.map((one, index) => ({ ...one, house: `House ${index}` })),
        );
      }),
    );
  });

  test('of a single house are 0 and certain, and the level is that without houses', () => {
    fc.assert(
      fc.property(polls, stateVariance, (list, q) => {
        const options = { ...days, stateVariancePerDay: q };
        const one = list.map((poll) => ({ ...poll, house: 'Kelmouth' }));
        const level = smoothLevelWithHouses(one, options);
        const plain = smoothLevel(list, options);
        expect(level.houseEffects).toEqual([{ house: 'Kelmouth', effect: 0, standardError: 0 }]);
        level.days.forEach((_, index) => {
          expect(isClose(level.smoothedMean[index]!, plain.smoothedMean[index]!)).toBe(true);
          expect(isClose(level.smoothedVariance[index]!, plain.smoothedVariance[index]!)).toBe(true);
        });
        expect(isClose(level.logLikelihoodFlat, plain.logLikelihoodFlat, 10)).toBe(true);
      }),
    );
  });

  test('take a constant difference of a house as its effect, and the level does not follow', () => {
    const base: HousePoll[] = [3, 8, 15, 22, 30].flatMap((day) => [
      { day, value: 0.42, variance: 3e-4, house: 'Kelmouth' },
      { day, value: 0.42, variance: 3e-4, house: 'Norwater' },
    ]);
    const leaning = base.map((poll) =>
      poll.house === 'Norwater' ? { ...poll, value: poll.value + 0.04 } : poll,
    );
    const level = smoothLevelWithHouses(leaning, { ...days, stateVariancePerDay: 1e-5 });
    expect(byName(level.houseEffects, 'Norwater').effect).toBeCloseTo(0.02, 12);
    level.smoothedMean.forEach((mean) => expect(mean).toBeCloseTo(0.44, 12));
  });
});

describe('house effects measured from certified results', () => {
  const results = fc.array(
    fc.record({
      day: fc.integer({ min: 1, max: LAST_DAY }),
      value: fc.double({ min: 0.3, max: 0.6, noNaN: true }),
      variance: fc.constantFrom(1e-6, 1e-5),
    }),
    { minLength: 1, maxLength: 2 },
  );

  test('agree with dense least squares, results carrying no effect', () => {
    fc.assert(
      fc.property(polls, results, stateVariance, (list, certified, q) => {
        const houses = housesOf(list);
        const level = smoothLevelWithHouses(list, { ...days, stateVariancePerDay: q, results: certified });
        const dense = denseGls([...list, ...certified], q, ownColumns(houses));
        expectSame(level, dense, houses);
        expect(isClose(level.logLikelihoodFlat, dense.logLikelihoodFlat, 100)).toBe(true);
      }),
      { numRuns: 60 },
    );
  });

  test('put the level on exact results, and agree with dense least squares', () => {
    fc.assert(
      fc.property(polls, fc.constantFrom(1e-6, 1e-5, 1e-4), (list, q) => {
        const houses = housesOf(list);
        const certified = [
          { day: 4, value: 0.43, variance: 0 },
          { day: 31, value: 0.39, variance: 0 },
        ];
        const level = smoothLevelWithHouses(list, { ...days, stateVariancePerDay: q, results: certified });
        expectSame(level, denseGls([...list, ...certified], q, ownColumns(houses)), houses);
        expect(level.smoothedMean[3]).toBe(0.43);
        expect(level.smoothedVariance[3]).toBe(0);
        expect(level.smoothedMean[30]).toBe(0.39);
      }),
      { numRuns: 60 },
    );
  });

  test('find an error that all houses share', () => {
    const list: HousePoll[] = [1, 2, 3, 4].flatMap((day) => [
      { day, value: 0.46, variance: 3e-4, house: 'Kelmouth' },
      { day, value: 0.48, variance: 3e-4, house: 'Norwater' },
    ]);
    const certified = [{ day: 5, value: 0.44, variance: 0 }];
    const { houseEffects } = smoothLevelWithHouses(list, {
      firstDay: 1,
      lastDay: 5,
      stateVariancePerDay: 0,
      results: certified,
    });
    expect(houseEffects[0]!.effect).toBeCloseTo(0.02, 14);
    expect(houseEffects[1]!.effect).toBeCloseTo(0.04, 14);
    expect(houseEffects[0]!.standardError).toBeCloseTo(Math.sqrt(3e-4 / 4), 14);
  });
});

describe('what is asked of a level with houses', () => {
  test('changes and predictions agree with dense least squares', () => {
    const place = fc.integer({ min: 1, max: LAST_DAY });
    fc.assert(
      fc.property(polls, stateVariance, place, place, (list, q, from, to) => {
        const houses = housesOf(list);
        const house = houses[0]!;
        const level = smoothLevelWithHouses(list, {
          ...days,
          stateVariancePerDay: q,
          changes: [{ from, to }],
          predictions: [{ day: to, house }],
        });
        const dense = denseGls(list, q, sumZero(houses));
        const change = dense.change(from, to);
        expect(isClose(level.changes[0]!.change, change.mean, 1)).toBe(true);
        expect(isClose(level.changes[0]!.standardError ** 2, Math.max(0, change.variance), 1e-3)).toBe(true);
        const expected = dense.expected(to, house);
        expect(isClose(level.predictions[0]!.mean, expected.mean, 1)).toBe(true);
        expect(isClose(level.predictions[0]!.variance, expected.variance)).toBe(true);
      }),
      { numRuns: 60 },
    );
  });

  test('leaves frozen polls as they were', () => {
    const list = Object.freeze(
      ['Kelmouth', 'Norwater'].map((house) => Object.freeze({ day: 1, value: 0.4, variance: 1e-4, house })),
    );
    const options = Object.freeze({
      firstDay: 1,
      lastDay: 2,
      stateVariancePerDay: 0,
      houses: Object.freeze(['Norwater', 'Kelmouth']),
      results: Object.freeze([Object.freeze({ day: 2, value: 0.41, variance: 0 })]),
    });
    expect(smoothLevelWithHouses(list, options).houseEffects.map((one) => one.house)).toEqual([
      'Norwater',
      'Kelmouth',
    ]);
  });
});

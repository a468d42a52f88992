import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { surveyDesign, weightedProportion, type LonelyPsu } from '@/lib/stats';
import { respondentFile } from './support';

const options = { level: 0.95 };
/** Two strata with two units, one with a single unit; weights 1, so that everything can be worked by hand. */
const lonely = {
  weights: [1, 1, 1, 1, 1, 1],
  stratum: ['a', 'a', 'b', 'b', 'c', 'c'],
  psu: [1, 2, 3, 4, 5, 5],
};
const outcome = [1, 0, 1, 0, 1, 1];
const seWith = (lonelyPsu: LonelyPsu) =>
  weightedProportion(surveyDesign({ ...lonely, lonelyPsu }), outcome, options);

/** Unit totals u = (y − 2/3)/6: 1/18 and −2/18 in a and in b, 2/18 in c; their mean is 0. */
const TWO_STRATA = 2 * 2 * 2 * (1.5 / 18) ** 2;

describe('a stratum with a single unit', () => {
  test('that is removed adds nothing', () => {
    expect(seWith('remove').se).toBeCloseTo(Math.sqrt(TWO_STRATA), 14);
    expect(seWith('remove').lonelyPsu).toBe('remove');
  });

  test('that is averaged counts as much as the others do on average', () => {
    expect(seWith('average').se).toBeCloseTo(Math.sqrt(1.5 * TWO_STRATA), 14);
  });

  test('that is adjusted is centred at the mean of all units', () => {
    expect(seWith('adjust').se).toBeCloseTo(Math.sqrt(TWO_STRATA + (2 / 18) ** 2), 14);
  });

  test('gives no degree of freedom', () => {
    expect(seWith('remove').df).toBe(2);
  });

  test('is no matter where it is a census of its units', () => {
    const design = surveyDesign({ ...lonely, populationSize: [1e9, 1e9, 1e9, 1e9, 1, 1] });
    expect(design.lonelyPsu).toBeNull();
    expect(weightedProportion(design, outcome, options).se).toBeCloseTo(Math.sqrt(TWO_STRATA), 9);
  });

  test('leaves no trace in a design that has none', () => {
    const design = surveyDesign({ weights: [1, 2, 3], lonelyPsu: 'average' });
    expect(design.lonelyPsu).toBeNull();
    expect(weightedProportion(design, [1, 0, 1], options).lonelyPsu).toBeNull();
  });
});

describe('the finite population correction', () => {
  test('leaves no variance to a census', () => {
    const design = surveyDesign({ weights: [1, 1, 1], populationSize: [3, 3, 3] });
    expect(weightedProportion(design, [1, 0, 0], options)).toMatchObject({
      se: 0,
      deff: null,
      effectiveN: null,
    });
  });

  test('of a sample of half takes half of the variance', () => {
    const weights = [1, 2, 3, 4];
    const with_ = weightedProportion(
      surveyDesign({ weights, populationSize: [8, 8, 8, 8] }),
      [1, 0, 0, 1],
      options,
    );
    const without = weightedProportion(surveyDesign({ weights }), [1, 0, 0, 1], options);
    expect(with_.se ** 2).toBeCloseTo(without.se ** 2 / 2, 14);
  });

  test('never widens, stratum by stratum', () => {
    fc.assert(
      fc.property(
        respondentFile,
        fc.integer({ min: 90, max: 5000 }),
        ({ weights, stratum, answer }, size) => {
          const values = answer.map((one) => (one === 'A' ? 1 : 0));
          const populationSize = weights.map(() => size);
          const narrow = weightedProportion(
            surveyDesign({ weights, stratum, populationSize }),
            values,
            options,
          );
          const wide = weightedProportion(surveyDesign({ weights, stratum }), values, options);
          expect(narrow.se).toBeLessThanOrEqual(wide.se);
        },
      ),
    );
  });
});

describe('units', () => {
  const weights = [1, 1, 1, 1, 1, 1, 1, 1];
  const stratum = ['n', 'n', 'n', 'n', 's', 's', 's', 's'];

  test('numbered anew in each stratum are as many as pairs of stratum and number', () => {
    const design = surveyDesign({ weights, stratum, psu: [1, 1, 2, 2, 1, 1, 2, 2], nest: true });
    expect(design.df).toBe(2);
    expect([...(design.psuOfRow ?? [])]).toEqual([0, 0, 1, 1, 2, 2, 3, 3]);
  });

  test('may be named in words or numbers, in arrays or typed arrays', () => {
    const words = surveyDesign({ weights, stratum, psu: ['p', 'p', 'q', 'q', 'r', 'r', 's', 's'] });
    const codes = surveyDesign({
      weights: Float64Array.from(weights),
      stratum: Int32Array.of(7, 7, 7, 7, 9, 9, 9, 9),
      psu: Int32Array.of(1, 1, 2, 2, 3, 3, 4, 4),
    });
    expect(codes).toEqual(words);
  });

  test('of a design are kept: later changes of the columns do not reach it', () => {
    const changing = [1, 2, 3, 4];
    const design = surveyDesign({ weights: changing });
    changing[0] = 99;
    expect(design.weights[0]).toBe(1);
    expect(Object.isFrozen(design)).toBe(true);
  });

  test('that answer alike make a sample worth fewer people', () => {
    const design = surveyDesign({ weights, psu: [1, 1, 2, 2, 3, 3, 4, 4] });
    const { deff } = weightedProportion(design, [1, 1, 0, 0, 1, 1, 0, 0], options);
    // Variance of four unit means against that of eight people: (1/4 · 1/3) / (1/4 · 1/7).
    expect(deff).toBeCloseTo(7 / 3, 13);
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { replicateDesign, surveyDesign, weightedLead, weightedMean, weightedProportion } from '@/lib/stats';
import { columnRank } from '@/lib/stats/samples/column-rank';
import { replicateRank } from '@/lib/stats/samples/replicate-rank';

const options = { level: 0.95 };

/** Delete-one replicates of a sample in which every respondent is a unit. */
function jackknife(weights: readonly number[]): number[][] {
  const n = weights.length;
  return weights.map((_, left) => weights.map((weight, row) => (row === left ? 0 : (weight * n) / (n - 1))));
}

const weightsOf = fc.array(fc.double({ min: 0.2, max: 5, noNaN: true }), { minLength: 4, maxLength: 30 });
const half = (weights: readonly number[]) => weights.map((_, row) => row % 2);

describe('delete-one replicates', () => {
  test('give exactly the linearized variance of an unweighted mean', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 100 }), { minLength: 3, maxLength: 25 }), (values) => {
        const weights = values.map(() => 2);
        const design = replicateDesign({
          weights,
          replicateWeights: jackknife(weights),
          type: 'JK1',
          mse: false,
        });
        const linear = weightedMean(surveyDesign({ weights }), values, options);
        const replicated = weightedMean(design, values, options);
        expect(replicated.se).toBeCloseTo(linear.se, 10);
        expect(replicated.df).toBe(linear.df);
      }),
    );
  });

  test('come close to the linearized variance of a weighted share in a large sample', () => {
    const weights = Array.from({ length: 400 }, (_, row) => 0.5 + ((row * 37) % 101) / 101);
    const outcome = weights.map((_, row) => ((row * 53) % 97 < 40 ? 1 : 0));
    const design = replicateDesign({ weights, replicateWeights: jackknife(weights), type: 'JK1', mse: true });
    const { se } = weightedProportion(design, outcome, options);
    const linear = weightedProportion(surveyDesign({ weights }), outcome, options).se;
    expect(Math.abs(se / linear - 1)).toBeLessThan(0.005);
  });

  test('compared with the full sample give no less than compared with their own mean', () => {
    fc.assert(
      fc.property(weightsOf, (weights) => {
        const columns = { weights, replicateWeights: jackknife(weights), type: 'JK1' as const };
        const around = weightedProportion(replicateDesign({ ...columns, mse: true }), half(weights), options);
        const within = weightedProportion(
          replicateDesign({ ...columns, mse: false }),
          half(weights),
          options,
        );
        expect(around.se).toBeGreaterThanOrEqual(within.se * (1 - 1e-12));
      }),
    );
  });
});

describe('a replicate design', () => {
  const weights = [1, 2, 3, 4];
  const columns = jackknife(weights);
  const outcome = [1, 0, 0, 1];

  test('takes columns or one long row after row, and gives the same', () => {
    const rows = Float64Array.from(
      { length: 16 },
      (_, index) => columns[index % 4]?.[Math.floor(index / 4)] ?? 0,
    );
    const one = replicateDesign({ weights, replicateWeights: columns, type: 'JK1', mse: true });
    const other = replicateDesign({ weights, replicateWeights: rows, type: 'JK1', mse: true });
    expect(weightedLead(one, outcome, [0, 1, 0, 0], options)).toEqual(
      weightedLead(other, outcome, [0, 1, 0, 0], options),
    );
  });

  test.each([
    ['JK1', {}, 3 / 4],
    ['BRR', {}, 1 / 4],
    ['Fay', { fayRho: 0.5 }, 1],
    ['subbootstrap', {}, 1 / 3],
    ['JKn', { rscales: [1, 1, 1, 1] }, 1],
    ['bootstrap', { scale: 0.2 }, 0.2],
  ] as const)('of type %s has its own scale', (type, rest, scale) => {
    const design = replicateDesign({ weights, replicateWeights: columns, type, mse: true, ...rest });
    expect(design.scale).toBeCloseTo(scale, 15);
  });

  test('leaves out replicates with an rscale of 0, were they even empty', () => {
    const withEmpty = [...columns, [0, 0, 0, 0]];
    const all = replicateDesign({
      weights,
      replicateWeights: columns,
      type: 'JKn',
      rscales: 0.75,
      mse: false,
    });
    const some = replicateDesign({
      weights,
      replicateWeights: withEmpty,
      type: 'JKn',
      rscales: [0.75, 0.75, 0.75, 0.75, 0],
      mse: false,
    });
    expect(weightedProportion(some, outcome, options)).toEqual(weightedProportion(all, outcome, options));
  });

  test('keeps stated degrees of freedom in every domain, and counts those it finds itself', () => {
    const stated = replicateDesign({ weights, replicateWeights: columns, type: 'JK1', mse: true, df: 40 });
    const found = replicateDesign({ weights, replicateWeights: columns, type: 'JK1', mse: true });
    const inDomain = { ...options, domain: [1, 1, 0, 1] };
    expect(weightedProportion(stated, outcome, inDomain).df).toBe(40);
    expect(weightedProportion(found, outcome, inDomain).df).toBe(2);
  });

  test.each([0, 1])('shows no variance where everyone says %d', (value) => {
    const design = replicateDesign({ weights, replicateWeights: columns, type: 'JK1', mse: true });
    const inDomain = { ...options, domain: [1, 1, 1, 0] };
    const everyone = weights.map(() => value);
    expect(weightedProportion(design, everyone, options)).toMatchObject({
      estimate: value,
      se: 0,
      deff: null,
    });
    expect(weightedProportion(design, everyone, inDomain)).toMatchObject({ se: 0, effectiveN: null });
  });
});

describe('the rank of replicate weights', () => {
  /** Rows of factors, one a unit, each taken by several respondents with weights of their own. */
  function repeated(units: readonly (readonly number[])[], times: number, digits: number): Float64Array {
    return Float64Array.from(
      Array.from({ length: times }, (_, time) =>
        units.flatMap((unit, at) =>
          unit.map((one) => Number((one * (0.3 + ((time * 7 + at) % 11))).toPrecision(digits))),
        ),
      ).flat(),
    );
  }
  const identity = (size: number, off: number) =>
    Array.from({ length: size }, (_, row) =>
      Array.from({ length: size }, (_, column) => (row === column ? 0 : off)),
    );
  const stratified = Array.from({ length: 8 }, (_, row) =>
    Array.from({ length: 8 }, (_, column) =>
      row === column ? 0 : Math.floor(row / 2) === Math.floor(column / 2) ? 2 : 1,
    ),
  );

  test.each([
    ['few respondents of a delete-one design', repeated(identity(8, 1.14), 1, 17), 8, 8],
    ['many respondents of it', repeated(identity(8, 1.14), 60, 9), 8, 8],
    ['few respondents of four strata with two units', repeated(stratified, 2, 9), 8, 5],
    ['many respondents of them, weights with nine digits', repeated(stratified, 60, 9), 8, 5],
  ])('of %s', (_name, matrix, replicates, rank) => {
    expect(replicateRank(matrix, replicates, null)).toBe(rank);
  });

  test('counts a column that depends on others once, though no two respondents are alike', () => {
    const rows = Array.from({ length: 200 }, (_, row) => {
      const free = [1, 2, 3, 4].map((column) => 1 + Math.sin(row * column * 1.7 + column));
      return [...free, (free[0] ?? 0) + (free[2] ?? 0)];
    });
    expect(replicateRank(Float64Array.from(rows.flat()), 5, null)).toBe(4);
  });

  test('is of the rows in the domain alone', () => {
    const matrix = repeated(identity(8, 1.14), 60, 9);
    const domain = Uint8Array.from({ length: 480 }, (_, row) => (row % 8 < 3 ? 1 : 0));
    expect(replicateRank(matrix, 8, domain)).toBe(3);
  });

  test('sets a column aside that keeps less than a hundred-thousandth of its length', () => {
    const nearly = (angle: number) => Float64Array.of(1, 0, 0, 1, angle, 0);
    expect(columnRank(nearly(2e-5), 3)).toBe(2);
    expect(columnRank(nearly(5e-6), 3)).toBe(1);
    expect(columnRank(Float64Array.of(0, 0, 1, 2), 2)).toBe(1);
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  agrestiCaffoInterval,
  differenceEstimate,
  fisherExactP,
  newcombeDifferenceInterval,
  newcombeInterval,
  pooledTest,
  unpooledTest,
  type Alternative,
  type SampleShare,
} from '@/lib/stats';
import { expectInterval, expectP } from '../../support/reference';

const share: fc.Arbitrary<SampleShare> = fc.record({
  p: fc.double({ min: 0, max: 1, noNaN: true }),
  n: fc.integer({ min: 1, max: 1_000_000 }),
  deff: fc.double({ min: 0.5, max: 10, noNaN: true }),
});
const smallTable = fc
  .tuple(fc.integer({ min: 0, max: 25 }), fc.integer({ min: 0, max: 25 }))
  .chain(([n1, n2]) =>
    fc.tuple(
      fc.integer({ min: 0, max: n1 }),
      fc.constant(n1),
      fc.integer({ min: 0, max: n2 }),
      fc.constant(n2),
    ),
  );
const opposite: Record<Alternative, Alternative> = {
  'two-sided': 'two-sided',
  less: 'greater',
  greater: 'less',
};
const alternative = fc.constantFrom<Alternative>('two-sided', 'less', 'greater');

describe('the tests of two shares', () => {
  test('turn their sign, and keep p, when the samples are swapped', () => {
    fc.assert(
      fc.property(share, share, alternative, (first, second, asked) => {
        const pairs = [
          [pooledTest(first, second, asked, 'none'), pooledTest(second, first, opposite[asked], 'none')],
          [
            pooledTest(first, second, asked, 'continuity'),
            pooledTest(second, first, opposite[asked], 'continuity'),
          ],
          [unpooledTest(first, second, asked), unpooledTest(second, first, opposite[asked])],
        ] as const;
        for (const [one, other] of pairs) {
          expect(one.kind).toBe(other.kind);
          expect((one.z ?? 0) + (other.z ?? 0)).toBeCloseTo(0, 9);
          expect(one.p ?? 2).toBeCloseTo(other.p ?? 2, 9);
        }
      }),
    );
  });

  test('weaken with a larger design effect', () => {
    fc.assert(
      fc.property(share, share, (first, second) => {
        const wider = { ...first, deff: first.deff * 2 };
        const plain = unpooledTest(first, second, 'two-sided');
        const designed = unpooledTest(wider, second, 'two-sided');
        expect(designed.p ?? 1).toBeGreaterThanOrEqual((plain.p ?? 1) - 1e-15);
      }),
    );
  });

  test('are the test of the effective samples where there is a design effect', () => {
    const designed = pooledTest(
      { p: 0.44, n: 1400, deff: 2 },
      { p: 0.4, n: 900, deff: 1.5 },
      'less',
      'continuity',
    );
    const effective = pooledTest(
      { p: 0.44, n: 700, deff: 1 },
      { p: 0.4, n: 600, deff: 1 },
      'less',
      'continuity',
    );
    expect(designed).toEqual(effective);
  });

  test('take no more from a difference than there is', () => {
    const same = { p: 0.5, n: 7, deff: 1 };
    expect(pooledTest(same, { ...same, p: 0.52 }, 'two-sided', 'continuity')).toMatchObject({ z: 0, p: 1 });
  });

  test('say that there is no variance instead of a number, even for all against none', () => {
    const [nobody, everybody] = [
      { p: 0, n: 40, deff: 1 },
      { p: 1, n: 60, deff: 1.4 },
    ];
    expect(pooledTest(nobody, nobody, 'two-sided', 'none')).toEqual({
      kind: 'no-variance',
      difference: 0,
      standardError: 0,
      z: null,
      p: null,
      pooled: 0,
    });
    expect(unpooledTest(nobody, everybody, 'two-sided')).toMatchObject({ difference: -1, z: null, p: null });
    expect(pooledTest(nobody, everybody, 'two-sided', 'none').kind).toBe('tested');
  });

  test('leave their samples as they were', () => {
    const frozen = Object.freeze({ p: 0.4, n: 500, deff: 1.2 });
    expect(() => pooledTest(frozen, frozen, 'two-sided', 'none')).not.toThrow();
    expect(frozen).toEqual({ p: 0.4, n: 500, deff: 1.2 });
  });
});

describe("Fisher's exact test", () => {
  test('counts every table at most as probable as the observed one', () => {
    fc.assert(
      fc.property(smallTable, ([hits1, n1, hits2, n2]) => {
        const ways = (count: number) => choose(n1, count) * choose(n2, hits1 + hits2 - count);
        const tables = Array.from({ length: n1 + 1 }, (_, count) => ways(count));
        const all = tables.reduce((sum, one) => sum + one, 0);
        const rare = tables
          .filter((one) => one <= ways(hits1) * (1 + 1e-7))
          .reduce((sum, one) => sum + one, 0);
        expectP(fisherExactP(hits1, n1, hits2, n2), Math.min(1, rare / all), 'two-sided');
        const above = tables.slice(hits1).reduce((sum, one) => sum + one, 0);
        expectP(fisherExactP(hits1, n1, hits2, n2, 'greater'), above / all, 'greater');
      }),
    );
  });

  test('is the same with samples or answers swapped, the one-sided one turned', () => {
    fc.assert(
      fc.property(smallTable, alternative, ([hits1, n1, hits2, n2], asked) => {
        const p = fisherExactP(hits1, n1, hits2, n2, asked);
        expectP(fisherExactP(hits2, n2, hits1, n1, opposite[asked]), p, 'samples');
        expectP(fisherExactP(n1 - hits1, n1, n2 - hits2, n2, opposite[asked]), p, 'answers');
      }),
    );
  });

  const tables: [table: [number, number, number, number], asked: Alternative, p: number][] = [
    [[3, 4, 1, 4], 'two-sided', 17 / 35],
    [[3, 4, 1, 4], 'greater', 17 / 70],
    [[0, 400, 400, 400], 'less', 5.317948384759284e-240],
  ];
  test.each(tables)('of %j, looking %s, is %d', (table, asked, p) => {
    expectP(fisherExactP(...table, asked), p, 'table');
  });

  test('is 1 where the margins leave one table, and needs nobody in a sample', () => {
    expect(fisherExactP(0, 10, 0, 12)).toBe(1);
    expect(fisherExactP(0, 0, 3, 5)).toBe(1);
    expect(fisherExactP(0, 0, 0, 0, 'less')).toBe(1);
    expect(fisherExactP(5, 10, 5, 10)).toBe(1);
  });

  test('of samples of a million agrees with the pooled test to three digits, and ends in 0 beyond all numbers', () => {
    const [hits1, hits2, n] = [501_200, 500_000, 1_000_000];
    const { p } = pooledTest(
      { p: hits1 / n, n, deff: 1 },
      { p: hits2 / n, n, deff: 1 },
      'two-sided',
      'continuity',
    );
    expect(fisherExactP(hits1, n, hits2, n) / (p ?? 0)).toBeCloseTo(1, 3);
    expect(fisherExactP(600_000, n, 400_000, n)).toBe(0);
    expect(fisherExactP(600_000, n, 400_000, n, 'greater')).toBe(0);
    expect(fisherExactP(600_000, n, 400_000, n, 'less')).toBe(1);
  });

  test('answers at once however many people there are', () => {
    const n = 1e15;
    expect(fisherExactP(0, n, n / 2, n)).toBe(0);
    expect(fisherExactP(0, n, n / 2, n, 'less')).toBe(0);
    expect(fisherExactP(0, n, n / 2, n, 'greater')).toBe(1);
    expect(fisherExactP(n / 2, n, 4, 1e6, 'greater')).toBe(0);
    expect(fisherExactP(n / 2, n, 4, 1e6, 'less')).toBe(1);
    expect(fisherExactP(3, n, 9, n)).toBeCloseTo(598 / 4096, 12);
  });
});

describe('the intervals of a difference', () => {
  test('contain it; Newcombe’s is antisymmetric and stays inside −1 to 1', () => {
    fc.assert(
      fc.property(share, share, (first, second) => {
        const [low, high] = newcombeDifferenceInterval(first, second, 0.95);
        const [back, forth] = newcombeDifferenceInterval(second, first, 0.95);
        expect(low).toBeLessThanOrEqual(first.p - second.p);
        expect(high).toBeGreaterThanOrEqual(first.p - second.p);
        expect(low).toBeGreaterThanOrEqual(-1 - 1e-15);
        expect(high).toBeLessThanOrEqual(1 + 1e-15);
        expect(back).toBeCloseTo(-high, 12);
        expect(forth).toBeCloseTo(-low, 12);
      }),
    );
  });

  test('widen with the design effect of either sample', () => {
    fc.assert(
      fc.property(share, share, (first, second) => {
        const wider = { ...second, deff: second.deff * 1.5 };
        const [low, high] = newcombeDifferenceInterval(first, second, 0.95);
        const [lower, higher] = newcombeDifferenceInterval(first, wider, 0.95);
        expect(higher - lower).toBeGreaterThan(high - low);
        expect(differenceEstimate(first, wider, 0.95).margin).toBeGreaterThanOrEqual(
          differenceEstimate(first, second, 0.95).margin,
        );
      }),
    );
  });

  test('agree with the unpooled test about no difference', () => {
    fc.assert(
      fc.property(share, share, (first, second) => {
        const { p } = unpooledTest(first, second, 'two-sided');
        const [low, high] = differenceEstimate(first, second, 0.95).interval;
        fc.pre(p !== null && Math.abs(p - 0.05) > 1e-9);
        expect((p ?? 0) > 0.05).toBe(low < 0 && high > 0);
      }),
    );
  });

  test('of effective sizes are those of the samples they stand for', () => {
    expectInterval(
      newcombeDifferenceInterval({ p: 0.47, n: 1400, deff: 2 }, { p: 0.44, n: 700, deff: 1 }, 0.95),
      newcombeInterval(0.44, 700, 0.47, 700, 1.959963984540054),
      'effective sizes',
    );
  });

  test('have a width by Agresti and Caffo even for none against all, and mirror', () => {
    const [low, high] = agrestiCaffoInterval(0, 15, 22, 22, 0.95);
    expect(high).toBeGreaterThan(low);
    const [back, forth] = agrestiCaffoInterval(22, 22, 0, 15, 0.95);
    expect(back).toBeCloseTo(-high, 14);
    expect(forth).toBeCloseTo(-low, 14);
  });
});

function choose(n: number, k: number): number {
  if (k < 0 || k > n) return 0;
  return Array.from({ length: k }, (_, i) => i + 1).reduce((ways, i) => (ways * (n - k + i)) / i, 1);
}

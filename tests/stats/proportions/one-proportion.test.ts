import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  binomialTestP,
  clopperPearsonInterval,
  criticalValue,
  effectiveCounts,
  exactBinomialP,
  oneProportionScoreTest,
  shareScoreTest,
  wilsonCorrectedInterval,
  wilsonInterval,
} from '@/lib/stats';
import { expectFigure, expectP } from '../../support/reference';

const inside = fc.double({ min: 0.01, max: 0.99, noNaN: true });
const counts = fc
  .integer({ min: 1, max: 3000 })
  .chain((n) => fc.tuple(fc.integer({ min: 0, max: n }), fc.constant(n)));
/** Where a p-value and an interval stand this close to their limit, rounding decides. */
const TOO_CLOSE = 1e-9;

describe('the score test of a share', () => {
  test('does not reject exactly the shares inside the Wilson interval', () => {
    fc.assert(
      fc.property(counts, inside, inside, ([x, n], p0, level) => {
        const { p } = oneProportionScoreTest(x, n, p0, 'two-sided', 'none');
        const [low, high] = wilsonInterval(x / n, n, criticalValue(1 - level, null));
        fc.pre(Math.abs((p ?? 0) - (1 - level)) > TOO_CLOSE);
        expect((p ?? 0) > 1 - level).toBe(p0 > low && p0 < high);
      }),
    );
  });

  test('with correction does not reject the shares inside the corrected interval', () => {
    fc.assert(
      fc.property(counts, inside, ([x, n], p0) => {
        fc.pre(Math.abs(x - n * p0) > 0.5);
        const { p } = oneProportionScoreTest(x, n, p0, 'two-sided', 'continuity');
        const [low, high] = wilsonCorrectedInterval(x, n, criticalValue(0.05, null)) ?? [0, 1];
        fc.pre(Math.abs((p ?? 0) - 0.05) > TOO_CLOSE);
        expect((p ?? 0) > 0.05).toBe(p0 > low && p0 < high);
      }),
    );
  });

  test('turns its sign for the others, and the one-sided p-values are those of the other side', () => {
    fc.assert(
      fc.property(counts, inside, ([x, n], p0) => {
        const one = oneProportionScoreTest(x, n, p0, 'less', 'continuity');
        const other = oneProportionScoreTest(n - x, n, 1 - p0, 'greater', 'continuity');
        expect(one.z ?? Number.NaN).toBeCloseTo(-(other.z ?? Number.NaN), 7);
        expect(one.p ?? Number.NaN).toBeCloseTo(other.p ?? Number.NaN, 8);
      }),
    );
  });

  test('is never strengthened by the correction, which takes no more than there is', () => {
    fc.assert(
      fc.property(counts, inside, ([x, n], p0) => {
        const plain = oneProportionScoreTest(x, n, p0, 'two-sided', 'none');
        const corrected = oneProportionScoreTest(x, n, p0, 'two-sided', 'continuity');
        expect(corrected.p ?? 0).toBeGreaterThanOrEqual(plain.p ?? 1);
      }),
    );
    expect(oneProportionScoreTest(50.3, 100, 0.5, 'two-sided', 'continuity')).toMatchObject({ z: 0, p: 1 });
  });

  test('with a design effect is the test of the effective counts', () => {
    fc.assert(
      fc.property(counts, inside, fc.double({ min: 0.5, max: 10, noNaN: true }), ([x, n], p0, deff) => {
        const share = { p: x / n, n, deff };
        const effective = effectiveCounts(share);
        const whole = shareScoreTest(share, p0, 'greater');
        const counted = oneProportionScoreTest(effective.x, effective.n, p0, 'greater', 'none');
        expect(whole.z ?? Number.NaN).toBeCloseTo(counted.z ?? Number.NaN, 8);
      }),
    );
  });

  test('always has a variance, so that one respondent or nobody gives a number', () => {
    expect(oneProportionScoreTest(0, 1, 0.5, 'two-sided', 'none')).toMatchObject({ kind: 'tested', z: -1 });
    expect(shareScoreTest({ p: 0, n: 200, deff: 1.5 }, 0.02, 'less').kind).toBe('tested');
  });
});

describe('the exact binomial test of effective counts', () => {
  test('doubles the smaller tail, which includes the count itself, and is at most 1', () => {
    expectP(exactBinomialP(2, 4, 0.5), 1, 'middle');
    expectP(exactBinomialP(0, 4, 0.5), 2 / 16, 'none');
    expectP(exactBinomialP(4, 4, 0.5), 2 / 16, 'all');
    expectP(exactBinomialP(3, 4, 0.5), 10 / 16, 'three of four');
  });

  test('is twice the smaller one-sided test for whole counts', () => {
    fc.assert(
      fc.property(counts, inside, ([x, n], p0) => {
        const smaller = Math.min(binomialTestP(x, n, p0, 'less'), binomialTestP(x, n, p0, 'greater'));
        expect(exactBinomialP(x, n, p0)).toBeCloseTo(Math.min(1, 2 * smaller), 10);
      }),
    );
  });
});

describe('the exact binomial test', () => {
  test('counts every outcome at most as probable as the observed one', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 60 }), fc.nat(60), inside, (n, start, p0) => {
        const x = Math.min(n, start);
        const chances = binomialChances(n, p0);
        const limit = (chances[x] ?? 0) * (1 + 1e-7);
        const listed = chances.filter((chance) => chance <= limit).reduce((sum, one) => sum + one, 0);
        expect(binomialTestP(x, n, p0, 'two-sided')).toBeCloseTo(Math.min(1, listed), 11);
      }),
    );
  });

  test('has the two tails of the observed count, which overlap in that count', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 60 }), fc.nat(60), inside, (n, start, p0) => {
        const x = Math.min(n, start);
        const both = binomialTestP(x, n, p0, 'less') + binomialTestP(x, n, p0, 'greater');
        expect(both).toBeCloseTo(1 + (binomialChances(n, p0)[x] ?? 0), 11);
      }),
    );
  });

  test('one-sided, does not reject exactly the shares inside the Clopper–Pearson interval', () => {
    fc.assert(
      fc.property(counts, inside, ([x, n], p0) => {
        const [low, high] = clopperPearsonInterval(x, n, 0.95);
        const smaller = Math.min(binomialTestP(x, n, p0, 'less'), binomialTestP(x, n, p0, 'greater'));
        fc.pre(Math.abs(smaller - 0.025) > TOO_CLOSE);
        expect(smaller > 0.025).toBe(p0 > low && p0 < high);
      }),
    );
  });

  test('is the doubled tail where the fixed share is one half', () => {
    fc.assert(
      fc.property(counts, ([x, n]) => {
        const doubled = exactBinomialP(x, n, 0.5);
        fc.pre(doubled > 1e-300);
        expect(binomialTestP(x, n, 0.5, 'two-sided') / doubled).toBeCloseTo(1, 9);
      }),
    );
  });

  const large: [x: number, n: number, p0: number, p: number][] = [
    [5_003_000, 10_000_000, 0.5, 0.057821285315837564],
    [49_000, 1_000_000, 0.05, 4.2285801886848873e-6],
    [1_234_567, 5_000_000, 0.25, 2.4122294449004622e-57],
    [11_000, 200_000, 0.05, 5.1156305964118943e-24],
    [3, 1_000_000, 1e-6, 0.080301305101449783],
  ];
  test.each(large)('agrees with R 4.2.2 for %d of %d against %d', (x, n, p0, p) => {
    expectP(binomialTestP(x, n, p0, 'two-sided'), p, 'binom.test');
  });

  test('of nobody and of everybody is the power of a probability', () => {
    expectP(binomialTestP(0, 10, 0.3, 'less'), 0.7 ** 10, 'nobody');
    expectP(binomialTestP(900, 900, 0.5, 'greater'), 2 ** -900, 'everybody');
    expect(binomialTestP(0, 900, 0.5, 'greater')).toBe(1);
    expect(binomialTestP(900, 900, 0.5, 'less')).toBe(1);
    expect(binomialTestP(50, 100, 0.5, 'two-sided')).toBe(1);
    expectFigure(binomialTestP(1, 1, 0.5, 'two-sided'), 1, 'one respondent');
  });
});

/** By Bernoulli trials, one after the other. */
function binomialChances(n: number, p0: number): number[] {
  let chances = [1];
  for (let trial = 0; trial < n; trial += 1) {
    chances = [...chances, 0].map(
      (chance, hits) => chance * (1 - p0) + (hits > 0 ? (chances[hits - 1] ?? 0) * p0 : 0),
    );
  }
  return chances;
}

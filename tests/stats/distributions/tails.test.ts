import { describe, expect, test } from 'vitest';
import { criticalValue, normalQuantile, normalUpperTail, twoSidedP } from '@/lib/stats';
import { expectFigure, expectP } from '../../support/reference';

/** The reference figures of this file were computed with mpmath 1.2.1 at 60 digits. */

describe('normal tails keep their digits', () => {
  const tails: [z: number, tail: number][] = [
    [0.5, 0.30853753872598689637],
    [3.99, 3.3036647629402415814e-5],
    [4.01, 3.0359373926618219758e-5],
    [8.3, 5.2055697448902465e-17],
    [20, 2.7536241186062337e-89],
    [37, 5.7255712225245768e-300],
  ];
  test.each(tails)('at z = %d', (z, tail) => {
    expectP(normalUpperTail(z), tail, `tail at ${z}`);
    expectP(twoSidedP(-z, null), 2 * tail, `p at ${z}`);
  });

  test.each([0.3, 1e-2, 1.01e-4, 0.99e-4, 1e-8, 1e-13, 1e-50, 1e-300])(
    'quantile and tail undo each other at %d',
    (p) => {
      expect(normalUpperTail(-normalQuantile(p)) / p).toBeCloseTo(1, 11);
    },
  );

  test('the quantile is antisymmetric and 0 in the middle', () => {
    expect(normalQuantile(0.5)).toBeCloseTo(0, 14);
    expect(normalQuantile(0.25)).toBeCloseTo(-normalQuantile(0.75), 14);
  });
});

describe("Student's t", () => {
  const values: [alpha: number, df: number, value: number][] = [
    [0.05, 1, 12.706204736174698],
    [0.05, 8, 2.3060041352041671],
    [0.05, 58, 2.0017174841452356],
    [0.001, 300, 3.3232515129741876],
  ];
  test.each(values)('has its quantile at alpha %d with %d degrees of freedom', (alpha, df, value) => {
    expectFigure(criticalValue(alpha, df), value, 'quantile');
    expectP(twoSidedP(value, df), alpha, 'p');
  });

  test.each([1e15, 1e17, 1e20, 1e300])('is the normal distribution with %d degrees of freedom', (df) => {
    expectFigure(criticalValue(0.05, df), criticalValue(0.05, null), 'quantile');
    expectFigure(criticalValue(1e-12, df), criticalValue(1e-12, null), 'far quantile');
  });

  test('approaches the normal distribution', () => {
    expect(criticalValue(0.05, 1e9)).toBeCloseTo(criticalValue(0.05, null), 7);
    expect(twoSidedP(2, 1e9)).toBeCloseTo(twoSidedP(2, null), 8);
  });
});

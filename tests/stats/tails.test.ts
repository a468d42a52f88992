import { describe, expect, test } from 'vitest';
import {
  clopperPearsonInterval,
  criticalValue,
  exactBinomialP,
  exactSignP,
  fisherExactP,
  normalQuantile,
  normalUpperTail,
  twoSidedP,
} from '@/lib/stats';
import { expectFigure, expectP } from '../support/reference';

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

  test('approaches the normal distribution', () => {
    expect(criticalValue(0.05, 1e9)).toBeCloseTo(criticalValue(0.05, null), 7);
    expect(twoSidedP(2, 1e9)).toBeCloseTo(twoSidedP(2, null), 8);
  });
});

describe('exact tests', () => {
  test('the sign test of whole counts is the binomial one', () => {
    expectP(exactSignP(9, 1), 22 / 1024, 'sign');
    expect(exactSignP(5, 5)).toBe(1);
    expect(exactSignP(0, 0)).toBe(1);
    expectP(exactSignP(0, 40), 2 ** -39, 'all on one side');
  });

  test('the binomial test doubles the smaller tail', () => {
    expectP(exactBinomialP(2, 4, 0.5), 1, 'middle');
    expectP(exactBinomialP(0, 4, 0.5), 2 / 16, 'none');
    expectP(exactBinomialP(4, 4, 0.5), 2 / 16, 'all');
    expectP(exactBinomialP(3, 4, 0.5), 10 / 16, 'three of four');
  });

  test("Fisher's test holds every table at most as probable as the observed one", () => {
    expectP(fisherExactP(3, 4, 1, 4), 0.48571428571428571, 'tea');
    expect(fisherExactP(5, 10, 5, 10)).toBe(1);
    expect(fisherExactP(0, 10, 0, 12)).toBe(1);
    expect(fisherExactP(0, 0, 3, 5)).toBe(1);
  });

  test("Fisher's test of mirrored samples is the same", () => {
    expectP(fisherExactP(12, 700, 3, 650), fisherExactP(3, 650, 12, 700), 'swapped samples');
    expectP(fisherExactP(12, 700, 3, 650), fisherExactP(688, 700, 647, 650), 'swapped outcomes');
  });

  test('the exact interval ends at 0 and 1 without counts on one side', () => {
    expect(clopperPearsonInterval(0, 50, 0.95)[0]).toBe(0);
    expect(clopperPearsonInterval(50, 50, 0.95)[1]).toBe(1);
    expectFigure(clopperPearsonInterval(0, 50, 0.95)[1], 1 - 0.025 ** (1 / 50), 'high end without counts');
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  chiSquareUpperTail,
  homogeneityOfAnswers,
  homogeneityOfShares,
  normalUpperTail,
  pooledStandardError,
} from '@/lib/stats';

const poll = fc.record({
  p: fc.double({ min: 0.02, max: 0.98, noNaN: true }),
  n: fc.integer({ min: 50, max: 20_000 }),
  deff: fc.double({ min: 0.5, max: 10, noNaN: true }),
});
const polls = fc.array(poll, { minLength: 2, maxLength: 12 });
const near = (a: number | null, b: number | null) =>
  expect(Math.abs((a ?? Number.NaN) - (b ?? Number.NaN))).toBeLessThan(1e-9 * Math.max(1, Math.abs(b ?? 0)));

describe('homogeneity of shares', () => {
  test('does not depend on the order of the polls', () => {
    fc.assert(
      fc.property(polls, (given) => {
        const forwards = homogeneityOfShares(given);
        const backwards = homogeneityOfShares(given.toReversed());
        near(backwards.chiSquare, forwards.chiSquare);
        near(backwards.pooled, forwards.pooled);
        near(backwards.cochranQ, forwards.cochranQ);
      }),
    );
  });

  test('of two polls is the square of the pooled test, and Cochran’s Q of the unpooled one', () => {
    fc.assert(
      fc.property(poll, poll, (a, b) => {
        const { chiSquare, cochranQ } = homogeneityOfShares([a, b]);
        const pooledError = pooledStandardError(a.p, a.n / a.deff, b.p, b.n / b.deff);
        const variance = [a, b].reduce((sum, { p, n, deff }) => sum + (deff * p * (1 - p)) / n, 0);
        near(chiSquare, ((a.p - b.p) / pooledError) ** 2);
        near(cochranQ, (a.p - b.p) ** 2 / variance);
      }),
    );
  });

  test('is the two-column case of homogeneity over answers', () => {
    fc.assert(
      fc.property(polls, (given) => {
        const answers = given.map(({ p, n, deff }) => ({ shares: [p, 1 - p, 0], n, deff }));
        const all = homogeneityOfAnswers(answers);
        const one = homogeneityOfShares(given);
        near(all.chiSquare, one.chiSquare);
        expect(all.df).toBe(one.df);
        near(all.pooled[0] ?? null, one.pooled);
        expect(all.pooled[2]).toBe(0);
      }),
    );
  });

  test('of identical polls is 0 with p-value 1', () => {
    const same = [500, 700, 900].map((n) => ({ p: 0.5, n, deff: 1 }));
    expect(homogeneityOfShares(same)).toEqual({
      pooled: 0.5,
      chiSquare: 0,
      df: 2,
      pValue: 1,
      inverseVarianceMean: 0.5,
      cochranQ: 0,
      cochranQPValue: 1,
    });
  });

  test.each([0, 1])('has no answer where every poll found %d', (p) => {
    const found = homogeneityOfShares([
      { p, n: 50, deff: 1 },
      { p, n: 60, deff: 1 },
    ]);
    expect(found).toEqual({
      pooled: p,
      chiSquare: null,
      df: 1,
      pValue: null,
      inverseVarianceMean: null,
      cochranQ: null,
      cochranQPValue: null,
    });
  });

  test('leaves Cochran’s Q out where one share has no variance of its own', () => {
    const found = homogeneityOfShares([
      { p: 0, n: 50, deff: 1 },
      { p: 0.2, n: 60, deff: 1 },
    ]);
    expect(found.cochranQ).toBeNull();
    expect(found.pValue).toBeLessThan(0.01);
  });

  test('takes frozen polls and leaves them as they are', () => {
    const given = Object.freeze([
      Object.freeze({ p: 0.4, n: 500, deff: 1 }),
      Object.freeze({ p: 0.5, n: 500, deff: 1 }),
    ]);
    expect(homogeneityOfShares(given).df).toBe(1);
  });
});

describe('homogeneity over answers', () => {
  test('does not depend on the order of the answers', () => {
    const given = [
      { shares: [0.42, 0.4, 0.18], n: 1000, deff: 1.4 },
      { shares: [0.47, 0.38, 0.15], n: 800, deff: 1.2 },
    ];
    const turned = given.map((one) => ({ ...one, shares: one.shares.toReversed() }));
    near(homogeneityOfAnswers(turned).chiSquare, homogeneityOfAnswers(given).chiSquare);
  });

  test('has no answer where everybody gave the same one', () => {
    const all = Object.freeze({ shares: Object.freeze([1, 0, 0]), n: 100, deff: 1 });
    expect(homogeneityOfAnswers([all, all])).toEqual({
      pooled: [1, 0, 0],
      chiSquare: null,
      df: 0,
      pValue: null,
    });
  });
});

describe('chi-square upper tail', () => {
  test('keeps its digits down to 1e-300: with one degree of freedom it is the two-sided normal tail', () => {
    for (const z of [0.1, 1, 3, 8, 20, 30, 37]) {
      expect(chiSquareUpperTail(z * z, 1) / (2 * normalUpperTail(z))).toBeCloseTo(1, 11);
    }
  });

  test('with two degrees of freedom is the exponential tail', () => {
    for (const x of [0, 0.5, 20, 1380])
      expect(chiSquareUpperTail(x, 2) / Math.exp(-x / 2)).toBeCloseTo(1, 12);
  });

  test.each([
    [1900, 800, 3.6611005899966256e-91],
    [2001, 1000, 3.2236938390543877e-69],
    [2100, 1500, 7.311578994720103e-23],
    [3300, 1400, 1.3654244746711184e-154],
    [2300, 1400, 7.163095379891592e-47],
  ])('agrees with R for %d with %d degrees of freedom', (x, df, p) => {
    expect(chiSquareUpperTail(x, df) / p).toBeCloseTo(1, 9);
  });

  test('is about a half in the middle of very many degrees of freedom', () => {
    expect(chiSquareUpperTail(100_000, 100_000)).toBeCloseTo(0.49940529, 7);
    expect(chiSquareUpperTail(2001, 40_000)).toBeCloseTo(1, 12);
  });
});

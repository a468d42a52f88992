import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  binomialTestP,
  differenceEstimate,
  exactSignP,
  leadEstimate,
  leadNullStandardError,
  leadScoreTest,
  leadStandardError,
  leadTest,
  mcnemarCorrectedP,
  oneProportionScoreTest,
  probabilityAheadNormal,
  shareEstimate,
  shareStandardError,
  signTest,
  type LeadSample,
} from '@/lib/stats';
import { expectP } from '../../support/reference';

const proportion = fc.double({ min: 0, max: 1, noNaN: true });
const sample: fc.Arbitrary<LeadSample> = fc
  .record({
    first: proportion,
    rest: proportion,
    n: fc.integer({ min: 1, max: 1_000_000 }),
    deff: fc.double({ min: 0.5, max: 10, noNaN: true }),
  })
  .map(({ first, rest, n, deff }) => ({ first, second: (1 - first) * rest, n, deff }));
const swapped = ({ first, second, ...size }: LeadSample): LeadSample => ({
  first: second,
  second: first,
  ...size,
});
const count = fc.integer({ min: 0, max: 2000 });

describe('the standard error of a lead', () => {
  test('over nobody is that of a share, and among two who share everything twice that', () => {
    expect(leadStandardError(0.4, 0, 900, 1.3)).toBeCloseTo(shareStandardError(0.4, 900, 1.3), 15);
    expect(leadStandardError(0.6, 0.4, 900, 1)).toBeCloseTo(2 * shareStandardError(0.6, 900, 1), 15);
  });

  test('is never larger than in a level race', () => {
    fc.assert(
      fc.property(sample, ({ first, second }) => {
        expect(leadStandardError(first, second, 500, 1.2)).toBeLessThanOrEqual(
          leadNullStandardError(first, second, 500, 1.2),
        );
      }),
    );
  });

  test('is larger than that of two shares from two samples, since what one gains the other loses', () => {
    const lead = leadEstimate({ first: 0.47, second: 0.41, n: 1000, deff: 1 }, 0.95);
    const apart = differenceEstimate({ p: 0.47, n: 1000, deff: 1 }, { p: 0.41, n: 1000, deff: 1 }, 0.95);
    expect(lead.margin).toBeGreaterThan(apart.margin);
    expect(lead.margin).toBeLessThan(2 * shareEstimate({ p: 0.47, n: 1000, deff: 1 }, 0.95).margin);
  });

  test('is 0, not a missing number, for one option with everybody', () => {
    expect(leadStandardError(1, 0, 500, 1)).toBe(0);
    expect(shareStandardError(0, 500, 1)).toBe(0);
  });
});

describe('a lead', () => {
  test('turns its sign with the order of the options, and nothing else', () => {
    fc.assert(
      fc.property(sample, (one) => {
        const [lead, back] = [leadEstimate(one, 0.9), leadEstimate(swapped(one), 0.9)];
        expect(back.estimate).toBeCloseTo(-lead.estimate, 15);
        expect(back.margin).toBeCloseTo(lead.margin, 15);
        const [p, turned] = [leadTest(one, 'greater').p, leadTest(swapped(one), 'less').p];
        expect(p ?? 2).toBeCloseTo(turned ?? 2, 12);
      }),
    );
  });

  test('has an interval about it that widens with level and design effect', () => {
    fc.assert(
      fc.property(sample, (one) => {
        const { estimate, interval, margin } = leadEstimate(one, 0.9);
        expect(interval[0]).toBeLessThanOrEqual(estimate);
        expect(interval[1]).toBeGreaterThanOrEqual(estimate);
        expect(leadEstimate(one, 0.99).margin).toBeGreaterThanOrEqual(margin);
        expect(leadEstimate({ ...one, deff: one.deff * 2 }, 0.9).margin).toBeGreaterThanOrEqual(margin);
      }),
    );
  });

  test('has a normal probability of being ahead that is what the one-sided test leaves', () => {
    fc.assert(
      fc.property(sample, (one) => {
        const left = 1 - (leadTest(one, 'greater').p ?? 0);
        expect(probabilityAheadNormal(one) ?? 1).toBeCloseTo(left, 9);
      }),
    );
    expect(probabilityAheadNormal({ first: 0.45, second: 0.45, n: 900, deff: 1.3 })).toBeCloseTo(0.5, 15);
  });

  test('without variance has no test and no probability, yet a lead', () => {
    const everybody = { first: 1, second: 0, n: 1, deff: 1 };
    expect(leadTest(everybody, 'two-sided')).toEqual({
      kind: 'no-variance',
      difference: 1,
      standardError: 0,
      z: null,
      p: null,
    });
    expect(probabilityAheadNormal(everybody)).toBeNull();
    expect(leadEstimate(everybody, 0.95)).toMatchObject({ estimate: 1, margin: 0 });
    expect(leadScoreTest(everybody, 'two-sided')).toMatchObject({ kind: 'tested', z: 1 });
    expect(leadScoreTest({ first: 0, second: 0, n: 9, deff: 1 }, 'two-sided').p).toBeNull();
  });
});

describe('the score test of a lead', () => {
  test('is the score test of the first among those who chose either', () => {
    fc.assert(
      fc.property(count, count, (x1, x2) => {
        fc.pre(x1 + x2 > 0);
        const n = x1 + x2 + 100;
        const lead = leadScoreTest({ first: x1 / n, second: x2 / n, n, deff: 1 }, 'two-sided');
        const either = oneProportionScoreTest(x1, x1 + x2, 0.5, 'two-sided', 'none');
        expect(lead.z ?? Number.NaN).toBeCloseTo(either.z ?? Number.NaN, 9);
      }),
    );
  });

  test('squared is McNemar’s statistic, and the corrected one is lessened by one', () => {
    fc.assert(
      fc.property(count, count, (x1, x2) => {
        fc.pre(x1 + x2 > 0);
        const n = x1 + x2 + 57;
        const { z } = leadScoreTest({ first: x1 / n, second: x2 / n, n, deff: 1 }, 'two-sided');
        expect((z ?? 0) ** 2).toBeCloseTo((x1 - x2) ** 2 / (x1 + x2), 7);
        const corrected = oneProportionScoreTest(x1, x1 + x2, 0.5, 'two-sided', 'continuity');
        expect(mcnemarCorrectedP(x1, x2) ?? 2).toBeCloseTo(corrected.p ?? 2, 10);
      }),
    );
  });

  test('of a design effect is that of a smaller sample', () => {
    const designed = leadScoreTest({ first: 0.47, second: 0.41, n: 1200, deff: 1.5 }, 'greater');
    const smaller = leadScoreTest({ first: 0.47, second: 0.41, n: 800, deff: 1 }, 'greater');
    expect(designed.p ?? 2).toBeCloseTo(smaller.p ?? 2, 14);
  });
});

describe('the sign test', () => {
  test('is the exact binomial test of one half', () => {
    fc.assert(
      fc.property(count, count, (x1, x2) => {
        fc.pre(x1 + x2 > 0);
        for (const asked of ['two-sided', 'less', 'greater'] as const) {
          const binomial = binomialTestP(x1, x1 + x2, 0.5, asked);
          expect(signTest(x1, x2, asked) ?? 2).toBeCloseTo(binomial, 11);
        }
      }),
    );
  });

  test('of whole counts has closed forms at the ends', () => {
    expectP(signTest(0, 40, 'two-sided') ?? 2, 2 ** -39, 'all on one side');
    expectP(signTest(900, 0, 'greater') ?? 2, 2 ** -900, 'nine hundred of nine hundred');
    expect(signTest(5, 5, 'two-sided')).toBe(1);
    expect(signTest(0, 7, 'greater')).toBe(1);
  });

  test('without counts has no answer; for a verdict that is 1', () => {
    expect(signTest(0, 0, 'less')).toBeNull();
    expect(mcnemarCorrectedP(0, 0)).toBeNull();
    expect(exactSignP(0, 0)).toBe(1);
    expect(exactSignP(9.5, 2.25)).toBe(signTest(9.5, 2.25, 'two-sided'));
  });

  test('moves evenly between whole counts', () => {
    const [nine, between, ten] = [9, 9.5, 10].map((first) => signTest(first, 2, 'greater') ?? 2);
    expect(between).toBeLessThan(nine ?? 0);
    expect(between).toBeGreaterThan(ten ?? 1);
  });
});

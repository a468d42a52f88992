import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  changeOfLead,
  changeOfShare,
  differenceEstimate,
  finitePopulationFactor,
  finitePopulationMargin,
  finitePopulationStandardError,
  leadEstimate,
  leadStandardError,
  shareEstimate,
  unpooledTest,
  type LeadSample,
  type SampleShare,
} from '@/lib/stats';

const deff = fc.double({ min: 0.5, max: 10, noNaN: true });
const n = fc.integer({ min: 2, max: 1_000_000 });
const proportion = fc.double({ min: 0, max: 1, noNaN: true });
const share: fc.Arbitrary<SampleShare> = fc.record({ p: proportion, n, deff });
const sample: fc.Arbitrary<LeadSample> = fc
  .record({ first: proportion, rest: proportion, n, deff })
  .map(({ first, rest, ...size }) => ({ first, second: (1 - first) * rest, ...size }));

describe('the change of a share', () => {
  test('is later less earlier, and turns its sign when time is turned', () => {
    fc.assert(
      fc.property(share, share, (before, after) => {
        const change = changeOfShare(before, after, 0.95);
        const back = changeOfShare(after, before, 0.95);
        expect(change.estimate).toBe(after.p - before.p);
        expect(back.estimate).toBeCloseTo(-change.estimate, 15);
        expect(back.margin).toBeCloseTo(change.margin, 14);
        expect(change.test.p ?? 2).toBeCloseTo(back.test.p ?? 2, 14);
      }),
    );
  });

  test('is the difference of two samples', () => {
    fc.assert(
      fc.property(share, share, (before, after) => {
        const { test: tested, ...estimate } = changeOfShare(before, after, 0.9);
        expect(estimate.margin).toBeCloseTo(differenceEstimate(after, before, 0.9).margin, 15);
        expect(tested.p ?? 2).toBeCloseTo(unpooledTest(after, before, 'two-sided').p ?? 2, 12);
      }),
    );
  });

  test('has no test where neither poll has a variance', () => {
    const change = changeOfShare({ p: 0, n: 90, deff: 1 }, { p: 1, n: 80, deff: 2 }, 0.95);
    expect(change).toMatchObject({ estimate: 1, margin: 0, test: { kind: 'no-variance', z: null, p: null } });
  });
});

describe('the change of a lead', () => {
  test('adds the variances of the two leads', () => {
    fc.assert(
      fc.property(sample, sample, (before, after) => {
        const change = changeOfLead(before, after, 0.95);
        const errors = [before, after].map((one) =>
          leadStandardError(one.first, one.second, one.n, one.deff),
        );
        expect(change.standardError ** 2).toBeCloseTo((errors[0] ?? 0) ** 2 + (errors[1] ?? 0) ** 2, 14);
        expect(change.leadAfter - change.leadBefore).toBe(change.estimate);
        expect(change.margin).toBeGreaterThanOrEqual(leadEstimate(after, 0.95).margin * (1 - 1e-12));
      }),
    );
  });

  test('of options over nobody is the change of their share', () => {
    const lead = changeOfLead(
      { first: 0.3, second: 0, n: 500, deff: 1.2 },
      { first: 0.36, second: 0, n: 700, deff: 1 },
      0.95,
    );
    const plain = changeOfShare({ p: 0.3, n: 500, deff: 1.2 }, { p: 0.36, n: 700, deff: 1 }, 0.95);
    expect(lead.margin).toBeCloseTo(plain.margin, 14);
    expect(lead.test.p ?? 2).toBeCloseTo(plain.test.p ?? 0, 12);
  });

  test('agrees in test and interval about no change', () => {
    fc.assert(
      fc.property(sample, sample, (before, after) => {
        const { interval, test: tested } = changeOfLead(before, after, 0.95);
        fc.pre(tested.p !== null && Math.abs(tested.p - 0.05) > 1e-9);
        expect((tested.p ?? 0) > 0.05).toBe(interval[0] < 0 && interval[1] > 0);
      }),
    );
  });

  test('leaves both samples as they were', () => {
    const frozen = Object.freeze({ first: 0.44, second: 0.43, n: 700, deff: 1 });
    expect(changeOfLead(frozen, frozen, 0.95)).toMatchObject({ estimate: 0, test: { z: 0, p: 1 } });
    expect(frozen).toEqual({ first: 0.44, second: 0.43, n: 700, deff: 1 });
  });
});

describe('a finite population', () => {
  const inside = fc
    .integer({ min: 2, max: 1_000_000 })
    .chain((population) => fc.tuple(fc.integer({ min: 1, max: population }), fc.constant(population)));

  test('lessens the margin, by all of it in a census, by nothing among very many', () => {
    fc.assert(
      fc.property(inside, proportion, ([size, population], p) => {
        const one = { p, n: size, deff: 1.3 };
        for (const convention of ['one-less', 'fraction'] as const) {
          const margin = finitePopulationMargin(one, population, 0.95, convention);
          expect(margin).toBeLessThanOrEqual(shareEstimate(one, 0.95).margin);
          expect(finitePopulationFactor(size, population, convention)).toBeGreaterThanOrEqual(0);
        }
      }),
    );
    expect(finitePopulationFactor(200, 200, 'fraction')).toBe(0);
    expect(finitePopulationMargin({ p: 0.5, n: 200, deff: 1 }, 200, 0.95, 'one-less')).toBe(0);
    expect(finitePopulationFactor(1000, 1e12, 'one-less')).toBeCloseTo(1, 8);
  });

  test('of one person asked in full shows no error, and one of many no variance', () => {
    expect(finitePopulationFactor(1, 1, 'one-less')).toBe(0);
    expect(finitePopulationStandardError({ p: 1, n: 1, deff: 1 }, 1)).toBe(0);
    expect(finitePopulationStandardError({ p: 1, n: 1, deff: 1 }, 40)).toBeNull();
  });

  test('has two factors, the one less than a person apart never the smaller', () => {
    fc.assert(
      fc.property(inside, ([size, population]) => {
        expect(finitePopulationFactor(size, population, 'one-less')).toBeGreaterThanOrEqual(
          finitePopulationFactor(size, population, 'fraction') * (1 - 1e-15),
        );
      }),
    );
  });
});

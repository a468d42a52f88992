import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  changePower,
  criticalValue,
  leadPower,
  sampleSizeForChange,
  sampleSizeForLead,
  sampleSizeForMargin,
  type TestSides,
} from '@/lib/stats';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const deff = between(0.5, 10);
const alternative = fc.constantFrom<TestSides>('two.sided', 'one.sided');
const alpha = fc.constantFrom(0.01, 0.05, 0.1);
const power = between(0.3, 0.99);

describe('sample size for a margin', () => {
  test('is the handbook figure: 1,068 people for 3 points at 95 percent', () => {
    expect(sampleSizeForMargin({ margin: 0.03, p: 0.5, deff: 1, level: 0.95 })).toEqual({
      nReal: expect.closeTo(1067.0718946372572, 9) as number,
      n: 1068,
      nRealInfinite: expect.closeTo(1067.0718946372572, 9) as number,
      nInfinite: 1068,
    });
  });

  test('rises as the margin falls', () => {
    fc.assert(
      fc.property(between(0.005, 0.1), between(0.05, 0.95), deff, (margin, p, effect) => {
        const wide = sampleSizeForMargin({ margin, p, deff: effect, level: 0.95 });
        const narrow = sampleSizeForMargin({ margin: margin * 0.9, p, deff: effect, level: 0.95 });
        expect(narrow.nReal).toBeGreaterThan(wide.nReal);
        expect(narrow.n).toBeGreaterThanOrEqual(wide.n);
      }),
    );
  });

  test('gives back the margin with the finite population factor, and never asks for more than everybody', () => {
    fc.assert(
      fc.property(
        between(0.01, 0.1),
        between(0.05, 0.95),
        fc.integer({ min: 2, max: 1e7 }),
        (margin, p, N) => {
          const { nReal, nRealInfinite, n } = sampleSizeForMargin({
            margin,
            p,
            deff: 1.3,
            level: 0.9,
            population: N,
          });
          const factor = Math.sqrt((N - nReal) / (N - 1));
          const reached = criticalValue(0.1, null) * Math.sqrt((1.3 * p * (1 - p)) / nReal) * factor;
          expect(Math.abs(reached - margin)).toBeLessThan(1e-6 * margin + 1e-9);
          expect(nReal).toBeLessThanOrEqual(Math.max(N, nRealInfinite) * (1 + 1e-12));
          expect(n).toBeLessThanOrEqual(N);
        },
      ),
    );
  });

  test.each([0, 1])('is nobody for a share of %d, which has no sampling error', (p) => {
    expect(sampleSizeForMargin({ margin: 0.03, p, deff: 1, level: 0.95, population: 1 })).toEqual({
      nReal: 0,
      n: 0,
      nRealInfinite: 0,
      nInfinite: 0,
    });
  });

  test('does not ask for one more for the last bits', () => {
    const margin = criticalValue(0.05, null) * Math.sqrt(0.25 / 1000);
    expect(sampleSizeForMargin({ margin, p: 0.5, deff: 1, level: 0.95 }).n).toBe(1000);
  });
});

describe('sample size for a change', () => {
  test('has the power asked for, and one person less has not', () => {
    fc.assert(
      fc.property(
        fc.record({ p1: between(0.02, 0.98), p2: between(0.02, 0.98), deff, alpha, power, alternative }),
        (plan) => {
          fc.pre(Math.abs(plan.p1 - plan.p2) > 0.005);
          const { nPerPoll } = sampleSizeForChange(plan);
          expect(changePower({ ...plan, n: nPerPoll }).power).toBeGreaterThanOrEqual(plan.power - 1e-9);
          fc.pre(nPerPoll > 1);
          expect(changePower({ ...plan, n: nPerPoll - 1 }).power).toBeLessThan(plan.power);
        },
      ),
    );
  });

  test('does not depend on which poll comes first', () => {
    const plan = { deff: 1.4, alpha: 0.05, power: 0.8, alternative: 'two.sided' as const };
    const up = sampleSizeForChange({ ...plan, p1: 0.4, p2: 0.44 });
    const down = sampleSizeForChange({ ...plan, p1: 0.44, p2: 0.4 });
    expect(up).toEqual(down);
    expect(up.nRealUnpooled).toBeLessThan(up.nReal);
  });
});

describe('sample size for a lead', () => {
  test('has the power asked for, and one person less has not', () => {
    fc.assert(
      fc.property(
        fc.record({ first: between(0.02, 0.5), second: between(0.02, 0.5), deff, alpha, power, alternative }),
        (plan) => {
          fc.pre(Math.abs(plan.first - plan.second) > 0.005);
          const { nPerPoll, nPerPollNullVariance } = sampleSizeForLead(plan);
          expect(leadPower({ ...plan, n: nPerPoll }).power).toBeGreaterThanOrEqual(plan.power - 1e-9);
          const score = leadPower({ ...plan, n: nPerPollNullVariance }).powerNullVariance;
          expect(score).toBeGreaterThanOrEqual(plan.power - 1e-9);
          fc.pre(nPerPoll > 1 && nPerPollNullVariance > 1);
          expect(leadPower({ ...plan, n: nPerPoll - 1 }).power).toBeLessThan(plan.power);
          const less = leadPower({ ...plan, n: nPerPollNullVariance - 1 }).powerNullVariance;
          expect(less).toBeLessThan(plan.power);
        },
      ),
    );
  });
});

describe('power', () => {
  const polls = { n: 1000, deff: 1, alpha: 0.05, alternative: 'two.sided' as const };

  test('of two polls without a change is half the error probability, and the whole of it in both directions', () => {
    const level = changePower({ ...polls, p1: 0.4, p2: 0.4 });
    expect(level.power).toBeCloseTo(0.025, 12);
    expect(level.powerStrict).toBeCloseTo(0.05, 12);
  });

  test('of a one-sided test has no other direction', () => {
    const oneSided = changePower({ ...polls, p1: 0.4, p2: 0.42, alternative: 'one.sided' });
    expect(oneSided.powerStrict).toBe(oneSided.power);
    expect(oneSided.power).toBeGreaterThan(changePower({ ...polls, p1: 0.4, p2: 0.42 }).power);
  });

  test.each([
    ['at a half is the normal tail of the change alone', 0.5],
    ['above a half turns the critical value', 0.6],
  ])('of a one-sided test %s', (_what, error) => {
    const lenient = changePower({ ...polls, p1: 0.4, p2: 0.4, alpha: error, alternative: 'one.sided' });
    expect(lenient.power).toBeCloseTo(error, 12);
  });

  test('of a level race is half the error probability in either form', () => {
    const level = leadPower({ ...polls, first: 0.45, second: 0.45 });
    expect(level.power).toBeCloseTo(0.025, 12);
    expect(level.powerNullVariance).toBeCloseTo(0.025, 12);
  });
});

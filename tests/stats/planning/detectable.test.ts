import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  changePower,
  criticalValue,
  detectableChange,
  detectableLead,
  leadPower,
  leadStandardError,
  smallestSignificantLead,
  type TestSides,
} from '@/lib/stats';
import { findRoot } from '@/lib/stats/find-root';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const polls = {
  n: fc.integer({ min: 20, max: 100_000 }),
  deff: between(0.5, 10),
  alpha: fc.constantFrom(0.01, 0.05, 0.1),
  alternative: fc.constantFrom<TestSides>('two.sided', 'one.sided'),
};

describe('detectable change', () => {
  test('is found with just the power asked for, upwards and downwards', () => {
    fc.assert(
      fc.property(
        fc.record({ ...polls, p1: between(0.01, 0.99), power: between(0.2, 0.99) }),
        ({ power, ...plan }) => {
          const { increase, decrease } = detectableChange({ ...plan, power });
          const reached = [increase ?? Number.NaN, -(decrease ?? Number.NaN)].filter(
            (change) => !Number.isNaN(change),
          );
          for (const change of reached) {
            const p2 = Math.min(1, Math.max(0, plan.p1 + change));
            expect(Math.abs(changePower({ ...plan, p2 }).power - power)).toBeLessThan(1e-7);
          }
          const highest = plan.p1 < 1 ? changePower({ ...plan, p2: 1 }).power : 0;
          expect(increase !== null).toBe(plan.p1 < 1 && highest > power);
        },
      ),
    );
  });

  test('is R’s root of the power to its digits', () => {
    const plan = { p1: 0.48, n: 6314, deff: 1, alpha: 0.01, power: 0.8, alternative: 'two.sided' as const };
    const { increase, decrease } = detectableChange(plan);
    expect(increase).toBeCloseTo(0.030406434925536296, 13);
    expect(decrease).toBeCloseTo(0.03033253234773514, 13);
  });

  test('is null where not even a share of 0 or 1 would be found so often', () => {
    const plan = { n: 20, deff: 4, alpha: 0.05, power: 0.8, alternative: 'two.sided' as const };
    expect(detectableChange({ ...plan, p1: 0.1 }).decrease).toBeNull();
    expect(detectableChange({ ...plan, p1: 0.9 }).increase).toBeNull();
    expect(detectableChange({ ...plan, p1: 0 }).decrease).toBeNull();
    expect(detectableChange({ ...plan, p1: 1 }).increase).toBeNull();
  });

  test('mirrors: a rise from p is a fall from 1 − p', () => {
    const plan = { n: 900, deff: 1.2, alpha: 0.05, power: 0.8, alternative: 'two.sided' as const };
    const rise = detectableChange({ ...plan, p1: 0.3 }).increase ?? Number.NaN;
    expect(detectableChange({ ...plan, p1: 0.7 }).decrease).toBeCloseTo(rise, 12);
  });
});

describe('smallest leads', () => {
  test('the smallest significant lead has a test statistic of exactly the critical value', () => {
    fc.assert(
      fc.property(fc.record({ ...polls, together: between(0.05, 1) }), (question) => {
        const { lead } = smallestSignificantLead(question);
        fc.pre(lead !== null);
        const size = lead ?? 0;
        const shares = [(question.together + size) / 2, (question.together - size) / 2] as const;
        const z = size / leadStandardError(...shares, question.n, question.deff);
        const error = question.alternative === 'two.sided' ? question.alpha : 2 * question.alpha;
        expect(z / criticalValue(error, null)).toBeCloseTo(1, 9);
      }),
    );
  });

  test('the detectable lead is found with just the power asked for, in both forms', () => {
    fc.assert(
      fc.property(
        fc.record({ ...polls, together: between(0.05, 1), power: between(0.2, 0.99) }),
        (question) => {
          const found = detectableLead(question);
          const powerAt = (lead: number) => {
            const sum = question.together;
            return leadPower({ ...question, first: (sum + lead) / 2, second: Math.max(0, (sum - lead) / 2) });
          };
          fc.pre(
            found.lead !== null &&
              found.leadNullVariance !== null &&
              Math.max(found.lead ?? 1, found.leadNullVariance ?? 1) < 0.95 * question.together,
          );
          expect(powerAt(found.lead ?? 0).power).toBeCloseTo(question.power, 8);
          expect(powerAt(found.leadNullVariance ?? 0).powerNullVariance).toBeCloseTo(question.power, 6);
        },
      ),
    );
  });

  test('are null where not even all of both would be enough', () => {
    const question = { together: 0.02, n: 30, deff: 2, alpha: 0.05, alternative: 'two.sided' as const };
    expect(smallestSignificantLead(question)).toEqual({ lead: null, leadNullVariance: null });
    expect(detectableLead({ ...question, power: 0.8 })).toEqual({ lead: null, leadNullVariance: null });
  });
});

describe('root finder', () => {
  test.each([
    ['a cube root', (x: number) => x ** 3 - 2, 0, 2, Math.cbrt(2)],
    ['the end where it already is', (x: number) => x - 1, 0, 1, 1],
    ['the other end', (x: number) => x, 0, 1, 0],
    ['the edge of a step', (x: number) => (x < 0.3 ? -1 : 1), 0, 1, 0.3],
    ['a flat crossing', (x: number) => (x - 0.25) ** 9, -1, 2, 0.25],
  ])('finds %s', (_what, f, from, to, root) => {
    expect(Math.abs(findRoot(f, from, to) - root)).toBeLessThan(1e-12);
    expect(Math.abs(findRoot(f, to, from) - root)).toBeLessThan(1e-12);
  });

  test('stops early when told how close is close enough', () => {
    let calls = 0;
    const f = (x: number) => {
      calls += 1;
      return Math.exp(x) - 2;
    };
    expect(Math.abs(findRoot(f, 0, 1, 1e-3) - Math.LN2)).toBeLessThan(1e-3);
    expect(calls).toBeLessThan(8);
  });
});

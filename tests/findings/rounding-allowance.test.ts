import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { boundedMemo } from '@/lib/findings/bounded-memo';
import { criticalAt } from '@/lib/findings/critical-at';
import { roundingAllowancePp } from '@/lib/findings/rounding-allowance';
import { criticalValue, roundingHalfWidth } from '@/lib/stats';

const units = fc.array(fc.constantFrom(1, 0.5, 0.1, 0.01), { minLength: 1, maxLength: 14 });
const normalBound = (of: readonly number[]) =>
  1.959963984540054 * Math.sqrt(of.reduce((sum, unit) => sum + unit ** 2 / 12, 0));

describe('the rounding allowance of an estimate', () => {
  test('is the exact half-width for up to four figures, whatever their order', () => {
    const few = fc.array(fc.constantFrom(1, 0.5, 0.1, 0.01), { minLength: 1, maxLength: 4 });
    fc.assert(
      fc.property(few, (of) => {
        const halves = of.map((unit) => unit / 2);
        expect(roundingAllowancePp(of)).toBe(roundingHalfWidth(halves, 0.95));
        expect(roundingAllowancePp([...of].reverse())).toBe(roundingAllowancePp(of));
      }),
    );
  });

  test('is exact for the many figures of a bloc', () => {
    // R 4.2.2: P <- function(x, n) sum((-1)^(0:n) * choose(n, 0:n) * pmax(0, x - (0:n))^n) / factorial(n)
    // uniroot(function(r) P(n / 2 - r, n) - .025, c(.5, 2.2), tol = 1e-14)$root for n = 5 and 12
    expect(roundingAllowancePp(Array<number>(5).fill(1))).toBeCloseTo(1.25389439003616, 12);
    expect(roundingAllowancePp(Array<number>(12).fill(1))).toBeCloseTo(1.95294921576156, 12);
  });

  test('never exceeds the normal bound and never falls below what any of the figures needs', () => {
    fc.assert(
      fc.property(units, (of) => {
        const allowance = roundingAllowancePp(of);
        expect(allowance).toBeLessThanOrEqual(normalBound(of) * (1 + 1e-12));
        expect(allowance).toBeGreaterThanOrEqual(0.475 * Math.max(...of) - 1e-12);
      }),
    );
  });

  test('grows with every further figure and with every coarser unit', () => {
    fc.assert(
      fc.property(units, fc.constantFrom(1, 0.5, 0.1), (of, unit) => {
        const allowance = roundingAllowancePp(of);
        expect(roundingAllowancePp([...of, unit])).toBeGreaterThan(allowance * (1 - 1e-9));
        expect(roundingAllowancePp(of.map((one) => 2 * one))).toBeCloseTo(2 * allowance, 9);
      }),
    );
  });

  test('takes the bound where the exact sum would cancel its digits', () => {
    const mixed = [1, 1, 1, 1, 1e-6];
    expect(roundingAllowancePp(mixed)).toBeCloseTo(normalBound(mixed), 12);
    const sixty = Array<number>(60).fill(1);
    expect(roundingAllowancePp(sixty)).toBeCloseTo(normalBound(sixty), 12);
  });

  test('refuses no figures and units that are none', () => {
    const message = 'roundingAllowancePp requires at least one unit, each above 0';
    expect(() => roundingAllowancePp([])).toThrow(message);
    expect(() => roundingAllowancePp([1, 0])).toThrow(message);
    expect(() => roundingAllowancePp([NaN])).toThrow(RangeError);
  });
});

describe('what is remembered within the engine', () => {
  test('quantiles are those of the statistics engine, asked once or twice', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-6, max: 0.4, noNaN: true }),
        fc.option(fc.integer({ min: 1, max: 90 })),
        (alpha, df) => {
          const expected = criticalValue(alpha, df);
          expect(criticalAt(alpha, df)).toBe(expected);
          expect(criticalAt(alpha, df)).toBe(expected);
        },
      ),
    );
  });

  test('a full memory is emptied and answers as before', () => {
    let computed = 0;
    const squared = boundedMemo((n: number) => {
      computed += 1;
      return n * n;
    }, 2);
    expect([1, 2, 1, 2].map(squared)).toEqual([1, 4, 1, 4]);
    expect(computed).toBe(2);
    expect([3, 1].map(squared)).toEqual([9, 1]);
    expect(computed).toBe(4);
    expect(() => boundedMemo((n: number) => n, 0)).toThrow('boundedMemo requires a limit of at least 1');
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { criticalValue, likelihoodInterval, proportionIntervals } from '@/lib/stats';

const share = fc.double({ min: 0.001, max: 0.999, noNaN: true });
const divergence = (p: number, x: number) => p * Math.log(p / x) + (1 - p) * Math.log((1 - p) / (1 - x));

describe('intervals of a share from its standard error', () => {
  test('fold an arcsine end beyond 0 back as R does, and set it to 0 when clamped', () => {
    const { arcsineT, arcsineClampedT } = proportionIntervals({
      p: 0.01,
      se: 0.02,
      n: 40,
      df: 20,
      level: 0.95,
    });
    expect(arcsineT?.[0]).toBeCloseTo(
      Math.sin(Math.asin(0.1) - (criticalValue(0.05, 20) * 0.02) / (2 * Math.sqrt(0.0099))) ** 2,
      14,
    );
    expect(arcsineT?.[0]).toBeGreaterThan(0);
    expect(arcsineClampedT?.[0]).toBe(0);
    expect(arcsineClampedT?.[1]).toBe(arcsineT?.[1]);
  });

  test('mirror each other for the share of the others', () => {
    fc.assert(
      fc.property(share, fc.double({ min: 0.001, max: 0.05, noNaN: true }), (p, se) => {
        const figures = { se, n: 400, df: 31, level: 0.9 };
        const mirrored = proportionIntervals({ ...figures, p: 1 - p });
        for (const [name, interval] of Object.entries(proportionIntervals({ ...figures, p }))) {
          const other = mirrored[name as keyof typeof mirrored];
          expect(other?.[0]).toBeCloseTo(1 - (interval?.[1] ?? Number.NaN), 9);
          expect(other?.[1]).toBeCloseTo(1 - (interval?.[0] ?? Number.NaN), 9);
        }
      }),
    );
  });

  test('cap the effective size of Korn and Graubard at the number of respondents', () => {
    const lucky = proportionIntervals({ p: 0.3, se: 0.01, n: 100, df: 40, level: 0.95 });
    const [low = 0, high = 1] = lucky.kornGraubardCapped ?? [];
    expect(low).toBeLessThan(lucky.kornGraubard?.[0] ?? 0);
    expect(high).toBeGreaterThan(lucky.kornGraubard?.[1] ?? 1);
    const unlucky = proportionIntervals({ p: 0.3, se: 0.06, n: 100, df: 40, level: 0.95 });
    expect(unlucky.kornGraubardCapped).toEqual(unlucky.kornGraubard);
  });

  test('leave out those of Korn and Graubard for one respondent', () => {
    const { kornGraubard, meanT } = proportionIntervals({ p: 0.3, se: 0.06, n: 1, df: 4, level: 0.95 });
    expect(kornGraubard).toBeNull();
    expect(meanT).not.toBeNull();
  });

  test('come near Student’s as the normal one when there are many degrees of freedom', () => {
    const { logitT, logitNormal } = proportionIntervals({ p: 0.3, se: 0.02, n: 1e6, df: 1e8, level: 0.95 });
    expect(logitT?.[0]).toBeCloseTo(logitNormal?.[0] ?? Number.NaN, 8);
  });
});

describe('the likelihood interval', () => {
  test.each([1e-9, 1e-17, 1e-40])('keeps its digits, in order, for a share of %d', (p) => {
    const [low, high] = likelihoodInterval(p, 4 / p, 1.959963984540054);
    const [rareLow, rareHigh] = likelihoodInterval(1e-6, 4e6, 1.959963984540054);
    expect(low).toBeLessThan(p);
    expect(low / p).toBeCloseTo(rareLow / 1e-6, 5);
    expect(high / p).toBeCloseTo(rareHigh / 1e-6, 5);
  });

  test('ends where twice the effective divergence is the square of the critical value', () => {
    fc.assert(
      fc.property(share, fc.double({ min: 10, max: 1e6, noNaN: true }), share, (p, effectiveN, alpha) => {
        const q = criticalValue(alpha, 12);
        for (const end of likelihoodInterval(p, effectiveN, q)) {
          if (end < 1e-12 || end > 1 - 1e-4) continue;
          expect(Math.abs(2 * effectiveN * divergence(p, end) - q * q)).toBeLessThan(1e-6 * (1 + q * q));
        }
      }),
    );
  });

  test('stays inside 0 and 1 for the smallest shares and samples', () => {
    const [low, high] = likelihoodInterval(1e-9, 0.5, 3);
    expect(low).toBeGreaterThanOrEqual(0);
    expect(high).toBeLessThanOrEqual(1);
    expect(low).toBeLessThanOrEqual(1e-9);
    expect(high).toBeGreaterThanOrEqual(1e-9);
  });
});

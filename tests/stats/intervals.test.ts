import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  clopperPearsonInterval,
  criticalValue,
  holm,
  kishDesignEffect,
  leadNullStandardError,
  leadStandardError,
  maximumMargin,
  newcombeInterval,
  shareStandardError,
  wilsonInterval,
} from '@/lib/stats';

const proportion = fc.double({ min: 0, max: 1, noNaN: true });
const size = fc.double({ min: 1, max: 1e6, noNaN: true });
const level = fc.double({ min: 0.51, max: 0.9999, noNaN: true });

describe('the handbook table of margins (common practice, no source)', () => {
  const table: [n: number, pointsAt95: number][] = [
    [400, 4.9],
    [600, 4.0],
    [1000, 3.1],
    [1500, 2.5],
  ];
  test.each(table)('a sample of %d has a margin of %d points', (n, points) => {
    expect(Number((100 * maximumMargin(n, 1, criticalValue(0.05, null))).toFixed(1))).toBe(points);
  });
});

describe('intervals of a share', () => {
  test('contain the share and stay inside 0 and 1', () => {
    fc.assert(
      fc.property(proportion, size, level, (p, n, confidence) => {
        const score = wilsonInterval(p, n, criticalValue(1 - confidence, null));
        const exact = clopperPearsonInterval(Math.min(n, n * p), n, confidence);
        for (const [low, high] of [score, exact]) {
          expect(low).toBeGreaterThanOrEqual(0);
          expect(low).toBeLessThanOrEqual(p + 1e-12);
          expect(high).toBeGreaterThanOrEqual(p - 1e-12);
          expect(high).toBeLessThanOrEqual(1);
        }
      }),
      { numRuns: 200 },
    );
  });

  test('mirror each other for the share of the others', () => {
    const [low, high] = wilsonInterval(0.3, 700, 1.96);
    const mirrored = wilsonInterval(0.7, 700, 1.96);
    expect(mirrored[0]).toBeCloseTo(1 - high, 14);
    expect(mirrored[1]).toBeCloseTo(1 - low, 14);
  });

  test('narrow with the sample', () => {
    fc.assert(
      fc.property(proportion, size, (p, n) => {
        const [low, high] = wilsonInterval(p, n, 1.96);
        const [lower, higher] = wilsonInterval(p, n / 2, 1.96);
        expect(higher - lower).toBeGreaterThan(high - low);
      }),
    );
  });
});

describe('the interval of a difference', () => {
  test('contains the difference and turns its sign with the order', () => {
    fc.assert(
      fc.property(proportion, size, proportion, size, (p1, n1, p2, n2) => {
        const [low, high] = newcombeInterval(p1, n1, p2, n2, 1.96);
        const turned = newcombeInterval(p2, n2, p1, n1, 1.96);
        expect(low).toBeLessThanOrEqual(p2 - p1);
        expect(high).toBeGreaterThanOrEqual(p2 - p1);
        expect(turned[0]).toBeCloseTo(-high, 12);
        expect(turned[1]).toBeCloseTo(-low, 12);
      }),
    );
  });
});

describe('standard errors', () => {
  test('a lead over nobody has the error of a share', () => {
    expect(leadStandardError(0.4, 0, 900, 1.3)).toBeCloseTo(shareStandardError(0.4, 900, 1.3), 15);
  });

  test('a lead among two options that share everything has twice the error of a share', () => {
    expect(leadStandardError(0.6, 0.4, 900, 1)).toBeCloseTo(2 * shareStandardError(0.6, 900, 1), 15);
  });

  test('a lead is never wider than under no lead', () => {
    fc.assert(
      fc.property(proportion, proportion, (a, rest) => {
        const b = (1 - a) * rest;
        expect(leadStandardError(a, b, 500, 1.2)).toBeLessThanOrEqual(leadNullStandardError(a, b, 500, 1.2));
      }),
    );
  });

  test('is 0, not NaN, for one option with everything', () => {
    expect(leadStandardError(1, 0, 500, 1)).toBe(0);
    expect(shareStandardError(0, 500, 1)).toBe(0);
  });
});

describe('kishDesignEffect', () => {
  test('is 1 for equal weights and does not depend on scale or order', () => {
    expect(kishDesignEffect([3, 3, 3])).toBe(1);
    expect(kishDesignEffect([1, 2, 4])).toBeCloseTo(kishDesignEffect([40, 10, 20]), 14);
    expect(kishDesignEffect([7])).toBe(1);
  });
});

describe('holm', () => {
  test('of one test is the test itself', () => {
    expect(holm([0.03], 0.05)).toEqual([{ alpha: 0.05, significant: true, pAdjusted: 0.03 }]);
    expect(holm([], 0.05)).toEqual([]);
  });

  test('stops at the first that misses its level, even if a later one would meet its own', () => {
    const [first, second] = holm([0.03, 0.04], 0.05);
    expect(first).toMatchObject({ alpha: 0.025, significant: false });
    expect(second).toMatchObject({ alpha: 0.05, significant: false });
  });

  test('ranks ties in the order given, also below 1e-300', () => {
    expect(holm([0.02, 0.02 * (1 + 1e-12), 0.02], 0.06).map(({ alpha }) => Number(alpha.toFixed(6)))).toEqual(
      [0.02, 0.03, 0.06],
    );
    expect(holm([1e-301, 0, 1e-310], 0.06).map(({ alpha }) => Number(alpha.toFixed(6)))).toEqual([
      0.02, 0.03, 0.06,
    ]);
  });

  test('finds a test significant exactly where its adjusted p is below alpha', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { maxLength: 12 }), (pValues) => {
        for (const { significant, pAdjusted } of holm(pValues, 0.05)) {
          if (Math.abs(pAdjusted - 0.05) > 1e-12) expect(significant).toBe(pAdjusted < 0.05);
        }
      }),
    );
  });
});

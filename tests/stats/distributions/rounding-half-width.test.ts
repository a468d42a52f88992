import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { roundingHalfWidth } from '@/lib/stats';

describe('roundingHalfWidth', () => {
  test('of one, two and four equal units is 0.475, 0.7764 and 1.1199 of the unit', () => {
    expect(roundingHalfWidth([0.5], 0.95)).toBeCloseTo(0.475, 14);
    expect(roundingHalfWidth([0.5, 0.5], 0.95)).toBeCloseTo(1 - Math.sqrt(0.05), 14);
    expect(roundingHalfWidth([0.5, 0.5, 0.5, 0.5], 0.95)).toBeCloseTo(1.1198882632066, 12);
  });

  test('of two unequal units is the closed form of a trapezoid', () => {
    const [wide, narrow] = [0.5, 0.05];
    const closed = wide + narrow - Math.sqrt(2 * (2 * wide) * (2 * narrow) * 0.025);
    expect(roundingHalfWidth([wide, narrow], 0.95)).toBeCloseTo(closed, 13);
  });

  test('keeps its digits with very unequal units', () => {
    expect(roundingHalfWidth([0.5, 0.5, 5e-7, 5e-7], 0.95)).toBeCloseTo(
      roundingHalfWidth([0.5, 0.5], 0.95),
      9,
    );
  });

  test('holds the stated part of simulated sums', () => {
    const halves = [0.5, 0.5, 0.05, 0.05];
    const width = roundingHalfWidth(halves, 0.95);
    const steps = 24;
    const grid = halves.map((half) =>
      Array.from({ length: steps }, (_, i) => half * ((2 * i + 1) / steps - 1)),
    );
    const sums = grid.reduce<number[]>(
      (all, points) => all.flatMap((sum) => points.map((point) => sum + point)),
      [0],
    );
    const inside = sums.filter((sum) => Math.abs(sum) <= width).length / sums.length;
    expect(inside).toBeGreaterThan(0.945);
    expect(inside).toBeLessThan(0.955);
  });

  test('does not depend on the order, scales with the unit, grows with coverage', () => {
    const half = fc.double({ min: 0.01, max: 5, noNaN: true });
    fc.assert(
      fc.property(fc.array(half, { minLength: 1, maxLength: 4 }), half, (halves, factor) => {
        const width = roundingHalfWidth(halves, 0.95);
        const scaled = roundingHalfWidth(halves.map((one) => one * factor).reverse(), 0.95);
        expect(scaled / factor).toBeCloseTo(width, 9);
        expect(roundingHalfWidth(halves, 0.5)).toBeLessThan(width);
        expect(width).toBeLessThan(halves.reduce((sum, one) => sum + one, 0));
      }),
      { numRuns: 30 },
    );
  });
});

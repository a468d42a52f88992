import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  impliedDesignEffect,
  impliedDesignEffectRange,
  kishDesignEffect,
  weightVariation,
} from '@/lib/stats';

const weights = fc.array(fc.double({ min: 0.01, max: 100, noNaN: true }), { minLength: 1, maxLength: 60 });

describe('the variation of weights', () => {
  test('gives n as effective size times design effect, and 1 plus cv² as the design effect', () => {
    fc.assert(
      fc.property(weights, (column) => {
        const { n, deff, effectiveN, cvSquared } = weightVariation(column);
        expect(effectiveN * deff).toBeCloseTo(n, 9);
        expect(deff).toBeCloseTo(1 + cvSquared, 10);
        expect(deff).toBeCloseTo(kishDesignEffect(column), 10);
      }),
    );
  });

  test('does not depend on the scale, were it the largest number there is', () => {
    expect(kishDesignEffect([1e308, 5e307])).toBeCloseTo(kishDesignEffect([2, 1]), 14);
    expect(kishDesignEffect([1e-320, 1e-320])).toBe(1);
    expect(weightVariation([3e90, 1e90]).cvSquared).toBeCloseTo(0.25, 14);
  });

  test('counts a weight of 0 as a respondent', () => {
    expect(weightVariation([0, 1, 1])).toMatchObject({
      n: 3,
      sumWeights: 2,
      sumSquaredWeights: 2,
      effectiveN: 2,
    });
  });
});

describe('the design effect that a margin implies', () => {
  test('lies in its range, which is that of the margins that print alike', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.005, max: 0.1, noNaN: true }),
        fc.integer({ min: 50, max: 5000 }),
        fc.constantFrom(0.001, 0.005, 0.01),
        (margin, n, unit) => {
          const { deff, range, effectiveN } = impliedDesignEffectRange(margin, n, 0.95, unit);
          expect(deff).toBeCloseTo(impliedDesignEffect(margin, n, 0.95), 12);
          expect(range[0]).toBeLessThan(deff);
          expect(range[1]).toBeCloseTo(impliedDesignEffect(margin + unit / 2, n, 0.95), 12);
          expect(effectiveN * deff).toBeCloseTo(n, 8);
        },
      ),
    );
  });

  test('begins at 0 where the rounding reaches as far as the margin', () => {
    expect(impliedDesignEffectRange(0.004, 900, 0.95, 0.01).range[0]).toBe(0);
  });

  test('is 1 at the margin of a simple random sample', () => {
    const { simpleRandomMargin } = impliedDesignEffectRange(0.03, 1000, 0.9, 0.001);
    expect(impliedDesignEffect(simpleRandomMargin, 1000, 0.9)).toBeCloseTo(1, 14);
  });
});

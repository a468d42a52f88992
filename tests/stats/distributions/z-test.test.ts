import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { normalP, twoSidedP, upperTailP, zTest } from '@/lib/stats';
import { expectP } from '../../support/reference';

const z = fc.double({ min: -35, max: 35, noNaN: true });

describe('the normal p-values of one statistic', () => {
  test('are two tails that make one, and twice the smaller', () => {
    fc.assert(
      fc.property(z, (statistic) => {
        const [less, greater] = [normalP(statistic, 'less'), normalP(statistic, 'greater')];
        expect(less + greater).toBeCloseTo(1, 12);
        expectP(normalP(statistic, 'two-sided'), 2 * Math.min(less, greater), 'two-sided');
        expect(normalP(statistic, 'two-sided')).toBe(twoSidedP(statistic, null));
        expect(greater).toBe(upperTailP(statistic, null));
      }),
    );
  });

  test('keep their digits far out (R 4.2.2 pnorm)', () => {
    expectP(normalP(-30, 'less'), 4.9067139271481872e-198, 'thirty');
    expectP(normalP(30, 'two-sided'), 2 * 4.9067139271481872e-198, 'thirty either way');
    expect(normalP(Infinity, 'greater')).toBe(0);
    expect(normalP(Infinity, 'less')).toBe(1);
  });
});

describe('a difference against its standard error', () => {
  test('has its sign and scale out of z', () => {
    fc.assert(
      fc.property(z, fc.double({ min: 0.001, max: 1000, noNaN: true }), (difference, unit) => {
        const one = zTest(difference, 1, 'two-sided');
        const scaled = zTest(difference * unit, unit, 'two-sided');
        expect(scaled.z ?? Number.NaN).toBeCloseTo(one.z ?? 0, 10);
        expect(one.z).toBe(difference);
      }),
    );
  });

  test('without a standard error is no test, whether there is a difference or not', () => {
    const untested = { kind: 'no-variance', standardError: 0, z: null, p: null };
    expect(zTest(0, 0, 'less')).toEqual({ ...untested, difference: 0 });
    expect(zTest(0.3, 0, 'two-sided')).toEqual({ ...untested, difference: 0.3 });
  });
});

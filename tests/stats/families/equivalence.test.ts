import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { equivalenceTest, upperTailP } from '@/lib/stats';
import { expectP } from '../../support/reference';

const difference = fc.double({ min: -10, max: 10, noNaN: true });
const error = fc.double({ min: 0.01, max: 5, noNaN: true });
const alpha = fc.double({ min: 0.001, max: 0.4, noNaN: true });
const df = fc.option(fc.integer({ min: 1, max: 500 }));

describe('the two one-sided tests', () => {
  test('find a difference equivalent exactly where the 1 − 2α interval lies inside the margin', () => {
    fc.assert(
      fc.property(difference, error, alpha, df, (observed, se, a, freedom) => {
        const tested = equivalenceTest(observed, se, 3, a, freedom);
        if (tested.kind !== 'tested') throw new Error('an error above 0 gives a test');
        fc.pre(Math.abs(tested.p - a) > 1e-9);
        const [low, high] = tested.interval;
        expect(tested.equivalent).toBe(low > -3 && high < 3);
        expect(tested.p).toBe(Math.max(tested.pAboveLow, tested.pBelowHigh));
      }),
    );
  });

  test('swap their p-values when the sign of the difference turns', () => {
    fc.assert(
      fc.property(difference, error, df, (observed, se, freedom) => {
        const one = equivalenceTest(observed, se, 3, 0.05, freedom);
        const turned = equivalenceTest(-observed, se, 3, 0.05, freedom);
        if (one.kind !== 'tested' || turned.kind !== 'tested')
          throw new Error('an error above 0 gives a test');
        expect(turned.pAboveLow).toBe(one.pBelowHigh);
        expect(turned.interval[0]).toBeCloseTo(-one.interval[1], 12);
      }),
    );
  });

  test('never find equivalent what lies outside the margin', () => {
    fc.assert(
      fc.property(error, alpha, df, (se, a, freedom) => {
        expect(equivalenceTest(3, se, 3, a, freedom).equivalent).toBe(false);
        expect(equivalenceTest(-4, se, 3, a, freedom).equivalent).toBe(false);
      }),
    );
  });

  test('are harder with Student’s t than with the normal distribution', () => {
    expect(equivalenceTest(0.5, 1, 3, 0.05, 8).p ?? 0).toBeGreaterThan(
      equivalenceTest(0.5, 1, 3, 0.05, null).p ?? 1,
    );
  });

  test('have p-values of R 4.2.2 pnorm and pt', () => {
    expectP(equivalenceTest(0.5, 1, 3, 0.05, null).p ?? 2, 0.0062096653257761349, 'pnorm(-2.5)');
    expectP(equivalenceTest(0.5, 1, 3, 0.05, 8).p ?? 2, 0.018471018856812033, 'pt(-2.5, 8)');
    expectP(upperTailP(30, null), 4.9067139271481872e-198, 'pnorm(-30)');
    expectP(upperTailP(30, 12), 5.8865909535094731e-13, 'pt(-30, 12)');
  });

  test('say that without variance there is no test', () => {
    expect(equivalenceTest(0, 0, 3, 0.05, null)).toEqual({ kind: 'no-variance', p: null, equivalent: null });
  });
});

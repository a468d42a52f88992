import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { holm } from '@/lib/stats';

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
    const alphas = (family: number[]) => holm(family, 0.06).map(({ alpha }) => Number(alpha.toFixed(6)));
    expect(alphas([0.02, 0.02 * (1 + 1e-12), 0.02])).toEqual([0.02, 0.03, 0.06]);
    expect(alphas([1e-301, 0, 1e-310])).toEqual([0.02, 0.03, 0.06]);
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

import betainc from '@stdlib/math-base-special-betainc';
import { required } from '../require';

/**
 * Two-sided p-value of the sign test of a lead, on effective counts that need not be whole.
 *
 * Use it where the two options together have few effective counts; with many it agrees with the score test.
 *
 * @param first effective count of the first option, at least 0
 * @param second effective count of the second, at least 0
 * @returns min(1, 2·I₀.₅(larger, smaller + 1)); 1 without any counts
 * @throws RangeError `exactSignP requires counts of at least 0`
 * @see R 4.2.2 `binom.test(first, first + second)` for whole counts
 * @example
 * exactSignP(9, 1); // => 0.021484375
 * exactSignP(0, 0); // => 1
 */
export function exactSignP(first: number, second: number): number {
  required(first >= 0 && second >= 0, 'exactSignP', 'counts of at least 0');
  const larger = Math.max(first, second);
  if (larger === 0) return 1;
  return Math.min(1, 2 * betainc(0.5, larger, Math.min(first, second) + 1));
}

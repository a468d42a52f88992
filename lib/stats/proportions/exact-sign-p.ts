import { required } from '../require';
import { signTest } from './sign-test';

/**
 * Two-sided p-value of the sign test of a lead, for a verdict: no counts speak for nobody and give 1.
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
  const usable = first >= 0 && second >= 0 && Number.isFinite(first + second);
  required(usable, 'exactSignP', 'counts of at least 0');
  return signTest(first, second, 'two-sided') ?? 1;
}

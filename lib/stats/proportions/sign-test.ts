import betainc from '@stdlib/math-base-special-betainc';
import type { Alternative } from '../distributions/alternative';
import { required } from '../require';

/**
 * Exact sign test of a lead: whether those who chose one of the two options chose the first more often than by chance.
 *
 * Use it where the two together have few answers; with many it agrees with the score test of the lead. It knows no
 * design effect: pass effective counts, which need not be whole.
 *
 * @param first effective count of the first option, at least 0
 * @param second effective count of the second, at least 0
 * @param alternative what the test looks for in first − second
 * @returns probability 0–1, two-sided twice the smaller tail and at most 1; null without any counts
 * @throws RangeError `signTest requires counts of at least 0`
 * @see R 4.2.2 `binom.test(first, first + second, 0.5, alternative)` for whole counts
 * @example
 * signTest(9, 1, 'two-sided'); // => 0.021484375
 * signTest(9, 1, 'greater'); // => 0.0107421875
 * signTest(0, 0, 'two-sided'); // => null
 */
export function signTest(first: number, second: number, alternative: Alternative): number | null {
  const usable = first >= 0 && second >= 0 && Number.isFinite(first + second);
  required(usable, 'signTest', 'counts of at least 0');
  if (first + second === 0) return null;
  if (alternative === 'greater') return atLeast(first, second);
  if (alternative === 'less') return atLeast(second, first);
  return Math.min(1, 2 * atLeast(Math.max(first, second), Math.min(first, second)));
}

function atLeast(count: number, others: number): number {
  return count === 0 ? 1 : betainc(0.5, count, others + 1);
}

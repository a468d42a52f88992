import type { Interval } from '../interval';
import { isPositive, required } from '../require';

/**
 * The score interval of a share with continuity correction: what a corrected score test would not reject.
 *
 * Use it for unweighted counts where covering too seldom is worse than being wide. A correction of half a person
 * means nothing for effective counts, so those have no such interval.
 *
 * @param x count of the share, 0–n
 * @param n sample size, above 0
 * @param q critical value, above 0
 * @returns proportions inside 0–1, 0 at x = 0 and 1 at x = n; null where x or n is not whole
 * @throws RangeError `wilsonCorrectedInterval requires n above 0`
 * @throws RangeError `wilsonCorrectedInterval requires x from 0 to n`
 * @throws RangeError `wilsonCorrectedInterval requires q above 0`
 * @see Newcombe (1998), Statistics in Medicine 17, 857–872, method 4 (from memory); checked against R 4.2.2
 *   `prop.test(correct = TRUE)`
 * @example
 * wilsonCorrectedInterval(81, 263, 1.959963984540054); // => [0.2535086..., 0.3681762...]
 * wilsonCorrectedInterval(81.5, 263, 1.959963984540054); // => null
 */
export function wilsonCorrectedInterval(x: number, n: number, q: number): Interval | null {
  required(isPositive(n), 'wilsonCorrectedInterval', 'n above 0');
  required(x >= 0 && x <= n, 'wilsonCorrectedInterval', 'x from 0 to n');
  required(isPositive(q), 'wilsonCorrectedInterval', 'q above 0');
  if (!Number.isInteger(x) || !Number.isInteger(n)) return null;
  const p = x / n;
  const others = n * (1 - p);
  const square = q * q;
  const scale = 2 * (n + square);
  const below = square - 2 - 1 / n + 4 * p * (others + 1);
  const above = square + 2 - 1 / n + 4 * p * (others - 1);
  const low = x === 0 ? 0 : (2 * x + square - 1 - q * Math.sqrt(Math.max(0, below))) / scale;
  const high = x === n ? 1 : (2 * x + square + 1 + q * Math.sqrt(Math.max(0, above))) / scale;
  return [Math.max(0, low), Math.min(1, high)];
}

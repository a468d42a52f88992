import type { Interval } from '../interval';
import { isPositive, isProportion, required } from '../require';

/**
 * The score interval of a share: the values that a score test would not reject.
 *
 * Use it for shares with at least ten effective counts on either side; below, the exact interval.
 *
 * @param p observed share, 0–1
 * @param n effective sample size, above 0, need not be whole
 * @param q critical value, above 0
 * @returns proportions, always inside 0–1
 * @throws RangeError `wilsonInterval requires p from 0 to 1`
 * @throws RangeError `wilsonInterval requires n above 0`
 * @throws RangeError `wilsonInterval requires q above 0`
 * @see Wilson (1927), Journal of the American Statistical Association 22, 209–212 (from memory); checked against
 *   R 4.2.2 `prop.test(correct = FALSE)`
 * @example
 * wilsonInterval(0.5, 100, 1.959963984540054); // => [0.4038315..., 0.5961684...]
 * wilsonInterval(0, 100, 1.959963984540054); // => [0, 0.0369934...]
 */
export function wilsonInterval(p: number, n: number, q: number): Interval {
  required(isProportion(p), 'wilsonInterval', 'p from 0 to 1');
  required(isPositive(n), 'wilsonInterval', 'n above 0');
  required(isPositive(q), 'wilsonInterval', 'q above 0');
  const centre = p + (q * q) / (2 * n);
  const half = q * Math.sqrt((p * (1 - p)) / n + (q * q) / (4 * n * n));
  const scale = 1 + (q * q) / n;
  const low = p === 0 ? 0 : (p * p) / (centre + half);
  const high = p === 1 ? 1 : Math.min(1, (centre + half) / scale);
  return [low, high];
}

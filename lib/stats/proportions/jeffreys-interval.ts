import { betaLowerQuantile, betaUpperQuantile } from '../distributions/beta-quantiles';
import type { Interval } from '../interval';
import { isInside, isPositive, required } from '../require';

/**
 * The equal-tailed posterior interval of a share under Jeffreys' prior, Beta(x + ½, n − x + ½).
 *
 * Use it for small counts where the exact interval is too wide; it covers about as promised on average, not always.
 *
 * @param x effective count of the share, 0–n
 * @param n effective sample size, above 0
 * @param level probability inside, inside 0–1
 * @param ends 'modified': the low end is 0 at x = 0 and the high end 1 at x = n, as Brown, Cai and DasGupta advise;
 *   'raw': the quantiles as they are
 * @returns proportions inside 0–1
 * @throws RangeError `jeffreysInterval requires n above 0`
 * @throws RangeError `jeffreysInterval requires x from 0 to n`
 * @throws RangeError `jeffreysInterval requires level inside 0 and 1`
 * @see Brown, Cai and DasGupta (2001), Statistical Science 16, 101–133 (from memory); checked against R 4.2.2 `qbeta`
 * @example
 * jeffreysInterval(4, 100, 0.95, 'modified'); // => [0.0136498..., 0.0922896...]
 * jeffreysInterval(0, 30, 0.95, 'modified')[0]; // => 0
 */
export function jeffreysInterval(x: number, n: number, level: number, ends: 'modified' | 'raw'): Interval {
  required(isPositive(n), 'jeffreysInterval', 'n above 0');
  required(x >= 0 && x <= n, 'jeffreysInterval', 'x from 0 to n');
  required(isInside(level), 'jeffreysInterval', 'level inside 0 and 1');
  const tail = (1 - level) / 2;
  const [a, b] = [x + 0.5, n - x + 0.5];
  const low = ends === 'modified' && x === 0 ? 0 : betaLowerQuantile(tail, a, b);
  const high = ends === 'modified' && x === n ? 1 : betaUpperQuantile(tail, a, b);
  return [low, high];
}

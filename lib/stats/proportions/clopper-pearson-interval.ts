import { betaLowerQuantile, betaUpperQuantile } from '../distributions/beta-quantiles';
import type { Interval } from '../interval';
import { isInside, isPositive, required } from '../require';

/**
 * The exact interval of a share, from quantiles of the beta distribution; the count need not be whole.
 *
 * Use it where counts are small: it covers at least as often as promised, and is wider than the score interval.
 *
 * @param x effective count of the share, 0–n
 * @param n effective sample size, above 0
 * @param level confidence level, inside 0–1
 * @returns proportions inside 0–1; the low end is 0 at x = 0, the high end 1 at x = n
 * @throws RangeError `clopperPearsonInterval requires n above 0`
 * @throws RangeError `clopperPearsonInterval requires x from 0 to n`
 * @throws RangeError `clopperPearsonInterval requires level inside 0 and 1`
 * @see Clopper and Pearson (1934), Biometrika 26, 404–413 (from memory); checked against R 4.2.2 `qbeta`
 * @example
 * clopperPearsonInterval(4, 100, 0.95); // => [0.0110044..., 0.0992571...]
 */
export function clopperPearsonInterval(x: number, n: number, level: number): Interval {
  required(isPositive(n), 'clopperPearsonInterval', 'n above 0');
  required(x >= 0 && x <= n, 'clopperPearsonInterval', 'x from 0 to n');
  required(isInside(level), 'clopperPearsonInterval', 'level inside 0 and 1');
  const tail = (1 - level) / 2;
  const low = x === 0 ? 0 : betaLowerQuantile(tail, x, n - x + 1);
  const high = x === n ? 1 : betaUpperQuantile(tail, x + 1, n - x);
  return [low, high];
}

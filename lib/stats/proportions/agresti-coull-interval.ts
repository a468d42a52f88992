import type { Interval } from '../interval';
import { isPositive, required } from '../require';

/**
 * The interval of a share after adding q²/2 answers to either side (Agresti and Coull).
 *
 * Use it where a Wald interval is asked for by hand; it holds the Wilson interval inside and is a little wider.
 *
 * @param x effective count of the share, 0–n
 * @param n effective sample size, above 0
 * @param q critical value, above 0
 * @returns proportions, not cut to 0–1 (see withinUnit)
 * @throws RangeError `agrestiCoullInterval requires n above 0`
 * @throws RangeError `agrestiCoullInterval requires x from 0 to n`
 * @throws RangeError `agrestiCoullInterval requires q above 0`
 * @see Agresti and Coull (1998), The American Statistician 52, 119–126 (from memory); closed form in R 4.2.2
 * @example
 * agrestiCoullInterval(4, 100, 1.959963984540054); // => [0.0124..., 0.1016...]
 */
export function agrestiCoullInterval(x: number, n: number, q: number): Interval {
  required(isPositive(n), 'agrestiCoullInterval', 'n above 0');
  required(x >= 0 && x <= n, 'agrestiCoullInterval', 'x from 0 to n');
  required(isPositive(q), 'agrestiCoullInterval', 'q above 0');
  const more = n + q * q;
  const centre = (x + (q * q) / 2) / more;
  const half = q * Math.sqrt((centre * (1 - centre)) / more);
  return [centre - half, centre + half];
}

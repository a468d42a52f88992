import studentCdf from '@stdlib/stats-base-dists-t-cdf';
import { normalUpperTail } from './normal-upper-tail';
import { required } from '../require';

/**
 * The two-sided p-value of a test statistic: normal, or Student's t where the variance was estimated.
 *
 * @param z the estimate divided by its standard error
 * @param df degrees of freedom of the variance estimate, at least 1; null for the normal distribution
 * @returns probability 0–1, with its digits down to 1e-300
 * @throws RangeError `twoSidedP requires a finite statistic`
 * @throws RangeError `twoSidedP requires df of at least 1, or null`
 * @see R 4.2.2 `2 * pnorm(-abs(z))`, `2 * pt(-abs(z), df)`
 * @example
 * twoSidedP(1.6975, null); // => 0.0896021...
 * twoSidedP(2.1, 58); // => 0.0400886...
 */
export function twoSidedP(z: number, df: number | null): number {
  required(Number.isFinite(z), 'twoSidedP', 'a finite statistic');
  required(df === null || df >= 1, 'twoSidedP', 'df of at least 1, or null');
  const tail = df === null ? normalUpperTail(Math.abs(z)) : studentCdf(-Math.abs(z), df);
  return Math.min(1, 2 * tail);
}

import studentCdf from '@stdlib/stats-base-dists-t-cdf';
import { normalUpperTail } from './normal-upper-tail';
import { required } from '../require';

/**
 * The one-sided p-value of a test statistic: normal, or Student's t where the variance was estimated.
 *
 * @param z the estimate less what it is tested against, divided by its standard error; finite
 * @param df degrees of freedom of the variance estimate, at least 1; null for the normal distribution
 * @returns the probability of a larger statistic, 0–1
 * @throws RangeError `upperTailP requires a finite statistic`
 * @throws RangeError `upperTailP requires df of at least 1, or null`
 * @see R 4.2.2 `pnorm(z, lower.tail = FALSE)`, `pt(z, df, lower.tail = FALSE)`
 * @example
 * upperTailP(1.6448536269514729, null); // => 0.05
 * upperTailP(2.1, 58); // => 0.0200443...
 */
export function upperTailP(z: number, df: number | null): number {
  required(Number.isFinite(z), 'upperTailP', 'a finite statistic');
  required(df === null || df >= 1, 'upperTailP', 'df of at least 1, or null');
  return df === null ? normalUpperTail(z) : studentCdf(-z, df);
}

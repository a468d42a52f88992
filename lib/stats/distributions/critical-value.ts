import studentQuantile from '@stdlib/stats-base-dists-t-quantile';
import { normalQuantile } from './normal-quantile';
import { isInside, required } from '../require';

/** From here on Student's t is normal to twelve digits; soon after, the library's quantile is 0 (measured at 1e17). */
const AS_NORMAL = 1e15;

/**
 * The value that a test statistic must exceed on either side to be significant at alpha.
 *
 * For a one-sided test at alpha pass 2·alpha.
 *
 * @param alpha two-sided error probability, inside 0–1
 * @param df degrees of freedom, at least 1, for Student's t; null for the normal distribution
 * @throws RangeError `criticalValue requires alpha inside 0 and 1`
 * @throws RangeError `criticalValue requires df of at least 1, or null`
 * @see R 4.2.2 `-qnorm(alpha / 2)`, `-qt(alpha / 2, df)`
 * @example
 * criticalValue(0.05, null); // => 1.959963984540054
 * criticalValue(0.05, 58); // => 2.0017174...
 */
export function criticalValue(alpha: number, df: number | null): number {
  required(isInside(alpha), 'criticalValue', 'alpha inside 0 and 1');
  required(df === null || df >= 1, 'criticalValue', 'df of at least 1, or null');
  return df === null || df >= AS_NORMAL ? -normalQuantile(alpha / 2) : -studentQuantile(alpha / 2, df);
}

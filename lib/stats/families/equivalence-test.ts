import { criticalValue } from '../distributions/critical-value';
import { upperTailP } from '../distributions/upper-tail-p';
import type { Interval } from '../interval';
import { isPositive, required } from '../require';

export type EquivalenceTest = {
  readonly kind: 'tested';
  /** p of the test that the true difference is not at or below −indifference. */
  readonly pAboveLow: number;
  /** p of the test that the true difference is not at or above indifference. */
  readonly pBelowHigh: number;
  /** The larger of the two. */
  readonly p: number;
  /** p is below alpha: the true difference lies inside ± indifference. */
  readonly equivalent: boolean;
  /** The 1 − 2·alpha interval of the difference; equivalent where it lies inside ± indifference. */
  readonly interval: Interval;
};

/** Without variance there is no test of equivalence. */
export type NoEquivalenceTest = { readonly kind: 'no-variance'; readonly p: null; readonly equivalent: null };

/**
 * Two one-sided tests: whether a difference is small enough not to matter.
 *
 * Use it before printing "little changed". A difference that is not significant is not thereby small; most pairs of polls
 * are too small to show equivalence within three points.
 *
 * @param difference what was observed, finite
 * @param standardError its standard error, in the same unit, at least 0
 * @param indifference differences below this, either way, do not matter; above 0
 * @param alpha error probability, above 0 and below 0.5
 * @param df degrees of freedom, at least 1, for Student's t; null for the normal distribution
 * @returns both p-values, the verdict and the interval; kind 'no-variance' for a standard error of 0
 * @throws RangeError `equivalenceTest requires a finite difference`
 * @throws RangeError `equivalenceTest requires a finite standard error of at least 0`
 * @throws RangeError `equivalenceTest requires indifference above 0`
 * @throws RangeError `equivalenceTest requires alpha above 0 and below 0.5`
 * @throws RangeError `equivalenceTest requires df of at least 1, or null`
 * @see Schuirmann (1987), Journal of Pharmacokinetics and Biopharmaceutics 15, 657–680 (from memory)
 * @example
 * equivalenceTest(0.5, 1, 3, 0.05, null).p; // => 0.0062096...
 * equivalenceTest(0.5, 1, 3, 0.05, null).interval; // => [-1.1448536..., 2.1448536...]
 * equivalenceTest(0.5, 0, 3, 0.05, null).kind; // => 'no-variance'
 */
export function equivalenceTest(
  difference: number,
  standardError: number,
  indifference: number,
  alpha: number,
  df: number | null,
): EquivalenceTest | NoEquivalenceTest {
  required(Number.isFinite(difference), 'equivalenceTest', 'a finite difference');
  const usable = standardError >= 0 && Number.isFinite(standardError);
  required(usable, 'equivalenceTest', 'a finite standard error of at least 0');
  required(isPositive(indifference), 'equivalenceTest', 'indifference above 0');
  required(alpha > 0 && alpha < 0.5, 'equivalenceTest', 'alpha above 0 and below 0.5');
  required(df === null || df >= 1, 'equivalenceTest', 'df of at least 1, or null');
  const fromLow = (difference + indifference) / standardError;
  const fromHigh = (indifference - difference) / standardError;
  if (standardError === 0 || !Number.isFinite(fromLow) || !Number.isFinite(fromHigh)) {
    return { kind: 'no-variance', p: null, equivalent: null };
  }
  const pAboveLow = upperTailP(fromLow, df);
  const pBelowHigh = upperTailP(fromHigh, df);
  const p = Math.max(pAboveLow, pBelowHigh);
  const half = criticalValue(2 * alpha, df) * standardError;
  const interval: Interval = [difference - half, difference + half];
  return { kind: 'tested', pAboveLow, pBelowHigh, p, equivalent: p < alpha, interval };
}

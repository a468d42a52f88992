import { twoSidedP } from '../distributions/two-sided-p';
import { isPositive, required } from '../require';
import { extended, type Extended } from './extended';
import { requirePollAndResult } from './shares';

export type PredictiveAccuracy = {
  /** Above 0 where the poll favoured the first of the pair; 0 is no bias. */
  a: Extended;
  se: Extended;
  z: Extended;
  pValue: number | null;
};

/**
 * The bias of a poll between two candidates, as the logarithm of an odds ratio (the A measure).
 *
 * Use it to compare polls of different races: unlike the error of the lead it does not hang on how many are
 * undecided or vote for others.
 *
 * @param poll shares 0–1; only the first two count
 * @param result shares 0–1 of the same candidates in the same order
 * @param n sample size, above 0
 * @param deff design effect, above 0
 * @returns a share of 0 makes the measure unbounded: `'Infinity'`, `'-Infinity'`, or null for 0/0
 * @throws RangeError `predictiveAccuracy requires poll and result of the same two or more candidates`
 * @throws RangeError `predictiveAccuracy requires shares from 0 to 1`
 * @throws RangeError `predictiveAccuracy requires shares that are not all 0`
 * @throws RangeError `predictiveAccuracy requires n and deff above 0`
 * @see Martin, Traugott and Kennedy (2005), Public Opinion Quarterly 69, 342–369 (from memory); closed forms in
 *   R 4.2.2, standard error by the delta method
 * @example
 * predictiveAccuracy([0.48, 0.44], [0.46, 0.47], 1000, 1.4).a; // => 0.108517...
 */
export function predictiveAccuracy(
  poll: readonly number[],
  result: readonly number[],
  n: number,
  deff: number,
): PredictiveAccuracy {
  requirePollAndResult(poll, result, 'predictiveAccuracy');
  required(isPositive(n) && isPositive(deff), 'predictiveAccuracy', 'n and deff above 0');
  const [p1 = 0, p2 = 0] = poll;
  const [r1 = 0, r2 = 0] = result;
  const a = Math.log(p1 / p2 / (r1 / r2));
  const se = Math.sqrt((deff * (1 / p1 + 1 / p2)) / n);
  const z = a / se;
  return { a: extended(a), se: extended(se), z: extended(z), pValue: pValueOf(z) };
}

function pValueOf(z: number): number | null {
  if (Number.isNaN(z)) return null;
  return Number.isFinite(z) ? twoSidedP(z, null) : 0;
}

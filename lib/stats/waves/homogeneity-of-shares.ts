import { chiSquareUpperTail } from './chi-square-upper-tail';
import { effectiveSize, pooledShare, requireShares, sumOf, type PolledShare } from './polls';

export type ShareHomogeneity = {
  /** The share in all polls together. */
  pooled: number;
  /** Pearson's chi-square on effective counts; null where every poll found 0, or every one 1. */
  chiSquare: number | null;
  /** Polls less one. */
  df: number;
  pValue: number | null;
  /** Mean weighted by each poll's own variance; null, as Cochran's Q is, where some share is 0 or 1. */
  inverseVarianceMean: number | null;
  cochranQ: number | null;
  cochranQPValue: number | null;
};

/**
 * Whether several polls of one share differ by more than their sampling errors.
 *
 * Use it on comparable polls whose number was fixed beforehand. A large p-value is not a sign that the polls
 * agree, nor a small spread one that anybody copied.
 *
 * @param polls two or more, in any order
 * @throws RangeError `homogeneityOfShares requires at least two polls`
 * @throws RangeError `homogeneityOfShares requires n and deff above 0`
 * @throws RangeError `homogeneityOfShares requires shares from 0 to 1`
 * @see R 4.2.2 `prop.test(p * n / deff, n / deff, correct = FALSE)`; Cochran (1954), Biometrics 10, 101–129
 *   (from memory)
 * @example
 * homogeneityOfShares([
 *   { p: 0.42, n: 1000, deff: 1.4 },
 *   { p: 0.47, n: 800, deff: 1.2 },
 * ]).pValue; // => 0.0616711...
 */
export function homogeneityOfShares(polls: readonly PolledShare[]): ShareHomogeneity {
  requireShares(polls, 'homogeneityOfShares');
  const pooled = pooledShare(polls);
  const df = polls.length - 1;
  const variance = pooled * (1 - pooled);
  const spread = sumOf(polls.map((poll) => effectiveSize(poll) * (poll.p - pooled) ** 2));
  const chiSquare = variance > 0 ? spread / variance : null;
  const pValue = chiSquare === null ? null : chiSquareUpperTail(chiSquare, df);
  return { pooled, chiSquare, df, pValue, ...cochran(polls, df) };
}

function cochran(polls: readonly PolledShare[], df: number) {
  const precisions = polls.map((poll) => effectiveSize(poll) / (poll.p * (1 - poll.p)));
  if (!precisions.every(Number.isFinite)) {
    return { inverseVarianceMean: null, cochranQ: null, cochranQPValue: null };
  }
  const weightOf = (index: number) => precisions[index] ?? 0;
  const mean = sumOf(polls.map((poll, index) => weightOf(index) * poll.p)) / sumOf(precisions);
  const cochranQ = sumOf(polls.map((poll, index) => weightOf(index) * (poll.p - mean) ** 2));
  return { inverseVarianceMean: mean, cochranQ, cochranQPValue: chiSquareUpperTail(cochranQ, df) };
}

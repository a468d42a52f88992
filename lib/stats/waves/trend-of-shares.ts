import { twoSidedP } from '../distributions/two-sided-p';
import { required } from '../require';
import { chiSquareUpperTail } from './chi-square-upper-tail';
import { effectiveSize, pooledShare, requireShares, sumOf, type PolledShare } from './polls';

export type ScoredShare = PolledShare & {
  /** Where the poll stands: its day, or its place in the row. */
  readonly score: number;
};

export type ShareTrend = {
  /** The share in all polls together. */
  pooled: number;
  /** Change of the share by one unit of score. */
  slope: number;
  /** Null, as all tests are, where every poll found 0, or every one 1. */
  z: number | null;
  /** z². */
  chiSquare: number | null;
  df: 1;
  pValue: number | null;
  /** How far the shares stray from the line. */
  chiSquareDeparture: number | null;
  /** Polls less two. */
  dfDeparture: number;
  /** Null with two polls too, which are always on a line. */
  pValueDeparture: number | null;
};

/**
 * Whether a share rises or falls steadily from poll to poll (Cochran–Armitage).
 *
 * Use it on comparable polls whose number was fixed beforehand. A significant departure says that a straight line
 * is not the story.
 *
 * @param polls two or more, in any order; scores on any scale
 * @throws RangeError `trendOfShares requires at least two polls`
 * @throws RangeError `trendOfShares requires n and deff above 0`
 * @throws RangeError `trendOfShares requires shares from 0 to 1`
 * @throws RangeError `trendOfShares requires scores that are finite and not all equal`
 * @see Armitage (1955), Biometrics 11, 375–386 (from memory); R 4.2.2 `prop.trend.test(p * n / deff, n / deff, score)`
 * @example
 * trendOfShares([0.4, 0.42, 0.45].map((p, score) => ({ p, n: 900, deff: 1, score }))).pValue; // => 0.0318166...
 */
export function trendOfShares(polls: readonly ScoredShare[]): ShareTrend {
  requireShares(polls, 'trendOfShares');
  const sizes = sumOf(polls.map(effectiveSize));
  const pooled = pooledShare(polls);
  const middle = sumOf(polls.map((poll) => effectiveSize(poll) * poll.score)) / sizes;
  const scatter = sumOf(polls.map((poll) => effectiveSize(poll) * (poll.score - middle) ** 2));
  required(
    polls.every(({ score }) => Number.isFinite(score)) && scatter > 0 && Number.isFinite(scatter),
    'trendOfShares',
    'scores that are finite and not all equal',
  );
  const product = sumOf(polls.map((poll) => effectiveSize(poll) * (poll.p - pooled) * (poll.score - middle)));
  const slope = product / scatter;
  const residuals = polls.map(
    (poll) => effectiveSize(poll) * (poll.p - pooled - slope * (poll.score - middle)) ** 2,
  );
  return { pooled, slope, ...tests(product, scatter, sumOf(residuals), pooled, polls.length - 2) };
}

function tests(product: number, scatter: number, stray: number, pooled: number, dfDeparture: number) {
  const variance = pooled * (1 - pooled);
  if (variance === 0) {
    const none = { z: null, chiSquare: null, pValue: null, chiSquareDeparture: null, pValueDeparture: null };
    return { ...none, df: 1 as const, dfDeparture };
  }
  const z = product / Math.sqrt(variance * scatter);
  const chiSquareDeparture = stray / variance;
  return {
    z,
    chiSquare: z * z,
    df: 1 as const,
    pValue: twoSidedP(z, null),
    chiSquareDeparture,
    dfDeparture,
    pValueDeparture: dfDeparture > 0 ? chiSquareUpperTail(chiSquareDeparture, dfDeparture) : null,
  };
}

import { clopperPearsonInterval, criticalValue, isBelow, type Interval } from '@/lib/stats';

const SMALLEST_N = 30;
const TOO_WIDE = 0.3;
const NARROW = 0.05;
const LARGEST_RELATIVE_WIDTH = 1.3;
const FEWEST_DF = 8;

/** Why a share is not shown, or wants a statistician's look first. */
export type PresentationReason =
  /** Suppressed: fewer than 30 people, or 30 effective ones. */
  | 'fewer-than-30'
  /** Suppressed: the interval is 30 points wide or wider. */
  | 'interval-too-wide'
  /** Suppressed: the interval is wider than 130 percent of the share. */
  | 'relative-width'
  /** Review: nobody, or everybody, gave the answer. */
  | 'no-events'
  /** Review: fewer than 8 degrees of freedom. */
  | 'few-clusters';

export type ShareToPresent = {
  /** Share, 0–1. */
  p: number;
  /** People asked, whole, at least 1. */
  n: number;
  /** Effective sample size, above 0. */
  nEff: number;
  /** Degrees of freedom of a design-based variance; absent or null where none are known. */
  df?: number | null;
  /** Level of the interval, inside 0–1; the standard asks for 0.95, which is the default. */
  level?: number;
};

export type Presentation = {
  outcome: 'show' | 'review' | 'suppress';
  /** All that apply, in the order of the type: what suppresses, then what asks for review. */
  reasons: PresentationReason[];
  /** Exact interval on effective counts, proportions. */
  interval: Interval;
  /** Effective size that the interval stands on: adjusted for df, at most n. */
  nEffUsed: number;
  /** Width of the interval, a proportion. */
  width: number;
  /** Width over the share; null for a share of 0. */
  relativeWidth: number | null;
  /** Width over the share of everyone else; null for a share of 1. */
  relativeWidthOfRest: number | null;
  /** A share that may be shown while what is left to 100 percent may not: say so beside it. */
  restUnreliable: boolean;
};

/**
 * Whether a share of a small base may be shown, after the standard that a health statistics office published.
 *
 * Use it for subgroups: one below the standard gets no verdict. Whole samples of an ordinary poll always pass
 * unless the share is tiny.
 *
 * Suppress with fewer than 30 people or effective ones; with an interval 30 points wide or wider; and, unless the
 * interval is 5 points wide or narrower, where it is wider than 130 percent of the share. Review where nobody or
 * everybody gave the answer, or on fewer than 8 degrees of freedom. What is nearly equal to a limit is equal to it.
 *
 * @param share the share, its base and the level of the interval
 * @returns the outcome with its reasons, the interval and its widths
 * @throws RangeError `presentShare requires p from 0 to 1`
 * @throws RangeError `presentShare requires a whole n of at least 1`
 * @throws RangeError `presentShare requires nEff above 0`
 * @throws RangeError `presentShare requires df of at least 1, or null`
 * @throws RangeError `presentShare requires level inside 0 and 1`
 * @see Parker et al. (2017), Vital and Health Statistics 2(175), thresholds from memory; interval of Korn and
 *   Graubard (1998), Survey Methodology 24, 193–201, from memory; R 4.2.2 `qbeta`, `qt`
 * @example
 * presentShare({ p: 0.12, n: 300, nEff: 40 }).outcome; // => 'suppress'
 * presentShare({ p: 0.12, n: 300, nEff: 40 }).reasons; // => ['relative-width']
 * presentShare({ p: 0.1, n: 300, nEff: 100 }).interval; // => [0.0490046..., 0.1762225...]
 */
export function presentShare({ p, n, nEff, df = null, level = 0.95 }: ShareToPresent): Presentation {
  refuseFaulty({ p, n, nEff, df, level });
  const nEffUsed = Math.min(n, nEff * adjustment(n, df, level));
  const interval = clopperPearsonInterval(Math.min(nEffUsed * p, nEffUsed), nEffUsed, level);
  const width = interval[1] - interval[0];
  const relativeWidth = p > 0 ? width / p : null;
  const relativeWidthOfRest = p < 1 ? width / (1 - p) : null;

  const against: PresentationReason[] = [];
  if (n < SMALLEST_N || isBelow(nEffUsed, SMALLEST_N)) against.push('fewer-than-30');
  if (!isBelow(width, TOO_WIDE)) against.push('interval-too-wide');
  if (isTooWideFor(relativeWidth, width)) against.push('relative-width');
  const doubts: PresentationReason[] = [];
  if (p === 0 || p === 1) doubts.push('no-events');
  if (df !== null && df < FEWEST_DF) doubts.push('few-clusters');
  const outcome = against.length > 0 ? 'suppress' : doubts.length > 0 ? 'review' : 'show';
  return {
    outcome,
    reasons: [...against, ...doubts],
    interval,
    nEffUsed,
    width,
    relativeWidth,
    relativeWidthOfRest,
    restUnreliable: outcome !== 'suppress' && isTooWideFor(relativeWidthOfRest, width),
  };
}

function isTooWideFor(relative: number | null, width: number): boolean {
  return relative !== null && isBelow(NARROW, width) && isBelow(LARGEST_RELATIVE_WIDTH, relative);
}

/** What few degrees of freedom leave of an effective size; 1 where the variance counts as known. */
function adjustment(n: number, df: number | null, level: number): number {
  if (df === null || n < 2) return 1;
  return (criticalValue(1 - level, n - 1) / criticalValue(1 - level, df)) ** 2;
}

function refuseFaulty({ p, n, nEff, df, level }: Required<ShareToPresent>): void {
  if (!(p >= 0 && p <= 1)) throw new RangeError('presentShare requires p from 0 to 1');
  if (!Number.isInteger(n) || n < 1) throw new RangeError('presentShare requires a whole n of at least 1');
  if (!(nEff > 0 && nEff < Infinity)) throw new RangeError('presentShare requires nEff above 0');
  if (df !== null && !(df >= 1 && df < Infinity)) {
    throw new RangeError('presentShare requires df of at least 1, or null');
  }
  if (!(level > 0 && level < 1)) throw new RangeError('presentShare requires level inside 0 and 1');
}

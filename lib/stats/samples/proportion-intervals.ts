import { criticalValue } from '../distributions/critical-value';
import type { Interval } from '../interval';
import { clopperPearsonInterval } from '../proportions/clopper-pearson-interval';
import { wilsonInterval } from '../proportions/wilson-interval';
import { isInside, isProportion, required } from '../require';
import { likelihoodInterval } from './likelihood-interval';

/** Intervals of one share, each by its method; null where the method has no answer. */
export type ProportionIntervals = {
  /** Estimate ± q·se, not cut at 0 and 1. */
  readonly meanNormal: Interval | null;
  readonly meanT: Interval | null;
  /** The same on the logit scale, turned back: inside 0–1. */
  readonly logitNormal: Interval | null;
  readonly logitT: Interval | null;
  /** On the arcsine scale as in R's survey: an end beyond 0 or 1 is folded back, so its ends may miss the estimate or change places. */
  readonly arcsineT: Interval | null;
  /** On the arcsine scale, an end beyond 0 or 1 set to 0 or 1. */
  readonly arcsineClampedT: Interval | null;
  /** Korn and Graubard: exact on effective counts, the effective size corrected for the degrees of freedom. */
  readonly kornGraubard: Interval | null;
  /** The same with an effective size of at most n. */
  readonly kornGraubardCapped: Interval | null;
  readonly likelihood: Interval | null;
  /** Wilson on effective counts, with the normal quantile. */
  readonly wilson: Interval | null;
};

export type ShareFigures = {
  /** Estimated share, 0–1. */
  readonly p: number;
  /** Standard error, at least 0. */
  readonly se: number;
  /** Respondents, at least 1. */
  readonly n: number;
  /** Degrees of freedom, at least 0. */
  readonly df: number;
  /** Confidence level, inside 0–1. */
  readonly level: number;
};

/**
 * All intervals of a share that was estimated from a sample with a design, from its standard error.
 *
 * Use `logitT` or `kornGraubardCapped` for print: they keep inside 0–1 and count the degrees of freedom. The
 * plain ones are for comparison with other software.
 *
 * @param figures share, standard error, respondents, degrees of freedom and level
 * @returns every interval is null where the standard error is 0 or the share is 0 or 1: the sample then shows no
 *   variance (take an exact interval with a design effect from elsewhere). With 0 degrees of freedom those
 *   that need Student's t are null, with one respondent both of Korn and Graubard
 * @throws RangeError `proportionIntervals requires p from 0 to 1`
 * @throws RangeError `proportionIntervals requires se of at least 0`
 * @throws RangeError `proportionIntervals requires n of at least 1`
 * @throws RangeError `proportionIntervals requires df of at least 0`
 * @throws RangeError `proportionIntervals requires level inside 0 and 1`
 * @see R 4.2.2, survey 4.1.1 `svyciprop` (mean, xlogit, asin, beta); Korn and Graubard (1998), Survey Methodology
 *   24, 193–201 (from memory); the cap as the presentation standard of NCHS (2017) asks (from memory)
 * @example
 * proportionIntervals({ p: 0.4, se: 0.02, n: 900, df: 58, level: 0.95 }).logitT; // => [0.360712..., 0.440617...]
 * proportionIntervals({ p: 0, se: 0, n: 900, df: 58, level: 0.95 }).wilson; // => null
 */
export function proportionIntervals({ p, se, n, df, level }: ShareFigures): ProportionIntervals {
  required(isProportion(p), 'proportionIntervals', 'p from 0 to 1');
  required(se >= 0 && Number.isFinite(se), 'proportionIntervals', 'se of at least 0');
  required(n >= 1 && Number.isFinite(n), 'proportionIntervals', 'n of at least 1');
  required(df >= 0, 'proportionIntervals', 'df of at least 0');
  required(isInside(level), 'proportionIntervals', 'level inside 0 and 1');
  const isKnown = se > 0 && p > 0 && p < 1;
  const z = criticalValue(1 - level, null);
  const t = isKnown && df >= 1 ? criticalValue(1 - level, df) : null;
  const effectiveN = (p * (1 - p)) / (se * se);
  const withNormal = (interval: () => Interval) => (isKnown ? interval() : null);
  const withT = (interval: (quantile: number) => Interval) => (t === null ? null : interval(t));

  const corrected = t === null || n <= 1 ? null : effectiveN * (criticalValue(1 - level, n - 1) / t) ** 2;
  const exact = (size: number) => clopperPearsonInterval(p * size, size, level);
  return {
    meanNormal: withNormal(() => [p - z * se, p + z * se]),
    meanT: withT((q) => [p - q * se, p + q * se]),
    logitNormal: withNormal(() => logitInterval(p, se, z)),
    logitT: withT((q) => logitInterval(p, se, q)),
    arcsineT: withT((q) => arcsineInterval(p, se, q, false)),
    arcsineClampedT: withT((q) => arcsineInterval(p, se, q, true)),
    kornGraubard: corrected === null ? null : exact(corrected),
    kornGraubardCapped: corrected === null ? null : exact(Math.min(corrected, n)),
    likelihood: withT((q) => likelihoodInterval(p, effectiveN, q)),
    wilson: withNormal(() => wilsonInterval(p, effectiveN, z)),
  };
}

function logitInterval(p: number, se: number, q: number): Interval {
  const centre = Math.log(p / (1 - p));
  const half = (q * se) / (p * (1 - p));
  const share = (logit: number) => 1 / (1 + Math.exp(-logit));
  return [share(centre - half), share(centre + half)];
}

function arcsineInterval(p: number, se: number, q: number, isClamped: boolean): Interval {
  const centre = Math.asin(Math.sqrt(p));
  const half = (q * se) / (2 * Math.sqrt(p * (1 - p)));
  const low = isClamped ? Math.max(0, centre - half) : centre - half;
  const high = isClamped ? Math.min(Math.PI / 2, centre + half) : centre + half;
  return [Math.sin(low) ** 2, Math.sin(high) ** 2];
}

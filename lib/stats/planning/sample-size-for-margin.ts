import { criticalValue } from '../distributions/critical-value';
import { isInside, isPositive, isProportion, required } from '../require';
import { wholeSample } from './whole-sample';

export type MarginPlan = {
  /** The margin of error that is wanted, half-width of the interval, a proportion above 0. */
  margin: number;
  /** The share that is expected, 0–1; 0.5 asks for the most. */
  p: number;
  /** Design effect that is expected, above 0. */
  deff: number;
  /** Confidence level, inside 0–1. */
  level: number;
  /** People in the population, at least 1; left out for one much larger than the sample. */
  population?: number | undefined;
};

export type MarginSampleSize = {
  /** As it comes out, for the population given, or the infinite one. */
  nReal: number;
  /** Rounded up. */
  n: number;
  nRealInfinite: number;
  nInfinite: number;
};

/**
 * How many people a poll must ask for a given margin of error of a share.
 *
 * Use it before a poll. It says nothing about telling two options apart: see sampleSizeForLead. With a population
 * the finite population factor √((N−n)/(N−1)) is counted on.
 *
 * @returns people; 0 for a share of 0 or 1, which has no sampling error
 * @throws RangeError `sampleSizeForMargin requires margin and deff above 0`
 * @throws RangeError `sampleSizeForMargin requires p from 0 to 1`
 * @throws RangeError `sampleSizeForMargin requires level inside 0 and 1`
 * @throws RangeError `sampleSizeForMargin requires a population of at least 1`
 * @see R 4.2.2 `deff * z^2 * p * q / margin^2`, then `n0 * N / (N + n0 - 1)`; common practice, no source
 * @example
 * sampleSizeForMargin({ margin: 0.03, p: 0.5, deff: 1, level: 0.95 }).n; // => 1068
 * sampleSizeForMargin({ margin: 0.03, p: 0.5, deff: 1, level: 0.95, population: 2000 }).n; // => 697
 */
export function sampleSizeForMargin({ margin, p, deff, level, population }: MarginPlan): MarginSampleSize {
  required(isPositive(margin) && isPositive(deff), 'sampleSizeForMargin', 'margin and deff above 0');
  required(isProportion(p), 'sampleSizeForMargin', 'p from 0 to 1');
  required(isInside(level), 'sampleSizeForMargin', 'level inside 0 and 1');
  const finite = population !== undefined;
  required(
    !finite || (population >= 1 && Number.isFinite(population)),
    'sampleSizeForMargin',
    'a population of at least 1',
  );
  const nRealInfinite = (deff * criticalValue(1 - level, null) ** 2 * p * (1 - p)) / margin ** 2;
  const counted = finite && nRealInfinite > 0;
  const nReal = counted ? (nRealInfinite * population) / (population + nRealInfinite - 1) : nRealInfinite;
  return { nReal, n: wholeSample(nReal), nRealInfinite, nInfinite: wholeSample(nRealInfinite) };
}

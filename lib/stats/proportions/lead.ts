import type { Alternative } from '../distributions/alternative';
import { normalUpperTail } from '../distributions/normal-upper-tail';
import { zTest, type ZTest } from '../distributions/z-test';
import { isPositive, isProportion, required } from '../require';
import { estimated, type Estimated } from './estimated';
import { leadNullStandardError, leadStandardError } from './standard-errors';

/**
 * Shares of two options in one sample, its size (above 0) and design effect (above 0, 1 if there is none). Shares are
 * 0–1 and together at most 1.05: printed ones may exceed 1 by their rounding.
 */
export type LeadSample = {
  readonly first: number;
  readonly second: number;
  readonly n: number;
  readonly deff: number;
};

const MOST_TOGETHER = 1.05;

/** Throws in the name of a function unless the leads of every sample can be computed. */
export function requireLeads(fn: string, ...samples: readonly LeadSample[]): void {
  const shares = samples.every(
    ({ first, second }) => isProportion(first) && isProportion(second) && first + second <= MOST_TOGETHER,
  );
  required(shares, fn, 'shares from 0 to 1, together at most 1.05');
  required(
    samples.every(({ n, deff }) => isPositive(n) && isPositive(deff)),
    fn,
    'n and deff above 0',
  );
}

/**
 * The lead of the first option over the second in one sample, with its margin of error at a level.
 *
 * Use it for two options of one question. The margin is near twice that of a share, since what one gains the other
 * often loses. Not for two polls (differenceEstimate).
 *
 * @param sample both shares, sample size and design effect
 * @param level confidence level, inside 0–1
 * @returns lead first − second, standard error, margin and interval (not cut), in proportions
 * @throws RangeError `leadEstimate requires shares from 0 to 1, together at most 1.05`
 * @throws RangeError `leadEstimate requires n and deff above 0`
 * @throws RangeError `leadEstimate requires level inside 0 and 1`
 * @see Franklin (2007), The "Margin of Error" for Differences in Polls (from memory); closed form in R 4.2.2
 * @example
 * leadEstimate({ first: 0.47, second: 0.41, n: 1012, deff: 1.4426 }, 0.95).margin; // => 0.0692...
 */
export function leadEstimate(sample: LeadSample, level: number): Estimated {
  requireLeads('leadEstimate', sample);
  return estimated('leadEstimate', sample.first - sample.second, errorOf(sample), level);
}

/**
 * Test of a lead against a level race, by the standard error of the lead itself (Wald).
 *
 * @param sample both shares, sample size and design effect
 * @param alternative what the test looks for in first − second
 * @returns lead and standard error; z and p null (kind 'no-variance') where one option has everybody or both nobody
 * @throws RangeError `leadTest requires shares from 0 to 1, together at most 1.05`
 * @throws RangeError `leadTest requires n and deff above 0`
 * @see closed form in R 4.2.2 `(a - b) / sqrt(deff * (a + b - (a - b)^2) / n)`
 * @example
 * leadTest({ first: 0.47, second: 0.41, n: 1012, deff: 1.4426 }, 'two-sided').p; // => 0.0895965...
 * leadTest({ first: 1, second: 0, n: 50, deff: 1 }, 'two-sided').kind; // => 'no-variance'
 */
export function leadTest(sample: LeadSample, alternative: Alternative): ZTest {
  requireLeads('leadTest', sample);
  return zTest(sample.first - sample.second, errorOf(sample), alternative);
}

/**
 * Score test of a lead: the variance is the one that a level race has. Its square is McNemar's test without correction.
 *
 * @param sample both shares, sample size and design effect
 * @param alternative what the test looks for in first − second
 * @returns lead and standard error under a level race; z and p null (kind 'no-variance') where both have nobody
 * @throws RangeError `leadScoreTest requires shares from 0 to 1, together at most 1.05`
 * @throws RangeError `leadScoreTest requires n and deff above 0`
 * @see R 4.2.2 `mcnemar.test(correct = FALSE)` for a design effect of 1
 * @example
 * leadScoreTest({ first: 0.47, second: 0.41, n: 1012, deff: 1.4426 }, 'two-sided').p; // => 0.0902...
 */
export function leadScoreTest(sample: LeadSample, alternative: Alternative): ZTest {
  requireLeads('leadScoreTest', sample);
  const { first, second, n, deff } = sample;
  return zTest(first - second, leadNullStandardError(first, second, n, deff), alternative);
}

/**
 * The probability that the first option is ahead, by the normal distribution about the observed lead.
 *
 * Use it for a quick reading of a large sample; a posterior of the two shares is the careful way. It counts sampling
 * error alone, so it is not the probability of winning.
 *
 * @param sample both shares, sample size and design effect
 * @returns probability 0–1; null where the lead has no variance
 * @throws RangeError `probabilityAheadNormal requires shares from 0 to 1, together at most 1.05`
 * @throws RangeError `probabilityAheadNormal requires n and deff above 0`
 * @see R 4.2.2 `pnorm(lead / se)`
 * @example
 * probabilityAheadNormal({ first: 0.47, second: 0.41, n: 1012, deff: 1.4426 }); // => 0.9552017...
 */
export function probabilityAheadNormal(sample: LeadSample): number | null {
  requireLeads('probabilityAheadNormal', sample);
  const { z } = zTest(sample.first - sample.second, errorOf(sample), 'two-sided');
  return z === null ? null : normalUpperTail(-z);
}

function errorOf({ first, second, n, deff }: LeadSample): number {
  return leadStandardError(first, second, n, deff);
}

import { required } from '../require';
import type { LeadPlan } from './lead-power';
import { plannedCritical } from './sides';
import { plannedPowerQuantile } from './target-power';
import { requireDesignEffect, requireLead, unitErrorsOfLead } from './two-shares';
import { wholeSample } from './whole-sample';

export type LeadSampleSize = {
  /** As it comes out, for the test that divides by the standard error of the lead. */
  nReal: number;
  /** Rounded up; people in the poll. */
  nPerPoll: number;
  /** For the score test. */
  nRealNullVariance: number;
  nPerPollNullVariance: number;
};

/**
 * How many people one poll must ask, to show a true lead with the given power.
 *
 * @param plan the two true shares, deff, alpha and alternative as in leadPower; power, above alpha and below 1
 * @returns people; leadPower at nPerPoll is at least the power asked for
 * @throws RangeError `sampleSizeForLead requires shares from 0 to 1 that leave some variance and sum to at most 1`
 * @throws RangeError `sampleSizeForLead requires deff above 0`
 * @throws RangeError `sampleSizeForLead requires alpha inside 0 and 1`
 * @throws RangeError `sampleSizeForLead requires alternative 'two.sided' or 'one.sided'`
 * @throws RangeError `sampleSizeForLead requires power above alpha and below 1`
 * @throws RangeError `sampleSizeForLead requires shares that differ`
 * @see closed forms in R 4.2.2; normal approximation without the far tail, common practice, no source
 * @example
 * sampleSizeForLead({
 *   ...{ first: 0.48, second: 0.42, deff: 1 },
 *   ...{ alpha: 0.05, power: 0.8, alternative: 'two.sided' },
 * }).nPerPoll; // => 1955
 */
export function sampleSizeForLead(plan: Omit<LeadPlan, 'n'> & { power: number }): LeadSampleSize {
  const { first, second, deff, alpha, alternative, power } = plan;
  requireLead(first, second, 'sampleSizeForLead');
  requireDesignEffect(deff, 'sampleSizeForLead');
  const critical = plannedCritical(alpha, alternative, 'sampleSizeForLead');
  const beyond = plannedPowerQuantile(power, alpha, 'sampleSizeForLead');
  const { level, actual } = unitErrorsOfLead(first, second);
  const lead = first - second;
  const nReal = deff * (((critical + beyond) * actual) / lead) ** 2;
  const nRealNullVariance = deff * ((critical * level + beyond * actual) / lead) ** 2;
  required(Number.isFinite(nRealNullVariance), 'sampleSizeForLead', 'shares that differ');
  return {
    nReal,
    nPerPoll: wholeSample(nReal),
    nRealNullVariance,
    nPerPollNullVariance: wholeSample(nRealNullVariance),
  };
}

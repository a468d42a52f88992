import { required } from '../require';
import type { ChangePlan } from './change-power';
import { plannedCritical } from './sides';
import { plannedPowerQuantile } from './target-power';
import { requireDesignEffect, requireTwoPolls, unitErrorsOfChange } from './two-shares';
import { wholeSample } from './whole-sample';

export type ChangeSampleSize = {
  /** As it comes out. */
  nReal: number;
  /** Rounded up; people in each of the two polls. */
  nPerPoll: number;
  /** By the unpooled variance alone. */
  nRealUnpooled: number;
  nPerPollUnpooled: number;
};

/**
 * How many people each of two polls must ask, to show a true change of a share with the given power.
 *
 * @param plan the two true shares, design effect, alpha and alternative as in changePower; power, above alpha and
 *   below 1
 * @returns people in each poll; changePower at nPerPoll is at least the power asked for
 * @throws RangeError `sampleSizeForChange requires p1 and p2 from 0 to 1, not both 0 or 1`
 * @throws RangeError `sampleSizeForChange requires deff above 0`
 * @throws RangeError `sampleSizeForChange requires alpha inside 0 and 1`
 * @throws RangeError `sampleSizeForChange requires alternative 'two.sided' or 'one.sided'`
 * @throws RangeError `sampleSizeForChange requires power above alpha and below 1`
 * @throws RangeError `sampleSizeForChange requires p1 and p2 that differ`
 * @see Fleiss, Statistical Methods for Rates and Proportions, without correction (from memory); R 4.2.2
 *   `power.prop.test(p1 = p1, p2 = p2, power = power)$n * deff`
 * @example
 * sampleSizeForChange({
 *   ...{ p1: 0.4, p2: 0.45, deff: 1 },
 *   ...{ alpha: 0.05, power: 0.8, alternative: 'two.sided' },
 * }).nPerPoll; // => 1534
 */
export function sampleSizeForChange(plan: Omit<ChangePlan, 'n'> & { power: number }): ChangeSampleSize {
  const { p1, p2, deff, alpha, alternative, power } = plan;
  requireTwoPolls(p1, p2, 'sampleSizeForChange');
  requireDesignEffect(deff, 'sampleSizeForChange');
  const critical = plannedCritical(alpha, alternative, 'sampleSizeForChange');
  const beyond = plannedPowerQuantile(power, alpha, 'sampleSizeForChange');
  const { level, actual } = unitErrorsOfChange(p1, p2);
  const difference = p1 - p2;
  const nReal = deff * ((critical * level + beyond * actual) / difference) ** 2;
  const nRealUnpooled = deff * (((critical + beyond) * actual) / difference) ** 2;
  required(Number.isFinite(nReal), 'sampleSizeForChange', 'p1 and p2 that differ');
  return {
    nReal,
    nPerPoll: wholeSample(nReal),
    nRealUnpooled,
    nPerPollUnpooled: wholeSample(nRealUnpooled),
  };
}

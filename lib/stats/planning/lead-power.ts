import { normalUpperTail } from '../distributions/normal-upper-tail';
import { plannedCritical, type TestSides } from './sides';
import { requireLead, requireSample, unitErrorsOfLead } from './two-shares';

export type LeadPlan = {
  /** True share of the one ahead, 0–1. */
  first: number;
  /** True share of the other in the same base, 0–1. */
  second: number;
  /** Size of the poll, above 0. */
  n: number;
  /** Design effect, above 0. */
  deff: number;
  /** Error probability of the test, inside 0–1. */
  alpha: number;
  alternative: TestSides;
};

export type LeadPower = {
  /** Of the test that divides by the standard error of the lead. */
  power: number;
  /** Of the score test, which divides by the standard error of a level race. */
  powerNullVariance: number;
};

/**
 * How often one poll would show a true lead, in its direction.
 *
 * @returns probabilities, without the far tail
 * @throws RangeError `leadPower requires shares from 0 to 1 that leave some variance and sum to at most 1`
 * @throws RangeError `leadPower requires n and deff above 0`
 * @throws RangeError `leadPower requires alpha inside 0 and 1`
 * @throws RangeError `leadPower requires alternative 'two.sided' or 'one.sided'`
 * @see R 4.2.2 `pnorm((d - z * se) / se)`; normal approximation, common practice, no source
 * @example
 * leadPower({
 *   ...{ first: 0.48, second: 0.42, n: 1000, deff: 1 },
 *   ...{ alpha: 0.05, alternative: 'two.sided' },
 * }).power; // => 0.5175669...
 */
export function leadPower({ first, second, n, deff, alpha, alternative }: LeadPlan): LeadPower {
  requireLead(first, second, 'leadPower');
  requireSample(n, deff, 'leadPower');
  const critical = plannedCritical(alpha, alternative, 'leadPower');
  const { level, actual } = unitErrorsOfLead(first, second);
  const lead = Math.abs(first - second) * Math.sqrt(n / deff);
  return {
    power: normalUpperTail(critical - lead / actual),
    powerNullVariance: normalUpperTail((critical * level - lead) / actual),
  };
}

import { required } from '../require';
import type { LeadPlan } from './lead-power';
import { plannedCritical } from './sides';
import { plannedPowerQuantile } from './target-power';
import { requireSample } from './two-shares';

/** A poll of two options that together hold a known part of it. */
export type LeadQuestion = Omit<LeadPlan, 'first' | 'second'> & {
  /** The two shares together, above 0 and at most 1. */
  together: number;
};

export type SmallestLead = {
  /** By the standard error of the lead; null where not even the whole of `together` is enough. */
  lead: number | null;
  /** By the score test. */
  leadNullVariance: number | null;
};

const ROUNDING = 1e-9;

/**
 * The smallest printed lead that would be significant in a poll of this size.
 *
 * Use it to say beforehand what a poll can show. A true lead of this size is found only about every second time:
 * see detectableLead.
 *
 * @returns proportions, or null where out of reach
 * @throws RangeError `smallestSignificantLead requires together above 0 and at most 1`
 * @throws RangeError `smallestSignificantLead requires n and deff above 0`
 * @throws RangeError `smallestSignificantLead requires alpha inside 0 and 1`
 * @throws RangeError `smallestSignificantLead requires alternative 'two.sided' or 'one.sided'`
 * @see R 4.2.2 `sqrt(z^2 * s / (n / deff + z^2))`; `z * sqrt(s * deff / n)`
 * @example
 * smallestSignificantLead({
 *   ...{ together: 0.9, n: 1000, deff: 1 },
 *   ...{ alpha: 0.05, alternative: 'two.sided' },
 * }).lead; // => 0.0586863...
 */
export function smallestSignificantLead(question: LeadQuestion): SmallestLead {
  const { together, nEff, critical } = asked(question, 'smallestSignificantLead');
  return {
    lead: withinReach(critical * Math.sqrt(together / (nEff + critical ** 2)), together),
    leadNullVariance: withinReach(critical * Math.sqrt(together / nEff), together),
  };
}

/**
 * The smallest true lead that a poll of this size would find with the given power.
 *
 * @param question as in smallestSignificantLead, and the power, above alpha and below 1
 * @returns proportions, or null where out of reach
 * @throws RangeError `detectableLead requires together above 0 and at most 1`
 * @throws RangeError `detectableLead requires n and deff above 0`
 * @throws RangeError `detectableLead requires alpha inside 0 and 1`
 * @throws RangeError `detectableLead requires alternative 'two.sided' or 'one.sided'`
 * @throws RangeError `detectableLead requires power above alpha and below 1`
 * @see leadPower solved for the lead, a quadratic equation
 * @example
 * detectableLead({
 *   ...{ together: 0.9, n: 1000, deff: 1 },
 *   ...{ alpha: 0.05, power: 0.8, alternative: 'two.sided' },
 * }).lead; // => 0.0837196...
 */
export function detectableLead(question: LeadQuestion & { power: number }): SmallestLead {
  const { together, nEff, critical } = asked(question, 'detectableLead');
  const beyond = plannedPowerQuantile(question.power, question.alpha, 'detectableLead');
  const reach = critical + beyond;
  const shift = critical * Math.sqrt(together / nEff);
  const share = beyond ** 2 / nEff;
  const root = Math.sqrt(Math.max(0, shift ** 2 - (1 + share) * (shift ** 2 - share * together)));
  return {
    lead: withinReach(reach * Math.sqrt(together / (nEff + reach ** 2)), together),
    leadNullVariance: withinReach((shift + Math.sign(beyond) * root) / (1 + share), together),
  };
}

function asked({ together, n, deff, alpha, alternative }: LeadQuestion, fn: string) {
  required(together > 0 && together <= 1 + ROUNDING, fn, 'together above 0 and at most 1');
  requireSample(n, deff, fn);
  return { together, nEff: n / deff, critical: Math.max(0, plannedCritical(alpha, alternative, fn)) };
}

function withinReach(lead: number, together: number): number | null {
  return lead <= together ? lead : null;
}

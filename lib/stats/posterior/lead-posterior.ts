import betaQuantile from '@stdlib/stats-base-dists-beta-quantile';
import { normalQuantile } from '../distributions/normal-quantile';
import { findRoot } from '../find-root';
import type { Interval } from '../interval';
import { isInside, isPositive, required } from '../require';
import { leadUpperTail } from './lead-tail';
import { probabilityLargest } from './probability-largest';

export type LeadPosteriorQuestion = {
  /** People for each option of one base, at least 0; two or more, the first two being the pair. They need not be whole. */
  readonly counts: readonly number[];
  /** Design effect, above 0: counts are divided by it. */
  readonly deff: number;
  /** Probability of the credible intervals, inside 0–1. */
  readonly level: number;
  /** A lead that matters, inside −1 to 1; 0 asks for being ahead at all. */
  readonly threshold: number;
};

export type LeadPosterior = {
  /** Parameters of the Dirichlet distribution: counts / deff + 1. */
  alpha: number[];
  firstAheadOfSecond: number;
  /** Probability that the lead of the first over the second exceeds the threshold. */
  leadOverThreshold: number;
  meanLead: number;
  sdLead: number;
  /** Equal-tailed. */
  credibleLead: Interval;
  /** For each option the probability that it has more than any other. */
  largest: number[];
  /** Equal-tailed. */
  credibleFirstShare: Interval;
};

/**
 * What one poll says of a lead, as probabilities: the posterior under a uniform prior over all shares.
 *
 * Use it to answer "how probable is it that A is ahead", sampling error alone being counted. It is not the
 * probability of winning: time, turnout and errors that polls share are not in it. Not for samples without a
 * recognised margin of sampling error.
 *
 * @returns proportions and probabilities, those from quadrature exact to 1e-9 up to millions of counts, and to
 *   1e-11 up to some thousand
 * @throws RangeError `leadPosterior requires two or more counts of at least 0`
 * @throws RangeError `leadPosterior requires deff above 0`
 * @throws RangeError `leadPosterior requires level inside 0 and 1`
 * @throws RangeError `leadPosterior requires threshold inside -1 and 1`
 * @see Gelman et al., Bayesian Data Analysis, on the multinomial model (from memory); R 4.2.2 `pbeta`, `qbeta` and
 *   quadrature
 * @example
 * leadPosterior({ counts: [258, 222, 120], deff: 1.4, level: 0.95, threshold: 0.02 }).firstAheadOfSecond; // => 0.9172820...
 */
export function leadPosterior({ counts, deff, level, threshold }: LeadPosteriorQuestion): LeadPosterior {
  const countable = counts.every((count) => count >= 0 && Number.isFinite(count));
  required(countable && counts.length >= 2, 'leadPosterior', 'two or more counts of at least 0');
  required(isPositive(deff), 'leadPosterior', 'deff above 0');
  required(isInside(level), 'leadPosterior', 'level inside 0 and 1');
  required(threshold > -1 && threshold < 1, 'leadPosterior', 'threshold inside -1 and 1');
  const alpha = counts.map((count) => count / deff + 1);
  const [first = 1, second = 1, ...others] = alpha;
  const rest = others.reduce((sum, one) => sum + one, 0);
  const total = first + second + rest;
  const meanLead = (first - second) / total;
  const sdLead = Math.sqrt(((first + second) / total - meanLead ** 2) / (total + 1));
  const exceeds = leadUpperTail({ first, second, rest });
  const tail = (1 - level) / 2;
  const reach = -normalQuantile(tail) * sdLead;
  return {
    alpha,
    firstAheadOfSecond: exceeds(0),
    leadOverThreshold: exceeds(threshold),
    meanLead,
    sdLead,
    credibleLead: [
      leadAt(1 - tail, meanLead - reach, sdLead, exceeds),
      leadAt(tail, meanLead + reach, sdLead, exceeds),
    ],
    largest: probabilityLargest(alpha),
    credibleFirstShare: [
      betaQuantile(tail, first, total - first),
      1 - betaQuantile(tail, total - first, first),
    ],
  };
}

const FIRST_BRACKET = 0.2;
const CLOSE_ENOUGH = 1e-13;

/** The lead that is exceeded with a probability, looked for around a guess in brackets that grow. */
function leadAt(probability: number, guess: number, sd: number, exceeds: (lead: number) => number): number {
  const known = new Map<number, number>();
  const excess = (lead: number) => {
    const value = known.get(lead) ?? exceeds(lead) - probability;
    known.set(lead, value);
    return value;
  };
  const middle = Math.min(1, Math.max(-1, guess));
  for (let half = FIRST_BRACKET * sd; half < 2; half *= 4) {
    const low = Math.max(-1, middle - half);
    const high = Math.min(1, middle + half);
    if (excess(low) >= 0 && excess(high) <= 0) return findRoot(excess, low, high, CLOSE_ENOUGH);
  }
  return findRoot(excess, -1, 1, CLOSE_ENOUGH);
}

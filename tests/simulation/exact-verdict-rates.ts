import gammaln from '@stdlib/math-base-special-gammaln';
import { printedLead, TWO_OPTIONS } from './printed-lead';

/** Counts further out than this many standard deviations add less than 1e-14. */
const REACH = 8;

export type ExactRates = { n: number; lead: number; holds: number; fragile: number; plainPrinted: number };

/**
 * The same rates as by simulation in a simple random sample, summed over every outcome instead of drawn.
 *
 * The two options' counts are split binomially: their sum, then the first one's part of it.
 */
export function exactVerdictRates(n: number, lead: number): ExactRates {
  const rates = { n, lead, holds: 0, fragile: 0, plainPrinted: 0 };
  const part = (TWO_OPTIONS + lead) / 2 / TWO_OPTIONS;
  for (const [printed, probability] of printedOutcomes(n, part)) {
    const [a = 0, b = 0] = printed.split(' ').map((pct) => (Number(pct) * n) / 100);
    const finding = printedLead({ n, deff: 1, knowledge: 'known' }, a, b).printed;
    if (finding.verdict === 'holds') rates.holds += probability;
    if (finding.verdict === 'fragile') rates.fragile += probability;
    if (finding.p < finding.alpha) rates.plainPrinted += probability;
  }
  return rates;
}

/** Probability of each pair of printed whole percents. */
function printedOutcomes(n: number, part: number): Map<string, number> {
  const outcomes = new Map<string, number>();
  for (const [sum, ofSum] of binomial(n, TWO_OPTIONS)) {
    for (const [first, ofFirst] of binomial(sum, part)) {
      const key = `${Math.round((100 * first) / n)} ${Math.round((100 * (sum - first)) / n)}`;
      outcomes.set(key, (outcomes.get(key) ?? 0) + ofSum * ofFirst);
    }
  }
  return outcomes;
}

/** The likely counts of a binomial distribution with their probabilities. */
export function binomial(n: number, p: number, reach = REACH): [count: number, probability: number][] {
  const spread = reach * Math.sqrt(n * p * (1 - p)) + 1;
  const low = Math.max(0, Math.floor(n * p - spread));
  const high = Math.min(n, Math.ceil(n * p + spread));
  return Array.from({ length: high - low + 1 }, (_, index) => {
    const count = low + index;
    const ways = gammaln(n + 1) - gammaln(count + 1) - gammaln(n - count + 1);
    return [count, Math.exp(ways + count * Math.log(p) + (n - count) * Math.log1p(-p))];
  });
}

import gammaln from '@stdlib/math-base-special-gammaln';
import { leadPrinter, TWO_OPTIONS } from './printed-lead';

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
  const leadOf = leadPrinter({ n, deff: 1, knowledge: 'known' });
  for (const [sum, ofSum] of binomial(n, TWO_OPTIONS)) {
    for (const [first, ofFirst] of binomial(sum, part)) {
      const { verdict, p, alpha } = leadOf(first, sum - first).printed;
      const probability = ofSum * ofFirst;
      if (verdict === 'holds') rates.holds += probability;
      if (verdict === 'fragile') rates.fragile += probability;
      if (p < alpha) rates.plainPrinted += probability;
    }
  }
  return rates;
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

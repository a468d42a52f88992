import type { Alternative } from '../distributions/alternative';
import { required } from '../require';

/** Tables whose probability is this much above the observed one still count as equally rare (R's rule). */
const AS_RARE = 1 + 1e-7;
/** Smaller numbers are no longer held to all digits, and a product of them may stand still short of 0. */
const LEAST_WEIGHT = 1e-307;

/**
 * Fisher's exact test of two shares; two-sided, all tables at most as probable as the observed one.
 *
 * Use it where a side has fewer than about ten answers. Tables are weighed against the most probable one by the
 * quotients of neighbouring tables, which are exact fractions: the library's density loses nine digits with a million
 * people. Cost grows with the square root of the sample sizes.
 *
 * @param hits1 whole count of the share in the first sample
 * @param n1 whole size of the first sample, at least hits1
 * @param hits2 whole count in the second
 * @param n2 whole size of the second, at least hits2
 * @param alternative what the test looks for in first − second; two-sided unless said
 * @returns probability 0–1; 1 where only one table has these margins; 0 below about 1e-307
 * @throws RangeError `fisherExactP requires whole counts of at least 0, none above its sample`
 * @see R 4.2.2 `fisher.test(matrix(c(hits1, hits2, n1 - hits1, n2 - hits2), 2), alternative = alternative)`
 * @example
 * fisherExactP(3, 20, 9, 20); // => 0.0823...
 * fisherExactP(3, 20, 9, 20, 'less'); // => 0.0411...
 */
export function fisherExactP(
  hits1: number,
  n1: number,
  hits2: number,
  n2: number,
  alternative: Alternative = 'two-sided',
): number {
  const whole = [hits1, n1, hits2, n2].every((count) => Number.isSafeInteger(count) && count >= 0);
  required(
    whole && hits1 <= n1 && hits2 <= n2,
    'fisherExactP',
    'whole counts of at least 0, none above its sample',
  );
  const { lowest, weights } = weighTables(hits1 + hits2, n1, n2);
  const at = hits1 - lowest;
  const limit = (weights[at] ?? 0) * AS_RARE;
  const counted = {
    'two-sided': () => weights.filter((weight) => weight <= limit),
    less: () => weights.slice(0, Math.max(0, at + 1)),
    greater: () => weights.slice(Math.max(0, at)),
  }[alternative]();
  return Math.min(1, sum(counted) / sum(weights));
}

/** Weights of all tables with these margins, by the first sample's count from `lowest` on; those too small to hold are left out. */
function weighTables(hits: number, n1: number, n2: number): { lowest: number; weights: number[] } {
  const least = Math.max(0, hits - n2);
  const most = Math.min(hits, n1);
  const guess = Math.floor(((n1 + 1) * (hits + 1)) / (n1 + n2 + 2));
  const mode = Math.min(most, Math.max(least, guess));
  const above: number[] = [];
  for (let count = mode, weight = 1; count < most; count += 1) {
    weight *= ((hits - count) / (count + 1)) * ((n1 - count) / (n2 - hits + count + 1));
    if (weight < LEAST_WEIGHT) break;
    above.push(weight);
  }
  const below: number[] = [];
  for (let count = mode, weight = 1; count > least; count -= 1) {
    weight *= (count / (hits - count + 1)) * ((n2 - hits + count) / (n1 - count + 1));
    if (weight < LEAST_WEIGHT) break;
    below.push(weight);
  }
  return { lowest: mode - below.length, weights: [...below.reverse(), 1, ...above] };
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}

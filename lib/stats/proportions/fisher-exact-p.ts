import type { Alternative } from '../distributions/alternative';
import { required } from '../require';

/** Tables whose probability is this much above the observed one still count as equally rare (R's rule). */
const AS_RARE = 1 + 1e-7;
/** Smaller numbers are no longer held to all digits, and a product of them may stand still short of 0. */
const LEAST_WEIGHT = 1e-307;

/** Where a tail is below e^−800 by its bound, even all tables together stay below LEAST_WEIGHT. */
const BEYOND = 800;

/**
 * Fisher's exact test of two shares; two-sided, all tables at most as probable as the observed one.
 *
 * Use it where a side has fewer than about ten answers. Tables are weighed against the most probable one by the
 * quotients of neighbouring tables, which are exact fractions: the library's density is off by 3e-9 with a million
 * people (measured). Cost grows with the square root of the smallest margin; a table that is out of reach costs nothing.
 *
 * @param hits1 whole count of the share in the first sample
 * @param n1 whole size of the first sample, at least hits1
 * @param hits2 whole count in the second
 * @param n2 whole size of the second, at least hits2
 * @param alternative what the test looks for in first − second; two-sided unless said
 * @returns probability 0–1; 1 where only one table has these margins; 0 below about 1e-307
 * @throws RangeError `fisherExactP requires whole counts of at least 0, none above its sample`
 * @see R 4.2.2 `fisher.test(matrix(c(hits1, hits2, n1 - hits1, n2 - hits2), 2), alternative = alternative)`; for tails
 *   out of reach Chvátal (1979), Discrete Mathematics 25, 285–287 (from memory)
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
  const part = (hits1 + hits2) / (n1 + n2);
  if (Math.max(divergence(hits1, n1, part), divergence(hits2, n2, part)) > BEYOND) {
    const isBelow = hits1 / n1 < hits2 / n2;
    return alternative === (isBelow ? 'greater' : 'less') ? 1 : 0;
  }
  const margins = { hits: hits1 + hits2, n1, n2 };
  const limit = weightOf(hits1, margins) * AS_RARE;
  const isCounted = {
    'two-sided': (_: number, weight: number) => weight <= limit,
    less: (count: number) => count <= hits1,
    greater: (count: number) => count >= hits1,
  }[alternative];
  let all = 0;
  let counted = 0;
  weighTables(margins, (count, weight) => {
    all += weight;
    if (isCounted(count, weight)) counted += weight;
  });
  return Math.min(1, counted / all);
}

/** n times the Kullback–Leibler divergence of the sample's share from the share of all: a tail is below e to minus this. */
function divergence(hits: number, n: number, part: number): number {
  const term = (count: number, expected: number) => (count === 0 ? 0 : count * Math.log(count / expected));
  return term(hits, n * part) + term(n - hits, n * (1 - part));
}

type Margins = { hits: number; n1: number; n2: number };

/** The weight of one table; 0 where it is too small to hold. */
function weightOf(wanted: number, margins: Margins): number {
  let found = 0;
  weighTables(margins, (count, weight) => {
    if (count === wanted) found = weight;
  });
  return found;
}

/** Visits all tables with these margins, by the first sample's count, from the most probable one outwards each way. */
function weighTables({ hits, n1, n2 }: Margins, visit: (count: number, weight: number) => void): void {
  const least = Math.max(0, hits - n2);
  const most = Math.min(hits, n1);
  const guess = Math.floor(((n1 + 1) * (hits + 1)) / (n1 + n2 + 2));
  const mode = Math.min(most, Math.max(least, guess));
  visit(mode, 1);
  for (let count = mode, weight = 1; count < most; count += 1) {
    weight *= ((hits - count) / (count + 1)) * ((n1 - count) / (n2 - hits + count + 1));
    if (weight < LEAST_WEIGHT) break;
    visit(count + 1, weight);
  }
  for (let count = mode, weight = 1; count > least; count -= 1) {
    weight *= (count / (hits - count + 1)) * ((n2 - hits + count) / (n1 - count + 1));
    if (weight < LEAST_WEIGHT) break;
    visit(count - 1, weight);
  }
}

import probabilityOf from '@stdlib/stats-base-dists-hypergeometric-pmf';
import { required } from '../require';

/** Tables whose probability is this much above the observed one still count as equally rare (R's rule). */
const AS_RARE = 1 + 1e-7;
const NEGLIGIBLE = 1e-18;

/**
 * Two-sided p-value of Fisher's exact test of two shares: all tables at most as probable as the observed one.
 *
 * Cost grows with the length of the tails, not with the size of the samples.
 *
 * @param hits1 whole count of the share in the first sample
 * @param n1 whole size of the first sample, at least hits1
 * @param hits2 whole count in the second
 * @param n2 whole size of the second, at least hits2
 * @throws RangeError `fisherExactP requires whole counts of at least 0, none above its sample`
 * @see R 4.2.2 `fisher.test(matrix(c(hits1, n1 - hits1, hits2, n2 - hits2), 2))`
 * @example
 * fisherExactP(3, 20, 9, 20); // => 0.0823...
 */
export function fisherExactP(hits1: number, n1: number, hits2: number, n2: number): number {
  const whole = [hits1, n1, hits2, n2].every((count) => Number.isInteger(count) && count >= 0);
  required(
    whole && hits1 <= n1 && hits2 <= n2,
    'fisherExactP',
    'whole counts of at least 0, none above its sample',
  );
  const all = n1 + n2;
  const hits = hits1 + hits2;
  const lowest = Math.max(0, hits - n2);
  const highest = Math.min(hits, n1);
  const mode = Math.min(highest, Math.max(lowest, Math.floor(((n1 + 1) * (hits + 1)) / (all + 2))));
  const probability = (count: number) => probabilityOf(count, all, hits, n1);
  const limit = probability(hits1) * AS_RARE;
  if (probability(mode) <= limit) return 1;

  const isRare = (count: number) => probability(count) <= limit;
  const below = lastRare(lowest, mode, isRare);
  const above = firstRare(mode, highest, isRare);
  return Math.min(1, tailSum(below, -1, lowest, probability) + tailSum(above, 1, highest, probability));
}

/** The last rare count from the low end up to a mode that is not rare; one below the end if there is none. */
function lastRare(lowest: number, mode: number, isRare: (count: number) => boolean): number {
  let rare = lowest - 1;
  let common = mode;
  while (common - rare > 1) {
    const middle = Math.floor((rare + common) / 2);
    if (isRare(middle)) rare = middle;
    else common = middle;
  }
  return rare;
}

function firstRare(mode: number, highest: number, isRare: (count: number) => boolean): number {
  return -lastRare(-highest, -mode, (count) => isRare(-count));
}

function tailSum(start: number, step: 1 | -1, end: number, probability: (count: number) => number): number {
  let sum = 0;
  for (let count = start; (end - count) * step >= 0; count += step) {
    const term = probability(count);
    sum += term;
    if (term <= NEGLIGIBLE * sum) break;
  }
  return sum;
}

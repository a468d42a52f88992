import type { Random } from './random';

/** Interviews in one cluster. */
const CLUSTER = 20;

export type Population = {
  /** Shares of all options but the last, which takes the rest. */
  shares: readonly number[];
  /** True design effect of every share and every lead, at least 1. */
  deff: number;
};

/** How many of `n` people gave each answer, the rest last. */
export type Counts = readonly number[];

/**
 * One poll of people in clusters of 20, the last cluster being what is left.
 *
 * In a cluster each person repeats the cluster's own answer with a chance of c and answers alone otherwise, so that
 * two people of one cluster correlate by c² and every variance is 1 + (20 − 1)c² times that of a simple random
 * sample: the design effect is true of the draw, whatever formula is used on it afterwards.
 */
export function drawPoll(random: Random, n: number, { shares, deff }: Population): Counts {
  const counts = new Array<number>(shares.length + 1).fill(0);
  const repeats = Math.sqrt((deff - 1) / (CLUSTER - 1));
  for (let start = 0; start < n; start += CLUSTER) {
    const common = deff > 1 ? drawOption(random, shares) : 0;
    const end = Math.min(n, start + CLUSTER);
    for (let person = start; person < end; person += 1) {
      const option = deff > 1 && random() < repeats ? common : drawOption(random, shares);
      counts[option] = (counts[option] ?? 0) + 1;
    }
  }
  return counts;
}

function drawOption(random: Random, shares: readonly number[]): number {
  let left = random();
  for (let option = 0; option < shares.length; option += 1) {
    left -= shares[option] ?? 0;
    if (left < 0) return option;
  }
  return shares.length;
}

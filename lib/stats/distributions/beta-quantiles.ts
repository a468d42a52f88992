import quantile from '@stdlib/stats-base-dists-beta-quantile';

/** Below this the library's quantile is not a number; the quantile is 0 to every digit anyway. */
const NO_COUNT = 1e-300;

/** What a beta variable stays below with a probability `tail`; 0 for a vanishing first parameter. */
export function betaLowerQuantile(tail: number, a: number, b: number): number {
  return a < NO_COUNT ? 0 : quantile(tail, a, b);
}

/** What it exceeds with that probability, from the side of 0 where the end lies there, so that no digits go. */
export function betaUpperQuantile(tail: number, a: number, b: number): number {
  const fromOne = betaLowerQuantile(tail, b, a);
  return fromOne > 0.5 ? quantile(1 - tail, a, b) : 1 - fromOne;
}

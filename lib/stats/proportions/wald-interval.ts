import type { Interval } from '../interval';
import { isPositive, isProportion, required } from '../require';
import { estimated, type Estimated } from './estimated';
import { requireShares, type SampleShare } from './sample-share';

/**
 * The interval of a share by its own standard error (Wald), as the usual margin of error has it.
 *
 * Use it to show what a stated margin means. Near 0 or 1, or with few people, it covers less often than promised and
 * runs outside 0–1: prefer the Wilson interval.
 *
 * @param p observed share, 0–1
 * @param n effective sample size, above 0, need not be whole
 * @param q critical value, above 0
 * @returns proportions, not cut to 0–1 (see withinUnit); both ends p for a share of 0 or 1
 * @throws RangeError `waldInterval requires p from 0 to 1`
 * @throws RangeError `waldInterval requires n above 0`
 * @throws RangeError `waldInterval requires q above 0`
 * @see R 4.2.2 `p + c(-1, 1) * q * sqrt(p * (1 - p) / n)`
 * @example
 * waldInterval(0.5, 100, 1.959963984540054); // => [0.4020018..., 0.5979981...]
 */
export function waldInterval(p: number, n: number, q: number): Interval {
  required(isProportion(p), 'waldInterval', 'p from 0 to 1');
  required(isPositive(n), 'waldInterval', 'n above 0');
  required(isPositive(q), 'waldInterval', 'q above 0');
  const half = q * Math.sqrt((p * (1 - p)) / n);
  return [p - half, p + half];
}

/**
 * A share with the margin of error that its design effect gives it at a level.
 *
 * @param share share, sample size and design effect
 * @param level confidence level, inside 0–1
 * @returns estimate, standard error, margin and Wald interval (not cut); the margin is 0 for a share of 0 or 1
 * @throws RangeError `shareEstimate requires p from 0 to 1`
 * @throws RangeError `shareEstimate requires n and deff above 0`
 * @throws RangeError `shareEstimate requires level inside 0 and 1`
 * @see R 4.2.2 `qnorm((1 + level) / 2) * sqrt(deff * p * (1 - p) / n)`
 * @example
 * shareEstimate({ p: 0.4, n: 1000, deff: 1.5 }, 0.95).margin; // => 0.0371877...
 */
export function shareEstimate(share: SampleShare, level: number): Estimated {
  requireShares('shareEstimate', share);
  const { p, n, deff } = share;
  return estimated('shareEstimate', p, Math.sqrt((deff * p * (1 - p)) / n), level);
}

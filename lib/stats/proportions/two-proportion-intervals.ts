import { criticalValue } from '../distributions/critical-value';
import type { Interval } from '../interval';
import { isInside, isPositive, required } from '../require';
import { estimated, type Estimated } from './estimated';
import { newcombeInterval } from './newcombe-interval';
import { requireShares, type SampleShare } from './sample-share';
import { differenceStandardError } from './two-proportion-tests';

/**
 * The difference of two shares from two samples with its margin of error (Wald).
 *
 * Use it to show a margin; near 0 or 1, or with few people, Newcombe's interval covers better.
 *
 * @param first first share, its sample size and design effect
 * @param second the same of the second
 * @param level confidence level, inside 0–1
 * @returns difference first − second, standard error, margin and interval (not cut to −1 to 1)
 * @throws RangeError `differenceEstimate requires p from 0 to 1`
 * @throws RangeError `differenceEstimate requires n and deff above 0`
 * @throws RangeError `differenceEstimate requires level inside 0 and 1`
 * @see R 4.2.2 `prop.test(correct = FALSE)$conf.int` for a design effect of 1
 * @example
 * differenceEstimate({ p: 0.47, n: 700, deff: 1.4 }, { p: 0.44, n: 900, deff: 1 }, 0.95).margin; // => 0.0544...
 */
export function differenceEstimate(first: SampleShare, second: SampleShare, level: number): Estimated {
  requireShares('differenceEstimate', first, second);
  const error = differenceStandardError(first, second);
  return estimated('differenceEstimate', first.p - second.p, error, level);
}

/**
 * Newcombe's hybrid score interval of the difference of two shares, on effective sample sizes.
 *
 * Use it wherever the interval of a difference is printed: it stays inside −1 to 1 and is never empty.
 *
 * @param first first share, its sample size and design effect
 * @param second the same of the second
 * @param level confidence level, inside 0–1
 * @returns proportions, of first − second
 * @throws RangeError `newcombeDifferenceInterval requires p from 0 to 1`
 * @throws RangeError `newcombeDifferenceInterval requires n and deff above 0`
 * @throws RangeError `newcombeDifferenceInterval requires level inside 0 and 1`
 * @see Newcombe (1998), Statistics in Medicine 17, 873–890, method 10 (from memory); closed form in R 4.2.2
 * @example
 * newcombeDifferenceInterval({ p: 0.47, n: 700, deff: 1 }, { p: 0.44, n: 700, deff: 1 }, 0.95); // => [-0.0221..., 0.0818...]
 */
export function newcombeDifferenceInterval(first: SampleShare, second: SampleShare, level: number): Interval {
  requireShares('newcombeDifferenceInterval', first, second);
  required(isInside(level), 'newcombeDifferenceInterval', 'level inside 0 and 1');
  const q = criticalValue(1 - level, null);
  return newcombeInterval(second.p, second.n / second.deff, first.p, first.n / first.deff, q);
}

/**
 * The interval of the difference of two shares after adding one answer to either side of each sample.
 *
 * Use it for small unweighted samples where a formula is wanted that fits on one line.
 *
 * @param x1 effective count of the share in the first sample, 0–n1
 * @param n1 effective size of the first sample, above 0
 * @param x2 effective count in the second, 0–n2
 * @param n2 effective size of the second, above 0
 * @param level confidence level, inside 0–1
 * @returns proportions, of first − second, not cut to −1 to 1; its middle is the difference of the shares after adding
 * @throws RangeError `agrestiCaffoInterval requires sizes above 0`
 * @throws RangeError `agrestiCaffoInterval requires counts from 0 to their size`
 * @throws RangeError `agrestiCaffoInterval requires level inside 0 and 1`
 * @see Agresti and Caffo (2000), The American Statistician 54, 280–288 (from memory); closed form in R 4.2.2
 * @example
 * agrestiCaffoInterval(3, 20, 9, 20, 0.95); // => [-0.5359144..., -0.0095401...]
 */
export function agrestiCaffoInterval(
  x1: number,
  n1: number,
  x2: number,
  n2: number,
  level: number,
): Interval {
  required(isPositive(n1) && isPositive(n2), 'agrestiCaffoInterval', 'sizes above 0');
  const inside = x1 >= 0 && x1 <= n1 && x2 >= 0 && x2 <= n2;
  required(inside, 'agrestiCaffoInterval', 'counts from 0 to their size');
  required(isInside(level), 'agrestiCaffoInterval', 'level inside 0 and 1');
  const first = { p: (x1 + 1) / (n1 + 2), n: n1 + 2, deff: 1 };
  const second = { p: (x2 + 1) / (n2 + 2), n: n2 + 2, deff: 1 };
  const error = differenceStandardError(first, second);
  return estimated('agrestiCaffoInterval', first.p - second.p, error, level).interval;
}

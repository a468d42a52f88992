import type { Alternative } from '../distributions/alternative';
import { zTest, type ZTest } from '../distributions/z-test';
import { isInside, isPositive, required } from '../require';
import { lessened } from './lessened';
import { requireShares, type SampleShare } from './sample-share';

const HALF_A_PERSON = 0.5;

/**
 * Score test of a count against a fixed share: the variance is the one that the fixed share has.
 *
 * Use it for a majority or an entry hurdle where at least about ten answers are expected on either side; below, an
 * exact test. It agrees with the Wilson interval: the shares that it does not reject are those inside.
 *
 * @param x count of the share, 0–n, whole or effective
 * @param n sample size, above 0
 * @param p0 the share tested against, inside 0–1
 * @param alternative what the test looks for in x/n − p0
 * @param correction 'none', or 'continuity': |x − n·p0| is lessened by half a person, never below 0, also one-sided
 * @returns difference (lessened if corrected) and standard error in proportions; the variance is never 0
 * @throws RangeError `oneProportionScoreTest requires n above 0`
 * @throws RangeError `oneProportionScoreTest requires x from 0 to n`
 * @throws RangeError `oneProportionScoreTest requires p0 inside 0 and 1`
 * @see R 4.2.2 `prop.test(x, n, p0, alternative, correct = FALSE | TRUE)`
 * @example
 * oneProportionScoreTest(540, 1000, 0.5, 'two-sided', 'none').z; // => 2.5298221...
 * oneProportionScoreTest(540, 1000, 0.5, 'two-sided', 'continuity').z; // => 2.4981993...
 */
export function oneProportionScoreTest(
  x: number,
  n: number,
  p0: number,
  alternative: Alternative,
  correction: 'none' | 'continuity',
): ZTest {
  required(isPositive(n), 'oneProportionScoreTest', 'n above 0');
  required(x >= 0 && x <= n, 'oneProportionScoreTest', 'x from 0 to n');
  required(isInside(p0), 'oneProportionScoreTest', 'p0 inside 0 and 1');
  const surplus = lessened(x - n * p0, correction === 'none' ? 0 : HALF_A_PERSON);
  return zTest(surplus / n, Math.sqrt((p0 * (1 - p0)) / n), alternative);
}

/**
 * Score test of a share with a design effect against a fixed share.
 *
 * As oneProportionScoreTest on effective counts, without a continuity correction: weighted counts move in no steps.
 *
 * @param share share, sample size and design effect
 * @param p0 the share tested against, inside 0–1
 * @param alternative what the test looks for in p − p0
 * @throws RangeError `shareScoreTest requires p from 0 to 1`
 * @throws RangeError `shareScoreTest requires n and deff above 0`
 * @throws RangeError `shareScoreTest requires p0 inside 0 and 1`
 * @see R 4.2.2 `prop.test(correct = FALSE)` on effective counts
 * @example
 * shareScoreTest({ p: 0.54, n: 1000, deff: 1.6 }, 0.5, 'greater').z; // => 2
 */
export function shareScoreTest(share: SampleShare, p0: number, alternative: Alternative): ZTest {
  requireShares('shareScoreTest', share);
  required(isInside(p0), 'shareScoreTest', 'p0 inside 0 and 1');
  return zTest(share.p - p0, Math.sqrt((share.deff * p0 * (1 - p0)) / share.n), alternative);
}

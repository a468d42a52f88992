import type { Alternative } from '../distributions/alternative';
import { zTest, type ZTest } from '../distributions/z-test';
import { lessened } from './lessened';
import { pooledStandardError, shareStandardError } from './standard-errors';
import { requireShares, type SampleShare } from './sample-share';

/** A pooled test, with the one share that both samples would then have. */
export type PooledTest = ZTest & { readonly pooled: number };

/**
 * Score test of two shares from two samples: the variance is the one that a common share has.
 *
 * Use it for a change between two polls of different people. Not for two shares of one poll (leadScoreTest), nor where
 * the same people were asked twice. Where a side has fewer than about ten answers, Fisher's test.
 *
 * @param first first share, its sample size and design effect
 * @param second the same of the second
 * @param alternative what the test looks for in first − second
 * @param correction 'none', or 'continuity': the difference is lessened by half the sum of 1 / effective size, never
 *   below 0, also one-sided
 * @returns difference first − second, lessened if corrected; z and p null (kind 'no-variance') where both shares are 0 or both are 1
 * @throws RangeError `pooledTest requires p from 0 to 1`
 * @throws RangeError `pooledTest requires n and deff above 0`
 * @see R 4.2.2 `prop.test(c(x1, x2), c(n1, n2), alternative, correct = FALSE | TRUE)`, on effective counts
 * @example
 * pooledTest({ p: 0.47, n: 700, deff: 1 }, { p: 0.44, n: 700, deff: 1 }, 'two-sided', 'none').z; // => 1.1270711...
 * pooledTest({ p: 0, n: 40, deff: 1 }, { p: 0, n: 60, deff: 1 }, 'two-sided', 'none').p; // => null
 */
export function pooledTest(
  first: SampleShare,
  second: SampleShare,
  alternative: Alternative,
  correction: 'none' | 'continuity',
): PooledTest {
  requireShares('pooledTest', first, second);
  const n1 = first.n / first.deff;
  const n2 = second.n / second.deff;
  const allowance = correction === 'none' ? 0 : (1 / n1 + 1 / n2) / 2;
  const difference = lessened(first.p - second.p, allowance);
  return {
    ...zTest(difference, pooledStandardError(first.p, n1, second.p, n2), alternative),
    pooled: Math.min(1, (n1 * first.p + n2 * second.p) / (n1 + n2)),
  };
}

/**
 * Test of two shares from two samples in which each keeps its own variance (Wald).
 *
 * It agrees with the Wald interval of the difference. The pooled test keeps its size better in small samples.
 *
 * @param first first share, its sample size and design effect
 * @param second the same of the second
 * @param alternative what the test looks for in first − second
 * @returns difference first − second; z and p null (kind 'no-variance') where each share is 0 or 1
 * @throws RangeError `unpooledTest requires p from 0 to 1`
 * @throws RangeError `unpooledTest requires n and deff above 0`
 * @see closed form in R 4.2.2 `(p1 - p2) / sqrt(d1 * p1 * (1 - p1) / n1 + d2 * p2 * (1 - p2) / n2)`
 * @example
 * unpooledTest({ p: 0.47, n: 700, deff: 1.4 }, { p: 0.44, n: 900, deff: 1 }, 'greater').z; // => 1.0797...
 */
export function unpooledTest(first: SampleShare, second: SampleShare, alternative: Alternative): ZTest {
  requireShares('unpooledTest', first, second);
  return zTest(first.p - second.p, differenceStandardError(first, second), alternative);
}

/** Variances of independent samples add. */
export function differenceStandardError(first: SampleShare, second: SampleShare): number {
  return Math.hypot(
    shareStandardError(first.p, first.n, first.deff),
    shareStandardError(second.p, second.n, second.deff),
  );
}

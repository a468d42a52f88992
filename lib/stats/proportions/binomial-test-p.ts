import betainc from '@stdlib/math-base-special-betainc';
import probabilityOf from '@stdlib/stats-base-dists-binomial-pmf';
import type { Alternative } from '../distributions/alternative';
import { isInside, required } from '../require';

/** Outcomes whose probability is this much above the observed one still count as equally rare (R's rule). */
const AS_RARE = 1 + 1e-7;

/**
 * Exact binomial test of a whole count: two-sided, all outcomes at most as probable as the observed one.
 *
 * Use it for unweighted counts. For effective counts, which need not be whole, there is exactBinomialP, which
 * doubles the smaller tail; the two agree in a symmetric case (p0 one half) and differ a little elsewhere.
 * Cost grows with the logarithm of n; digits hold to 1e-9 up to n of ten million.
 *
 * @param x whole count, 0–n
 * @param n whole number of trials, at least 1
 * @param p0 the share tested against, inside 0–1
 * @param alternative what the test looks for in x/n − p0
 * @returns probability 0–1
 * @throws RangeError `binomialTestP requires whole x and n, n at least 1, x from 0 to n`
 * @throws RangeError `binomialTestP requires p0 inside 0 and 1`
 * @see R 4.2.2 `binom.test(x, n, p0, alternative)`
 * @example
 * binomialTestP(12, 120, 0.05, 'two-sided'); // => 0.0194250...
 * binomialTestP(12, 120, 0.05, 'greater'); // => 0.0173...
 */
export function binomialTestP(x: number, n: number, p0: number, alternative: Alternative): number {
  const whole = Number.isSafeInteger(x) && Number.isSafeInteger(n);
  required(
    whole && n >= 1 && x >= 0 && x <= n,
    'binomialTestP',
    'whole x and n, n at least 1, x from 0 to n',
  );
  required(isInside(p0), 'binomialTestP', 'p0 inside 0 and 1');
  if (alternative === 'less') return atMost(x, n, p0);
  if (alternative === 'greater') return atLeast(x, n, p0);
  const expected = n * p0;
  if (x === expected) return 1;
  const limit = probabilityOf(x, n, p0) * AS_RARE;
  const isRare = (count: number) => probabilityOf(count, n, p0) <= limit;
  if (x < expected) {
    const mirror = firstWhole(Math.ceil(expected), n + 1, isRare);
    return Math.min(1, atMost(x, n, p0) + atLeast(mirror, n, p0));
  }
  const mirror = -firstWhole(-Math.floor(expected), 1, (count) => isRare(-count));
  return Math.min(1, atLeast(x, n, p0) + atMost(mirror, n, p0));
}

function atLeast(x: number, n: number, p0: number): number {
  if (x <= 0) return 1;
  return x > n ? 0 : betainc(p0, x, n - x + 1);
}

function atMost(x: number, n: number, p0: number): number {
  if (x < 0) return 0;
  return x >= n ? 1 : betainc(p0, x + 1, n - x, true, true);
}

/** The first whole number from `from` on that meets a condition which, once met, stays so; `end` if none does. */
function firstWhole(from: number, end: number, isMet: (value: number) => boolean): number {
  let low = from;
  let high = end;
  while (low < high) {
    const middle = low + Math.floor((high - low) / 2);
    if (isMet(middle)) high = middle;
    else low = middle + 1;
  }
  return low;
}

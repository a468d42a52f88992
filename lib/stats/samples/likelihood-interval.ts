import type { Interval } from '../interval';
import { isInside, isPositive, required } from '../require';

const MOST_STEPS = 200;
const CLOSE_ENOUGH = 4e-16;

/**
 * The shares whose likelihood, on an effective sample size, is not too far below that of the observed share.
 *
 * All x with 2 nₑ KL(p, x) ≤ q², KL the Kullback–Leibler divergence of two yes-or-no distributions. Use it for
 * small or large shares, where the logit and the Wilson interval disagree; it stays inside 0–1.
 *
 * @param p observed share, inside 0–1 (at 0 or 1 use an exact interval)
 * @param effectiveN effective sample size, above 0
 * @param q critical value, above 0: normal, or Student's t, whose square is the F quantile with 1 and df
 * @throws RangeError `likelihoodInterval requires p inside 0 and 1`
 * @throws RangeError `likelihoodInterval requires effectiveN and q above 0`
 * @see Rao and Scott (1984), Annals of Statistics 12, 46–60 (from memory), as in survey 4.1.1
 *   `svyciprop(method = "likelihood")`; checked against R 4.2.2 `uniroot` on the closed equation
 * @example
 * likelihoodInterval(0.5, 100, 1.959963984540054); // => [0.402935..., 0.597064...]
 */
export function likelihoodInterval(p: number, effectiveN: number, q: number): Interval {
  required(isInside(p), 'likelihoodInterval', 'p inside 0 and 1');
  required(isPositive(effectiveN) && isPositive(q), 'likelihoodInterval', 'effectiveN and q above 0');
  const divergence = (q * q) / (2 * effectiveN);
  return [p * Math.exp(-logFall(p, 1 - p, divergence)), p + fallOf(1 - p, logFall(1 - p, p, divergence))];
}

/** How far a share falls in s = ln(p/x), without the cancellation of p − x. */
const fallOf = (p: number, s: number): number => -p * Math.expm1(-s);

/**
 * How far the x below p at the given divergence lies, as s = ln(p/x), where the divergence is convex and rises: Newton
 * from above cannot overshoot.
 */
function logFall(p: number, rest: number, divergence: number): number {
  let s = (divergence - rest * Math.log(rest)) / p;
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const fall = fallOf(p, s);
    const excess = p * s - rest * Math.log1p(fall / rest) - divergence;
    const move = excess / (fall / (rest + fall));
    s -= move;
    if (!(Math.abs(move) > CLOSE_ENOUGH * s)) break;
  }
  return s;
}

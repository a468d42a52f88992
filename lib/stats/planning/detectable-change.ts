import { findRoot } from '../find-root';
import { isProportion, required } from '../require';
import type { ChangePlan } from './change-power';
import { plannedCritical } from './sides';
import { plannedPowerQuantile } from './target-power';
import { requireSample, unitErrorsOfChange } from './two-shares';

export type DetectableChange = {
  /** Rise from p1, a proportion; null where not even a rise to 1 would be found so often. */
  increase: number | null;
  /** Fall from p1, above 0; null where not even a fall to 0 would be found so often. */
  decrease: number | null;
};

/**
 * The smallest true change of a share that two polls of one size would find with the given power.
 *
 * Use it beside a change that was not shown, so that two polls too small to see it are not read as showing none.
 * Rise and fall differ, since the error depends on where the share goes to.
 *
 * @param plan true share at the first poll, and n, deff, alpha and alternative as in changePower; power, above
 *   alpha and below 1
 * @returns exact to about 1e-14
 * @throws RangeError `detectableChange requires p1 from 0 to 1`
 * @throws RangeError `detectableChange requires n and deff above 0`
 * @throws RangeError `detectableChange requires alpha inside 0 and 1`
 * @throws RangeError `detectableChange requires alternative 'two.sided' or 'one.sided'`
 * @throws RangeError `detectableChange requires power above alpha and below 1`
 * @see R 4.2.2 `uniroot` on the power of `power.prop.test(strict = FALSE)`
 * @example
 * detectableChange({
 *   ...{ p1: 0.4, n: 1000, deff: 1 },
 *   ...{ alpha: 0.05, power: 0.8, alternative: 'two.sided' },
 * }).increase; // => 0.0620094...
 */
export function detectableChange(plan: Omit<ChangePlan, 'p2'> & { power: number }): DetectableChange {
  const { p1, n, deff, alpha, alternative, power } = plan;
  required(isProportion(p1), 'detectableChange', 'p1 from 0 to 1');
  requireSample(n, deff, 'detectableChange');
  const critical = plannedCritical(alpha, alternative, 'detectableChange');
  const beyond = plannedPowerQuantile(power, alpha, 'detectableChange');
  const shortfall = (change: number, p2: number) => {
    const { level, actual } = unitErrorsOfChange(p1, p2);
    return change - (critical * level + beyond * actual) / Math.sqrt(n / deff);
  };
  return {
    increase: smallestFound((change) => shortfall(change, p1 + change), 1 - p1),
    decrease: smallestFound((change) => shortfall(change, p1 - change), p1),
  };
}

/** The excess is below 0 for small changes; halving from the largest one finds where it turns. */
function smallestFound(excess: (change: number) => number, largest: number): number | null {
  if (!(excess(largest) > 0)) return null;
  let below = largest / 2;
  while (excess(below) > 0) below /= 2;
  return findRoot(excess, below, 2 * below);
}

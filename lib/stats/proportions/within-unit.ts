import type { Interval } from '../interval';
import { required } from '../require';

/**
 * An interval of a share, cut to what a share can be.
 *
 * Use it for methods that run over (Wald, Agresti–Coull). A cut end hides that the method does not fit.
 *
 * @param interval low and high end, low at most high
 * @returns proportions inside 0–1
 * @throws RangeError `withinUnit requires low at most high`
 * @see R 4.2.2 `pmin(1, pmax(0, interval))`
 * @example
 * withinUnit([-0.02, 0.06]); // => [0, 0.06]
 */
export function withinUnit([low, high]: Interval): Interval {
  required(low <= high, 'withinUnit', 'low at most high');
  return [Math.min(1, Math.max(0, low)), Math.min(1, Math.max(0, high))];
}

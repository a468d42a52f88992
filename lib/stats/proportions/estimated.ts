import type { Interval } from '../interval';
import { criticalValue } from '../distributions/critical-value';
import { isInside, required } from '../require';

/** An estimate with its normal margin: the interval is the estimate less and plus the margin, never cut. */
export type Estimated = {
  readonly estimate: number;
  readonly standardError: number;
  readonly margin: number;
  readonly interval: Interval;
};

/** Puts the normal margin of a level round an estimate; throws in the name of the function that asks. */
export function estimated(fn: string, estimate: number, standardError: number, level: number): Estimated {
  required(isInside(level), fn, 'level inside 0 and 1');
  const margin = criticalValue(1 - level, null) * standardError;
  return { estimate, standardError, margin, interval: [estimate - margin, estimate + margin] };
}

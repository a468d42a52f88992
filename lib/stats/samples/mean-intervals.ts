import { criticalValue } from '../distributions/critical-value';
import type { Interval } from '../interval';

/** Intervals of a mean or a lead; null without variance, by Student's t also with 0 degrees of freedom. */
export type MeanIntervals = {
  readonly normal: Interval | null;
  readonly t: Interval | null;
};

/** Estimate ± q·se with the normal quantile and with Student's. */
export function meanIntervals(estimate: number, se: number, df: number, level: number): MeanIntervals {
  const around = (degrees: number | null): Interval => {
    const half = criticalValue(1 - level, degrees) * se;
    return [estimate - half, estimate + half];
  };
  return { normal: se > 0 ? around(null) : null, t: se > 0 && df >= 1 ? around(df) : null };
}

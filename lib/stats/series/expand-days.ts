import type { Level } from './solve-level';
import { betweenKnots, houseUncertainty } from './uncertain-houses';

export type DailyLevel = { readonly mean: number[]; readonly variance: number[] };

/** The smoothed level of every day from firstDay to lastDay, with the uncertainty of the house effects. */
export function smoothedDays(level: Level): DailyLevel {
  const { arranged, gains, means, stateVariance } = level;
  const { knotDay, days } = arranged;
  const { drift, variance } = gains;
  const uncertainty = houseUncertainty(level);
  const dayCount = days.lastDay - days.firstDay + 1;
  const last = knotDay.length - 1;
  const mean = new Array<number>(dayCount);
  const total = new Array<number>(dayCount);

  const firstKnot = knotDay[0]!;
  for (let day = 0; day < firstKnot; day += 1) {
    mean[day] = means.smoothed[0]!;
    total[day] =
      stateVariance * (firstKnot - day) +
      gains.smoothedVariance[0]! +
      (uncertainty ? uncertainty.smoothed[0]! : 0);
  }
  for (let knot = 0; knot < last; knot += 1) {
    const here = knotDay[knot]!;
    const next = knotDay[knot + 1]!;
    const before = means.filtered[knot]!;
    const ahead = means.smoothed[knot + 1]!;
    const aheadVariance = gains.smoothedVariance[knot + 1]!;
    const inverse = drift[knot]! === 0 ? 0 : 1 / (variance[knot]! + drift[knot]!);
    for (let day = here; day < next; day += 1) {
      const remaining = stateVariance * (next - day);
      const follow = inverse === 0 ? 1 : (variance[knot]! + stateVariance * (day - here)) * inverse;
      mean[day] = before + follow * (ahead - before);
      total[day] = follow * (remaining + follow * aheadVariance);
      if (uncertainty) {
        const { filtered, across, smoothed } = uncertainty;
        total[day]! += betweenKnots(filtered[knot]!, across[knot]!, smoothed[knot + 1]!, follow);
      }
    }
  }
  const lastKnot = knotDay[last]!;
  const own = variance[last]! + (uncertainty ? uncertainty.filtered[last]! : 0);
  for (let day = lastKnot; day < dayCount; day += 1) {
    mean[day] = means.filtered[last]!;
    total[day] = own + stateVariance * (day - lastKnot);
  }
  return { mean, variance: total };
}

export type FilteredLevel = {
  readonly mean: (number | null)[];
  readonly variance: (number | null)[];
};

/** The level of every day given the polls up to and including it; null before the first poll. */
export function filteredDays(level: Level): FilteredLevel {
  const { arranged, gains, means, stateVariance } = level;
  const { knotDay, days } = arranged;
  const dayCount = days.lastDay - days.firstDay + 1;
  const mean = new Array<number | null>(dayCount);
  const variance = new Array<number | null>(dayCount);
  mean.fill(null, 0, knotDay[0]);
  variance.fill(null, 0, knotDay[0]);
  for (let knot = 0; knot < knotDay.length; knot += 1) {
    const next = knot + 1 < knotDay.length ? knotDay[knot + 1]! : dayCount;
    for (let day = knotDay[knot]!; day < next; day += 1) {
      mean[day] = means.filtered[knot]!;
      variance[day] = gains.variance[knot]! + stateVariance * (day - knotDay[knot]!);
    }
  }
  return { mean, variance };
}

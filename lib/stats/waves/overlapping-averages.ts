import { twoSidedP } from '../distributions/two-sided-p';
import { isPositive, isProportion, required } from '../require';
import { sumOf } from './polls';

export type Wave = {
  /** Share, 0–1. */
  readonly p: number;
  /** People of this wave, above 0. */
  readonly n: number;
};

export type TrackingAverages = {
  /** Waves in one average, a whole number of at least 1. */
  window: number;
  /** Waves in both averages, 0 to window. */
  shared: number;
  /** All 2·window − shared waves, earliest first. */
  waves: readonly Wave[];
  /** Design effect of every wave, above 0. */
  deff: number;
  /** Each wave counts the same, or by its people. */
  weighting: 'equal' | 'by_n';
};

export type AveragesChange = {
  /** Average of the first `window` waves. */
  before: number;
  /** Average of the last `window` waves. */
  after: number;
  /** After less before. */
  change: number;
  /** From each wave's own share; 0 where the averages rest on the same waves. */
  se: number;
  /** Null where se is 0. */
  z: number | null;
  pValue: number | null;
  /** Share in all waves together, by people. */
  pooled: number;
  /** As if every wave had the pooled share. */
  sePooled: number;
  zPooled: number | null;
  pValuePooled: number | null;
  /** What the standard error would be with no wave in common: too large for averages that share some. */
  seIfIndependent: number;
  /** Of the two averages; null where one of them has no variance. */
  correlation: number | null;
};

/**
 * The change from one tracking average to a later one that shares waves with it.
 *
 * Use it for rolling averages: what both hold cancels, so only the waves not shared (and, weighted by people, what
 * the shared ones' weights change by) make the difference. Not for averages of different pollsters.
 *
 * @throws RangeError `changeOfOverlappingAverages requires whole window of at least 1 and shared from 0 to window`
 * @throws RangeError `changeOfOverlappingAverages requires 2·window − shared waves`
 * @throws RangeError `changeOfOverlappingAverages requires waves with p from 0 to 1 and n above 0`
 * @throws RangeError `changeOfOverlappingAverages requires deff above 0`
 * @throws RangeError `changeOfOverlappingAverages requires weighting 'equal' or 'by_n'`
 * @see closed form Σ(w₂−w₁)²·deff·pq/n in R 4.2.2
 * @example
 * changeOfOverlappingAverages({
 *   waves: [0.4, 0.41, 0.43, 0.44].map((p) => ({ p, n: 500 })),
 *   ...{ window: 3, shared: 2, deff: 1, weighting: 'equal' },
 * }).z; // => 1.2824729...
 */
export function changeOfOverlappingAverages(averages: TrackingAverages): AveragesChange {
  requireAverages(averages, 'changeOfOverlappingAverages');
  const { waves, deff } = averages;
  const [first, second] = weights(averages);
  const pooled = sumOf(waves.map(({ p, n }) => n * p)) / sumOf(waves.map(({ n }) => n));
  const own = waves.map(({ p, n }) => (deff * p * (1 - p)) / n);
  const alike = waves.map(({ n }) => (deff * pooled * Math.max(0, 1 - pooled)) / n);
  const moved = second.map((weight, index) => (weight - (first[index] ?? 0)) ** 2);
  const shares = waves.map(({ p }) => p);
  const before = dot(first, shares);
  const after = dot(second, shares);
  const change = after - before;
  const se = Math.sqrt(dot(moved, own));
  const sePooled = Math.sqrt(dot(moved, alike));
  const [z, pValue] = tested(change, se);
  const [zPooled, pValuePooled] = tested(change, sePooled);
  const apart = variancesApart(first, second, own);
  return { before, after, change, se, z, pValue, pooled, sePooled, zPooled, pValuePooled, ...apart };
}

function variancesApart(first: readonly number[], second: readonly number[], own: readonly number[]) {
  const varianceBefore = sumOf(first.map((weight, index) => weight ** 2 * (own[index] ?? 0)));
  const varianceAfter = sumOf(second.map((weight, index) => weight ** 2 * (own[index] ?? 0)));
  const covariance = sumOf(first.map((weight, index) => weight * (second[index] ?? 0) * (own[index] ?? 0)));
  const both = varianceBefore > 0 && varianceAfter > 0;
  return {
    seIfIndependent: Math.sqrt(varianceBefore + varianceAfter),
    correlation: both ? covariance / Math.sqrt(varianceBefore * varianceAfter) : null,
  };
}

function weights({ window, shared, waves, weighting }: TrackingAverages): [number[], number[]] {
  const sizes = waves.map(({ n }) => (weighting === 'equal' ? 1 : n));
  const over = (from: number) => {
    const inside = (index: number) => index >= from && index < from + window;
    const sum = sumOf(sizes.filter((_, index) => inside(index)));
    return sizes.map((size, index) => (inside(index) ? size / sum : 0));
  };
  return [over(0), over(window - shared)];
}

function dot(a: readonly number[], b: readonly number[]): number {
  return sumOf(a.map((value, index) => value * (b[index] ?? 0)));
}

function tested(change: number, se: number): [z: number | null, pValue: number | null] {
  return se > 0 ? [change / se, twoSidedP(change / se, null)] : [null, null];
}

function requireAverages({ window, shared, waves, deff, weighting }: TrackingAverages, fn: string): void {
  const whole = Number.isInteger(window) && Number.isInteger(shared);
  required(
    whole && window >= 1 && shared >= 0 && shared <= window,
    fn,
    'whole window of at least 1 and shared from 0 to window',
  );
  required(waves.length === 2 * window - shared, fn, '2·window − shared waves');
  required(
    waves.every(({ p, n }) => isProportion(p) && isPositive(n)),
    fn,
    'waves with p from 0 to 1 and n above 0',
  );
  required(isPositive(deff), fn, 'deff above 0');
  required(weighting === 'equal' || weighting === 'by_n', fn, "weighting 'equal' or 'by_n'");
}

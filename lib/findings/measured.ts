import { twoSidedP, type Interval } from '@/lib/stats';
import type { Range, SecondTest } from './check-types';
import { unitsOf, type BaseFigures, type Sampled } from './base-figures';

/** Which design effect of each base a standard error takes: the chosen one, or an end of its range. */
export type DeffEnd = 'chosen' | 'low' | 'high';

/** One printed share in an estimate, added or taken away. */
export type Term = { base: BaseFigures; option: string; sign: 1 | -1 };

/** A second test before it is known whether it agrees: a p-value, or an interval that must exclude 0. */
export type SecondResult =
  { name: Exclude<SecondTest['name'], 'newcombe'>; p: number } | { name: 'newcombe'; intervalPp: Range };

/** One estimate with what its test needs; proportions but for `estimatePp`. */
export type Measured = {
  bases: readonly Sampled[];
  /** Computed from whole printed units, so that equal printed figures differ by exactly 0. */
  estimatePp: number;
  /** Smallest degrees of freedom among the bases; null: normal. */
  df: number | null;
  standardError: (end: DeffEnd) => number;
  interval: (q: number) => Interval;
  /** Rounding unit in points of each printed figure in the estimate. */
  unitsPp: readonly number[];
  secondTests: (alpha: number) => SecondResult[];
};

/** The design effect of a base at one end of its range. */
export function deffAt({ deff }: Sampled, end: DeffEnd): number {
  if (end === 'chosen') return deff.value;
  return end === 'low' ? deff.range[0] : deff.range[1];
}

/** The smallest degrees of freedom among bases; null where none has any. */
export function smallestDf(bases: readonly Sampled[]): number | null {
  let smallest: number | null = null;
  for (const { deff } of bases) {
    if (deff.df !== null && (smallest === null || deff.df < smallest)) smallest = deff.df;
  }
  return smallest;
}

/** A signed sum of printed shares in points, exact in the finest printed decimal. */
export function sumOfShares(terms: readonly Term[]): number {
  let decimals = 0;
  for (const { base } of terms) decimals = Math.max(decimals, base.decimals);
  let units = 0;
  for (const { base, option, sign } of terms) {
    units += sign * unitsOf(base, option) * 10 ** (decimals - base.decimals);
  }
  return (units + 0) / 10 ** decimals;
}

/** p of an estimate over its standard error; without variance 1 for an estimate of 0, else 0. */
export function pOfRatio(estimate: number, standardError: number, df: number | null): number {
  if (standardError === 0) return estimate === 0 ? 1 : 0;
  return twoSidedP(estimate / standardError, df);
}

/** `estimate ± q·standardError`. */
export function symmetric(estimate: number, standardError: number, q: number): Interval {
  return [estimate - q * standardError, estimate + q * standardError];
}

import { criticalValue } from '@/lib/stats';
import { boundedMemo } from './bounded-memo';

const LIMIT = 4096;

const normal = boundedMemo((alpha: number) => criticalValue(alpha, null), LIMIT);
const ofDf = boundedMemo((df: number) => boundedMemo((alpha: number) => criticalValue(alpha, df), 64), 64);

/**
 * criticalValue, remembered: all findings of a release ask for the same few.
 *
 * @param alpha two-sided error probability, inside 0–1
 * @param df degrees of freedom, at least 1; null for the normal distribution
 * @throws RangeError `criticalValue requires alpha inside 0 and 1`
 * @throws RangeError `criticalValue requires df of at least 1, or null`
 * @see criticalValue of the statistics engine
 * @example
 * criticalAt(0.05, null); // => 1.959963984540054
 */
export function criticalAt(alpha: number, df: number | null): number {
  return df === null ? normal(alpha) : ofDf(df)(alpha);
}

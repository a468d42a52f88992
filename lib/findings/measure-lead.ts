import { exactSignP, isBelow, leadNullStandardError, leadStandardError } from '@/lib/stats';
import type { Pair } from './check-types';
import { proportionOf, roundingUnitsPp, type BaseFigures, type Sampled } from './base-figures';
import { deffAt, pOfRatio, smallestDf, sumOfShares, symmetric } from './measured';
import type { DeffEnd, Measured, SecondResult } from './measured';

const FEW_FOR_SIGN = 50;

/** Standard error of a lead at one end of the design effect's range. */
export function leadErrorAt(base: BaseFigures, sampled: Sampled, [a, b]: Pair, end: DeffEnd): number {
  return leadStandardError(proportionOf(base, a), proportionOf(base, b), sampled.n, deffAt(sampled, end));
}

/**
 * The lead of the first option of a pair over the second, on one base.
 *
 * @param base the base, both options disclosed
 * @param sampled its sampled part
 * @param pair first and second option
 */
export function measureLead(base: BaseFigures, sampled: Sampled, pair: Pair): Measured {
  const [first, second] = pair;
  const a = proportionOf(base, first);
  const b = proportionOf(base, second);
  const estimatePp = sumOfShares([
    { base, option: first, sign: 1 },
    { base, option: second, sign: -1 },
  ]);
  const df = smallestDf([sampled]);
  const standardError = (end: DeffEnd) => leadErrorAt(base, sampled, pair, end);
  return {
    bases: [sampled],
    estimatePp,
    df,
    standardError,
    interval: (q) => symmetric(estimatePp / 100, standardError('chosen'), q),
    unitsPp: [...roundingUnitsPp(base, first), ...roundingUnitsPp(base, second)],
    secondTests: () => {
      const nullError = leadNullStandardError(a, b, sampled.n, sampled.deff.value);
      const tests: SecondResult[] = [{ name: 'score', p: pOfRatio(estimatePp / 100, nullError, df) }];
      if (isBelow(sampled.nEff * (a + b), FEW_FOR_SIGN)) {
        tests.push({ name: 'exact-sign', p: exactSignP(sampled.nEff * a, sampled.nEff * b) });
      }
      return tests;
    },
  };
}

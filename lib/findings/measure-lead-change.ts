import type { Pair } from './check-types';
import { roundingUnitsPp } from './base-figures';
import type { SampledBase } from './measure-change';
import { leadErrorAt } from './measure-lead';
import { smallestDf, sumOfShares, symmetric } from './measured';
import type { DeffEnd, Measured } from './measured';

/**
 * The change of a lead from an earlier base to a later one.
 *
 * @param earlier the earlier base, both options disclosed
 * @param later the later base, both options disclosed
 * @param pair first and second option
 */
export function measureLeadChange(earlier: SampledBase, later: SampledBase, pair: Pair): Measured {
  const [first, second] = pair;
  const bases = [later.sampled, earlier.sampled];
  const estimatePp = sumOfShares([
    { base: later.base, option: first, sign: 1 },
    { base: later.base, option: second, sign: -1 },
    { base: earlier.base, option: first, sign: -1 },
    { base: earlier.base, option: second, sign: 1 },
  ]);
  const standardError = (end: DeffEnd) =>
    Math.hypot(
      leadErrorAt(earlier.base, earlier.sampled, pair, end),
      leadErrorAt(later.base, later.sampled, pair, end),
    );
  return {
    bases,
    estimatePp,
    df: smallestDf(bases),
    standardError,
    interval: (q) => symmetric(estimatePp / 100, standardError('chosen'), q),
    unitsPp: [later.base, earlier.base].flatMap((base) =>
      pair.flatMap((name) => roundingUnitsPp(base, name)),
    ),
    secondTests: () => [],
  };
}

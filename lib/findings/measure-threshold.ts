import { exactBinomialP, isBelow, shareStandardError } from '@/lib/stats';
import type { Threshold } from './check-types';
import { proportionOf, roundingUnitsPp, unitsOf, type BaseFigures, type Sampled } from './base-figures';
import { deffAt, smallestDf } from './measured';
import type { DeffEnd, Measured } from './measured';
import { shareInterval } from './share-interval';

const FEW_COUNTS = 10;

/**
 * A share against a fixed value, such as a majority or an entry hurdle. The standard error is the one at that
 * value; the interval is the share's, less the value.
 *
 * @param base the base that the rule counts, option disclosed
 * @param sampled its sampled part
 * @param threshold option and value in percent
 * @param level confidence level of the interval
 */
export function measureThreshold(
  base: BaseFigures,
  sampled: Sampled,
  { option, pct }: Threshold,
  level: number,
): Measured {
  const { n, nEff } = sampled;
  const p = proportionOf(base, option);
  const p0 = pct / 100;
  const [low, high] = shareInterval(p, sampled, level).interval;
  return {
    bases: [sampled],
    estimatePp: unitsOf(base, option) / 10 ** base.decimals - pct,
    df: smallestDf([sampled]),
    standardError: (end: DeffEnd) => shareStandardError(p0, n, deffAt(sampled, end)),
    interval: () => [low - p0, high - p0],
    unitsPp: roundingUnitsPp(base, option),
    secondTests: () => {
      const counts = [p0, 1 - p0, p, 1 - p].map((share) => nEff * share);
      if (!counts.some((count) => isBelow(count, FEW_COUNTS))) return [];
      return [{ name: 'exact-binomial', p: exactBinomialP(Math.min(nEff * p, nEff), nEff, p0) }];
    },
  };
}

import { fisherExactP, isBelow, newcombeInterval } from '@/lib/stats';
import { pooledStandardError, roundHalfUp, shareStandardError } from '@/lib/stats';
import { criticalAt } from './critical-at';
import { proportionOf, roundingUnitsPp, type BaseFigures, type Sampled } from './base-figures';
import { deffAt, pOfRatio, smallestDf, sumOfShares, symmetric } from './measured';
import type { DeffEnd, Measured, SecondResult } from './measured';

const FEW_COUNTS = 10;

/** A base together with its sampled part. */
export type SampledBase = { base: BaseFigures; sampled: Sampled };

/**
 * The change of one option's share from an earlier base to a later one.
 *
 * @param earlier the earlier base, option disclosed
 * @param later the later base, option disclosed
 * @param option the answer option
 */
export function measureChange(earlier: SampledBase, later: SampledBase, option: string): Measured {
  const p1 = proportionOf(earlier.base, option);
  const p2 = proportionOf(later.base, option);
  const estimatePp = sumOfShares([
    { base: later.base, option, sign: 1 },
    { base: earlier.base, option, sign: -1 },
  ]);
  const bases = [later.sampled, earlier.sampled];
  const standardError = (end: DeffEnd) =>
    Math.hypot(
      shareStandardError(p1, earlier.sampled.n, deffAt(earlier.sampled, end)),
      shareStandardError(p2, later.sampled.n, deffAt(later.sampled, end)),
    );
  return {
    bases,
    estimatePp,
    df: smallestDf(bases),
    standardError,
    interval: (q) => symmetric(estimatePp / 100, standardError('chosen'), q),
    unitsPp: [...roundingUnitsPp(later.base, option), ...roundingUnitsPp(earlier.base, option)],
    secondTests: (alpha) =>
      changeTests(
        { p: p1, nEff: earlier.sampled.nEff },
        { p: p2, nEff: later.sampled.nEff },
        {
          estimate: estimatePp / 100,
          df: smallestDf(bases),
          alpha,
        },
      ),
  };
}

type EffectiveShare = { p: number; nEff: number };

function changeTests(
  earlier: EffectiveShare,
  later: EffectiveShare,
  { estimate, df, alpha }: { estimate: number; df: number | null; alpha: number },
): SecondResult[] {
  const pooled = pooledStandardError(earlier.p, earlier.nEff, later.p, later.nEff);
  const [low, high] = newcombeInterval(earlier.p, earlier.nEff, later.p, later.nEff, criticalAt(alpha, null));
  const tests: SecondResult[] = [
    { name: 'pooled', p: pOfRatio(estimate, pooled, df) },
    { name: 'newcombe', intervalPp: [100 * low, 100 * high] },
  ];
  const counts = [earlier, later].flatMap(({ p, nEff }) => [nEff * p, nEff * (1 - p)]);
  if (counts.some((count) => isBelow(count, FEW_COUNTS))) {
    const [hits1 = 0, others1 = 0, hits2 = 0, others2 = 0] = counts.map(roundHalfUp);
    tests.push({ name: 'fisher', p: fisherExactP(hits1, hits1 + others1, hits2, hits2 + others2) });
  }
  return tests;
}

import { changeOfOverlappingAverages } from '@/lib/stats';
import { proportionOf, roundingUnitsPp } from './base-figures';
import type { WaveOverlap } from './judge-types';
import type { SampledBase } from './measure-change';
import { deffAt, smallestDf, sumOfShares, symmetric } from './measured';
import type { DeffEnd, Measured, Term } from './measured';
import { trackedWaves } from './tracking-waves';

/** What an estimate is about: one share, or a lead. */
export type Named = readonly [option: string] | readonly [first: string, second: string];

/**
 * The change between two tracking averages with waves in common, of a share or of a lead: only the waves not shared
 * make the difference.
 *
 * Every wave counts with the larger design effect of the two averages. Where single waves' shares are not known,
 * all stand at the share pooled over both averages.
 *
 * @param earlier the earlier average, every name disclosed
 * @param later the later average, every name disclosed
 * @param named one option, or the two of a lead
 * @param overlap at least one wave shared, and at least one not
 * @see changeOfOverlappingAverages of the statistics engine
 */
export function measureOverlap(
  earlier: SampledBase,
  later: SampledBase,
  named: Named,
  overlap: WaveOverlap,
): Measured {
  const bases = [later.sampled, earlier.sampled];
  const estimatePp = sumOfShares(overlapTerms(earlier, later, named));
  const waves = trackedWaves(overlap, earlier.sampled, later.sampled);
  const shares = waves.map((_, place) => waveShares(earlier, later, named, overlap, place));
  const unit = unitError(waves, shares, overlap);
  const standardError = (end: DeffEnd) => unit * Math.sqrt(overlapDeffAt(earlier, later, end));
  return {
    bases,
    estimatePp,
    df: smallestDf(bases),
    standardError,
    interval: (q) => symmetric(estimatePp / 100, standardError('chosen'), q),
    unitsPp: [later.base, earlier.base].flatMap((base) =>
      named.flatMap((name) => roundingUnitsPp(base, name)),
    ),
    secondTests: () => [],
  };
}

/** The larger design effect of two averages. */
export function overlapDeffAt(earlier: SampledBase, later: SampledBase, end: DeffEnd): number {
  return Math.max(deffAt(earlier.sampled, end), deffAt(later.sampled, end));
}

/** The share of each name in one wave: its own where it is known, else pooled over both averages by their people. */
export function waveShares(
  earlier: SampledBase,
  later: SampledBase,
  named: Named,
  { shares }: WaveOverlap,
  place: number,
): number[] {
  const own = named.map((name) => shares?.find(({ option }) => option === name)?.pct[place]);
  if (own.every((pct) => pct !== undefined)) return own.map((pct) => pct / 100);
  const [n1, n2] = [earlier.sampled.n, later.sampled.n];
  return named.map(
    (name) => (n1 * proportionOf(earlier.base, name) + n2 * proportionOf(later.base, name)) / (n1 + n2),
  );
}

function overlapTerms(earlier: SampledBase, later: SampledBase, named: Named): Term[] {
  return [later, earlier].flatMap(({ base }, ofEarlier) =>
    named.map((option, place): Term => ({ base, option, sign: (ofEarlier + place) % 2 === 0 ? 1 : -1 })),
  );
}

/** Standard error at a design effect of 1. */
function unitError(
  waves: readonly { interviews: number }[],
  shares: readonly number[][],
  { window, shared, interviews }: WaveOverlap,
): number {
  const isLead = shares.some((ofWave) => ofWave.length > 1);
  const { se } = changeOfOverlappingAverages({
    window,
    shared,
    waves: waves.map((wave, place) => ({ p: shareLike(shares[place] ?? []), n: wave.interviews })),
    deff: 1,
    weighting: interviews ? 'by_n' : 'equal',
  });
  return isLead ? 2 * se : se;
}

/** One share as it is; for a lead the share with a quarter of its variance, a lead counting from −1 to 1. */
function shareLike([a = 0, b]: readonly number[]): number {
  if (b === undefined) return a;
  const variance = Math.min(1, Math.max(0, a + b - (a - b) ** 2));
  return (1 - Math.sqrt(1 - variance)) / 2;
}

import { clopperPearsonInterval, isBelow, wilsonInterval, type Interval } from '@/lib/stats';
import { criticalAt } from './critical-at';
import type { ShareFinding } from './check-types';
import { proportionOf, type BaseFigures, type Sampled } from './base-figures';

const FEW_COUNTS = 10;

/**
 * The interval of a share at the policy's level: score interval, or the exact one where either side has fewer than
 * ten effective counts.
 *
 * @param p the share, 0–1
 * @param sampled the base it was measured on
 * @param level confidence level
 */
export function shareInterval(
  p: number,
  { nEff, deff }: Sampled,
  level: number,
): { interval: Interval; method: 'wilson' | 'clopper-pearson' } {
  if (isBelow(nEff * p, FEW_COUNTS) || isBelow(nEff * (1 - p), FEW_COUNTS)) {
    const count = Math.min(nEff * p, nEff);
    return { interval: clopperPearsonInterval(count, nEff, level), method: 'clopper-pearson' };
  }
  return { interval: wilsonInterval(p, nEff, criticalAt(1 - level, deff.df)), method: 'wilson' };
}

/** The finding of one printed share: its interval where it is disclosed and its base has a margin. */
export function findShare(base: BaseFigures, option: string, level: number): ShareFinding {
  if (typeof base.units.get(option) !== 'number') return { kind: 'share', option, estimatePct: null };
  const p = proportionOf(base, option);
  const estimatePct = 100 * p;
  if (!base.sampled) return { kind: 'share', option, estimatePct };
  const { interval, method } = shareInterval(p, base.sampled, level);
  const intervalPct = [100 * interval[0], 100 * interval[1]] as const;
  return { kind: 'share', option, estimatePct, intervalPct, method };
}

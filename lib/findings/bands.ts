import { sampledBase } from './ask';
import { criticalAt } from './critical-at';
import { proportionOf, readBase, type Sampled } from './base-figures';
import type { CheckDocument, Finding, Range } from './check-types';
import type { ReleaseShare, ReleaseTestable } from './judge-types';
import { measureChange, type SampledBase } from './measure-change';
import { measureLead } from './measure-lead';
import { measureLeadChange } from './measure-lead-change';
import type { DeffEnd, Measured } from './measured';
import { resolvePolicy } from './policy';
import { shareInterval } from './share-interval';

/** One interval, in percent for a share or threshold and in points for the rest. */
export type LevelInterval = { level: number; low: number; high: number };

export type Uncertainty = {
  /** Outermost first: the policy's level, then 80 and 50 % where it is above them. */
  bands: LevelInterval[];
  /** The outermost interval at the high end of the design effect's range; null where that is no wider. */
  far: { low: number; high: number } | null;
};

const INNER_LEVELS = [0.8, 0.5];

/**
 * The intervals of one finding at several levels, for a picture of it.
 *
 * A share and a threshold have the share's interval in percent; leads and changes theirs in points. The first
 * band is the finding's own interval at the policy's level, unadjusted.
 *
 * @param finding a finding of `check(document)`
 * @param document the check document it came from
 * @returns null where the finding has no interval; only its own band where the document alone does not make it: net
 *   scores, gaps, blocs and changes between waves
 * @example
 * uncertaintyOf({ kind: 'share', option: 'A', estimatePct: 50 }, { release: { sampleSource: 'probability',
 *   n: 1000, design: 'unweighted', decimals: 0, shares: [{ option: 'A', pct: 50 }] } }).bands.length; // => 3
 */
export function uncertaintyOf(
  finding: Finding | ReleaseShare | ReleaseTestable,
  document: CheckDocument,
): Uncertainty | null {
  if (finding.kind !== 'share' && finding.verdict === 'cannot-be-tested') return null;
  const policy = resolvePolicy(document.policy);
  if (!isOfDocument(finding, document)) return ownBand(finding, policy.level);
  const interval = intervalsOf(finding, document);
  if (!interval) return null;
  const levels = [policy.level, ...INNER_LEVELS.filter((level) => level < policy.level)];
  const bands = levels.map((level) => levelInterval(level, interval(level, 'chosen')));
  const { low, high } = levelInterval(policy.level, interval(policy.level, 'high'));
  const outer = bands[0];
  const isWider = outer !== undefined && (low < outer.low - 1e-9 || high > outer.high + 1e-9);
  return { bands, far: isWider ? { low, high } : null };
}

/** Whether its test can be measured anew from the bases of a check document. */
function isOfDocument(
  finding: Finding | ReleaseShare | ReleaseTestable,
  { release, previous }: CheckDocument,
): finding is Finding {
  if (finding.kind === 'gap' || finding.kind === 'net-score' || finding.kind === 'net-score-change')
    return false;
  if ('trace' in finding) return false;
  const names = 'pair' in finding ? finding.pair : [finding.option];
  const bases = finding.kind === 'change' || finding.kind === 'lead-change' ? [release, previous] : [release];
  return bases.every((base) => names.every((name) => base?.shares.some(({ option }) => option === name)));
}

function ownBand(finding: Finding | ReleaseShare | ReleaseTestable, level: number): Uncertainty | null {
  if (finding.kind === 'share') {
    const range = finding.intervalPct;
    return range ? { bands: [{ level, low: range[0], high: range[1] }], far: null } : null;
  }
  if (finding.verdict === 'cannot-be-tested') return null;
  const from = finding.kind === 'threshold' ? finding.thresholdPct : 0;
  const [low, high] = finding.intervalPp;
  return { bands: [{ level, low: from + low, high: from + high }], far: null };
}

/** The interval in percent or points at a level, with one end of the design effect. */
type Intervals = (level: number, end: DeffEnd) => Range;

function intervalsOf(finding: Finding, document: CheckDocument): Intervals | null {
  const policy = resolvePolicy(document.policy);
  const release = sampledBase(readBase(document.release, policy));
  const previous = document.previous ? sampledBase(readBase(document.previous, policy)) : null;
  if (!release) return null;
  switch (finding.kind) {
    case 'share':
      return finding.estimatePct === null ? null : ofShare(release, finding.option);
    case 'threshold':
      return ofShare(release, finding.option);
    case 'lead':
      return ofMeasured(measureLead(release.base, release.sampled, finding.pair));
    case 'change':
      return previous && ofMeasured(measureChange(previous, release, finding.option));
    case 'lead-change':
      return previous && ofMeasured(measureLeadChange(previous, release, finding.pair));
  }
}

function ofShare({ base, sampled }: SampledBase, option: string): Intervals {
  const p = proportionOf(base, option);
  return (level, end) => shareInterval(p, atEnd(sampled, end), level).interval;
}

function atEnd(sampled: Sampled, end: DeffEnd): Sampled {
  return end === 'high' ? { ...sampled, nEff: sampled.n / sampled.deff.range[1] } : sampled;
}

function ofMeasured(measured: Measured): Intervals {
  const estimate = measured.estimatePp / 100;
  return (level, end) => {
    const half = criticalAt(1 - level, measured.df) * measured.standardError(end);
    return [estimate - half, estimate + half];
  };
}

function levelInterval(level: number, [low, high]: Range): LevelInterval {
  return { level, low: 100 * low, high: 100 * high };
}

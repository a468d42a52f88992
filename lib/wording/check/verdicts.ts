import { type ReleaseFacts, pctOf } from '@/lib/domain/release-facts';
import type { Finding, TestableFinding, Verdict } from '@/lib/findings/check-types';
import { claimKey } from '@/lib/findings/claim-key';
import { roundHalfUp } from '@/lib/format/number';
import type { CheckedRelease } from './types';

/** A finding as a sentence would claim it: its estimate turned to the order of the names. */
export type Claimed = {
  release: number;
  claim: string;
  verdict: Verdict;
  estimatePp: number | null;
  marginPp: number | null;
  littleChanged: boolean;
  finding: TestableFinding;
};

/** The lead of one option over another in a release; null where it was not tested. */
export function leadOf(
  releases: readonly CheckedRelease[],
  release: number,
  a: string,
  b: string,
): Claimed | null {
  return ofPair(releases, release, 'lead', a, b);
}

/** The change of that lead since the earlier release. */
export function leadChangeOf(
  releases: readonly CheckedRelease[],
  release: number,
  a: string,
  b: string,
): Claimed | null {
  return ofPair(releases, release, 'lead-change', a, b);
}

export function changeOf(
  releases: readonly CheckedRelease[],
  release: number,
  option: string,
): Claimed | null {
  const found = findFinding(releases[release], (one) => one.kind === 'change' && one.option === option);
  return found && claimed(found, release, 1);
}

export function thresholdOf(
  releases: readonly CheckedRelease[],
  release: number,
  option: string,
  pct: number,
): Claimed | null {
  const found = findFinding(
    releases[release],
    (one) => one.kind === 'threshold' && one.option === option && one.thresholdPct === pct,
  );
  return found && claimed(found, release, 1);
}

function ofPair(
  releases: readonly CheckedRelease[],
  release: number,
  kind: 'lead' | 'lead-change',
  a: string,
  b: string,
): Claimed | null {
  const found = findFinding(
    releases[release],
    (one) => one.kind === kind && one.pair.includes(a) && one.pair.includes(b) && a !== b,
  );
  return found && 'pair' in found ? claimed(found, release, found.pair[0] === a ? 1 : -1) : null;
}

function findFinding(
  release: CheckedRelease | undefined,
  fits: (finding: TestableFinding) => boolean,
): TestableFinding | null {
  const isIt = (one: Finding): one is TestableFinding => one.kind !== 'share' && fits(one);
  return release?.answer.findings.find(isIt) ?? null;
}

function claimed(finding: TestableFinding, release: number, sign: 1 | -1): Claimed {
  return {
    release,
    claim: claimKey(finding),
    verdict: finding.verdict,
    estimatePp: finding.estimatePp === null ? null : finding.estimatePp * sign,
    marginPp: 'marginPp' in finding ? finding.marginPp : null,
    littleChanged: 'littleChanged' in finding && finding.littleChanged,
    finding,
  };
}

/** A printed share in percent; null where not disclosed or not asked. */
export function shareOf(facts: ReleaseFacts | null | undefined, option: string): number | null {
  const units = facts?.shares.find((share) => share.option === option)?.units ?? null;
  return units === null || !facts ? null : pctOf(units, facts.decimals);
}

/** Disclosed answers by their share, largest first. */
export function rankedOptions({ facts }: CheckedRelease): string[] {
  return facts.shares
    .filter(({ isAnswer, units }) => isAnswer && units !== null)
    .sort((x, y) => (y.units ?? 0) - (x.units ?? 0))
    .map(({ option }) => option);
}

/** Whether a size in a text is a figure, as exact as the text prints it. */
export function isRounded(value: number, decimals: number, figure: number): boolean {
  return Math.abs(value - roundHalfUp(figure, Math.min(decimals, 6))) < 1e-6;
}

import type { ClaimMessages } from './language-pack';
import type { ClaimKind } from '@/lib/domain/sheet';
import type { TestedReason, Verdict } from '@/lib/findings/check-types';
import type { DraftFinding } from './draft-finding';

/** How far a sentence about a finding may go: the verdict, told apart where a different sentence is owed. */
export type WordingState =
  'holds-twice' | 'holds' | 'fragile' | 'level' | 'not-shown' | 'family' | 'little-changed' | 'untested';

export type FragileReason = Exclude<TestedReason, 'family' | 'would-hold-at-lower-deff'>;

export const VERDICT_OF_STATE: Record<WordingState, Verdict> = {
  'holds-twice': 'holds',
  holds: 'holds',
  fragile: 'fragile',
  level: 'does-not-hold',
  'not-shown': 'does-not-hold',
  family: 'does-not-hold',
  'little-changed': 'does-not-hold',
  untested: 'cannot-be-tested',
};

/**
 * The state that chooses the words of a finding.
 *
 * `level` is equal printed figures, `family` a finding that only fails because several were tested together;
 * `little-changed` only where the test of equivalence passed.
 */
export function wordingState(finding: DraftFinding): WordingState {
  if (finding.verdict === 'cannot-be-tested') return 'untested';
  if (finding.verdict === 'holds') return finding.survivesTwiceError ? 'holds-twice' : 'holds';
  if (finding.verdict === 'fragile') return 'fragile';
  if (finding.kind === 'change' && finding.littleChanged) return 'little-changed';
  if (finding.estimatePp === 0) return 'level';
  return finding.reasons.includes('family') ? 'family' : 'not-shown';
}

/** The reasons of a fragile finding that a paper would print; empty for every other verdict. */
export function fragileReasons(finding: DraftFinding): FragileReason[] {
  if (finding.verdict !== 'fragile') return [];
  return finding.reasons.filter(
    (reason): reason is FragileReason => reason !== 'family' && reason !== 'would-hold-at-lower-deff',
  );
}

/** The message of a kind of claim in a state. */
export function claimMessage(messages: ClaimMessages, kind: ClaimKind, state: WordingState): string {
  const ofKind: Partial<Record<WordingState, string>> = messages[kind];
  const message = ofKind[state];
  if (message === undefined) throw new RangeError('claimMessage requires a state of its kind of claim');
  return message;
}

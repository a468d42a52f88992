import {
  REQUESTED_LINE_KINDS,
  type ClaimKind,
  type LineKind,
  type RequestedLineKind,
} from '@/lib/domain/sheet';
import type { DraftInput } from './draft-input';

const EVERY: readonly ClaimKind[] = [
  'lead',
  'change',
  'lead-change',
  'threshold',
  'net-score',
  'net-score-change',
  'gap',
];
const OF_TWO_RELEASES: readonly ClaimKind[] = ['change', 'lead-change', 'net-score-change'];

/**
 * Which kinds of line each claim can carry. A change sentence tells how a figure compares with an earlier poll, so
 * that a claim about one poll alone has none; every other kind exists for every claim.
 */
const CARRIED_BY: Record<LineKind, readonly ClaimKind[]> = {
  headline: EVERY,
  standfirst: EVERY,
  body: EVERY,
  'change-sentence': OF_TWO_RELEASES,
  caveat: EVERY,
  'caveat-short': EVERY,
  'caveat-one-breath': EVERY,
  'method-note': EVERY,
  'chart-title': EVERY,
  'alt-text': EVERY,
  'spoken-line': EVERY,
  'newsletter-line': EVERY,
  'correction-notice': EVERY,
};

/**
 * Whether a claim can carry a kind of line.
 *
 * @param kind any kind of line
 * @param claim any kind of claim
 * @example
 * carries('change-sentence', 'change'); // => true
 * carries('change-sentence', 'lead'); // => false
 */
export function carries(kind: LineKind, claim: ClaimKind): boolean {
  return CARRIED_BY[kind].includes(claim);
}

/**
 * The kinds of line that can be asked for beside the standing ones, in the order of the screen.
 *
 * A correction notice needs what stood in print before, and every requested kind a house style with words for it:
 * styles from before 1.1.0 have none.
 *
 * @param input what the sheet is drafted from
 */
export function requestable(
  input: Pick<DraftInput, 'claim' | 'corrected' | 'houseStyle' | 'language'>,
): RequestedLineKind[] {
  const pack: Partial<DraftInput['houseStyle']['messages']['en']> = input.houseStyle.messages[input.language];
  if (!pack.told || !pack.oneBreath || !pack.spoken) return [];
  return REQUESTED_LINE_KINDS.filter(
    (kind) =>
      carries(kind, input.claim.kind) && (kind !== 'correction-notice' || input.corrected !== undefined),
  );
}

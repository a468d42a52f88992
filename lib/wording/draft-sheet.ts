import {
  STANDING_LINE_KINDS,
  type LineKind,
  type LineText,
  type ReleaseClaim,
  type StandingLineKind,
} from '@/lib/domain/sheet';
import { keyOf } from '@/lib/findings/claim-key';
import { draftAltText } from './alt-text';
import { draftBody } from './body';
import { carries } from './carries';
import { draftCaveat } from './caveat';
import { claimSlots } from './claim-slots';
import { draftCorrection } from './correction';
import type { Draft } from './draft';
import type { DraftFinding } from './draft-finding';
import { isOfTwoReleases, type DraftInput } from './draft-input';
import { marginSlots } from './margin-slots';
import { draftMethodNote } from './method-note';
import { releaseSlots } from './release-slots';
import { say } from './say';
import {
  draftChangeSentence,
  draftNewsletterLine,
  draftOneBreath,
  draftShortCaveat,
  draftSpokenLine,
  draftStandfirst,
} from './short-lines';
import { untestedSlots } from './untested';
import { voiceOf } from './voice';
import { claimMessage, wordingState } from './wording-state';

/**
 * The standing lines of a sheet for one claim, never above its verdict.
 *
 * Use it when a reporter chooses a claim, and again to see what an edited line was drafted as. The text depends on
 * nothing but the input.
 *
 * @param input the claim with its finding, both releases, the desk's style and policy
 * @returns one text per line kind, in the order of STANDING_LINE_KINDS
 * @throws RangeError `draftSheet requires the finding of its claim`
 * @throws RangeError `draftSheet requires the earlier release of a change`
 * @throws RangeError `draftSheet requires both groups of a gap`
 */
export function draftSheet(input: DraftInput): (LineText & { kind: StandingLineKind })[] {
  requireMatching(input);
  const draft = draftOf(input, false);
  return STANDING_LINE_KINDS.map((kind) => ({ kind, text: WRITERS[kind](draft) }));
}

/**
 * One line of any kind for one claim, never above its verdict.
 *
 * Use it for what is drafted on request. A spoken line has its numbers and dates in words.
 *
 * @param input as for draftSheet; a correction notice needs `corrected` too
 * @param kind a kind that the claim carries: see carries
 * @returns the text
 * @throws RangeError `draftLine requires a kind of line that its claim carries`
 * @throws RangeError `draftLine requires what stood in print before`
 * @throws RangeError as draftSheet
 */
export function draftLine(input: DraftInput, kind: LineKind): string {
  requireMatching(input);
  if (!carries(kind, input.claim.kind)) {
    throw new RangeError('draftLine requires a kind of line that its claim carries');
  }
  return WRITERS[kind](draftOf(input, kind === 'spoken-line'));
}

function draftOf(input: DraftInput, isSpoken: boolean): Draft {
  const voice = voiceOf(input.houseStyle, input.language, isSpoken);
  return {
    input,
    voice,
    pack: input.houseStyle.messages[input.language],
    state: wordingState(input.finding),
    slots: {
      ...releaseSlots(input.release, input.previous, voice),
      ...claimSlots(input, voice),
      ...marginSlots(input, voice),
      ...untestedSlots(input),
    },
  };
}

const WRITERS: Record<LineKind, (draft: Draft) => string> = {
  headline: (draft) => fromClaim(draft, 'headline'),
  standfirst: draftStandfirst,
  body: draftBody,
  'change-sentence': draftChangeSentence,
  caveat: draftCaveat,
  'caveat-short': draftShortCaveat,
  'caveat-one-breath': draftOneBreath,
  'method-note': draftMethodNote,
  'chart-title': (draft) => fromClaim(draft, 'chartTitle'),
  'alt-text': draftAltText,
  'spoken-line': draftSpokenLine,
  'newsletter-line': draftNewsletterLine,
  'correction-notice': draftCorrection,
};

function fromClaim({ input, pack, state, slots, voice }: Draft, kind: 'headline' | 'chartTitle'): string {
  return say(claimMessage(pack[kind], input.finding.kind, state), slots, voice.locale);
}

function requireMatching({ claim, finding, previous }: DraftInput): void {
  if (keyOf(claim.kind, namesInClaim(claim)) !== keyOf(finding.kind, namesInFinding(finding))) {
    throw new RangeError('draftSheet requires the finding of its claim');
  }
  if (isOfTwoReleases(claim.kind) && !previous) {
    throw new RangeError('draftSheet requires the earlier release of a change');
  }
}

function namesInClaim(claim: ReleaseClaim): readonly string[] {
  if ('pair' in claim) return claim.pair;
  if (claim.kind === 'threshold') return [claim.option, String(claim.pct)];
  return claim.kind === 'gap' ? [claim.question, claim.option, ...claim.groups] : [claim.option];
}

function namesInFinding(finding: DraftFinding): readonly string[] {
  if ('pair' in finding) return finding.pair;
  if (finding.kind === 'threshold') return [finding.option, String(finding.thresholdPct)];
  return finding.kind === 'gap' ? [finding.question, finding.option, ...finding.groups] : [finding.option];
}

import { LINE_KINDS, type LineKind, type LineText } from '@/lib/domain/sheet';
import { claimKey } from '@/lib/findings/claim-key';
import type { Finding } from '@/lib/findings/check-types';
import { draftAltText } from './alt-text';
import { draftBody } from './body';
import { draftCaveat } from './caveat';
import { claimSlots } from './claim-slots';
import type { Draft } from './draft';
import { isOfTwoReleases, type DraftInput } from './draft-input';
import { marginSlots } from './margin-slots';
import { draftMethodNote } from './method-note';
import { voiceOf } from './print';
import { releaseSlots } from './release-slots';
import { say } from './say';
import { untestedSlots } from './untested';
import { claimMessage, wordingState } from './wording-state';

/**
 * The six lines of a sheet for one claim, never above its verdict.
 *
 * Use it when a reporter chooses a claim, and again to see what an edited line was drafted as. The text depends on
 * nothing but the input.
 *
 * @param input the claim with its finding, both releases, the desk's style and policy
 * @returns one text per line kind, in the order of LINE_KINDS
 * @throws RangeError `draftSheet requires the finding of its claim`
 * @throws RangeError `draftSheet requires the earlier release of a change`
 */
export function draftSheet(input: DraftInput): LineText[] {
  requireMatching(input);
  const voice = voiceOf(input.houseStyle, input.language);
  const draft: Draft = {
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
  return LINE_KINDS.map((kind) => ({ kind, text: WRITERS[kind](draft) }));
}

const WRITERS: Record<LineKind, (draft: Draft) => string> = {
  headline: (draft) => fromClaim(draft, 'headline'),
  body: draftBody,
  caveat: draftCaveat,
  'method-note': draftMethodNote,
  'chart-title': (draft) => fromClaim(draft, 'chartTitle'),
  'alt-text': draftAltText,
};

function fromClaim({ input, pack, state, slots, voice }: Draft, kind: 'headline' | 'chartTitle'): string {
  return say(claimMessage(pack[kind], input.finding.kind, state), slots, voice.locale);
}

function requireMatching({ claim, finding, previous }: DraftInput): void {
  const asked: Finding =
    claim.kind === 'threshold'
      ? { kind: 'threshold', option: claim.option, thresholdPct: claim.pct, ...UNTESTED }
      : { ...claim, ...UNTESTED };
  if (claimKey(asked) !== claimKey(finding)) {
    throw new RangeError('draftSheet requires the finding of its claim');
  }
  if (isOfTwoReleases(claim.kind) && !previous) {
    throw new RangeError('draftSheet requires the earlier release of a change');
  }
}

const UNTESTED = { estimatePp: null, verdict: 'cannot-be-tested' as const, reasons: [] };

import type { TestableFinding } from '@/lib/findings/check-types';
import { hasRange, sayAll, type Draft } from './draft';
import { isOfTwoReleases } from './draft-input';
import { say } from './say';
import { whichPoll } from './untested';
import { claimMessage, fragileReasons, type FragileReason } from './wording-state';

/** What the poll found, what that depends on, the range, and for a change what would have been found. */
export function draftBody(draft: Draft): string {
  const { input, pack, state } = draft;
  const { finding } = input;
  const found = claimMessage(pack.body, finding.kind, state);
  if (finding.verdict === 'cannot-be-tested') {
    return [sayAll([found], draft), untestedSentences(draft, isSilent(draft))].join(' ');
  }
  const isMissable = finding.verdict === 'does-not-hold' && state !== 'little-changed';
  const isDetectable = isMissable && isOfTwoReleases(finding.kind) && finding.detectable80Pp !== null;
  return sayAll(
    [
      found,
      ...doubts(finding).map((reason) => pack.fragile[reason]),
      hasRange(input) ? pack.range[finding.kind] : null,
      isDetectable ? pack.detectable : null,
    ],
    draft,
  );
}

/** Whether the first sentence has already said that figures are not disclosed. */
function isSilent({ slots }: Draft): boolean {
  return slots.known === 'no' || slots.known === 'none';
}

/** What a fragile finding depends on, after what it is as printed. */
function doubts(finding: TestableFinding): (FragileReason | 'as-printed')[] {
  const reasons = fragileReasons(finding);
  return reasons.length > 0 ? ['as-printed', ...reasons] : [];
}

/** Every reason why there was no test, and that it says nothing against the figures. */
export function untestedSentences({ input, pack, slots, voice }: Draft, isSaid = false): string {
  if (input.finding.verdict !== 'cannot-be-tested') return '';
  const reasons = input.finding.reasons
    .filter((reason) => !(isSaid && reason === 'not-disclosed'))
    .map((reason) => say(pack.untested[reason], { ...slots, which: whichPoll(reason, input) }, voice.locale));
  return [...reasons, say(pack.untested['no-sign-of-error'], slots, voice.locale)].join(' ');
}

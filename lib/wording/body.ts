import type { ReleaseUntestedReason } from '@/lib/findings/judge-types';
import { contextSentences } from './context';
import { hasRange, sayAll, type Draft } from './draft';
import type { DraftFinding } from './draft-finding';
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
    const parts = [
      sayAll([found], draft),
      contextSentences(draft),
      untestedSentences(draft, isSilent(draft)),
    ];
    return parts.filter((part) => part !== '').join(' ');
  }
  const isMissable = finding.verdict === 'does-not-hold' && state !== 'little-changed';
  const isOfTwoBases = isOfTwoReleases(finding.kind) || finding.kind === 'gap';
  const isDetectable = isMissable && isOfTwoBases && finding.detectable80Pp !== null;
  const limits = sayAll(
    [
      ...doubts(finding).map((reason) => pack.fragile[reason]),
      hasRange(input) ? pack.range[finding.kind] : null,
      isDetectable ? pack.detectable : null,
    ],
    draft,
  );
  return [sayAll([found], draft), contextSentences(draft), limits].filter((part) => part !== '').join(' ');
}

/** Whether the first sentence has already said that figures are not disclosed. */
function isSilent({ slots }: Draft): boolean {
  return slots.known === 'no' || slots.known === 'none' || slots.known === 'hidden';
}

/** What a fragile finding depends on, after what it is as printed. */
function doubts(finding: DraftFinding): (FragileReason | 'as-printed')[] {
  const reasons = fragileReasons(finding);
  return reasons.length > 0 ? ['as-printed', ...reasons] : [];
}

const SAID_AT_ONCE: readonly ReleaseUntestedReason[] = ['not-disclosed', 'below-presentation-standard'];

/** Every reason why there was no test, and that it says nothing against the figures. */
export function untestedSentences({ input, pack, slots, voice }: Draft, isSaid = false): string {
  if (input.finding.verdict !== 'cannot-be-tested') return '';
  const reasons = input.finding.reasons
    .filter((reason) => !(isSaid && SAID_AT_ONCE.includes(reason)))
    .map((reason) => say(pack.untested[reason], { ...slots, which: whichPoll(reason, input) }, voice.locale));
  const beside =
    typeof input.finding.independentMarginPp === 'number'
      ? [say(pack.untested['independent-margin'], slots, voice.locale)]
      : [];
  return [...reasons, ...beside, say(pack.untested['no-sign-of-error'], slots, voice.locale)].join(' ');
}

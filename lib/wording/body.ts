import { hasRange, sayAll, type Draft } from './draft';
import { isOfTwoReleases } from './draft-input';
import { say } from './say';
import { whichPoll } from './untested';
import { claimMessage, fragileReasons } from './wording-state';

/** What the poll found, what that depends on, the range, and for a change what would have been found. */
export function draftBody(draft: Draft): string {
  const { input, pack, state } = draft;
  const { finding } = input;
  const found = claimMessage(pack.body, finding.kind, state);
  if (finding.verdict === 'cannot-be-tested')
    return [sayAll([found], draft), untestedSentences(draft)].join(' ');
  const isMissable = finding.verdict === 'does-not-hold' && state !== 'little-changed';
  const isDetectable = isMissable && isOfTwoReleases(finding.kind) && finding.detectable80Pp !== null;
  return sayAll(
    [
      found,
      ...fragileReasons(finding).map((reason) => pack.fragile[reason]),
      hasRange(input) ? pack.range[finding.kind] : null,
      isDetectable ? pack.detectable : null,
    ],
    draft,
  );
}

/** Every reason why there was no test, and that it says nothing against the figures. */
export function untestedSentences({ input, pack, slots, voice }: Draft): string {
  if (input.finding.verdict !== 'cannot-be-tested') return '';
  const reasons = input.finding.reasons.map((reason) =>
    say(pack.untested[reason], { ...slots, which: whichPoll(reason, input) }, voice.locale),
  );
  return [...reasons, say(pack.untested['no-sign-of-error'], slots, voice.locale)].join(' ');
}

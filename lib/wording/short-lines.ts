import { isOfTwoReleases } from './draft-input';
import { hasRange, sayAll, type Draft } from './draft';
import { missing } from './caveat';
import { rebasedSentence } from './context';
import type { MarginCase } from './language-pack';
import { say } from './say';
import { claimMessage, fragileReasons } from './wording-state';

/** The finding in a sentence, what a fragile one depends on, and the range of a change that holds. */
function told(draft: Draft, isRanged: boolean): string {
  const { input, pack, state } = draft;
  const { finding } = input;
  return sayAll(
    [
      claimMessage(pack.told, finding.kind, state),
      ...fragileReasons(finding).map((reason) => pack.fragileShort[reason]),
      isRanged && hasRange(input) ? pack.range[finding.kind] : null,
    ],
    draft,
  );
}

/** A change that holds gives its size only with its interval. */
function owesRange({ input: { finding } }: Draft): boolean {
  return isOfTwoReleases(finding.kind) && finding.verdict === 'holds';
}

export function draftStandfirst(draft: Draft): string {
  return join([told(draft, owesRange(draft)), sayAll([draft.pack.caveat.fieldwork], draft)]);
}

/** How the figure compares with the earlier poll, always with its interval where there is one. */
export function draftChangeSentence(draft: Draft): string {
  return told(draft, true);
}

export function draftNewsletterLine(draft: Draft): string {
  const line = told(draft, owesRange(draft));
  return join([sayAll([draft.pack.newsletter.line], draft, { line }), draftOneBreath(draft)]);
}

/** For a presenter: the slots of this draft hold words, never digits or symbols. */
export function draftSpokenLine(draft: Draft): string {
  const { pack } = draft;
  return join([
    sayAll([pack.spoken.fieldwork], draft),
    told(draft, owesRange(draft)),
    sayAll([pack.spoken[marginCase(draft)]], draft),
  ]);
}

/** Everything that the short length owes: see CAVEAT_PARTICULARS. */
export function draftShortCaveat(draft: Draft): string {
  const { input, pack } = draft;
  const isOfTwo = isOfTwoReleases(input.finding.kind);
  return join([
    sayAll([pack.caveat.fieldwork, isOfTwo ? pack.caveat.earlier : null], draft),
    rebasedSentence(draft),
    missing('not-disclosed', draft),
    missing('not-entered', draft),
    sayAll([pack.caveatShort[marginCase(draft)]], draft),
  ]);
}

export function draftOneBreath(draft: Draft): string {
  const slots = { ...draft.slots, twoPolls: isOfTwoReleases(draft.input.finding.kind) ? 'yes' : 'no' };
  return say(draft.pack.oneBreath[marginCase(draft)], slots, draft.voice.locale);
}

/** What may be said of a margin: of the quantity itself, of a share by the pollster alone, none, or why none. */
function marginCase({ input }: Draft): MarginCase {
  const { finding, release, answer } = input;
  const { basis } = answer.base;
  if (finding.verdict !== 'cannot-be-tested' && finding.marginPp > 0) {
    return basis === 'modelled' || basis === 'comparison' ? basis : 'margin';
  }
  if (release.sampleSource !== 'probability') return 'not-random';
  return release.statedMargin.status === 'given' ? 'stated-only' : 'none';
}

function join(parts: readonly string[]): string {
  return parts.filter((part) => part !== '').join(' ');
}

import { hasRange, sayAll, type Draft } from './draft';
import { say } from './say';
import { claimMessage } from './wording-state';

/** What the chart shows, read aloud: the finding, its range, how far it could widen, who was asked, how and when. */
export function draftAltText(draft: Draft): string {
  const { input, pack, slots, voice, state } = draft;
  const { finding } = input;
  const title = say(claimMessage(pack.chartTitle, finding.kind, state), slots, voice.locale);
  const { intro, range, wider, fieldwork } = pack.altText;
  const isWider = slots.rangeWidens === 'yes';
  return sayAll(
    [
      intro,
      pack.altText.title,
      hasRange(input) ? range : null,
      hasRange(input) && isWider ? wider : null,
      fieldwork,
    ],
    draft,
    { title },
  );
}

import { AS_PRINTED_KINDS } from '@/lib/domain/as-printed';
import { valueOf } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { LineText } from '@/lib/domain/sheet';
import type { Language } from '@/lib/domain/vocabulary';
import { AS_PRINTED_MESSAGES } from './as-printed-messages';
import type { HouseStyle } from './house-style';
import { printLevel } from './margin-slots';
import { plain } from './names';
import { printNumber, printShare } from './print';
import { releaseSlots } from './release-slots';
import { say, type Slots } from './say';
import { type Voice, voiceOf } from './voice';

/** More answers than these do not stand in a headline. */
const HEADLINE_ANSWERS = 4;

/**
 * A release as it was printed: shares, base, interviews, dates, pollster, sponsor and a caveat. No comparison, no
 * test, no word of a verdict.
 *
 * Use it where figures have to be out before anybody has worked on them. It is not a claim: a sheet that says who
 * leads is drafted with draftSheet.
 *
 * @param release one version of a release
 * @param houseStyle percent style, name of the newsroom and words for the closed lists
 * @param language of the sheet
 * @returns headline, body and caveat
 */
export function draftAsPrinted(
  release: ReleaseFacts,
  houseStyle: HouseStyle,
  language: Language,
): LineText[] {
  const messages = AS_PRINTED_MESSAGES[language];
  const voice = voiceOf(houseStyle, language);
  const slots = slotsOf(release, voice);
  const told = (message: string) => say(message, slots, voice.locale);
  const caveat = [
    told(messages.sponsor),
    told(messages.sample),
    told(messages.margin),
    slots.items === '' ? '' : told(messages.missing),
    told(messages.standing),
  ];
  const texts = {
    headline: told(messages.headline),
    body: told(messages.body),
    caveat: caveat.filter((sentence) => sentence !== '').join(' '),
  };
  return AS_PRINTED_KINDS.map((kind) => ({ kind, text: texts[kind] }));
}

function slotsOf(release: ReleaseFacts, voice: Voice): Slots {
  const printed = (answersOnly: boolean) =>
    release.shares
      .filter(({ isAnswer }) => isAnswer || !answersOnly)
      .map(({ option, units }) => `${plain(option)} ${printShare(units, release.decimals, voice)}`);
  const answers = printed(true);
  const margin = valueOf(release.statedMargin);
  return {
    ...releaseSlots(release, null, voice),
    short: answers.length <= HEADLINE_ANSWERS ? 'yes' : 'no',
    answers: answers.join(', '),
    shares: printed(false).join(', '),
    random: release.sampleSource === 'probability' ? 'yes' : 'no',
    stated: margin === null ? 'none' : 'given',
    statedPp: margin === null ? '' : printNumber(margin.pp, 2, voice, 'points'),
    statedCount: margin?.pp ?? 0,
    statedLevel: margin === null ? '' : printLevel(margin.level, voice),
    items: missingItems(release, voice),
  };
}

function missingItems(release: ReleaseFacts, { style, language, locale }: Voice): string {
  const { particular } = style.messages[language].terms;
  const items = (['population', 'n', 'mode'] as const)
    .filter((item) => release[item].status === 'not-disclosed' || release[item].status === 'not-entered')
    .map((item) => particular[item]);
  return new Intl.ListFormat(locale, { type: 'conjunction' }).format(items);
}

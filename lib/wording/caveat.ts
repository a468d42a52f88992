import { ELECTION_KINDS } from '@/lib/domain/vocabulary';
import type { DisclosureStatus } from '@/lib/domain/disclosed';
import { roundHalfUp } from '@/lib/format/number';
import type { CaveatSentence, Terms } from './language-pack';
import { rebasedSentence } from './context';
import { sayAll, type Draft } from './draft';
import { namesOf } from './draft-finding';
import { figureOf, isOfTwoReleases } from './draft-input';
import { printNumber } from './print';
import type { Slots } from './say';
import { twiceTheMargin } from './twice-margin';

/** Below this share the margin is well under the one that a pollster states for a share near half. */
const SMALL_PCT = 15;

/** Who, for whom, whom, how many, how, when; what kind of sample; whose margin of what; what margins leave out. */
export function draftCaveat(draft: Draft): string {
  const { input, pack } = draft;
  const sentences: (CaveatSentence | null)[] = [
    'fieldwork',
    isOfTwoReleases(input.finding.kind) ? 'earlier' : null,
  ];
  const closing: (CaveatSentence | null)[] = [
    sampleSentence(draft),
    marginSentence(draft),
    twiceSentence(draft),
    smallShareSentence(draft),
    errorSentence(draft),
  ];
  return [
    sayAll(sentences.map(messageOf(pack.caveat)), draft),
    rebasedSentence(draft),
    missing('not-disclosed', draft),
    missing('not-entered', draft),
    sayAll(closing.map(messageOf(pack.caveat)), draft, twiceSlots(draft)),
  ]
    .filter((text) => text !== '')
    .join(' ');
}

const messageOf = (messages: Record<CaveatSentence, string>) => (key: CaveatSentence | null) =>
  key === null ? null : messages[key];

/** What the release withholds, or nobody has entered; an empty text where nothing is missing. */
export function missing(status: DisclosureStatus, draft: Draft): string {
  const { release } = draft.input;
  const items = (Object.keys(draft.pack.terms.particular) as (keyof Terms['particular'])[])
    .filter((item) => release[item].status === status)
    .map((item) => draft.pack.terms.particular[item]);
  if (items.length === 0) return '';
  const list = new Intl.ListFormat(draft.voice.locale, { type: 'conjunction' }).format(items);
  const key = status === 'not-disclosed' ? 'not-disclosed' : 'not-recorded';
  return sayAll([draft.pack.caveat[key]], draft, { items: list });
}

function sampleSentence({ input }: Draft): CaveatSentence {
  if (input.release.sampleSource === 'probability') return 'sample-random';
  if (input.answer.base.basis === 'modelled') return 'sample-modelled';
  return input.answer.base.basis === 'comparison' ? 'sample-comparison' : 'sample-not-random';
}

/** Where a stated margin stands beside a small share, readers would take it for that share's own. */
function smallShareSentence({ input }: Draft): CaveatSentence | null {
  const { finding, release } = input;
  const isStated = release.sampleSource === 'probability' && release.statedMargin.status === 'given';
  const isSmall = namesOf(finding).some((name) => {
    const figure = figureOf(name, input, 'now');
    return figure?.units ? figure.units / 10 ** figure.decimals < SMALL_PCT : false;
  });
  return isStated && isSmall ? 'small-shares' : null;
}

function marginSentence({ input }: Draft): CaveatSentence | null {
  const { finding, release, answer } = input;
  if (finding.verdict !== 'cannot-be-tested' && finding.marginPp > 0) return 'margin';
  if (answer.base.basis === 'modelled' || answer.base.basis === 'comparison') return 'margin-none';
  if (release.sampleSource !== 'probability') return null;
  return release.statedMargin.status === 'given' ? 'margin-stated-only' : 'margin-none';
}

/** The house reading beside ours, where the desk wants it; older packs have no sentence for it. */
function twiceSentence(draft: Draft): CaveatSentence | null {
  return readTwice(draft) && draft.pack.caveat['twice-margin'] ? 'twice-margin' : null;
}

function readTwice({ input: { houseStyle, finding, answer, release, policy } }: Draft) {
  return houseStyle.twiceTheMargin ? twiceTheMargin(finding, answer.base, release, policy.level) : null;
}

function twiceSlots(draft: Draft): Slots {
  const reading = readTwice(draft);
  if (!reading) return {};
  const { marginPp, zone, test } = reading;
  const shown = roundHalfUp(marginPp, 1);
  return {
    shareMargin: printNumber(shown, 1, draft.voice, 'points'),
    shareMarginCount: shown,
    zone,
    thumb: test,
  };
}

function errorSentence({ input }: Draft): CaveatSentence {
  if (input.release.sampleSource !== 'probability') return 'errors-without-margin';
  return ELECTION_KINDS.includes(input.release.race.kind) ? 'errors-before-a-vote' : 'errors';
}

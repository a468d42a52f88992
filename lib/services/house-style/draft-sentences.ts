import 'server-only';
import { carries } from '@/lib/wording/carries';
import { checkWording } from '@/lib/wording/check/check-wording';
import { checkedReleaseOf } from '@/lib/wording/check/checked-release';
import type { CheckedRelease, WordingMark } from '@/lib/wording/check/types';
import type { LineKind } from '@/lib/domain/sheet';
import type { DraftInput } from '@/lib/wording/draft-input';
import { draftLine } from '@/lib/wording/draft-sheet';
import type { HouseStyle } from '@/lib/wording/house-style';
import { claimsAbove } from '@/lib/wording/never-says-more';
import { exampleInputs, HOSTILE_NAMES, PLAIN_NAMES } from './example-inputs';
import { withLeaf } from './leaves';
import { fault, placeIn, type SentenceFault, tooMuch } from './sentence-fault';
import { placeOfSentence, type SentencePlace } from './sentence-rules';

const OPEN = '\uE000';
const CLOSE = '\uE001';

/** The lines that a part of the pack is printed in. */
const LINES_OF: Record<string, LineKind[]> = {
  headline: ['headline'],
  body: ['body'],
  chartTitle: ['chart-title', 'alt-text'],
  told: ['standfirst', 'newsletter-line', 'change-sentence', 'spoken-line'],
  range: ['body'],
  detectable: ['body'],
  fragile: ['body'],
  fragileShort: ['standfirst', 'newsletter-line', 'spoken-line'],
  untested: ['body', 'method-note'],
  context: ['body', 'standfirst', 'caveat'],
  caveat: ['caveat', 'caveat-short'],
  caveatShort: ['caveat-short'],
  oneBreath: ['caveat-one-breath'],
  methodNote: ['method-note'],
  altText: ['alt-text'],
  spoken: ['spoken-line'],
  newsletter: ['newsletter-line'],
  terms: ['headline', 'body', 'caveat', 'method-note', 'spoken-line'],
};

let kept: DraftInput[] | null = null;

function inputsFor(language: string): DraftInput[] {
  kept ??= [PLAIN_NAMES, ...HOSTILE_NAMES].flatMap(exampleInputs);
  return kept.map((input) => ({ ...input, language: language as DraftInput['language'] }));
}

export type Filled = { input: DraftInput; text: string };

/** The sentence as drafting prints it, marked so that it can be told from its neighbours. */
export function filledSentences(
  path: string,
  message: string,
  style: HouseStyle,
  inputs: readonly DraftInput[],
): Filled[] {
  const marked = withLeaf({ style }, path, `${OPEN}${message}${CLOSE}`).style;
  const place = placeOfSentence(path);
  const kinds = LINES_OF[place?.part ?? ''] ?? [];
  return inputs.flatMap((input) => {
    if (place?.claim && place.claim !== input.claim.kind) return [];
    const styled = { ...input, houseStyle: { ...marked, comparisonRule: input.houseStyle.comparisonRule } };
    const text = kinds
      .filter((kind) => carries(kind, input.claim.kind))
      .map((kind) => between(draftLine(styled, kind)))
      .find((one) => one !== null);
    return text ? [{ input, text }] : [];
  });
}

function between(text: string): string | null {
  const [start, end] = [text.indexOf(OPEN), text.indexOf(CLOSE)];
  return start >= 0 && end > start ? text.slice(start + 1, end) : null;
}

/** What drafting a sentence over the table shows: what cannot be filled, and what says more than the finding. */
export function draftFaults(
  path: string,
  message: string,
  style: HouseStyle,
  shipped: string,
  place: SentencePlace,
): SentenceFault[] {
  const inputs = inputsFor(place.language);
  let filled: Filled[];
  try {
    filled = filledSentences(path, message, style, inputs);
  } catch (cause) {
    return [unfilled(cause, shipped)];
  }
  if (!place.verdict) return [];
  const usual = new Set(
    filledSentences(path, shipped, style, inputs).flatMap((one) => objections(one, style).map(keyOf)),
  );
  return filled
    .flatMap((one) => objections(one, style))
    .filter((one) => !usual.has(keyOf(one)))
    .map(({ phrase, message: why, verdict }) =>
      why === null
        ? fault(tooMuch(phrase, verdict), phrase, placeIn(message, phrase))
        : fault(`“${phrase}”: ${why}`, phrase, placeIn(message, phrase)),
    )
    .filter((one, at, all) => all.findIndex((other) => other.message === one.message) === at);
}

function unfilled(cause: unknown, shipped: string): SentenceFault {
  const name = /variable "([A-Za-z]+)"/.exec(cause instanceof Error ? cause.message : '')?.[1];
  return fault(
    name && !shipped.includes(`{${name}`)
      ? `{${name}} is not filled for every finding that this sentence is for.`
      : 'This sentence cannot be drafted for every finding that it is for.',
  );
}

type Objection = { phrase: string; message: string | null; verdict: DraftInput['finding']['verdict'] };

const keyOf = ({ phrase, message }: Objection) => `${phrase} ${message ?? ''}`;
const NAMES = [PLAIN_NAMES, ...HOSTILE_NAMES].flatMap((names) => Object.values(names));

/** Phrases above the verdict, and what the wording check calls wrong or not supported by the release. */
function objections({ input, text }: Filled, style: HouseStyle): Objection[] {
  const { verdict } = input.finding;
  const above = claimsAbove(verdict, text, input.language).filter(
    (phrase) => !NAMES.some((name) => claimsAbove('cannot-be-tested', name, input.language).includes(phrase)),
  );
  return [
    ...above.map((phrase) => ({ phrase, message: null, verdict })),
    ...marksOf(input, text, style)
      .filter(({ grade, quoted }) => !quoted && (grade === 'wrong' || grade === 'not-supported'))
      .map(({ phrase, message }) => ({ phrase, message, verdict })),
  ];
}

const releases = new WeakMap<object, CheckedRelease>();

/** Of examples with plain names: the check reads names, and hostile ones are no test of words. */
function marksOf(input: DraftInput, text: string, style: HouseStyle): WordingMark[] {
  const { release, previous, policy, answer, language } = input;
  if (release.pollster.name !== PLAIN_NAMES.pollster) return [];
  let checked = releases.get(answer);
  if (!checked) {
    checked = checkedReleaseOf(release, previous, policy, { answer });
    releases.set(answer, checked);
  }
  return checkWording({ text, language, releases: [checked], houseStyle: style, policy, part: 'line' }).marks;
}

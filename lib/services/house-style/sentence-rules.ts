import 'server-only';
import type { Verdict } from '@/lib/findings/check-types';
import { type WordingState, VERDICT_OF_STATE } from '@/lib/wording/wording-state';
import { leafAt, leavesOf } from './leaves';
import { type Shape, shapeOf } from './message-shape';

/** Where a sentence stands: its language, its part of the pack, and for a claim which claim in which state. */
export type SentencePlace = {
  language: string;
  part: string;
  claim: string | null;
  state: WordingState | null;
  verdict: Verdict | null;
};

const CLAIM_PARTS = ['headline', 'body', 'chartTitle', 'told'];

/** @param path such as `style.messages.en.headline.lead.fragile` */
export function placeOfSentence(path: string): SentencePlace | null {
  const [style, messages, language = '', part = '', claim = '', state = ''] = path.split('.');
  if (style !== 'style' || messages !== 'messages' || part === '') return null;
  if (!CLAIM_PARTS.includes(part) || !(state in VERDICT_OF_STATE))
    return { language, part, claim: null, state: null, verdict: null };
  const known = state as WordingState;
  return { language, part, claim, state: known, verdict: VERDICT_OF_STATE[known] };
}

/** Slots for style alone: a sentence may do without them. Everything else that the shipped one tells has to stay. */
const OPTIONAL = new Set([
  'setting',
  'habit',
  'populated',
  'population',
  'gap',
  'move',
  'design',
  'samePollster',
  'prevPollster',
  'prevPopulated',
  'prevPopulation',
  'modeKnown',
  'sized',
  'sponsored',
  'ended',
  'poll',
  'ranged',
  'newsroomStart',
  'pollsterStart',
]);

/** Either of them will do. */
const TWINS = [
  ['pollster', 'pollsterStart', 'pollsters'],
  ['newsroom', 'newsroomStart'],
  ['dates', 'start'],
  ['prevDates', 'then', 'bThen'],
];

/** The slots that a sentence has to name, from what the shipped one tells. */
export function neededSlots(shipped: Shape): string[][] {
  return [...shipped.slots.keys()]
    .filter((name) => !OPTIONAL.has(name) && !name.endsWith('Count'))
    .map((name) => TWINS.find((twins) => twins.includes(name)) ?? [name]);
}

const offered = new WeakMap<object, Map<string, Map<string, string[]>>>();

/** Slots that an editor may insert: those of the shipped sentences about the same claim, worked out once. */
export function slotsFor(path: string, shipped: object, locale: string): Map<string, string[]> {
  const place = placeOfSentence(path);
  if (!place) return new Map();
  const kept = offered.get(shipped) ?? new Map<string, Map<string, string[]>>();
  offered.set(shipped, kept);
  const key = `${locale} ${place.claim ? `${place.language}.${place.claim}` : path}`;
  const slots = kept.get(key) ?? gathered(path, place, shipped, locale);
  kept.set(key, slots);
  return slots;
}

function gathered(
  path: string,
  place: SentencePlace,
  shipped: object,
  locale: string,
): Map<string, string[]> {
  const slots = new Map<string, string[]>();
  const family = place.claim
    ? [...leavesOf(shipped)].filter(([one]) => isKin(one, place)).map(([, message]) => message)
    : [leafAt(shipped, path)];
  for (const message of family) {
    if (typeof message !== 'string') continue;
    for (const [name, choices] of shapeOf(message, locale).slots)
      slots.set(name, [...new Set([...(slots.get(name) ?? []), ...choices])]);
  }
  return slots;
}

function isKin(path: string, place: SentencePlace): boolean {
  const other = placeOfSentence(path);
  return other?.language === place.language && other.claim !== null && other.claim === place.claim;
}

const UP = /\b(?:up|higher|rise[sn]?|rising|rose|more|increase[sd]?|grown|gain(?:s|ed)?)\b/i;
const DOWN = /\b(?:down|lower|fall(?:s|en|ing)?|fell|less|decrease[sd]?|shrunk|lost|loses)\b/i;
const ABOVE = /\b(?:above|over|(?<!by )more than|past)\b/i;
const BELOW = /\b(?:below|under|less than|short of)\b/i;

/** A sentence that says the opposite of the direction that it is chosen for. English alone. */
export function wrongDirection(text: string, chosen: Readonly<Record<string, string>>): string | null {
  const wrong = (pattern: RegExp) => pattern.exec(text.replace(/\{[^}]*\}/g, ' '))?.[0] ?? null;
  if (chosen.direction === 'more') return wrong(DOWN);
  if (chosen.direction === 'other' || chosen.direction === 'less') return wrong(UP);
  if (chosen.side === 'above') return wrong(BELOW);
  if (chosen.side === 'other' || chosen.side === 'below') return wrong(ABOVE);
  return null;
}

/** Names and figures in the order that the sentence needs: the one ahead first, the earlier figure before the later. */
export function wrongOrder(text: string, place: SentencePlace): string | null {
  const at = (slot: string) => text.indexOf(`{${slot}}`);
  const isBefore = (one: string, other: string) => at(one) >= 0 && at(other) >= 0 && at(one) < at(other);
  const isClaim = place.claim === 'lead' && (place.verdict === 'holds' || place.verdict === 'fragile');
  if (isClaim && isBefore('b', 'a')) return '{a} is the one with the higher figure: name it before {b}.';
  if (place.claim === 'lead' && isBefore('bShare', 'aShare'))
    return '{aShare} belongs to {a}: print it before {bShare}.';
  if (/\bfrom \{now\}|\{now\} to \{then\}|\bagainst \{now\}/.test(text))
    return '{then} is the earlier figure, {now} the one of this poll: here they stand the wrong way round.';
  return null;
}

/** What says that a poll leaves a fragile finding open. */
export const UNSETTLED =
  /\b(?:cannot|can’t|can't|does not|doesn’t|doesn't|do not|don’t|don't|could not|not) (?:yet )?(?:settle|settled|decide|tell|say for certain|be sure)\b/i;

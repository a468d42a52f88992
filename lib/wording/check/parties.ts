import type { Mention } from './mentions';
import type { Hit } from './phrases';
import type { Reading } from './reading';
import { clauseOf } from './scope';

/** Whom a phrase is about: an option, a capitalised name of no release, or nobody named. */
export type Party = { option: string; mention: Mention } | 'unknown' | null;

/** The option a phrase is said of. */
export function subjectOf(reading: Reading, hit: Hit): Party {
  const beside = reading.mentionAt(hit.from - 1);
  if (beside?.kind === 'option') return { option: beside.name, mention: beside };
  const owner = ownerOf(reading, hit);
  if (owner) return { option: owner.name, mention: owner };
  if (isUnknownName(reading, hit)) return 'unknown';
  const clause = clauseOf(reading, hit);
  const sentence = reading.sentenceAt(hit.from);
  const turned = afterParticiple(reading, hit, clause);
  if (turned) return turned;
  return (
    lastBefore(reading, clause.from, hit.from) ??
    firstAfter(reading, pastObject(reading, hit), clause.to) ??
    lastBefore(reading, sentence.from, clause.from) ??
    firstAfter(reading, clause.to, sentence.to) ??
    fromSentenceBefore(reading, hit, sentence.from)
  );
}

/** "la ventaja de Alder", "l'avance d'Alder": whose a noun is stands after it, past an article. */
function ownerOf(reading: Reading, { from, to }: Hit): Mention | null {
  if (!reading.has('ownedNouns', { from, to })) return null;
  const of = reading.cueAt('ofWords', to);
  const owner = of && reading.mentionAt(of.to);
  return owner?.kind === 'option' ? owner : null;
}

/** A name that a preposition stands before is no subject: "Vor Brook liegt Alder". */
const pastObject = (reading: Reading, { to, objectAt }: Hit) =>
  objectAt === undefined ? to : (reading.mentionAt(objectAt)?.to ?? to);

/** The other option of a comparison: the first named after the phrase, or else the other one named before it. */
export function objectOf(reading: Reading, hit: Hit, subject: string): Party {
  const clause = clauseOf(reading, hit);
  const after = optionsIn(reading, hit.to, clause.to).find(({ name }) => name !== subject);
  if (after) return { option: after.name, mention: after };
  if (hasUnknownAfter(reading, hit)) return 'unknown';
  const before = optionsIn(reading, clause.from, hit.from).findLast(({ name }) => name !== subject);
  return before ? { option: before.name, mention: before } : null;
}

/** Options named in a stretch, in order. */
export function optionsIn(reading: Reading, from: number, to: number): Mention[] {
  return reading.mentions.filter((one) => one.kind === 'option' && one.from >= from && one.to <= to);
}

/** "Trailing Brook, Alder …": the name right after the opening phrase is its object, the next one its subject. */
function afterParticiple(reading: Reading, { from, to }: Hit, clause: Hit): Party {
  if (optionsIn(reading, clause.from, from).length > 0) return null;
  const [object, subject] = optionsIn(reading, to, clause.to);
  const isTurned = object && subject && object.from - to <= 1 && hasComma(reading, object.to, subject.from);
  return isTurned && subject.name !== object.name ? { option: subject.name, mention: subject } : null;
}

function hasComma({ tokens }: Reading, from: number, to: number): boolean {
  return tokens.slice(from, to).some(({ text }) => text === ',');
}

function lastBefore(reading: Reading, from: number, to: number): Party {
  const options = optionsIn(reading, from, to);
  const chosen = options.findLast((one) => !isObject(reading, one)) ?? options.at(-1);
  return chosen ? { option: chosen.name, mention: chosen } : null;
}

function firstAfter(reading: Reading, from: number, to: number): Party {
  const [chosen] = optionsIn(reading, from, to);
  return chosen ? { option: chosen.name, mention: chosen } : null;
}

function fromSentenceBefore(reading: Reading, hit: Hit, start: number): Party {
  const before = reading.sentences.findLast(({ to }) => to <= start);
  if (!before || !reading.has('pronouns', { from: start, to: hit.to })) return null;
  const options = optionsIn(reading, before.from, before.to);
  const chosen = options.find((one) => !isObject(reading, one)) ?? options[0];
  return chosen ? { option: chosen.name, mention: chosen } : null;
}

/** After a preposition or a verb of leading a name is no subject; after a list's "and" it is as good as the first. */
function isObject({ cueAt, tokens }: Reading, { from }: Mention): boolean {
  const previous = tokens[from - 1]?.text;
  if (cueAt('negators', from - 1)) return true;
  if (previous === '"') return cueAt('objectMarkers', from - 2) !== null;
  return cueAt('objectMarkers', from - 1) !== null;
}

const AUX = 4;

/** "Carrow leads", "Carrow is ahead": the word before the phrase, past a few small ones, is a name of no release. */
function isUnknownName(reading: Reading, { from, to }: Hit): boolean {
  const isNoun = reading.has('leadNoun', { from, to });
  const { from: start } = reading.sentenceAt(from);
  for (let at = from - 1; at >= Math.max(start, from - AUX); at -= 1) {
    if (reading.mentionAt(at)) return false;
    const token = reading.tokens[at];
    if (token?.kind !== 'word') return false;
    if (isName(reading, at)) return !isNoun || reading.tokens[at + 1]?.text === "'s";
    if (!reading.cueAt('auxiliaries', at)) return false;
  }
  return false;
}

function hasUnknownAfter(reading: Reading, { to }: Hit): boolean {
  for (let at = to; at < to + 2; at += 1) {
    if (reading.mentionAt(at)) return false;
    if (isName(reading, at)) return true;
    if (!reading.cueAt('objectMarkers', at)) return false;
  }
  return false;
}

function isName(reading: Reading, at: number): boolean {
  const token = reading.tokens[at];
  const { words } = reading.lexicon;
  if (token?.kind !== 'word' || words.nounsHaveCapitals || !reading.isCapital(at)) return false;
  if (words.notNames.includes(token.text) || words.months.flat().includes(token.text)) return false;
  return !words.weekdays.flat().includes(token.text);
}

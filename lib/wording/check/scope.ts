import type { Hit } from './phrases';
import type { Reading } from './reading';

/** How a phrase stands: as a claim, left open ("cannot say who leads"), or denied ("does not lead"). */
export type Scope = 'claimed' | 'open' | 'denied';

const NEAR = 4;

/**
 * Whether the words before a phrase, back to the last break of its sentence, leave it open or deny it. A condition
 * ("if the vote were held today, …") reaches to its comma; a denial reaches over a few words.
 */
export function scopeOf(reading: Reading, hit: Hit): Scope {
  const { from } = hit;
  const { from: start } = reading.sentenceAt(from);
  let pastComma = false;
  for (let at = from - 1; at >= start; at -= 1) {
    if (reading.cueAt('clauseBreaks', at)) break;
    if (reading.cueAt('openers', at) && !isRelative(reading, at)) return 'open';
    if (reading.tokens[at]?.text === ',') pastComma = true;
    if (!pastComma && reading.cueAt('conditionals', at)) return 'open';
    if (!pastComma && from - at <= NEAR && reading.cueAt('negators', at)) return 'denied';
  }
  if (isQuestion(reading, from)) return 'open';
  return isDeniedAfter(reading, hit) ? 'denied' : 'claimed';
}

/** "Alder führt nicht": where a language denies after the verb, up to the next comma. */
export function isDeniedAfter(reading: Reading, { from, to }: Hit): boolean {
  const { negatorsAfter } = reading.lexicon.words;
  const { to: end } = reading.sentenceAt(from);
  for (let at = to; negatorsAfter && at < end; at += 1) {
    const { text = '' } = reading.tokens[at] ?? {};
    if (text === ',' || reading.cueAt('clauseBreaks', at)) return false;
    if (negatorsAfter.includes(text)) return true;
  }
  return false;
}

/** "Alder, who leads": the word points back to a name and leaves nothing open. */
function isRelative(reading: Reading, at: number): boolean {
  const before = reading.tokens[at - 1]?.text === ',' ? at - 2 : at - 1;
  return reading.cueAt('relatives', at) !== null && reading.mentionAt(before)?.kind === 'option';
}

/** A sentence that ends in a question mark asks. */
function isQuestion(reading: Reading, from: number): boolean {
  const { from: start, to } = reading.sentenceAt(from);
  let last = to - 1;
  while (last > start && /["\n]/.test(reading.tokens[last]?.text ?? '')) last -= 1;
  return reading.tokens[last]?.text === '?';
}

/** The clause a phrase stands in: between breaks of its sentence. */
export function clauseOf(reading: Reading, { from, to }: Hit): Hit {
  const sentence = reading.sentenceAt(from);
  let start = from;
  while (start > sentence.from && !reading.cueAt('clauseBreaks', start - 1)) start -= 1;
  let end = to;
  while (end < sentence.to && !reading.cueAt('clauseBreaks', end)) end += 1;
  return { from: start, to: end };
}

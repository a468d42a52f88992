import { fold, type Folded } from './fold';
import { quotationsOf, type Span } from './quotation';
import type { WordingCheckInput, WordingMark, WordingRule } from './types';

/** A text as house style reads it: letters alone, whatever the language. */
export type HouseText = {
  input: WordingCheckInput;
  folded: Folded;
  quotations: readonly Span[];
  /** Names of the releases, which are nobody's style. */
  names: readonly Span[];
};

export function houseTextOf(input: WordingCheckInput): HouseText {
  const folded = fold(input.text);
  return { input, folded, quotations: quotationsOf(input.text), names: namesIn(folded.text, input) };
}

/** Where a phrase stands as whole words, in a folded text. */
export function placesOf(phrase: string, text: string): Span[] {
  const words = fold(phrase).text.trim().split(/\s+/).map(escaped).join('\\s+');
  if (words === '') return [];
  const pattern = new RegExp(`(?<![\\p{L}\\p{N}])${words}(?![\\p{L}\\p{N}])`, 'gu');
  return [...text.matchAll(pattern)].map(({ 0: found, index }) => ({
    start: index,
    end: index + found.length,
  }));
}

/** A mark on a place of the folded text; none where a name stands there. */
export function markOn(
  { input, folded, quotations, names }: HouseText,
  place: Span,
  { rule, message, replacement }: { rule: WordingRule; message: string; replacement: string | null },
): WordingMark | null {
  if (names.some((name) => name.start < place.end && place.start < name.end)) return null;
  const start = folded.starts[place.start] ?? 0;
  const end = folded.ends[place.end - 1] ?? start;
  const phrase = input.text.slice(start, end);
  const quoted = quotations.some((span) => span.start <= start && end <= span.end);
  return {
    start,
    end,
    phrase,
    rule,
    grade: quoted ? 'cannot-judge' : 'house-style',
    quoted,
    release: null,
    claim: null,
    message: quoted ? `Quoted words, not judged. In our own words: ${message}` : message,
    replacement: quoted || replacement === null ? null : likeTheFirst(phrase, replacement),
  };
}

function likeTheFirst(phrase: string, replacement: string): string {
  const isCapital = /^\p{Lu}/u.test(phrase);
  return isCapital ? replacement.charAt(0).toUpperCase() + replacement.slice(1) : replacement;
}

function namesIn(text: string, { releases }: WordingCheckInput): Span[] {
  const names = releases.flatMap(({ facts: { race, pollster, sponsor, shares } }) => [
    race.name,
    pollster.name,
    ...(sponsor.status === 'given' ? [sponsor.value.name] : []),
    ...shares.map(({ option }) => option),
  ]);
  return [...new Set(names)].flatMap((name) => placesOf(name, text));
}

const escaped = (text: string) => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

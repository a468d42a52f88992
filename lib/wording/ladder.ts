import type { Verdict } from '@/lib/findings/check-types';

/** Per verdict, the words its sentences stand on, strongest first. */
export type Ladder = Record<Verdict, string[]>;

/** Phrases of one language, as patterns without their ends, by the verdict they take. */
export type Barred = {
  never: string[];
  needsHolds: string[];
  needsFragile: string[];
  /** What only a test that was passed may be called. */
  needsTestPassed: string[];
};

const LETTER = '[\\p{L}\\p{M}\\p{N}]';
const compiled = new WeakMap<Barred, Record<Verdict, RegExp>>();

/**
 * The phrases of a text that say more than its verdict, by one language's list, as they stand in the text.
 *
 * A caution, never a proof: it reads no negations and sees no names. Where one phrase holds another, the longer one
 * that begins first is given.
 *
 * @param barred the list of the language of the text
 * @param verdict the verdict of the finding that the text is about
 * @param text any text of a line
 * @returns each phrase once, in order of appearance
 */
export function phrasesAbove(barred: Barred, verdict: Verdict, text: string): string[] {
  const set = text.replaceAll("'", '’');
  const found = [...set.matchAll(patternsOf(barred)[verdict])];
  return [...new Set(found.map(({ 0: phrase, index }) => text.slice(index, index + phrase.length)))];
}

function patternsOf(barred: Barred): Record<Verdict, RegExp> {
  const known = compiled.get(barred);
  if (known) return known;
  const { never, needsHolds, needsFragile, needsTestPassed } = barred;
  const fragile = [...never, ...needsHolds];
  const untested = [...fragile, ...needsFragile, ...needsTestPassed];
  const patterns = {
    holds: wholeWords(never),
    fragile: wholeWords(fragile),
    'does-not-hold': wholeWords(untested),
    'cannot-be-tested': wholeWords(untested),
  };
  compiled.set(barred, patterns);
  return patterns;
}

/** Words end where letters end in any script: a plain word boundary would cut "más" and "égalité". */
function wholeWords(phrases: readonly string[]): RegExp {
  const longestFirst = [...phrases].sort((one, other) => other.length - one.length);
  return new RegExp(`(?<!${LETTER})(?:${longestFirst.join('|')})(?!${LETTER})`, 'giu');
}

import 'server-only';
import type { Verdict } from '@/lib/findings/check-types';
import type { Place } from './message-shape';

export type SentenceFault = {
  message: string;
  place: Place | null;
  /** The words that say too much, where that is what is wrong. */
  phrase: string | null;
};

export const VERDICT_WORDS: Record<Verdict, string> = {
  holds: 'Holds',
  fragile: 'Fragile',
  'does-not-hold': 'Not shown',
  'cannot-be-tested': 'Cannot be tested',
};

export function fault(
  message: string,
  phrase: string | null = null,
  place: Place | null = null,
): SentenceFault {
  return { message, place, phrase };
}

export function tooMuch(phrase: string, verdict: Verdict | null): string {
  return verdict === null
    ? `“${phrase}” claims something that this sentence cannot know.`
    : `“${phrase}” says more than the verdict ${VERDICT_WORDS[verdict]} supports.`;
}

export function placeIn(message: string, words: string): Place | null {
  const start = message.toLowerCase().indexOf(words.toLowerCase());
  return start < 0 ? null : { start, end: start + words.length };
}

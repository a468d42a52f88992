import type { Language } from '@/lib/domain/vocabulary';

/** Names as they stand in a sentence: single spaces, and an article of their own follows the place. */

/** An English article is English to no other language: there "The" stays part of the name, whatever the place. */
export function inSentence(name: string, language: Language): string {
  const plainName = plain(name);
  return isolated(language === 'en' ? plainName.replace(/^The (?=\S)/, 'the ') : plainName);
}

const OPENINGS: Record<Language, RegExp> = {
  en: /^(?:the|our|a|an) /,
  es: /^(?:el|la|los|las|nuestr[oa]) /,
  fr: /^(?:le|la|les|notre) |^l’/,
  de: /^(?:der|die|das|unsere?) /,
};

export function atStart(name: string, language: Language): string {
  const plainName = isolated(name);
  return OPENINGS[language].test(plainName) ? plainName[0]!.toUpperCase() + plainName.slice(1) : plainName;
}

export function plain(text: string): string {
  return text.trim().replace(/\s+/g, ' ');
}

const RIGHT_TO_LEFT = /[\p{Script=Arabic}\p{Script=Hebrew}\p{Script=Syriac}\p{Script=Thaana}\p{Script=Nko}]/u;

/**
 * A name as it stands in a sentence that runs from left to right: one with letters that run the other way is held
 * apart by the invisible marks U+2068 and U+2069, or the figures after it would change places with it. Other names
 * stay as they are, so that nothing invisible is copied without need.
 */
export function isolated(name: string): string {
  const plainName = plain(name);
  return RIGHT_TO_LEFT.test(plainName) ? `\u2068${plainName}\u2069` : plainName;
}

import { compilePhrases, type Cue, type Phrases } from '../phrases';
import type { WordingLanguage } from '../types';
import { EN_LEXICON } from './en';
import { CUE_GROUPS, type CueGroup, type Lexicon } from './types';

/** A lexicon with its phrases ready to be found. */
export type CompiledLexicon = {
  words: Lexicon;
  cues: Readonly<Record<CueGroup, Phrases>>;
  fractions: Phrases;
  numbers: Phrases;
  inEvery: Phrases;
};

const LEXICONS: Readonly<Record<WordingLanguage, Lexicon | null>> = {
  en: EN_LEXICON,
  es: null,
  fr: null,
  de: null,
};

const compiled = new Map<WordingLanguage, CompiledLexicon>();

/** The lexicon of a language, or null where it has none yet. Compiled once. */
export function lexiconOf(language: WordingLanguage): CompiledLexicon | null {
  const words = LEXICONS[language];
  if (!words) return null;
  const known = compiled.get(language);
  if (known) return known;
  const compile = (list: readonly Cue[]) => compilePhrases(list, words.elisions);
  const cues = Object.fromEntries(CUE_GROUPS.map((group) => [group, compile(words.cues[group])]));
  const lexicon: CompiledLexicon = {
    words,
    cues: cues as Record<CueGroup, Phrases>,
    fractions: compile([{ say: Object.keys(words.fractions) }]),
    numbers: compile([{ say: Object.keys(words.numbers) }]),
    inEvery: compile([{ say: words.inEvery }]),
  };
  compiled.set(language, lexicon);
  return lexicon;
}

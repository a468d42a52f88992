import { compilePhrases, indexOf, type Cue, type PhraseIndex, type Phrases } from '../phrases';
import { wordsIn } from '../tokens';
import type { WordingLanguage } from '../types';
import { DE_LEXICON } from './de';
import { EN_LEXICON } from './en';
import { CUE_GROUPS, type CueGroup, type Lexicon } from './types';

/** A lexicon with its phrases ready to be found. */
export type CompiledLexicon = {
  words: Lexicon;
  cues: Readonly<Record<CueGroup, Phrases>>;
  index: PhraseIndex<CueGroup>;
  fractions: Phrases;
  numbers: Phrases;
  inEvery: Phrases;
  names: Readonly<Record<'common' | 'afterCommon' | 'generic', ReadonlySet<string>>>;
};

const LEXICONS: Readonly<Record<WordingLanguage, Lexicon | null>> = {
  en: EN_LEXICON,
  es: null,
  fr: null,
  de: DE_LEXICON,
};

const compiled = new Map<WordingLanguage, CompiledLexicon>();

/** The lexicon of a language, or null where it has none yet. Compiled once. */
export function lexiconOf(language: WordingLanguage): CompiledLexicon | null {
  const words = LEXICONS[language];
  if (!words) return null;
  const known = compiled.get(language);
  if (known) return known;
  const compile = (list: readonly Cue[]) => compilePhrases(list, words.elisions);
  const cues = Object.fromEntries(CUE_GROUPS.map((group) => [group, compile(words.cues[group])])) as Record<
    CueGroup,
    Phrases
  >;
  const lexicon: CompiledLexicon = {
    words,
    cues,
    index: indexOf(cues),
    fractions: compile([{ say: Object.keys(words.fractions) }]),
    numbers: compile([{ say: Object.keys(words.numbers) }]),
    inEvery: compile([{ say: words.inEvery }]),
    names: {
      common: new Set(words.commonNames.map((name) => wordsIn(name, words).join(' '))),
      afterCommon: new Set(words.afterCommonName),
      generic: new Set(words.genericNameWords),
    },
  };
  compiled.set(language, lexicon);
  return lexicon;
}

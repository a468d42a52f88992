import { datesIn, type Dated } from './dates';
import { fold, type Folded } from './fold';
import type { CompiledLexicon } from './lexicon/compiled';
import type { CueGroup } from './lexicon/types';
import { mentionsOf, type Mention } from './mentions';
import { findPhrases, type Hit } from './phrases';
import { quantitiesOf, type Quantity } from './quantities';
import { quotationsOf, type Span } from './quotation';
import { sentencesOf, type Sentence } from './sentences';
import { tokenise, type Token } from './tokens';
import type { WordingCheckInput } from './types';

/** A text taken apart once; every rule reads this. Places are those of tokens, `to` past the last. */
export type Reading = {
  input: WordingCheckInput;
  lexicon: CompiledLexicon;
  folded: Folded;
  tokens: readonly Token[];
  sentences: readonly Sentence[];
  sentenceAt: (token: number) => Sentence;
  mentions: readonly Mention[];
  mentionAt: (token: number) => Mention | null;
  quantities: readonly Quantity[];
  quantityAt: (token: number) => Quantity | null;
  dates: readonly Dated[];
  quotations: readonly Span[];
  isCapital: (token: number) => boolean;
  /** Where the phrases of a group stand, none of them inside a name. */
  cues: (group: CueGroup) => readonly Hit[];
  cueAt: (group: CueGroup, token: number) => Hit | null;
  /** Whether a phrase of a group lies within these places. */
  has: (group: CueGroup, range: Hit) => boolean;
};

export function readText(input: WordingCheckInput, lexicon: CompiledLexicon): Reading {
  const folded = fold(input.text);
  const tokens = tokenise(folded.text, lexicon.words.elisions);
  const isCapital = (at: number) => isUpper(input.text, folded.starts[tokens[at]?.from ?? -1]);
  const mentions = mentionsOf(tokens, isCapital, input.releases, lexicon);
  const mentionAt = placesOf(mentions, tokens.length);
  const isNamed = (at: number) => mentionAt(at) !== null;
  const isOption = (at: number) => mentionAt(at)?.kind === 'option';
  const dates = datesIn(tokens, isCapital, isNamed, lexicon);
  const dateAt = placesOf(dates, tokens.length);
  const quantities = quantitiesOf(tokens, lexicon, (at) => isNamed(at) || dateAt(at) !== null);
  const sentences = sentencesOf(tokens, folded.text, isCapital, lexicon);
  const sentenceAt = placesOf(sentences, tokens.length);
  const known = new Map<CueGroup, { hits: readonly Hit[]; at: (token: number) => Hit | null }>();
  const cueMap = (group: CueGroup) => {
    let entry = known.get(group);
    if (!entry) {
      const hits = findPhrases(lexicon.cues[group], tokens, isNamed, isOption);
      entry = { hits, at: placesOf(hits, tokens.length) };
      known.set(group, entry);
    }
    return entry;
  };
  return {
    input,
    lexicon,
    folded,
    tokens,
    sentences,
    sentenceAt: (token) => sentenceAt(token) ?? { from: token, to: token + 1, index: 0 },
    mentions,
    mentionAt,
    quantities,
    quantityAt: placesOf(quantities, tokens.length),
    dates,
    quotations: quotationsOf(input.text),
    isCapital,
    cues: (group) => cueMap(group).hits,
    cueAt: (group, token) => cueMap(group).at(token),
    has: (group, { from, to }) => {
      const { at } = cueMap(group);
      for (let token = from; token < to; token += 1) if (at(token)) return true;
      return false;
    },
  };
}

function placesOf<T extends Hit>(items: readonly T[], length: number): (token: number) => T | null {
  if (items.length === 0) return () => null;
  const places = new Array<T | null>(length).fill(null);
  for (const item of items) places.fill(item, item.from, item.to);
  return (token) => places[token] ?? null;
}

function isUpper(text: string, at: number | undefined): boolean {
  return at !== undefined && /^\p{Lu}/u.test(text.slice(at, at + 2));
}

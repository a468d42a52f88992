import { datesIn, type Dated } from './dates';
import { fold, type Folded } from './fold';
import type { CompiledLexicon } from './lexicon/compiled';
import type { CueGroup } from './lexicon/types';
import { mentionsOf, type Mention } from './mentions';
import { findAll, type Hit } from './phrases';
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

const NONE: readonly Hit[] = [];

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
  const found = findAll(lexicon.index, tokens, isNamed, isOption);
  const cues = (group: CueGroup) => found.get(group) ?? NONE;
  const covered = coverOf(cues, tokens.length);
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
    cues,
    cueAt: (group, token) => covered(group).first[token] ?? null,
    has: (group, { from, to }) => {
      const { before } = covered(group);
      const end = Math.min(to, tokens.length);
      return from < end && (before[end] ?? 0) > (before[Math.max(0, from)] ?? 0);
    },
  };
}

type Cover = { first: (Hit | null)[]; before: Uint32Array };

/** Which hit of a group stands at each place, and how many places before it are covered: asked for at every word. */
function coverOf(cues: (group: CueGroup) => readonly Hit[], length: number): (group: CueGroup) => Cover {
  const kept = new Map<CueGroup, Cover>();
  return (group) => {
    const known = kept.get(group);
    if (known) return known;
    const first = new Array<Hit | null>(length).fill(null);
    for (const hit of cues(group))
      for (let at = hit.from; at < Math.min(hit.to, length); at += 1) first[at] ??= hit;
    const before = new Uint32Array(length + 1);
    first.forEach((hit, at) => {
      before[at + 1] = (before[at] ?? 0) + (hit === null ? 0 : 1);
    });
    const cover = { first, before };
    kept.set(group, cover);
    return cover;
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

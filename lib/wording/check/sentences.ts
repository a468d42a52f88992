import type { CompiledLexicon } from './lexicon/compiled';
import type { Hit } from './phrases';
import type { Token } from './tokens';

export type Sentence = Hit & { index: number };

/**
 * The sentences of a text, as token places. A full stop ends one where a new one can begin: before a capital, a digit,
 * a mark or the end; not after an abbreviation or a single letter. A line break always ends one.
 */
export function sentencesOf(
  tokens: readonly Token[],
  text: string,
  isCapital: (at: number) => boolean,
  { words }: CompiledLexicon,
): Sentence[] {
  const abbreviations = new Set(words.abbreviations);
  const months = new Set(words.ordinalDots ? words.months.flat() : []);
  const isOrdinal = (before: Token | undefined, next: Token | undefined) =>
    before?.kind === 'number' && before.text.length <= 2 && next !== undefined && months.has(next.text);
  const sentences: Sentence[] = [];
  let from = 0;
  const close = (to: number) => {
    if (to > from) sentences.push({ from, to, index: sentences.length });
    from = to;
  };
  tokens.forEach((token, at) => {
    if (token.kind === 'break') return close(at + 1);
    if (token.text !== '.' && token.text !== '!' && token.text !== '?') return;
    const before = tokens[at - 1];
    if (token.text === '.' && before && isShort(before, abbreviations)) return;
    let next = at + 1;
    while (tokens[next]?.text === '"' && tokens[next]?.from === tokens[next - 1]?.to) next += 1;
    const following = tokens[next];
    const isSpaced = !following || /\s/.test(text.charAt(following.from - 1)) || following.kind === 'break';
    if (token.text === '.' && isOrdinal(before, following)) return;
    if (isSpaced && (!following || following.kind !== 'word' || isCapital(next))) close(next);
  });
  close(tokens.length);
  return sentences;
}

function isShort({ text, kind }: Token, abbreviations: ReadonlySet<string>): boolean {
  return kind === 'word' && (text.length === 1 || abbreviations.has(text));
}

import { fold } from './fold';
import { tokenise, type Token } from './tokens';

/** Words that carry a claim, with what must not stand beside them. All in lower case; accents do not count. */
export type Cue = {
  say: readonly string[];
  /** Not where one of these words follows, or goes before. */
  notBefore?: readonly string[];
  notAfter?: readonly string[];
  /** Only where one of these follows, or goes before. */
  before?: readonly string[];
  after?: readonly string[];
  /** Only where one of these ends the clause further on, as the parts of a verb do in German: "legt um 3 Punkte ZU". */
  then?: readonly string[];
  /** Words that, like a mark or the end, may follow the last word of a clause. */
  thenBefore?: readonly string[];
  /** Only right before a name, past an article: "vor der Reform League". The name is the object. */
  beforeName?: readonly string[];
};

/** A list of cues, ready to be found: by its first word, longest first. */
export type Phrases = ReadonlyMap<string, readonly Phrase[]>;

type Phrase = { words: readonly string[]; cue: Beside };
type Beside = {
  [
    K in 'notBefore' | 'notAfter' | 'before' | 'after' | 'then' | 'thenBefore' | 'beforeName'
  ]: ReadonlySet<string> | null;
};

/** Token places: `from` is in the phrase, `to` is past it. */
export type Hit = {
  from: number;
  to: number;
  /** Past the word that ends the clause, where the phrase has a second part. */
  tail?: number;
  /** Where the name stands that the phrase is followed by, which is its object. */
  objectAt?: number;
};

export function compilePhrases(cues: readonly Cue[], elisions: readonly string[] = []): Phrases {
  const byFirst = new Map<string, Phrase[]>();
  for (const cue of cues) {
    const beside: Beside = {
      notBefore: setOf(cue.notBefore),
      notAfter: setOf(cue.notAfter),
      before: setOf(cue.before),
      after: setOf(cue.after),
      then: setOf(cue.then),
      thenBefore: setOf(cue.thenBefore),
      beforeName: setOf(cue.beforeName),
    };
    for (const text of cue.say) {
      const words = tokenise(fold(text).text, elisions).map((token) => token.text);
      const [first = ''] = words;
      const list = byFirst.get(first) ?? [];
      list.push({ words, cue: beside });
      byFirst.set(first, list);
    }
  }
  for (const list of byFirst.values()) list.sort((a, b) => b.words.length - a.words.length);
  return byFirst;
}

const setOf = (words: readonly string[] | undefined) =>
  words ? new Set(words.map((word) => fold(word).text)) : null;

/** Where phrases stand: the longest at each place, none overlapping, none touching a token that `isTaken`. */
export function findPhrases(
  phrases: Phrases,
  tokens: readonly Token[],
  isTaken: (at: number) => boolean,
  isName: (at: number) => boolean = () => false,
): Hit[] {
  const hits: Hit[] = [];
  for (let at = 0; at < tokens.length; at += 1) {
    const found = phraseAt(phrases, tokens, at, isTaken, isName);
    if (!found) continue;
    hits.push(found);
    at = found.to - 1;
  }
  return hits;
}

/** The longest phrase that begins at a token. */
export function phraseAt(
  phrases: Phrases,
  tokens: readonly Token[],
  at: number,
  isTaken: (at: number) => boolean = () => false,
  isName: (at: number) => boolean = () => false,
): Hit | null {
  for (const { words, cue } of phrases.get(tokens[at]?.text ?? '') ?? []) {
    if (!words.every((word, index) => tokens[at + index]?.text === word && !isTaken(at + index))) continue;
    const to = at + words.length;
    if (!fits(cue, tokens[at - 1]?.text ?? '', tokens[to]?.text ?? '')) continue;
    const tail = cue.then && tailAfter(tokens, to, cue);
    const objectAt = cue.beforeName && nameAfter(tokens, to, cue.beforeName, isName);
    if ((cue.then && !tail) || (cue.beforeName && !objectAt)) continue;
    return { from: at, to, ...(tail ? { tail } : {}), ...(objectAt ? { objectAt } : {}) };
  }
  return null;
}

function fits({ notBefore, notAfter, before, after }: Beside, previous: string, next: string): boolean {
  if (notBefore?.has(next) || notAfter?.has(previous)) return false;
  return (!before || before.has(next)) && (!after || after.has(previous));
}

const REACH = 16;

/** Past the second part of a phrase, which ends its clause. */
function tailAfter(tokens: readonly Token[], from: number, { then, thenBefore }: Beside): number | null {
  for (let at = from; at < from + REACH; at += 1) {
    const token = tokens[at];
    if (!token || token.kind === 'break' || /^[;:!?,–]$/.test(token.text)) return null;
    const next = tokens[at + 1];
    const isLast = next?.kind !== 'word' || thenBefore?.has(next.text) === true;
    if (then?.has(token.text) && isLast) return at + 1;
  }
  return null;
}

/** The place of a name that follows, past articles and an opening quotation mark. */
function nameAfter(
  tokens: readonly Token[],
  from: number,
  articles: ReadonlySet<string>,
  isName: (at: number) => boolean,
): number | null {
  for (let at = from; at <= from + 2; at += 1) {
    if (isName(at)) return at;
    const text = tokens[at]?.text ?? '';
    if (text !== '"' && !articles.has(text)) return null;
  }
  return null;
}

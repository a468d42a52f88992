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
};

/** A list of cues, ready to be found: by its first word, longest first. */
export type Phrases = ReadonlyMap<string, readonly Phrase[]>;

type Phrase = { words: readonly string[]; cue: Beside };
type Beside = { [K in 'notBefore' | 'notAfter' | 'before' | 'after']: ReadonlySet<string> | null };

/** Token places: `from` is in the phrase, `to` is past it. */
export type Hit = { from: number; to: number };

export function compilePhrases(cues: readonly Cue[], elisions: readonly string[] = []): Phrases {
  const byFirst = new Map<string, Phrase[]>();
  for (const cue of cues) {
    const beside: Beside = {
      notBefore: setOf(cue.notBefore),
      notAfter: setOf(cue.notAfter),
      before: setOf(cue.before),
      after: setOf(cue.after),
    };
    for (const text of cue.say) {
      const words = tokenise(text, elisions).map((token) => token.text);
      const [first = ''] = words;
      const list = byFirst.get(first) ?? [];
      list.push({ words, cue: beside });
      byFirst.set(first, list);
    }
  }
  for (const list of byFirst.values()) list.sort((a, b) => b.words.length - a.words.length);
  return byFirst;
}

const setOf = (words: readonly string[] | undefined) => (words ? new Set(words) : null);

/** Where phrases stand: the longest at each place, none overlapping, none touching a token that `isTaken`. */
export function findPhrases(
  phrases: Phrases,
  tokens: readonly Token[],
  isTaken: (at: number) => boolean,
): Hit[] {
  const hits: Hit[] = [];
  for (let at = 0; at < tokens.length; at += 1) {
    const found = phraseAt(phrases, tokens, at, isTaken);
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
): Hit | null {
  const list = phrases.get(tokens[at]?.text ?? '');
  const found = list?.find(
    ({ words, cue }) =>
      words.every((word, index) => tokens[at + index]?.text === word && !isTaken(at + index)) &&
      fits(cue, tokens[at - 1]?.text ?? '', tokens[at + words.length]?.text ?? ''),
  );
  return found ? { from: at, to: at + found.words.length } : null;
}

function fits({ notBefore, notAfter, before, after }: Beside, previous: string, next: string): boolean {
  if (notBefore?.has(next) || notAfter?.has(previous)) return false;
  return (!before || before.has(next)) && (!after || after.has(previous));
}

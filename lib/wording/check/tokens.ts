/** A piece of a folded text: a word, a number or one sign. Hyphens between words only join them. */
export type Token = {
  text: string;
  kind: 'word' | 'number' | 'sign' | 'break';
  /** Places in the folded text. */
  from: number;
  to: number;
  /** A hyphen or nothing stands between this token and the one before. */
  joined: boolean;
};

const PATTERN = /\n|\d+(?:[.,]\d+)*|[\p{L}\p{Lo}]+(?:'[\p{L}]+)*|[^\s]/gu;

/**
 * The tokens of a folded text. "Alder's" is two, `alder` and `'s`; "isn't" is `is` and `not`, "cannot" is `can` and
 * `not`, so that a negation is always a word of its own. Of a word in `elisions` the apostrophe is the end: "l'avance"
 * is `l'` and `avance`.
 */
export function tokenise(text: string, elisions: readonly string[] = []): Token[] {
  const tokens: Token[] = [];
  let end = -1;
  let isHyphen = false;
  for (const match of text.matchAll(PATTERN)) {
    const [piece] = match;
    const from = match.index;
    if (piece === '-' && tokens.length > 0 && from === end && isTight(text, from)) {
      isHyphen = true;
      end = from + 1;
      continue;
    }
    const joined = from === end && (isHyphen || !/^[^\p{L}\d]/u.test(piece));
    const parts = partsOf(piece, elisions);
    parts.forEach((part, index) =>
      tokens.push({ ...part, from: from + part.from, to: from + part.to, joined: index === 0 && joined }),
    );
    end = from + piece.length;
    isHyphen = false;
  }
  return tokens;
}

const isTight = (text: string, at: number) =>
  /[\p{L}\d%]/u.test(text.charAt(at - 1)) && /[\p{L}\d]/u.test(text.charAt(at + 1));

type Part = Pick<Token, 'text' | 'kind' | 'from' | 'to'>;

const word = (text: string, from: number, to: number): Part => ({ text, kind: 'word', from, to });

function partsOf(piece: string, elisions: readonly string[]): Part[] {
  const { length } = piece;
  if (piece === '\n') return [{ text: piece, kind: 'break', from: 0, to: 1 }];
  if (/^\d/.test(piece)) return [{ text: piece, kind: 'number', from: 0, to: length }];
  if (!/^\p{L}/u.test(piece)) return [{ text: piece, kind: 'sign', from: 0, to: length }];
  if (piece === 'cannot') return [word('can', 0, 3), word('not', 3, 6)];
  const negated = NEGATED[piece];
  if (negated) return [word(negated, 0, length - 3), word('not', length - 3, length)];
  const apostrophe = piece.indexOf("'");
  if (apostrophe <= 0) return [word(piece, 0, length)];
  if (elisions.includes(piece.slice(0, apostrophe))) return elided(piece, apostrophe + 1, elisions);
  if (piece.endsWith("n't"))
    return [word(piece.slice(0, -3), 0, length - 3), word('not', length - 3, length)];
  return [word(piece.slice(0, apostrophe), 0, apostrophe), word(piece.slice(apostrophe), apostrophe, length)];
}

/** "l'avance", and "qu'il n'est" word by word: what follows is a word of its own. */
function elided(piece: string, cut: number, elisions: readonly string[]): Part[] {
  const rest = partsOf(piece.slice(cut), elisions);
  return [
    word(piece.slice(0, cut), 0, cut),
    ...rest.map((part) => ({ ...part, from: part.from + cut, to: part.to + cut })),
  ];
}

const NEGATED: Record<string, string> = { "won't": 'will', "can't": 'can', "shan't": 'shall' };

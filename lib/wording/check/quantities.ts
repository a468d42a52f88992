import type { CompiledLexicon } from './lexicon/compiled';
import { phraseAt } from './phrases';
import type { Token } from './tokens';

/** A number in the text with its unit; token places, `to` past the unit. */
export type Quantity = {
  from: number;
  to: number;
  /** Past the number itself. */
  numberTo: number;
  value: number;
  decimals: number;
  unit: 'percent' | 'points' | 'fraction' | 'none';
  isInWords: boolean;
};

/** Every number: digits, words, "half a point", "two thirds", "one in three". */
export function quantitiesOf(
  tokens: readonly Token[],
  lexicon: CompiledLexicon,
  isTaken: (at: number) => boolean,
): Quantity[] {
  const found: Quantity[] = [];
  for (let at = 0; at < tokens.length; at += 1) {
    const quantity = isTaken(at) ? null : quantityAt(tokens, at, lexicon);
    if (!quantity) continue;
    found.push(quantity);
    at = quantity.to - 1;
  }
  return found;
}

type Reader = (tokens: readonly Token[], at: number, lexicon: CompiledLexicon) => Quantity | null;

const quantityAt: Reader = (tokens, at, lexicon) =>
  halfPointAt(tokens, at, lexicon) ??
  oneInAt(tokens, at, lexicon) ??
  fractionAt(tokens, at, lexicon) ??
  numberAt(tokens, at, lexicon);

const halfPointAt: Reader = (tokens, at, lexicon) => {
  const fraction = phraseAt(lexicon.fractions, tokens, at);
  if (!fraction || valueOfFraction(tokens, fraction, lexicon) !== 50) return null;
  for (const skip of [0, 1]) {
    const unit = phraseAt(lexicon.cues.pointWords, tokens, fraction.to + skip);
    if (unit) {
      return {
        from: at,
        to: unit.to,
        numberTo: fraction.to,
        value: 0.5,
        decimals: 1,
        unit: 'points',
        isInWords: true,
      };
    }
  }
  return null;
};

const oneInAt: Reader = (tokens, at, lexicon) => {
  const part = articleAt(tokens, at, lexicon) ?? bareNumberAt(tokens, at, lexicon);
  const link = part && phraseAt(lexicon.inEvery, tokens, peopleEnd(tokens, part.to, lexicon));
  const whole = link && bareNumberAt(tokens, link.to, lexicon);
  if (!part || !whole || part.decimals > 0 || whole.decimals > 0) return null;
  if (whole.value < 2 || whole.value > 10 || part.value < 1 || part.value >= whole.value) return null;
  const value = (100 * part.value) / whole.value;
  return {
    from: at,
    to: whole.to,
    numberTo: whole.to,
    value,
    decimals: 0,
    unit: 'fraction',
    isInWords: true,
  };
};

/** "un électeur sur trois": past the people between the part and the whole. */
function peopleEnd(tokens: readonly Token[], at: number, { cues }: CompiledLexicon): number {
  const groups = [cues.likelyVoters, cues.registeredVoters, cues.voters, cues.adults, cues.countedPeople];
  const ends = groups.map((group) => phraseAt(group, tokens, at)?.to ?? at);
  return Math.max(...ends);
}

const fractionAt: Reader = (tokens, at, lexicon) => {
  const hit = phraseAt(lexicon.fractions, tokens, at);
  if (!hit) return null;
  const value = valueOfFraction(tokens, hit, lexicon);
  return { ...hit, numberTo: hit.to, value, decimals: 0, unit: 'fraction', isInWords: true };
};

function valueOfFraction(
  tokens: readonly Token[],
  { from, to }: { from: number; to: number },
  lexicon: CompiledLexicon,
): number {
  const phrase = tokens
    .slice(from, to)
    .map(({ text }) => text)
    .join(' ');
  return lexicon.words.fractions[phrase] ?? 0;
}

const numberAt: Reader = (tokens, at, lexicon) => {
  const number = bareNumberAt(tokens, at, lexicon) ?? articleWithUnit(tokens, at, lexicon);
  if (!number) return null;
  const points = phraseAt(lexicon.cues.pointWords, tokens, number.to);
  const percent = phraseAt(lexicon.cues.percentWords, tokens, number.to);
  const isPoints = points !== null && points.to >= (percent?.to ?? 0);
  const unit = isPoints ? 'points' : percent ? 'percent' : 'none';
  const to = (isPoints ? points.to : percent?.to) ?? number.to;
  return {
    from: at,
    to,
    numberTo: number.to,
    value: number.value,
    decimals: number.decimals,
    unit,
    isInWords: number.isInWords,
  };
};

type Bare = { to: number; value: number; decimals: number; isInWords: boolean };

const articleAt = (tokens: readonly Token[], at: number, { words }: CompiledLexicon): Bare | null =>
  words.oneArticles.includes(tokens[at]?.text ?? '')
    ? { to: at + 1, value: 1, decimals: 0, isInWords: true }
    : null;

/** "un punto", "un point": the article counts only right before its unit. */
function articleWithUnit(tokens: readonly Token[], at: number, lexicon: CompiledLexicon): Bare | null {
  const article = articleAt(tokens, at, lexicon);
  return article && phraseAt(lexicon.cues.pointWords, tokens, article.to) ? article : null;
}

function bareNumberAt(
  tokens: readonly Token[],
  at: number,
  { words, numbers }: CompiledLexicon,
): Bare | null {
  const token = tokens[at];
  if (token?.kind === 'number') {
    const to = words.groupsBySpace ? endOfGroups(tokens, at) : at + 1;
    const digits = tokens.slice(at, to).map(({ text }) => text);
    const read = readDigits(digits.join(''), words.decimalMark);
    return read && { ...read, to, isInWords: false };
  }
  const said = phraseAt(numbers, tokens, at);
  if (!said) return null;
  const phrase = tokens.slice(said.from, said.to).map(({ text }) => text);
  const value = words.numbers[phrase.join(' ')] ?? 0;
  const next = said.to === at + 1 ? numberWord(words.numbers, tokens[at + 1]) : undefined;
  const isCompound = value >= 20 && value % 10 === 0 && next !== undefined && next > 0 && next < 10;
  return isCompound
    ? { to: at + 2, value: value + next, decimals: 0, isInWords: true }
    : { to: said.to, value, decimals: 0, isInWords: true };
}

/** Past the groups of three digits that one space each parts from a number of one to three. */
function endOfGroups(tokens: readonly Token[], at: number): number {
  let to = at + 1;
  if (!/^\d{1,3}$/.test(tokens[at]?.text ?? '')) return to;
  while (
    /^\d{3}(?:[.,]\d+)?$/.test(tokens[to]?.text ?? '') &&
    tokens[to]?.from === (tokens[to - 1]?.to ?? 0) + 1
  ) {
    to += 1;
  }
  return to;
}

const numberWord = (numbers: Readonly<Record<string, number>>, token: Token | undefined) =>
  token && Object.hasOwn(numbers, token.text) ? numbers[token.text] : undefined;

function readDigits(text: string, decimalMark: '.' | ','): { value: number; decimals: number } | null {
  const grouping = decimalMark === '.' ? ',' : '.';
  const parts = text.split(grouping);
  const isGrouped =
    parts.length > 1 &&
    parts.slice(1).every((part, index) => {
      const [digits = ''] = index === parts.length - 2 ? part.split(decimalMark) : [part];
      return digits.length === 3;
    });
  const plain = isGrouped ? parts.join('') : text.replace(grouping, decimalMark);
  const [whole = '', fraction = '', more] = plain.split(decimalMark);
  if (more !== undefined || whole.length > 12) return null;
  return { value: Number(fraction ? `${whole}.${fraction}` : whole), decimals: fraction.length };
}

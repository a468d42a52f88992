import { optionsIn, subjectOf } from '../parties';
import type { Quantity } from '../quantities';
import type { Reading } from '../reading';
import { clauseOf, scopeOf } from '../scope';
import { isPairOfShares, sizeOf } from '../sizes';

export type Link = { option: string; mayBeEarlier: boolean };

const REACH = 6;

/**
 * The option a share is given for: the name right before it ("Alder at 47%", "Alder 47, Brook 41"), right after it
 * ("47% for Alder"), or by its place in a pair ("Alder leads Brook 52% to 38%"). null where no name is near or the
 * number is no share.
 */
export function linkedOption(reading: Reading, quantity: Quantity): Link | null {
  if (!isShare(reading, quantity)) return null;
  return inPair(reading, quantity) ?? after(reading, quantity) ?? before(reading, quantity);
}

function isShare(reading: Reading, quantity: Quantity): boolean {
  const { from, to, unit, value } = quantity;
  if (value > 100 || reading.has('plusMinus', { from: from - 3, to: from })) return false;
  if (reading.has('notShare', { from: to, to: to + 2 }) || reading.cueAt('outsideMargin', from - 1))
    return false;
  if (reading.has('marginNoun', { from: from - 3, to: to + 4 })) return false;
  if (reading.has('thresholdNoun', { from: to, to: to + 2 })) return false;
  if (reading.cueAt('beforeNoShare', from - 1) || scopeOf(reading, quantity) === 'open') return false;
  if (reading.has('rangeWords', { from: reading.sentenceAt(from).from, to: from })) return false;
  if (isSizeOfSomething(reading, quantity)) return false;
  return unit === 'percent' || isPairOfShares(reading, quantity) || isBare(reading, quantity);
}

/** "Alder 47": a bare number right after a name. */
function isBare(reading: Reading, { from, to, decimals, value }: Quantity): boolean {
  const mention =
    reading.mentionAt(from - 1) ??
    (reading.cueAt('shareLeads', from - 1) ? reading.mentionAt(from - 2) : null);
  const next = reading.tokens[to];
  const isEnd =
    !next ||
    next.kind !== 'word' ||
    reading.mentionAt(to) !== null ||
    reading.cueAt('afterBareShare', to) !== null;
  return mention?.kind === 'option' && isEnd && value >= 1 && decimals <= 2;
}

function isSizeOfSomething(reading: Reading, quantity: Quantity): boolean {
  const { from, to } = clauseOf(reading, quantity);
  const groups = [
    'leadStrong',
    'leadWeak',
    'leadNoun',
    'trailStrong',
    'trailWeak',
    'up',
    'down',
    'gap',
  ] as const;
  return groups.some((group) =>
    reading
      .cues(group)
      .some((hit) => hit.from >= from && hit.to <= to && sizeOf(reading, hit)?.from === quantity.from),
  );
}

/** Two shares in a row go to the names in their order; after "from" they are one name's, earlier and now. */
function inPair(reading: Reading, quantity: Quantity): Link | null {
  if (!isPairOfShares(reading, quantity)) return null;
  const first = firstOfPair(reading, quantity);
  const second = secondOfPair(reading, first);
  if (!second) return null;
  const isFirst = first.from === quantity.from;
  if (reading.cueAt('fromWords', first.from - 1)) {
    const subject = subjectOf(reading, first);
    return subject && subject !== 'unknown' ? { option: subject.option, mayBeEarlier: true } : null;
  }
  const forOne = after(reading, second);
  const clause = clauseOf(reading, first);
  const sentence = reading.sentenceAt(first.from);
  const names = [...new Set(optionsIn(reading, sentence.from, first.from).map(({ name }) => name))];
  if (forOne && !isFirst) return forOne;
  const [a, b] = names.slice(-2);
  if (b !== undefined && a !== undefined)
    return { option: isFirst ? a : b, mayBeEarlier: isEarlier(reading, quantity) };
  const subject = subjectOf(reading, { from: first.from, to: clause.to });
  return isFirst && forOne && subject && subject !== 'unknown'
    ? { option: subject.option, mayBeEarlier: false }
    : null;
}

function firstOfPair(reading: Reading, quantity: Quantity): Quantity {
  const before =
    reading.quantityAt(quantity.from - 2) ??
    (reading.tokens[quantity.from]?.joined ? reading.quantityAt(quantity.from - 1) : null);
  return before && secondOfPair(reading, before)?.from === quantity.from ? before : quantity;
}

function secondOfPair(reading: Reading, { to }: Quantity): Quantity | null {
  const isLink = reading.lexicon.words.to.includes(reading.tokens[to]?.text ?? '');
  if (isLink) return reading.quantityAt(to + 1);
  return reading.tokens[to]?.joined ? reading.quantityAt(to) : null;
}

function after(reading: Reading, quantity: Quantity): Link | null {
  const { to } = quantity;
  const clause = clauseOf(reading, { from: to - 1, to });
  let isBacking = false;
  for (let at = to; at < Math.min(clause.to, to + REACH); at += 1) {
    const mention = reading.mentionAt(at);
    if (mention?.kind === 'option') {
      const isBeside = at === to && !reading.mentionAt(quantity.from - 1);
      return isBacking || isBeside || reading.cueAt('backs', at)
        ? { option: mention.name, mayBeEarlier: isEarlier(reading, mention) }
        : null;
    }
    const isCut = reading.tokens[at]?.text === ',' && !reading.cueAt('backs', at + 1);
    if (reading.quantityAt(at) || isCut) return null;
    if (reading.cueAt('backs', at)) isBacking = true;
  }
  return null;
}

function before(reading: Reading, quantity: Quantity): Link | null {
  const sentence = reading.sentenceAt(quantity.from);
  if (reading.cueAt('withWords', quantity.from - 1)) {
    const subject = subjectOf(reading, quantity);
    return subject && subject !== 'unknown'
      ? { option: subject.option, mayBeEarlier: isEarlier(reading, quantity) }
      : null;
  }
  for (let at = quantity.from - 1; at >= Math.max(sentence.from, quantity.from - REACH); at -= 1) {
    const mention = reading.mentionAt(at);
    if (mention?.kind === 'option')
      return { option: mention.name, mayBeEarlier: isEarlier(reading, quantity) };
    if (mention || reading.quantityAt(at)) return null;
  }
  return null;
}

/** Whether the words around it speak of an earlier poll. */
function isEarlier(reading: Reading, { from }: { from: number }): boolean {
  const sentence = reading.sentenceAt(from);
  return reading.has('earlierWords', sentence);
}

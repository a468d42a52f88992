import { phraseAt, type Hit } from './phrases';
import type { Quantity } from './quantities';
import type { Reading } from './reading';
import { clauseOf } from './scope';

const REACH = 4;

/**
 * The size that is said of a lead or a change: "by 6 points" after the phrase, past a name; "6-point" before it.
 * Shares ("52% to 38%") and what a figure moved to are no sizes.
 */
export function sizeOf(reading: Reading, hit: Hit): Quantity | null {
  return sizeAfter(reading, hit) ?? sizeBefore(reading, hit);
}

function sizeAfter(reading: Reading, hit: Hit): Quantity | null {
  const { tokens } = reading;
  const clause = clauseOf(reading, hit);
  let skipped = 0;
  let last = '';
  for (let at = hit.to; at < clause.to && skipped < REACH; at += 1) {
    const quantity = reading.quantityAt(at);
    if (quantity) return isSize(reading, quantity, last) ? quantity : null;
    const mention = reading.mentionAt(at);
    if (mention) {
      at = mention.to - 1;
      last = '';
      continue;
    }
    last = tokens[at]?.text ?? '';
    if (last === ',' || last === '.' || last === '(') return null;
    skipped += 1;
  }
  return null;
}

/** Points are sizes whatever goes before; percents only after "by", "of" or nothing; bare numbers only after "by". */
function isSize(reading: Reading, quantity: Quantity, last: string): boolean {
  if (isMargin(reading, quantity)) return false;
  if (quantity.unit === 'points')
    return !reading.has('marginNoun', { from: quantity.to, to: quantity.to + 3 });
  const isBy = reading.cueAt('sizeMarkers', quantity.from - 1) !== null && !isTo(reading, quantity.from - 1);
  if (isPairOfShares(reading, quantity)) return false;
  if (quantity.unit === 'percent') return (last === '' && isOpen(reading, quantity)) || isBy;
  const isTime = reading.cueAt('afterNoFraction', quantity.to) !== null;
  return quantity.unit === 'none' && isBy && !isTime && quantity.value <= 60;
}

/** Right after the phrase itself, which does not end in a word that leads to a share ("up to 48%"). */
const isOpen = (reading: Reading, { from }: Quantity) =>
  reading.mentionAt(from - 1) === null && !isTo(reading, from - 1);

function isTo(reading: Reading, at: number): boolean {
  return linkBefore(reading, at + 1) !== null || reading.cueAt('shareLeads', at) !== null;
}

export function isPairOfShares(reading: Reading, quantity: Quantity): boolean {
  const isLike = (other: Quantity | null) => other !== null && !areUnlike(quantity, other);
  return isLike(secondOfPair(reading, quantity)) || isLike(firstOfPair(reading, quantity));
}

/** The number that a link ("52% TO 38%", "52 % FRENTE A 38 %") or a hyphen ties to one before it. */
export function secondOfPair({ lexicon, tokens, quantityAt }: Reading, { to }: Quantity): Quantity | null {
  const link = phraseAt(lexicon.to, tokens, to);
  if (link) return quantityAt(link.to);
  return tokens[to]?.joined ? quantityAt(to) : null;
}

/** The number before a link or a hyphen that ties it to this one. */
export function firstOfPair(reading: Reading, { from }: Quantity): Quantity | null {
  const link = linkBefore(reading, from);
  if (link) return reading.quantityAt(link.from - 1);
  return reading.tokens[from]?.joined ? reading.quantityAt(from - 1) : null;
}

/** The link that ends right before a place. */
function linkBefore({ lexicon, tokens }: Reading, to: number): Hit | null {
  for (const length of [2, 1]) {
    const link = phraseAt(lexicon.to, tokens, to - length);
    if (link?.to === to) return link;
  }
  return null;
}

/** "Up 10 points to 51%": points and a percentage are no pair. */
const areUnlike = (a: Quantity, b: Quantity) =>
  (a.unit === 'points' && b.unit === 'percent') || (a.unit === 'percent' && b.unit === 'points');

/** "With 52% ahead", "auf 52 Prozent gestiegen"; but "with a 14% lead". */
function isShareBefore(reading: Reading, { from }: Quantity, hit: number): boolean {
  if (reading.cueAt('leadNoun', hit)) return false;
  return reading.cueAt('withWords', from - 1) !== null || linkBefore(reading, from) !== null;
}

const isMargin = (reading: Reading, { from }: Quantity) =>
  reading.has('plusMinus', { from: from - 3, to: from });

function sizeBefore(reading: Reading, { from }: Hit): Quantity | null {
  for (let at = from - 1; at >= Math.max(0, from - 3); at -= 1) {
    const quantity = reading.quantityAt(at);
    if (quantity)
      return quantity.unit === 'points' || quantity.unit === 'percent'
        ? beforeSize(reading, quantity, from)
        : null;
    if (reading.mentionAt(at) || reading.tokens[at]?.kind !== 'word') return null;
  }
  return null;
}

/** "6 points ahead", "6-point lead"; of a percent only right before the word. */
function beforeSize(reading: Reading, quantity: Quantity, from: number): Quantity | null {
  if (isPairOfShares(reading, quantity) || isMargin(reading, quantity)) return null;
  if (quantity.unit === 'points') return quantity;
  const isOf = quantity.to + 1 === from && reading.cueAt('ofWords', quantity.to) !== null;
  return (quantity.to === from || isOf) && !isShareBefore(reading, quantity, from) ? quantity : null;
}

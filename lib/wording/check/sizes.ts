import type { Hit } from './phrases';
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
  return quantity.unit === 'none' && isBy && quantity.value <= 60;
}

/** Right after the phrase itself, which does not end in a word that leads to a share ("up to 48%"). */
const isOpen = (reading: Reading, { from }: Quantity) =>
  reading.mentionAt(from - 1) === null && !isTo(reading, from - 1);

function isTo(reading: Reading, at: number): boolean {
  return (
    reading.lexicon.words.to.includes(reading.tokens[at]?.text ?? '') ||
    reading.cueAt('shareLeads', at) !== null
  );
}

export function isPairOfShares(reading: Reading, own: Quantity): boolean {
  const { from, to } = own;
  const { to: links } = reading.lexicon.words;
  const isLink = (at: number) => links.includes(reading.tokens[at]?.text ?? '');
  const ofKind = (other: Quantity | null) => other !== null && !areUnlike(own, other);
  const follows = ofKind(reading.quantityAt(to + 1)) && isLink(to);
  const joined = reading.quantityAt(to) !== null && reading.tokens[to]?.joined === true;
  const precedes = ofKind(reading.quantityAt(from - 2)) && isLink(from - 1);
  return (
    follows ||
    joined ||
    precedes ||
    (reading.tokens[from]?.joined === true && reading.quantityAt(from - 1) !== null)
  );
}

/** "Up 10 points to 51%": points and a percentage are no pair. */
const areUnlike = (a: Quantity, b: Quantity) =>
  (a.unit === 'points' && b.unit === 'percent') || (a.unit === 'percent' && b.unit === 'points');

/** "With 52% ahead", "auf 52 Prozent gestiegen"; but "with a 14% lead". */
function isShareBefore(reading: Reading, { from }: Quantity, hit: number): boolean {
  if (reading.cueAt('leadNoun', hit)) return false;
  const { to } = reading.lexicon.words;
  return reading.cueAt('withWords', from - 1) !== null || to.includes(reading.tokens[from - 1]?.text ?? '');
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
  return quantity.to === from && !isShareBefore(reading, quantity, from) ? quantity : null;
}

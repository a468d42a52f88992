import { markAt } from '../marks';
import type { Reading } from '../reading';
import type { WordingMark } from '../types';

const LEAST_SENTENCES = 3;

/**
 * What a text that stands alone must tell its readers: pollster, sponsor, dates, number and kind of people, margin or
 * why none. AAPOR's and NCPP's lists of disclosure, from memory.
 */
export function markMissing(reading: Reading): WordingMark[] {
  const { releases, part = 'whole' } = reading.input;
  const givesFigures = reading.quantities.some(({ unit }) => unit === 'percent' || unit === 'points');
  if (part !== 'whole' || releases.length === 0 || !givesFigures) return [];
  if (reading.sentences.length < LEAST_SENTENCES) return [];
  const items = missingItems(reading);
  if (items.length === 0) return [];
  const message = `Missing: ${new Intl.ListFormat('en-GB', { type: 'conjunction' }).format(items)}.`;
  const mark = markAt(
    reading,
    { from: 0, to: 1 },
    { rule: 'missing', grade: 'house-style', message, release: 0 },
  );
  return [{ ...mark, start: 0, end: 0, phrase: '', quoted: false, grade: 'house-style', message }];
}

function missingItems(reading: Reading): string[] {
  const whole = { from: 0, to: reading.tokens.length };
  const { releases } = reading.input;
  const names = (kind: 'pollster' | 'sponsor') => reading.mentions.some((one) => one.kind === kind);
  const hasSponsor = releases.some(({ facts }) => facts.sponsor.status === 'given');
  const { months, datesAreNames } = reading.lexicon.words;
  const hasDate = reading.tokens.some(
    ({ text }, at) => (!datesAreNames || reading.isCapital(at)) && months.flat().includes(text),
  );
  const hasSize = reading.quantities.some(
    ({ unit, value }) => unit === 'none' && value >= 50 && !(value >= 1900 && value < 2100),
  );
  const hasBase = (['adults', 'voters', 'likelyVoters', 'registeredVoters'] as const).some((group) =>
    reading.has(group, whole),
  );
  const hasMargin =
    reading.has('marginNoun', whole) || reading.has('plusMinus', whole) || reading.has('noMargin', whole);
  const items: [string, boolean][] = [
    ['the pollster', names('pollster')],
    ['the sponsor', !hasSponsor || names('sponsor')],
    ['the field dates', hasDate],
    ['how many were asked', hasSize],
    ['who was asked', hasBase],
    ['the margin of error, or why there is none', hasMargin],
  ];
  return items.filter(([, isThere]) => !isThere).map(([item]) => item);
}

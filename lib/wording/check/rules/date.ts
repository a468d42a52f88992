import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { Dated } from '../dates';
import { markAt, type Judged } from '../marks';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';
import type { WordingMark } from '../types';

/** Field dates and weekdays against the release's own. Common practice, no source. */
export function markDates(reading: Reading): WordingMark[] {
  if (reading.input.releases.length === 0) return [];
  const isOfPoll = (hit: Hit) => {
    const sentence = reading.sentenceAt(hit.from);
    return (
      (reading.has('fieldworkWords', sentence) || reading.has('publishedWords', sentence)) &&
      !isOfEvent(reading, hit)
    );
  };
  const dated = reading.dates.filter(isOfPoll);
  const relative = reading
    .cues('relativeDates')
    .filter((hit) => isOfPoll(hit) && !isHypothetical(reading, hit));
  return [
    ...dated.flatMap((hit) => (isInReleases(reading, hit) ? [] : [markAt(reading, hit, WRONG)])),
    ...weekdaysIn(reading)
      .filter(isOfPoll)
      .flatMap((hit) => (isWeekdayInReleases(reading, hit) ? [] : [markAt(reading, hit, WRONG)])),
    ...relative.map((hit) => markAt(reading, hit, RELATIVE)),
  ];
}

const WRONG: Judged = {
  rule: 'date',
  grade: 'wrong',
  message: 'No release given was interviewed or published then.',
};
const RELATIVE: Judged = {
  rule: 'date',
  grade: 'cannot-judge',
  message: 'Which day this is depends on when it is read: write the date.',
};

const isHypothetical = (reading: Reading, { from }: Hit) =>
  reading.has('conditionals', { from: reading.sentenceAt(from).from, to: from }) ||
  reading.cueAt('heldWords', from - 1) !== null;

/** "the November election", "the vote on 3 November". */
function isOfEvent(reading: Reading, { from, to }: Hit): boolean {
  return (
    reading.has('eventWords', { from: from - 4, to: from }) ||
    reading.has('eventWords', { from: to, to: to + 2 })
  );
}

function factsOf(reading: Reading): ReleaseFacts[] {
  return reading.input.releases.flatMap(({ facts, previous }) => [facts, ...(previous ? [previous] : [])]);
}

function isInReleases(reading: Reading, { days, month, year }: Dated): boolean {
  return factsOf(reading).some((facts) => {
    const own = [facts.fieldStartOn, facts.fieldEndOn, facts.publishedOn];
    const fits = (day: string) =>
      Number(day.slice(5, 7)) === month && (year === null || Number(day.slice(0, 4)) === year);
    return (
      own.some(fits) && days.every((day) => own.some((one) => fits(one) && Number(one.slice(8)) === day))
    );
  });
}

function weekdaysIn(reading: Reading): (Hit & { weekday: number })[] {
  const { weekdays, datesAreNames } = reading.lexicon.words;
  return reading.tokens.flatMap(({ text }, at) => {
    const weekday = weekdays.findIndex((names) => names.includes(text));
    return weekday < 0 || (datesAreNames && !reading.isCapital(at)) || reading.mentionAt(at)
      ? []
      : [{ from: at, to: at + 1, weekday }];
  });
}

function isWeekdayInReleases(reading: Reading, { weekday }: { weekday: number }): boolean {
  return factsOf(reading).some(({ fieldStartOn, fieldEndOn, publishedOn }) =>
    [fieldStartOn, fieldEndOn, publishedOn].some(
      (day) => new Date(`${day}T00:00:00Z`).getUTCDay() === weekday,
    ),
  );
}

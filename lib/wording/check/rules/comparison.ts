import type { Judged } from '../marks';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';

/**
 * What stands against comparing: another pollster's poll named beside a change, or releases that differ in who was
 * asked, how, or what. Like with like: BBC Editorial Guidelines, section 10, from memory.
 */
export function comparisonFault(reading: Reading, hit: Hit, release: number): Judged | null {
  const checked = reading.input.releases[release];
  const sentence = reading.sentenceAt(hit.from);
  const pollsters = new Set(
    reading.mentions
      .filter(({ kind, from, to }) => kind === 'pollster' && from >= sentence.from && to <= sentence.to)
      .map(({ name }) => name),
  );
  const own = [checked?.facts.pollster.name, checked?.previous?.pollster.name];
  if ([...pollsters].some((name) => !own.includes(name)) && pollsters.size > 1) {
    return {
      rule: 'not-comparable',
      grade: 'not-supported',
      release,
      message: 'Polls of different pollsters are set against each other: that is no change.',
    };
  }
  const comparability = checked?.comparability;
  if (!comparability || comparability.comparable || comparability.isOverridden) return null;
  const items = comparability.differences.map(({ item }) => item.replace(/-/g, ' ')).join(', ');
  return {
    rule: 'not-comparable',
    grade: 'not-supported',
    release,
    message: `The two releases are not comparable: they differ in ${items}.`,
  };
}

/** Whether the sentence says since when, and neither release was then: another month, "a year ago". */
export function namesPeriodOutside(reading: Reading, hit: Hit, release: number): boolean {
  const sentence = reading.sentenceAt(hit.from);
  const checked = reading.input.releases[release];
  if (reading.has('periodWords', sentence)) return true;
  const months = monthsIn(reading, sentence);
  const own = [checked?.facts, checked?.previous].flatMap((facts) =>
    facts
      ? [facts.fieldStartOn, facts.fieldEndOn, facts.publishedOn].map((day) => Number(day.slice(5, 7)))
      : [],
  );
  return months.some((month) => !own.includes(month));
}

function monthsIn(reading: Reading, { from, to }: Hit): number[] {
  const { months, datesAreNames } = reading.lexicon.words;
  const found: number[] = [];
  for (let at = from; at < to; at += 1) {
    if ((datesAreNames && !reading.isCapital(at)) || reading.mentionAt(at)) continue;
    const month = months.findIndex((names) => names.includes(reading.tokens[at]?.text ?? ''));
    if (month >= 0) found.push(month + 1);
  }
  return found;
}

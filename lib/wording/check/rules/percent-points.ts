import { markAt, replacementOf } from '../marks';
import { subjectOf } from '../parties';
import type { Hit } from '../phrases';
import type { Quantity } from '../quantities';
import type { Reading } from '../reading';
import { isPairOfShares, sizeOf } from '../sizes';
import type { WordingMark } from '../types';

/** A difference between two percentages is in points: SciLine's advice and AP usage, from memory. */
export function markPercentForPoints(reading: Reading): WordingMark[] {
  const hits = (
    [
      'leadStrong',
      'leadWeak',
      'trailStrong',
      'trailWeak',
      'leadNoun',
      'gap',
      'up',
      'down',
      'leadUp',
      'leadDown',
      'dramatic',
    ] as const
  ).flatMap((group) => reading.cues(group));
  const sizes = new Map<number, Quantity>();
  for (const hit of hits) {
    const size = sizeOf(reading, hit);
    if (size?.unit === 'percent' && !isPairOfShares(reading, size) && isOfPoll(reading, hit))
      sizes.set(size.from, size);
  }
  return [...sizes.values()].map((size) =>
    markAt(reading, size, {
      rule: 'percent-points',
      grade: 'wrong',
      message: 'A difference between two percentages is in percentage points, not percent.',
      replacement: replacementOf(reading.lexicon.words, 'points', { n: textOf(reading, size) }),
    }),
  );
}

const LEADS = ['leadStrong', 'leadWeak', 'trailStrong', 'trailWeak', 'leadNoun'] as const;

/** Prices rise by percents too: somebody of a poll, or a word of the trade, must be in the sentence. */
function isOfPoll(reading: Reading, hit: Hit): boolean {
  const isLead = LEADS.some((group) => reading.has(group, hit));
  return isLead || reading.has('poll', reading.sentenceAt(hit.from)) || subjectOf(reading, hit) !== null;
}

function textOf(reading: Reading, { from, numberTo }: Quantity): string {
  const start = reading.tokens[from]?.from ?? 0;
  return reading.folded.text.slice(start, reading.tokens[numberTo - 1]?.to ?? start);
}

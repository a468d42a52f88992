import { markAt, type Judged } from '../marks';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';
import type { WordingMark, WordingRule } from '../types';

/** One mark where every release that may be meant is judged alike; where they differ, that it cannot be judged. */
export function agreed(
  reading: Reading,
  hit: Hit,
  judgements: readonly (Judged | null)[],
  rule: WordingRule,
): WordingMark[] {
  const [first = null] = judgements;
  if (judgements.every((one) => one?.grade === first?.grade))
    return first ? [markAt(reading, hit, first)] : [];
  const message = 'Several releases may be meant and they do not agree: name the pollster.';
  return [markAt(reading, hit, { rule, grade: 'cannot-judge', message })];
}

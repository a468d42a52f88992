import { diffWordsWithSpace } from 'diff';
import type { DiffPart } from '../ui/word-diff';

/** What became of a wording, word by word: what went stands before what came. */
export function diffParts(before: string, after: string): DiffPart[] {
  return diffWordsWithSpace(before, after).map(({ value, added, removed }) => ({
    text: value,
    ...(added ? { change: 'added' as const } : removed ? { change: 'removed' as const } : {}),
  }));
}

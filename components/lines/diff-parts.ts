import { diffWordsWithSpace } from 'diff';
import type { DiffPart } from '../ui/word-diff';

/** Words that stayed between two changes are told as changed too where they are no more than so many. */
const STRAY_WORDS = 2;

/**
 * What became of a wording: what went stands before what came. A passage that was rewritten is shown as one
 * passage, not as scattered words that happen to be in both.
 */
export function diffParts(before: string, after: string): DiffPart[] {
  const changes = diffWordsWithSpace(before, after);
  const parts: DiffPart[] = [];
  let removed = '';
  let added = '';
  const close = () => {
    if (removed !== '') parts.push({ text: removed, change: 'removed' });
    if (added !== '') parts.push({ text: added, change: 'added' });
    removed = '';
    added = '';
  };
  for (const [at, change] of changes.entries()) {
    if (change.removed) removed += change.value;
    else if (change.added) added += change.value;
    else if (isBetween(at, changes.length) && isStray(change.value)) {
      removed += change.value;
      added += change.value;
    } else {
      close();
      parts.push({ text: change.value });
    }
  }
  close();
  return parts;
}

const isBetween = (at: number, length: number) => at > 0 && at < length - 1;

function isStray(text: string): boolean {
  return text.split(/\s+/).filter((word) => /[\p{L}\p{N}]/u.test(word)).length <= STRAY_WORDS;
}

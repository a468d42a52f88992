import { type Anchor, markedPieces } from '@/lib/domain/comments';
import type { DiffPart } from '../ui/word-diff';

export type CommentedPart = DiffPart & {
  /** Places in the list of comments of those that are on these words. */
  comments: number[];
};

/**
 * The parts of a difference, cut again where a passage that was commented on begins or ends. Words that went carry no
 * comment: comments stand on the words as they are now.
 *
 * @param parts what stayed, came and went; what stayed and came make up the words
 * @param anchors one for each comment
 */
export function commentedParts(parts: readonly DiffPart[], anchors: readonly Anchor[]): CommentedPart[] {
  const text = parts.map((part) => (part.change === 'removed' ? '' : part.text)).join('');
  const pieces = markedPieces(text, anchors).filter((piece) => piece.text !== '');
  let [at, used] = [0, 0];
  return parts.flatMap((part): CommentedPart[] => {
    if (part.change === 'removed') return [{ ...part, comments: [] }];
    const cut: CommentedPart[] = [];
    for (let left = part.text.length; left > 0;) {
      const piece = pieces[at]!;
      const taken = piece.text.slice(used, used + left);
      cut.push({ ...part, text: taken, comments: piece.comments });
      left -= taken.length;
      used += taken.length;
      if (used === piece.text.length) [at, used] = [at + 1, 0];
    }
    return cut;
  });
}

import type { LineComment } from '@/components/lines/commented-words';
import type { LineKind } from '@/lib/domain/sheet';
import type { CommentView } from '@/lib/services/sheet/list-comments';

/** The open comments on one line, numbered as they stand on the whole sheet. */
export function lineCommentsOf(comments: readonly CommentView[], kind: LineKind): LineComment[] {
  return openComments(comments)
    .map(({ id, by, quote, body, anchor, kind: on }, index) => ({
      on,
      comment: { id, number: index + 1, by, quote, body, anchor },
    }))
    .filter(({ on }) => on === kind)
    .map(({ comment }) => comment);
}

export function openComments(comments: readonly CommentView[]): CommentView[] {
  return comments.filter(({ resolved }) => resolved === null);
}

import 'server-only';
import type { Conn } from '@/db/client';
import { listComments } from '@/db/queries/comments';
import { type Anchor, anchorIn } from '@/lib/domain/comments';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import type { LineKind } from '@/lib/domain/sheet';
import type { Opened } from './sheet-state';

export type CommentView = {
  id: string;
  kind: LineKind;
  quote: string;
  body: string;
  by: string;
  at: number;
  /** Where those words stand in the line now. */
  anchor: Anchor;
  resolved: { by: string; at: number } | null;
  maySettle: boolean;
};

/** The comments on a sheet, each found again in the words as they are now. */
export function commentsOf(conn: Conn, actor: Actor, opened: Opened): CommentView[] {
  const mayAll = canActAsEditor(actor) || opened.sheet.authorId === actor.personId;
  return listComments(conn, opened.sheet.id).map(({ comment, kind, person, resolvedBy }) => {
    const text = opened.lines.find(({ line }) => line.id === comment.lineId)?.version.text ?? '';
    const passage = { start: comment.startAt, end: comment.endAt, quote: comment.quote };
    return {
      id: comment.publicId,
      kind,
      quote: comment.quote,
      body: comment.body,
      by: person,
      at: comment.at,
      anchor: anchorIn(text, passage),
      resolved: comment.resolvedAt === null ? null : { by: resolvedBy ?? '', at: comment.resolvedAt },
      maySettle: comment.resolvedAt === null && (mayAll || comment.personId === actor.personId),
    };
  });
}

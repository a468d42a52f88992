import 'server-only';
import { listNumberedStyles, listOpenStyles } from '@/db/queries/house-style';
import type { StyleOrigin, StyleState } from '@/lib/domain/house-style';
import { type Actor, canActAsEditor, canReadCopyDesk } from '@/lib/domain/roles';
import { authorize, type Ctx } from '../context';

export type StyleItem = {
  id: string;
  number: number | null;
  state: StyleState;
  origin: StyleOrigin;
  author: string | null;
  second: string | null;
  note: string;
  at: number;
  isMine: boolean;
};

export type StyleList = { versions: StyleItem[]; open: StyleItem[] };

const LIMIT = 200;

/** Versions that are or were in force, for everybody; what is being written or waits, for editors. */
export function listStyles(actor: Actor, ctx: Pick<Ctx, 'db'>): StyleList {
  authorize(canReadCopyDesk(actor), 'House style is read by the staff of this desk.');
  const item = ({ version, author, second }: ReturnType<typeof listOpenStyles>[number]): StyleItem => ({
    id: version.publicId,
    number: version.number,
    state: version.state,
    origin: version.origin,
    author,
    second,
    note: version.note,
    at: version.inForceAt ?? version.proposedAt ?? version.updatedAt,
    isMine: version.authorId === actor.personId,
  });
  return {
    versions: listNumberedStyles(ctx.db, LIMIT).map(item),
    open: canActAsEditor(actor) ? listOpenStyles(ctx.db, LIMIT).map(item) : [],
  };
}

import 'server-only';
import { z } from 'zod';
import { listActs } from '@/db/queries/clearing';
import { deleteCommentsOf } from '@/db/queries/comments';
import { deleteSheet } from '@/db/queries/sheet';
import { deleteDeskRowsOf } from '@/db/queries/sheet-desk';
import { type Actor, canActAsEditor, canDraftSheets } from '@/lib/domain/roles';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { openSheet, refuseUnless } from './sheet-state';

const schema = z.strictObject({ id: z.string().min(1).max(64) });

/** Deletes a draft that was never filed; its words stay in the history. Whatever was filed once is kept. */
export function discardSheet(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canDraftSheets(actor), 'Only reporters and editors discard drafts.');
  const { id } = parse(schema, input);
  transact(ctx, (tx) => {
    const opened = openSheet(tx, actor, id, ctx.now);
    const isAuthor = opened.sheet.authorId === actor.personId;
    authorize(isAuthor || canActAsEditor(actor), 'Only its author or an editor discards this draft.');
    refuseUnless(
      listActs(tx, opened.sheet.id).length === 0,
      'This sheet was filed once, so it is kept. Only a draft that nobody filed is discarded.',
    );
    deleteCommentsOf(tx, opened.sheet.id);
    deleteDeskRowsOf(tx, opened.sheet.id);
    deleteSheet(tx, opened.sheet.id);
    const entry = {
      action: 'discarded draft',
      entity: 'sheet',
      entityId: id,
      before: { texts: opened.texts },
    };
    appendRecord(tx, { personId: actor.personId, ...entry, releaseId: opened.release.id }, ctx.now);
  });
}

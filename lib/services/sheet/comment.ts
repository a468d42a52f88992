import 'server-only';
import { z } from 'zod';
import { findComment, insertComment, resolveComment as resolve } from '@/db/queries/comments';
import { type Actor, canActAsEditor, canDraftSheets } from '@/lib/domain/roles';
import { LINE_KINDS, type LineState } from '@/lib/domain/sheet';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/security/ids';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { openSheet, refuseUnless } from './sheet-state';

const id = z.string().min(1).max(64);
const schema = z.strictObject({
  id,
  kind: z.enum(LINE_KINDS),
  start: z.number().int().min(0),
  end: z.number().int().min(1),
  /** The words that were on the screen between them. */
  quote: z.string().min(1, 'Select the words that you comment on.').max(5000),
  body: z.string().trim().min(1, 'Say what you mean by it.').max(2000, 'At most 2,000 characters.'),
});

const OPEN: readonly LineState[] = ['draft', 'filed', 'sent-back'];

/** Notes something on a passage of a line. It changes no word, no evidence and no agreement. */
export function addComment(actor: Actor, input: unknown, ctx: Ctx): { id: string } {
  authorize(canDraftSheets(actor), 'Reporters and editors comment on lines.');
  const asked = parse(schema, input);
  return transact(ctx, (tx) => {
    const opened = openSheet(tx, actor, asked.id, ctx.now);
    refuseUnless(OPEN.includes(opened.state), 'Comments are made while words are being written or read.');
    const found = opened.lines.find(({ line }) => line.kind === asked.kind);
    if (!found) throw new AppError('invalid', 'This sheet has no such line.');
    const { start, end, quote, body } = asked;
    refuseUnless(
      found.version.text.slice(start, end) === quote,
      'The words of this line changed meanwhile. Reload the page and select them again.',
    );
    const comment = insertComment(tx, {
      publicId: newId(),
      lineId: found.line.id,
      lineVersionId: found.version.id,
      startAt: start,
      endAt: end,
      quote,
      body,
      personId: actor.personId,
      at: ctx.now,
    });
    const entry = { action: 'commented on sheet', entity: 'sheet', entityId: asked.id };
    const after = { comment: comment.publicId, kind: asked.kind, quote, body };
    appendRecord(tx, { personId: actor.personId, ...entry, after, releaseId: opened.release.id }, ctx.now);
    return { id: comment.publicId };
  });
}

/** Settles a comment: whoever made it, the sheet's author, or an editor. */
export function resolveComment(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canDraftSheets(actor), 'Reporters and editors settle comments.');
  const { id: publicId } = parse(z.strictObject({ id }), input);
  transact(ctx, (tx) => {
    const found = findComment(tx, publicId);
    if (!found) throw new AppError('not-found', 'There is no such comment.');
    const opened = openSheet(tx, actor, found.sheetId, ctx.now);
    const isTheirs = [found.comment.personId, opened.sheet.authorId].includes(actor.personId);
    authorize(
      isTheirs || canActAsEditor(actor),
      'Whoever made a comment settles it, or the author of the sheet, or an editor.',
    );
    refuseUnless(resolve(tx, found.comment.id, actor.personId, ctx.now), 'This comment is settled already.');
    const entry = { action: 'settled comment', entity: 'sheet', entityId: found.sheetId };
    const after = { comment: publicId, kind: found.kind, quote: found.comment.quote };
    appendRecord(tx, { personId: actor.personId, ...entry, after, releaseId: opened.release.id }, ctx.now);
  });
}

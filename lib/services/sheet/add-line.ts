import 'server-only';
import { z } from 'zod';
import { insertLine, insertLineVersion, touchSheet } from '@/db/queries/sheet';
import { isAsPrinted } from '@/lib/domain/as-printed';
import { type Actor, canDraftSheets } from '@/lib/domain/roles';
import { LINE_KIND_NAMES, LINE_KINDS } from '@/lib/domain/sheet';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/security/ids';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { assemble } from './assemble-evidence';
import { openForWriting, renewLines } from './edit-lines';
import { MOVED_ON, refuseUnless } from './sheet-state';

const schema = z.strictObject({
  id: z.string().min(1).max(64),
  version: z.number().int().min(1),
  kind: z.enum(LINE_KINDS),
});

/** Drafts one more kind of line onto a sheet that is being written. It is filed and cleared with the others. */
export function addLine(actor: Actor, input: unknown, ctx: Ctx): { version: number } {
  authorize(canDraftSheets(actor), 'Only reporters and editors write lines.');
  const { id, version, kind } = parse(schema, input);
  return transact(ctx, (tx) => {
    const opened = openForWriting(tx, actor, id, version, ctx.now);
    const name = LINE_KIND_NAMES[kind].toLowerCase();
    refuseUnless(!opened.lines.some(({ line }) => line.kind === kind), `This sheet has its ${name} already.`);
    const assembled = isAsPrinted(opened.sheet) ? null : assemble(tx, opened.sheet, ctx.now);
    const asked = assembled?.requestable.find((one) => one === kind);
    if (!assembled || !asked) {
      const fields = { kind: 'Choose one of the lines that this claim can carry.' };
      throw new AppError('invalid', `This claim carries no ${name}.`, { fields });
    }
    if (opened.state === 'sent-back') renewLines(tx, actor, opened, ctx.now);
    const line = insertLine(tx, { publicId: newId(), sheetId: opened.sheet.id, kind });
    const text = assembled.draftRequested(asked);
    insertLineVersion(tx, {
      publicId: newId(),
      lineId: line.id,
      number: 1,
      draftText: text,
      text,
      state: 'draft',
      templateVersion: assembled.computed.settings.houseStyle.body.templateVersion,
      changedBy: actor.personId,
      changedAt: ctx.now,
    });
    refuseUnless(touchSheet(tx, opened.sheet.id, version), MOVED_ON);
    const entry = { action: 'added line', entity: 'sheet', entityId: id, after: { kind, text } };
    appendRecord(tx, { personId: actor.personId, ...entry, releaseId: opened.release.id }, ctx.now);
    return { version: version + 1 };
  });
}

import 'server-only';
import { z } from 'zod';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import { touchSheet } from '@/db/queries/sheet';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { overrideInput } from '../wording-check/refuse-wording';
import { endFiling, filingOf } from './clear-sheet';
import { applyEdits, lineEdits, renewLines } from './edit-lines';
import { type Filed, fileIn } from './file-sheet';
import { MOVED_ON, openSheet, refuseUnless } from './sheet-state';

const schema = z.strictObject({
  id: z.string().min(1).max(64),
  version: z.number().int().min(1),
  basisHash: z.string().regex(/^[0-9a-f]{64}$/),
  lines: lineEdits,
  override: overrideInput,
});

/**
 * An editor changes filed words. The editor is now the one who agreed by filing; the sheet goes to its author, or
 * to any other reader, for the second agreement.
 */
export function changeFiledSheet(actor: Actor, input: unknown, ctx: Ctx): Filed {
  authorize(canActAsEditor(actor), 'Only an editor changes filed words.');
  const { id, version, basisHash, lines, override } = parse(schema, input);
  return transact(ctx, (tx) => {
    authorize(canActAsEditor(actingNow(tx, actor)), 'Only an editor changes filed words.');
    const opened = openSheet(tx, actor, id, ctx.now);
    refuseUnless(opened.sheet.version === version, MOVED_ON);
    const filing = filingOf(tx, opened);
    const comment = 'Changed by an editor, who agrees to the new words; yours is the second agreement.';
    endFiling(tx, actor, opened, filing, ctx.now, { act: 'sent-back', comment });
    const reopened = openSheet(tx, actor, id, ctx.now);
    applyEdits(tx, actor, reopened, lines, ctx.now);
    return fileIn(
      tx,
      actor,
      { id, version: version + 1, basisHash, override },
      ctx.now,
      'changed filed sheet',
    );
  });
}

const revise = z.strictObject({ id: z.string().min(1).max(64), version: z.number().int().min(1) });

/** Starts a new version of cleared or pulled words. What is cleared stays so until the new version is. */
export function reviseSheet(actor: Actor, input: unknown, ctx: Ctx): { version: number } {
  const { id, version } = parse(revise, input);
  return transact(ctx, (tx) => {
    const opened = openSheet(tx, actor, id, ctx.now);
    const isAuthor = opened.sheet.authorId === actor.personId && actor.roles.includes('reporter');
    authorize(isAuthor || canActAsEditor(actor), 'Only its author or an editor writes on this sheet.');
    refuseUnless(opened.sheet.version === version, MOVED_ON);
    refuseUnless(
      opened.state === 'cleared' || opened.state === 'pulled',
      'A new version starts from cleared or pulled words.',
    );
    renewLines(tx, actor, opened, ctx.now);
    const entry = { action: 'started new version', entity: 'sheet', entityId: opened.sheet.publicId };
    const change = { before: { state: opened.state }, after: { state: 'draft' } };
    appendRecord(
      tx,
      { personId: actor.personId, ...entry, ...change, releaseId: opened.release.id },
      ctx.now,
    );
    refuseUnless(touchSheet(tx, opened.sheet.id, version), MOVED_ON);
    return { version: version + 1 };
  });
}

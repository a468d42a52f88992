import 'server-only';
import { z } from 'zod';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { pullIn } from './pull-in';
import { openSheet } from './sheet-state';

const schema = z.strictObject({
  id: z.string().min(1).max(64),
  reason: z.string().trim().min(10, 'Say in a sentence why the words are withdrawn.').max(2000),
});

/** Withdraws cleared words and their chart at once. One editor is enough: pulling is never held up. */
export function pullSheet(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canActAsEditor(actor), 'Only an editor pulls cleared words.');
  const { id, reason } = parse(schema, input);
  transact(ctx, (tx) => {
    const opened = openSheet(tx, actor, id, ctx.now);
    const embed = pullIn(tx, actor, opened.sheet, reason, ctx.now);
    const releaseId = opened.release.id;
    const entry = { action: 'pulled sheet', entity: 'sheet', entityId: opened.sheet.publicId, reason };
    const [before, after] = [{ state: 'cleared' }, { state: 'pulled', embed: embed?.publicId ?? null }];
    appendRecord(tx, { personId: actor.personId, ...entry, before, after, releaseId }, ctx.now);
  });
}

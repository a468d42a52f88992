import 'server-only';
import { z } from 'zod';
import { findEmbedOfSheet, pullEmbedVersions } from '@/db/queries/embed';
import { insertClearing } from '@/db/queries/clearing';
import { isReleasePublic, listClearedLines, moveLineVersions, touchSheet } from '@/db/queries/sheet';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import { newId } from '@/lib/security/ids';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { enqueuePurgeIn } from '../jobs/enqueue-purge';
import { tellIn } from '../outbox/tell-in';
import { markSiblings } from './languages';
import { MOVED_ON, openSheet, refuseUnless } from './sheet-state';

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
    const cleared = listClearedLines(tx, opened.sheet.id).map(({ version }) => version.id);
    refuseUnless(cleared.length > 0, 'Nothing of this sheet is cleared now.');
    const change = { state: 'pulled' as const, pullReason: reason };
    refuseUnless(moveLineVersions(tx, cleared, 'cleared', change), MOVED_ON);
    insertClearing(
      tx,
      {
        publicId: newId(),
        sheetId: opened.sheet.id,
        evidenceId: null,
        act: 'pulled',
        personId: actor.personId,
        roles: JSON.stringify(actor.roles),
        comment: reason,
        at: ctx.now,
      },
      cleared,
    );
    const embed = findEmbedOfSheet(tx, opened.sheet.id);
    const wasSeen = isReleasePublic(tx, opened.release.id, ctx.now);
    const releaseId = opened.release.id;
    if (embed) {
      pullEmbedVersions(tx, embed.id, ctx.now, !wasSeen);
      const event = `pulled-${opened.sheet.version}`;
      enqueuePurgeIn(tx, { of: 'embed', id: embed.publicId }, event, ctx.now, { releaseId });
    }
    tellIn(tx, { kind: 'sheet-pulled', entity: 'sheet', entityId: id, releaseId }, ctx.now);
    refuseUnless(touchSheet(tx, opened.sheet.id, opened.sheet.version), MOVED_ON);
    markSiblings(tx, opened.sheet, 'pulled', ctx.now);
    const entry = { action: 'pulled sheet', entity: 'sheet', entityId: opened.sheet.publicId, reason };
    const [before, after] = [{ state: 'cleared' }, { state: 'pulled', embed: embed?.publicId ?? null }];
    appendRecord(tx, { personId: actor.personId, ...entry, before, after, releaseId }, ctx.now);
  });
}

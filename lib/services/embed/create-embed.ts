import 'server-only';
import { z } from 'zod';
import { findLastAct } from '@/db/queries/clearing';
import { findEmbedOfSheet, insertEmbed, insertEmbedVersion } from '@/db/queries/embed';
import { findSheet, listClearedLines } from '@/db/queries/sheet';
import { type Actor, canMakeEmbeds } from '@/lib/domain/roles';
import { isAsPrinted } from '@/lib/domain/as-printed';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/security/ids';
import { refuseUnderBan } from '../bans/hold';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { enqueuePurgeIn } from '../jobs/enqueue-purge';

const schema = z.strictObject({ sheetId: z.string().min(1).max(64) });

/** Makes the embed of a cleared sheet; asked again, it gives the same one. */
export function createEmbed(actor: Actor, input: unknown, ctx: Ctx): { id: string } {
  authorize(canMakeEmbeds(actor), 'Embeds are made by reporters, editors and the copy desk.');
  const { sheetId } = parse(schema, input);
  return transact(ctx, (tx) => {
    const found = findSheet(tx, sheetId, actor, ctx.now);
    if (!found) throw new AppError('not-found', 'There is no such sheet.');
    const before = findEmbedOfSheet(tx, found.sheet.id);
    if (before) return { id: before.publicId };
    if (isAsPrinted(found.sheet))
      throw new AppError('conflict', 'Figures as printed have no chart: an embed shows what they support.');
    refuseUnderBan(tx, found.release.raceId, ctx.now);
    const cleared = findLastAct(tx, found.sheet.id, 'cleared');
    if (listClearedLines(tx, found.sheet.id).length === 0 || !cleared?.evidenceId)
      throw new AppError('conflict', 'An embed is made from cleared words, and these are not cleared now.');
    const embed = insertEmbed(tx, {
      publicId: newId(),
      sheetId: found.sheet.id,
      createdBy: actor.personId,
      createdAt: ctx.now,
    });
    const number = insertEmbedVersion(tx, embed.id, cleared.evidenceId, ctx.now);
    const releaseId = found.release.id;
    enqueuePurgeIn(tx, { of: 'embed', id: embed.publicId }, `version-${number}`, ctx.now, { releaseId });
    const entry = {
      action: 'made embed',
      entity: 'embed',
      entityId: embed.publicId,
      after: { sheet: sheetId },
    };
    appendRecord(tx, { personId: actor.personId, ...entry, releaseId }, ctx.now);
    return { id: embed.publicId };
  });
}

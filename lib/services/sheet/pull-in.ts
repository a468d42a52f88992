import 'server-only';
import type { Tx } from '@/db/client';
import { insertClearing } from '@/db/queries/clearing';
import { type EmbedRow, findEmbedOfSheet, pullEmbedVersions } from '@/db/queries/embed';
import {
  isReleasePublic,
  listClearedLines,
  moveLineVersions,
  type SheetRow,
  touchSheet,
} from '@/db/queries/sheet';
import type { Actor } from '@/lib/domain/roles';
import { newId } from '@/lib/security/ids';
import { enqueuePurgeIn } from '../jobs/enqueue-purge';
import { tellIn } from '../outbox/tell-in';
import { markSiblings } from './languages';
import { MOVED_ON, refuseUnless } from './sheet-state';

/** Withdraws cleared words and everything their chart ever showed. The embed, where there is one, comes back. */
export function pullIn(tx: Tx, actor: Actor, sheet: SheetRow, reason: string, now: number): EmbedRow | null {
  const cleared = listClearedLines(tx, sheet.id).map(({ version }) => version.id);
  refuseUnless(cleared.length > 0, 'Nothing of this sheet is cleared now.');
  const change = { state: 'pulled' as const, pullReason: reason };
  refuseUnless(moveLineVersions(tx, cleared, 'cleared', change), MOVED_ON);
  insertClearing(
    tx,
    {
      publicId: newId(),
      sheetId: sheet.id,
      evidenceId: null,
      act: 'pulled',
      personId: actor.personId,
      roles: JSON.stringify(actor.roles),
      comment: reason,
      at: now,
    },
    cleared,
  );
  const { releaseId } = sheet;
  const embed = findEmbedOfSheet(tx, sheet.id);
  if (embed) {
    pullEmbedVersions(tx, embed.id, now, !isReleasePublic(tx, releaseId, now));
    const event = `pulled-${sheet.version}`;
    enqueuePurgeIn(tx, { of: 'embed', id: embed.publicId }, event, now, { releaseId });
  }
  tellIn(tx, { kind: 'sheet-pulled', entity: 'sheet', entityId: sheet.publicId, releaseId }, now);
  refuseUnless(touchSheet(tx, sheet.id, sheet.version), MOVED_ON);
  markSiblings(tx, sheet, 'pulled', now);
  return embed;
}

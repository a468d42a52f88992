import 'server-only';
import type { Tx } from '@/db/client';
import { insertLine, insertLineVersion, insertSheet, type SheetRow } from '@/db/queries/sheet';
import type { Actor } from '@/lib/domain/roles';
import type { LineKind, LineText } from '@/lib/domain/sheet';
import { newId } from '@/lib/security/ids';
import { appendRecord } from '../history/append-record';

type NewSheet = Parameters<typeof insertSheet>[1];

/** A new sheet with its drafted lines, and its entry in the history. */
export function storeSheet(
  tx: Tx,
  actor: Actor,
  sheet: Omit<NewSheet, 'authorId' | 'createdAt'>,
  drafted: { draft: readonly LineText[]; templateVersion: string; knockedOut: readonly LineKind[] },
  told: { release: string },
  now: number,
): SheetRow {
  const stored = insertSheet(tx, { ...sheet, authorId: actor.personId, createdAt: now });
  for (const { kind, text } of drafted.draft) {
    const knockedOut = drafted.knockedOut.includes(kind);
    const line = insertLine(tx, { publicId: newId(), sheetId: stored.id, kind, knockedOut });
    insertLineVersion(tx, {
      publicId: newId(),
      lineId: line.id,
      number: 1,
      draftText: text,
      text,
      state: 'draft',
      templateVersion: drafted.templateVersion,
      changedBy: actor.personId,
      changedAt: now,
    });
  }
  const entry = { action: 'drafted sheet', entity: 'sheet', entityId: stored.publicId };
  const after = { release: told.release, claim: sheet.claim, language: sheet.language, draft: drafted.draft };
  appendRecord(tx, { personId: actor.personId, ...entry, after, releaseId: stored.releaseId }, now);
  return stored;
}

import 'server-only';
import type { Tx } from '@/db/client';
import type { CorrectionRow } from '@/db/queries/corrections';
import type { Consequence } from '@/lib/domain/corrections';
import type { Actor } from '@/lib/domain/roles';
import { appendRecord } from '../history/append-record';
import { tellIn } from '../outbox/tell-in';

/** The history tells what was corrected, why, and what it did to everything in print. */
export function recordCorrection(
  tx: Tx,
  actor: Actor,
  told: {
    action: string;
    row: CorrectionRow;
    releaseId: string;
    preview: { changed: readonly string[]; consequences: readonly Consequence[] };
    facts?: { before: unknown; after: unknown };
  },
  now: number,
): void {
  const { action, row, releaseId, preview, facts } = told;
  const news = { entity: 'release' as const, entityId: releaseId, releaseId: row.releaseId };
  if (action === 'corrected release')
    tellIn(tx, { kind: 'release-corrected', ...news, refs: { correction: row.publicId } }, now);
  const effects = preview.consequences.map(({ sheetId, effect }) => ({ sheet: sheetId, effect }));
  appendRecord(
    tx,
    {
      personId: actor.personId,
      action,
      entity: 'release',
      entityId: releaseId,
      releaseId: row.releaseId,
      ...(facts ? { before: facts.before } : {}),
      after: {
        correction: row.publicId,
        whose: row.whose,
        changed: preview.changed,
        effects,
        ...(facts ? { release: facts.after } : {}),
      },
      reason: row.explanation,
    },
    now,
  );
}

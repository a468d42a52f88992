import 'server-only';
import type { Conn, Tx } from '@/db/client';
import { findEvidence, findLastAct } from '@/db/queries/clearing';
import { findLatestHouseStyle } from '@/db/queries/desk';
import { findTerms } from '@/db/queries/sheet-desk';
import { listClearedLines, type SheetRow } from '@/db/queries/sheet';
import { shelfEnd } from '@/lib/domain/currency';
import { readEnv } from '@/lib/env';
import { readStyle } from '../house-style/style-body';
import { enqueueIn } from '../jobs/enqueue';
import { dayStart } from '../wall-time';

/** The clearing that stands now, and the first day on which its words are no longer current; null where none is set. */
export function shelfEndOf(conn: Conn, sheet: SheetRow): { clearing: string; endedOn: string } | null {
  const act = findLastAct(conn, sheet.id, 'cleared');
  if (!act?.evidenceId || listClearedLines(conn, sheet.id).length === 0) return null;
  const style = findLatestHouseStyle(conn);
  const days = findTerms(conn, sheet.id)?.shelfDays ?? (style ? readStyle(style.body).shelfLifeDays : null);
  if (days === null) return null;
  const { release } = JSON.parse(findEvidence(conn, act.evidenceId)!.bytes.toString('utf8')) as {
    release: { fieldEndOn: string };
  };
  return { clearing: act.publicId, endedOn: shelfEnd(release.fieldEndOn, days) };
}

/** Has the end of a shelf life told when it comes. What is past already is told by no one: its words say so. */
export function enqueueShelfEndIn(tx: Tx, sheet: SheetRow, now: number): void {
  const end = shelfEndOf(tx, sheet);
  if (!end) return;
  const runAt = dayStart(end.endedOn, readEnv().LEADLINE_ZONE);
  if (runAt <= now) return;
  enqueueIn(
    tx,
    {
      kind: 'shelf-ended',
      payload: { sheet: sheet.publicId, ...end },
      idempotencyKey: `shelf-ended:${end.clearing}:${end.endedOn}`,
      runAt,
      releaseId: sheet.releaseId,
    },
    now,
  );
}

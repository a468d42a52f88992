import 'server-only';
import type { Conn } from '@/db/client';
import { countClearedSheetsOn } from '@/db/queries/sheet';

/** Why the figures of a release may not change now, or null where they may. */
export function whyNotRevised(conn: Conn, releaseId: number): string | null {
  return countClearedSheetsOn(conn, releaseId) > 0
    ? 'Cleared words rest on these figures: pull them before they change.'
    : null;
}

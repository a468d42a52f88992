import 'server-only';
import type { Conn } from '@/db/client';
import { findStagedCorrection } from '@/db/queries/corrections';
import { countClearedSheetsOn } from '@/db/queries/sheet';

/** Why the figures of a release may not change now, or null where they may. */
export function whyNotRevised(conn: Conn, releaseId: number): string | null {
  if (findStagedCorrection(conn, releaseId))
    return 'A correction of this release is staged: it is applied or withdrawn first.';
  return countClearedSheetsOn(conn, releaseId) > 0
    ? 'Cleared words rest on these figures: correct the release, and see what that does to them.'
    : null;
}

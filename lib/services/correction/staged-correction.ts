import 'server-only';
import { findStagedCorrection } from '@/db/queries/corrections';
import { type Actor, canReadUnpublished } from '@/lib/domain/roles';
import { authorize, type Ctx } from '../context';
import { findVisibleRelease } from '../release/get-release';

/** The correction that a release waits for, or null. */
export function stagedCorrectionOf(actor: Actor, releaseId: string, ctx: Ctx): string | null {
  authorize(canReadUnpublished(actor), 'Releases are read by reporters and editors.');
  const release = findVisibleRelease(actor, releaseId, ctx);
  return findStagedCorrection(ctx.db, release.id)?.publicId ?? null;
}

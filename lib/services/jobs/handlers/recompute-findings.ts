import 'server-only';
import * as z from 'zod';
import type { Tx } from '@/db/client';
import { countCurrentVersions, listCurrentVersionIds } from '@/db/queries/job-subjects';
import { ENGINE_VERSION } from '@/lib/findings/engine-version';
import { computeFindings } from '../../release/compute-findings';
import { indexFindings } from '../../release/index-findings';
import { readDeskSettings } from '../../setup/desk-settings';
import { FINISHED, type Handler } from '../handler';

const BATCH = 25;
const cursorSchema = z.strictObject({ before: z.number().int(), failed: z.number().int() }).nullable();

/**
 * Computes what every release supports under the policy in force, newest first, so that the list is right soonest
 * where it is read. A policy that comes into force meanwhile has a job of its own, and this one ends.
 */
export const recomputeFindings: Handler<'recompute-findings'> = (job, ctx) => (tx) => {
  const { policy, engine } = job.payload;
  if (readDeskSettings(tx).policy.version !== policy || engine !== ENGINE_VERSION)
    return { ...FINISHED, progress: { done: job.done, total: null, note: 'A newer one took over.' } };
  const cursor = cursorSchema.parse(job.cursor);
  const versionIds = listCurrentVersionIds(tx, cursor?.before ?? null, BATCH);
  const failed = (cursor?.failed ?? 0) + versionIds.filter((id) => !recompute(tx, id, ctx.now)).length;
  const done = job.done + versionIds.length;
  const last = versionIds.at(-1);
  return {
    cursor: last === undefined || versionIds.length < BATCH ? null : { before: last, failed },
    progress: { done, total: Math.max(done, countCurrentVersions(tx)), note: noteOf(failed) },
  };
};

/** One release that cannot be computed holds up no other; the list goes on saying that its marks are missing. */
function recompute(tx: Tx, versionId: number, now: number): boolean {
  try {
    indexFindings(tx, versionId, computeFindings(tx, versionId, now));
    return true;
  } catch (error) {
    console.error(new Error(`release version ${versionId} could not be computed anew`, { cause: error }));
    return false;
  }
}

function noteOf(failed: number): string | null {
  if (failed === 0) return null;
  return failed === 1 ? 'One release could not be computed.' : `${failed} releases could not be computed.`;
}

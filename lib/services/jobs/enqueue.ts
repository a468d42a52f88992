import 'server-only';
import type { Tx } from '@/db/client';
import { findJobByKey, insertJob, updateJobIn } from '@/db/queries/jobs';
import { JOB_PAYLOADS, type JobKind, type JobPayload } from '@/lib/domain/jobs';
import { canonicalJson } from '@/lib/security/canonical';
import { newId } from '@/lib/security/ids';

export type Enqueued<Kind extends JobKind> = {
  kind: Kind;
  payload: JobPayload<Kind>;
  /** What is done once under this key is done. */
  idempotencyKey: string;
  /** Not before this instant; without it, at once. */
  runAt?: number;
  /** The release whose embargo hides what it is about. */
  releaseId?: number;
  askedBy?: number;
};

/**
 * Promises work inside the change that needs it. One that waits under the same key moves to the earlier time; one
 * that was given up or cancelled is taken up again; one that runs or is done is not repeated.
 */
export function enqueueIn<Kind extends JobKind>(tx: Tx, job: Enqueued<Kind>, now: number): void {
  const { kind, idempotencyKey, runAt = now, releaseId = null, askedBy = null } = job;
  const payload = canonicalJson(JOB_PAYLOADS[kind].parse(job.payload));
  const before = findJobByKey(tx, idempotencyKey);
  if (!before) {
    const row = { kind, payload, idempotencyKey, runAt, releaseId, askedBy };
    insertJob(tx, { publicId: newId(), ...row, state: 'waiting', createdAt: now });
  } else if (before.state === 'waiting') {
    updateJobIn(tx, before.id, 'waiting', { runAt: Math.min(before.runAt, runAt) });
  }
}

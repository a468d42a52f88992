import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { findJob, type JobRow, updateJobIn } from '@/db/queries/jobs';
import { type Actor, canManageJobs } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';

const schema = z.strictObject({ id: z.string().min(1).max(64) });
const ONLY = 'Administrators decide about the work behind the screens.';

/** Ends a job that waits; one that runs ends after the step in hand. */
export function cancelJob(actor: Actor, input: unknown, ctx: Ctx): { state: 'cancelled' | 'running' } {
  authorize(canManageJobs(actor), ONLY);
  const { id } = parse(schema, input);
  return transact(ctx, (tx) => {
    const { acting, job } = openJob(tx, actor, id);
    const asked = { cancelRequestedAt: ctx.now, cancelRequestedBy: acting.personId };
    if (job.state === 'running') {
      refuseUnless(job.cancelRequestedAt === null, 'It was asked to stop already, and ends after this step.');
      updateJobIn(tx, job.id, 'running', asked);
      record(tx, acting, job, { action: 'asked job to stop', state: 'running' }, ctx.now);
      return { state: 'running' };
    }
    refuseUnless(job.state === 'waiting' || job.state === 'dead', 'This job has ended. Reload the page.');
    updateJobIn(tx, job.id, job.state, { ...asked, state: 'cancelled', endedAt: ctx.now });
    record(tx, acting, job, { action: 'cancelled job', state: 'cancelled' }, ctx.now);
    return { state: 'cancelled' };
  });
}

/** Takes up again, from where it had got to, a job that was given up or cancelled. */
export function retryJob(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canManageJobs(actor), ONLY);
  const { id } = parse(schema, input);
  transact(ctx, (tx) => {
    const { acting, job } = openJob(tx, actor, id);
    refuseUnless(
      job.state === 'dead' || job.state === 'cancelled',
      'This job was not given up, or somebody tried it again meanwhile. Reload the page.',
    );
    updateJobIn(tx, job.id, job.state, {
      state: 'waiting',
      runAt: ctx.now,
      attempts: 0,
      askedBy: acting.personId,
      endedAt: null,
      cancelRequestedAt: null,
      cancelRequestedBy: null,
    });
    record(tx, acting, job, { action: 'tried job again', state: 'waiting' }, ctx.now);
  });
}

function openJob(tx: Tx, actor: Actor, id: string): { acting: Actor; job: JobRow } {
  const acting = actingNow(tx, actor);
  authorize(canManageJobs(acting), ONLY);
  const job = findJob(tx, id);
  if (!job) throw new AppError('not-found', 'There is no such job.');
  return { acting, job };
}

function refuseUnless(condition: boolean, message: string): void {
  if (!condition) throw new AppError('conflict', message);
}

function record(
  tx: Tx,
  actor: Actor,
  job: JobRow,
  { action, state }: { action: string; state: JobRow['state'] },
  now: number,
): void {
  const subject = { entity: 'job', entityId: job.publicId, releaseId: job.releaseId ?? undefined };
  const change = { before: { state: job.state }, after: { kind: job.kind, state } };
  appendRecord(tx, { personId: actor.personId, action, ...subject, ...change }, now);
}

import 'server-only';
import type { Tx } from '@/db/client';
import { findDueJob, findHeldJob, type JobRow, updateHeldJob, updateJobIn } from '@/db/queries/jobs';
import { type JobKind, MAX_ATTEMPTS, retryAt } from '@/lib/domain/jobs';
import { newId } from '@/lib/security/ids';
import { type Ctx, transact } from '../context';

/** So long a job belongs to its process without a word from it; every step and every sign of life renews it. */
export const LEASE_MS = 30_000;

/** A job in hand: nobody else writes to it while the lease holds. */
export type Claim = { job: JobRow; leaseBy: string };

export type Progress = { done: number; total: number | null; note: string | null };

/** Where a step left the job: the cursor to go on from, or null where nothing is left to do. */
export type StepEnd = { cursor: unknown; progress?: Progress };

/** Somebody else holds the job by now, since this process was silent for too long. */
export class LeaseLost extends Error {
  override readonly name = 'LeaseLost';
}

const WORN_OUT = 'The process ended each time while it worked on this.';

/** Takes the job that is due longest, waiting or left behind; null where none is due. */
export function claimDue(ctx: Ctx, kinds: readonly JobKind[]): Claim | null {
  if (!findDueJob(ctx.db, kinds, ctx.now)) return null;
  return transact(ctx, (tx) => {
    for (;;) {
      const job = findDueJob(tx, kinds, ctx.now);
      if (!job) return null;
      if (job.cancelRequestedAt !== null) updateJobIn(tx, job.id, job.state, ended('cancelled', ctx.now));
      else if (job.attempts >= MAX_ATTEMPTS)
        updateJobIn(tx, job.id, job.state, {
          ...ended('dead', ctx.now),
          lastError: job.lastError ?? WORN_OUT,
        });
      else return hold(tx, job, ctx.now);
    }
  });
}

function hold(tx: Tx, job: JobRow, now: number): Claim {
  const leaseBy = newId();
  updateJobIn(tx, job.id, job.state, {
    state: 'running',
    attempts: job.attempts + 1,
    leaseBy,
    leaseUntil: now + LEASE_MS,
    startedAt: job.startedAt ?? now,
  });
  return { job: findHeldJob(tx, job.id, leaseBy)!, leaseBy };
}

const ended = (state: 'done' | 'dead' | 'cancelled', now: number) => ({
  state,
  endedAt: now,
  leaseBy: null,
  leaseUntil: null,
});

/** False where the job belongs to somebody else by now. */
export function renewLease(ctx: Ctx, { job, leaseBy }: Claim): boolean {
  return transact(ctx, (tx) => updateHeldJob(tx, job.id, leaseBy, { leaseUntil: ctx.now + LEASE_MS }));
}

/**
 * What a step does to the database, how far the job came, and its end where it was the last one or was asked to stop:
 * all in one transaction, so that a crash leaves the step done or not done.
 * @returns the job as it goes on, or null where it ended
 * @throws LeaseLost with nothing written
 */
export function saveStep(ctx: Ctx, claim: Claim, effects: (tx: Tx) => StepEnd): Claim | null {
  return transact(ctx, (tx) => {
    const { job } = claim;
    const held = heldIn(tx, claim);
    const { cursor, progress } = effects(tx);
    const isFinished = cursor === null;
    const end = isFinished ? 'done' : held.cancelRequestedAt === null ? null : 'cancelled';
    updateHeldJob(tx, job.id, claim.leaseBy, {
      cursor: isFinished ? held.cursor : JSON.stringify(cursor),
      attempts: 1,
      lastError: null,
      ...(progress
        ? { progressDone: progress.done, progressTotal: progress.total, progressNote: progress.note }
        : {}),
      ...(end ? ended(end, ctx.now) : { leaseUntil: ctx.now + LEASE_MS }),
    });
    return end ? null : { ...claim, job: findHeldJob(tx, job.id, claim.leaseBy)! };
  });
}

/** After a failure: tried again later, longer each time, and given up after the last time. */
export function fail(ctx: Ctx, claim: Claim, error: string, isHopeless = false): 'waiting' | 'dead' {
  return transact(ctx, (tx) => {
    const held = heldIn(tx, claim);
    const isLast = isHopeless || held.attempts >= MAX_ATTEMPTS;
    const next = isLast
      ? ended('dead', ctx.now)
      : { ...FREE, state: 'waiting' as const, runAt: retryAt(ctx.now, held.attempts) };
    updateHeldJob(tx, held.id, claim.leaseBy, { ...next, lastError: error.slice(0, 500) });
    return isLast ? 'dead' : 'waiting';
  });
}

/** The process was asked to stop between two steps: the job waits for the next one, and no attempt is counted. */
export function putBack(ctx: Ctx, claim: Claim): void {
  transact(ctx, (tx) => {
    const held = heldIn(tx, claim);
    const set = { ...FREE, state: 'waiting' as const, attempts: Math.max(0, held.attempts - 1) };
    updateHeldJob(tx, held.id, claim.leaseBy, set);
  });
}

const FREE = { leaseBy: null, leaseUntil: null };

function heldIn(tx: Tx, { job, leaseBy }: Claim): JobRow {
  const held = findHeldJob(tx, job.id, leaseBy);
  if (!held) throw new LeaseLost(`job ${job.publicId} belongs to another process by now`);
  return held;
}

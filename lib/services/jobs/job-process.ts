import 'server-only';
import { endLeases, findJobProcess, putJobProcess } from '@/db/queries/jobs';
import { isAnswering } from '@/lib/domain/jobs';
import type { Db } from '@/db/client';
import { type Ctx, transact } from '../context';

/**
 * Enters this process as the one that runs jobs. What the one before it held is free at once where that one is known
 * to be dead, else when its leases end.
 */
export function enterJobProcess(ctx: Ctx, pid: number, isAlive: (pid: number) => boolean): void {
  transact(ctx, (tx) => {
    const before = findJobProcess(tx);
    if (before && (before.pid === pid || !isAlive(before.pid))) endLeases(tx, ctx.now);
    putJobProcess(tx, { pid, startedAt: ctx.now, beatAt: ctx.now });
  });
}

/** A sign of life; a process that another has taken over from gives none. */
export function beat(ctx: Ctx, pid: number): void {
  transact(ctx, (tx) => {
    const own = findJobProcess(tx);
    if (own?.pid === pid) putJobProcess(tx, { pid, startedAt: own.startedAt, beatAt: ctx.now });
  });
}

export type JobProcessView = {
  state: 'answering' | 'silent' | 'never-started';
  beatAt: number | null;
  startedAt: number | null;
};

export function viewJobProcess(db: Db, now: number): JobProcessView {
  const row = findJobProcess(db);
  if (!row) return { state: 'never-started', beatAt: null, startedAt: null };
  const { beatAt, startedAt } = row;
  return { state: isAnswering(beatAt, now) ? 'answering' : 'silent', beatAt, startedAt };
}

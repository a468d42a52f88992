import 'server-only';
import { and, asc, count, desc, eq, inArray, lte, or, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { Conn } from '@/db/client';
import { people } from '@/db/schema/people';
import { pollsters, races } from '@/db/schema/races';
import { jobProcess, jobs } from '@/db/schema/records';
import { releases } from '@/db/schema/releases';
import type { JobKind, JobState } from '@/lib/domain/jobs';
import { type Viewer, visible } from './visible';

export type JobRow = typeof jobs.$inferSelect;

export function insertJob(conn: Conn, row: typeof jobs.$inferInsert): JobRow {
  return conn.insert(jobs).values(row).returning().get();
}

export function findJobByKey(conn: Conn, idempotencyKey: string): JobRow | null {
  return conn.select().from(jobs).where(eq(jobs.idempotencyKey, idempotencyKey)).get() ?? null;
}

export function findJob(conn: Conn, publicId: string): JobRow | null {
  return conn.select().from(jobs).where(eq(jobs.publicId, publicId)).get() ?? null;
}

/** False where it was in another state meanwhile. */
export function updateJobIn(
  conn: Conn,
  id: number,
  state: JobState,
  set: Partial<typeof jobs.$inferInsert>,
): boolean {
  const where = and(eq(jobs.id, id), eq(jobs.state, state));
  return conn.update(jobs).set(set).where(where).run().changes === 1;
}

/** What is due and free: waiting until now, or left behind by whoever had it. */
function isDue(kinds: readonly JobKind[], now: number) {
  return and(
    inArray(jobs.kind, [...kinds]),
    or(
      and(eq(jobs.state, 'waiting'), lte(jobs.runAt, now)),
      and(eq(jobs.state, 'running'), lte(jobs.leaseUntil, now)),
    ),
  );
}

export function findDueJob(conn: Conn, kinds: readonly JobKind[], now: number): JobRow | null {
  const due = conn.select().from(jobs).where(isDue(kinds, now));
  return due.orderBy(asc(jobs.runAt), asc(jobs.id)).limit(1).get() ?? null;
}

/** When the next job of these kinds is due, which may be in the past; null where none waits. */
export function nextRunAt(conn: Conn, kinds: readonly JobKind[]): number | null {
  const row = conn
    .select({
      at: sql<
        number | null
      >`min(case ${jobs.state} when 'waiting' then ${jobs.runAt} else ${jobs.leaseUntil} end)`,
    })
    .from(jobs)
    .where(and(inArray(jobs.kind, [...kinds]), inArray(jobs.state, ['waiting', 'running'])))
    .get();
  return row?.at ?? null;
}

/** Writes to a running job for whoever holds its lease; false where somebody else does by now. */
export function updateHeldJob(
  conn: Conn,
  id: number,
  leaseBy: string,
  set: Partial<typeof jobs.$inferInsert>,
): boolean {
  const where = and(eq(jobs.id, id), eq(jobs.state, 'running'), eq(jobs.leaseBy, leaseBy));
  return conn.update(jobs).set(set).where(where).run().changes === 1;
}

export function findHeldJob(conn: Conn, id: number, leaseBy: string): JobRow | null {
  const where = and(eq(jobs.id, id), eq(jobs.state, 'running'), eq(jobs.leaseBy, leaseBy));
  return conn.select().from(jobs).where(where).get() ?? null;
}

/** Gives back everything that a process held which is known to be dead. */
export function endLeases(conn: Conn, now: number): number {
  return conn.update(jobs).set({ leaseUntil: now }).where(eq(jobs.state, 'running')).run().changes;
}

const askers = alias(people, 'askers');
const cancellers = alias(people, 'cancellers');

/** Jobs in some states with who asked and, as far as this viewer may know it, whose poll they are about. */
export function listJobsIn(
  conn: Conn,
  states: readonly JobState[],
  order: 'soonest' | 'latest',
  limit: number,
  viewer: Viewer,
  now: number,
) {
  return conn
    .select({
      job: jobs,
      askedBy: askers.name,
      cancelledBy: cancellers.name,
      race: races.name,
      pollster: pollsters.name,
      isVisible: sql<number>`(${visible(conn, viewer, now)})`.mapWith(Boolean),
    })
    .from(jobs)
    .leftJoin(askers, eq(askers.id, jobs.askedBy))
    .leftJoin(cancellers, eq(cancellers.id, jobs.cancelRequestedBy))
    .leftJoin(releases, eq(releases.id, jobs.releaseId))
    .leftJoin(races, eq(races.id, releases.raceId))
    .leftJoin(pollsters, eq(pollsters.id, releases.pollsterId))
    .where(inArray(jobs.state, [...states]))
    .orderBy(...(order === 'soonest' ? [asc(jobs.runAt), asc(jobs.id)] : [desc(jobs.endedAt), desc(jobs.id)]))
    .limit(limit)
    .all();
}

export function countJobsIn(conn: Conn, state: JobState): number {
  return conn.select({ count: count() }).from(jobs).where(eq(jobs.state, state)).get()?.count ?? 0;
}

export type JobProcessRow = typeof jobProcess.$inferSelect;

export function findJobProcess(conn: Conn): JobProcessRow | null {
  return conn.select().from(jobProcess).limit(1).get() ?? null;
}

export function putJobProcess(conn: Conn, row: { pid: number; startedAt: number; beatAt: number }): void {
  conn
    .insert(jobProcess)
    .values({ id: 1, ...row })
    .onConflictDoUpdate({ target: jobProcess.id, set: row })
    .run();
}

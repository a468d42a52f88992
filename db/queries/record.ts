import 'server-only';
import { and, desc, eq, lt, type SQL, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { Conn } from '@/db/client';
import { people } from '@/db/schema/people';
import { pollsters, races } from '@/db/schema/races';
import { records } from '@/db/schema/records';
import { releases } from '@/db/schema/releases';
import { isPublic, type Viewer, visible } from './visible';

export type RecordRow = typeof records.$inferSelect;

export function findLastRecord(conn: Conn): RecordRow | null {
  return conn.select().from(records).orderBy(desc(records.seq)).limit(1).get() ?? null;
}

export function findRecord(conn: Conn, seq: number): RecordRow | null {
  return conn.select().from(records).where(eq(records.seq, seq)).get() ?? null;
}

export function insertRecord(conn: Conn, row: RecordRow): void {
  conn.insert(records).values(row).run();
}

export function listAllRecords(conn: Conn): RecordRow[] {
  return conn.select().from(records).orderBy(records.seq).all();
}

export type RecordPage = {
  before: number | null;
  limit: number;
  entity: string | null;
  entityId: string | null;
};

/** The person whom an entry is about, apart from the one who acted. */
const subjects = alias(people, 'subjects');

/**
 * Newest first, with the actor's name, whether the embargo of its release lets this viewer see what changed, and
 * the names of the person or release that it is about.
 */
export function listRecords(conn: Conn, page: RecordPage, viewer: Viewer, now: number) {
  const conditions: SQL[] = [];
  if (page.before !== null) conditions.push(lt(records.seq, page.before));
  if (page.entity !== null) conditions.push(eq(records.entity, page.entity));
  if (page.entityId !== null) conditions.push(eq(records.entityId, page.entityId));
  return conn
    .select({
      record: records,
      person: people.name,
      subject: subjects.name,
      race: races.name,
      pollster: pollsters.name,
      raceId: releases.raceId,
      isVisible: sql<number>`(${visible(conn, viewer, now)})`.mapWith(Boolean),
      isHeld: sql<number>`(not (${isPublic(now)}))`.mapWith(Boolean),
    })
    .from(records)
    .leftJoin(people, eq(people.id, records.personId))
    .leftJoin(subjects, and(eq(records.entity, 'person'), eq(subjects.publicId, records.entityId)))
    .leftJoin(releases, eq(releases.id, records.releaseId))
    .leftJoin(races, eq(races.id, releases.raceId))
    .leftJoin(pollsters, eq(pollsters.id, releases.pollsterId))
    .where(and(...conditions))
    .orderBy(desc(records.seq))
    .limit(page.limit)
    .all();
}

import 'server-only';
import { and, count, eq, isNull, sql } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { people } from '@/db/schema/people';
import { embargoList, embargoViews, releases } from '@/db/schema/releases';
import { isOnEmbargoList, type Viewer } from './visible';

export function listEmbargoReaders(conn: Conn, releaseId: number) {
  return conn
    .select({ personId: people.publicId, name: people.name, at: embargoList.addedAt })
    .from(embargoList)
    .leftJoin(people, eq(people.id, embargoList.personId))
    .where(eq(embargoList.releaseId, releaseId))
    .orderBy(embargoList.id)
    .all();
}

export function addEmbargoReader(conn: Conn, row: typeof embargoList.$inferInsert): boolean {
  const same = and(
    eq(embargoList.releaseId, row.releaseId),
    row.personId == null ? isNull(embargoList.personId) : eq(embargoList.personId, row.personId),
  );
  if (conn.select().from(embargoList).where(same).get()) return false;
  conn.insert(embargoList).values(row).run();
  return true;
}

export function removeEmbargoReader(conn: Conn, releaseId: number, personId: number | null): boolean {
  const who = personId === null ? isNull(embargoList.personId) : eq(embargoList.personId, personId);
  return (
    conn
      .delete(embargoList)
      .where(and(eq(embargoList.releaseId, releaseId), who))
      .run().changes > 0
  );
}

export function isListed(conn: Conn, releaseId: number, viewer: Viewer): boolean {
  return (
    conn
      .select({ id: releases.id })
      .from(releases)
      .where(and(eq(releases.id, releaseId), isOnEmbargoList(conn, viewer)))
      .get() !== undefined
  );
}

export function insertEmbargoView(conn: Conn, row: typeof embargoViews.$inferInsert): void {
  conn.insert(embargoViews).values(row).run();
}

export function listEmbargoViews(conn: Conn, releaseId: number) {
  return conn
    .select({ name: people.name, at: embargoViews.at, what: embargoViews.what })
    .from(embargoViews)
    .innerJoin(people, eq(people.id, embargoViews.personId))
    .where(eq(embargoViews.releaseId, releaseId))
    .orderBy(embargoViews.id)
    .all();
}

/** Who on a release's list has read it before its hour: how often, and last when. */
export function summarizeEmbargoViews(conn: Conn, releaseId: number) {
  return conn
    .select({ name: people.name, count: count(), lastAt: sql<number>`max(${embargoViews.at})` })
    .from(embargoViews)
    .innerJoin(people, eq(people.id, embargoViews.personId))
    .where(eq(embargoViews.releaseId, releaseId))
    .groupBy(people.id)
    .orderBy(people.name)
    .all();
}

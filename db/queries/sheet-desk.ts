import 'server-only';
import { and, asc, eq, gt, inArray, lte, min, ne } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { sheetLooks, sheetPresence, sheetReviews, sheetTerms } from '@/db/schema/clearing';
import { people } from '@/db/schema/people';

export type TermsRow = typeof sheetTerms.$inferSelect;

export function findTerms(conn: Conn, sheetId: number): TermsRow | null {
  return conn.select().from(sheetTerms).where(eq(sheetTerms.sheetId, sheetId)).get() ?? null;
}

/** The terms of many sheets at once, by sheet. */
export function listTermsOf(conn: Conn, sheetIds: number[]): Map<number, TermsRow> {
  const rows = conn.select().from(sheetTerms).where(inArray(sheetTerms.sheetId, sheetIds)).all();
  return new Map(rows.map((row) => [row.sheetId, row]));
}

export function putTerms(conn: Conn, row: typeof sheetTerms.$inferInsert): void {
  conn.insert(sheetTerms).values(row).onConflictDoUpdate({ target: sheetTerms.sheetId, set: row }).run();
}

export function putPresence(conn: Conn, row: typeof sheetPresence.$inferInsert): void {
  const { doing, seenAt } = row;
  conn
    .insert(sheetPresence)
    .values(row)
    .onConflictDoUpdate({ target: [sheetPresence.sheetId, sheetPresence.personId], set: { doing, seenAt } })
    .run();
}

/** Others who have had a sheet open since a moment, by name. */
export function listOthersPresent(conn: Conn, sheetId: number, personId: number, since: number) {
  return conn
    .select({ name: people.name, doing: sheetPresence.doing })
    .from(sheetPresence)
    .innerJoin(people, eq(people.id, sheetPresence.personId))
    .where(
      and(
        eq(sheetPresence.sheetId, sheetId),
        ne(sheetPresence.personId, personId),
        gt(sheetPresence.seenAt, since),
      ),
    )
    .orderBy(asc(people.name))
    .all();
}

export function deletePresenceUntil(conn: Conn, until: number): void {
  conn.delete(sheetPresence).where(lte(sheetPresence.seenAt, until)).run();
}

/** True where this is the first look of this person at this filing. */
export function insertLook(conn: Conn, row: typeof sheetLooks.$inferInsert): boolean {
  return conn.insert(sheetLooks).values(row).onConflictDoNothing().run().changes === 1;
}

/** When each filing was first looked at, by filing. */
export function listFirstLooks(conn: Conn, clearingIds: number[]): Map<number, number> {
  const rows = conn
    .select({ clearingId: sheetLooks.clearingId, at: min(sheetLooks.at) })
    .from(sheetLooks)
    .where(inArray(sheetLooks.clearingId, clearingIds))
    .groupBy(sheetLooks.clearingId)
    .all();
  return new Map(rows.map(({ clearingId, at }) => [clearingId, at ?? 0]));
}

/** What hangs on a draft that is discarded, apart from its words. */
export function deleteDeskRowsOf(conn: Conn, sheetId: number): void {
  conn.delete(sheetTerms).where(eq(sheetTerms.sheetId, sheetId)).run();
  conn.delete(sheetPresence).where(eq(sheetPresence.sheetId, sheetId)).run();
  conn.delete(sheetReviews).where(eq(sheetReviews.sheetId, sheetId)).run();
}

import 'server-only';
import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { oneReaderReleases } from '@/db/schema/clearing';
import { people } from '@/db/schema/people';
import { sheets } from '@/db/schema/sheets';

export type OneReaderRow = typeof oneReaderReleases.$inferSelect;

export function insertOneReader(conn: Conn, row: typeof oneReaderReleases.$inferInsert): void {
  conn.insert(oneReaderReleases).values(row).run();
}

export function findOneReader(conn: Conn, evidenceId: number): OneReaderRow | null {
  return (
    conn.select().from(oneReaderReleases).where(eq(oneReaderReleases.evidenceId, evidenceId)).get() ?? null
  );
}

/** Evidence that one editor released alone and nobody else has read yet, with that editor's name, by evidence. */
export function listUnread(conn: Conn, evidenceIds: number[]): Map<number, string> {
  const rows = conn
    .select({ evidenceId: oneReaderReleases.evidenceId, person: people.name })
    .from(oneReaderReleases)
    .innerJoin(people, eq(people.id, oneReaderReleases.personId))
    .where(and(inArray(oneReaderReleases.evidenceId, evidenceIds), isNull(oneReaderReleases.secondAt)))
    .all();
  return new Map(rows.map(({ evidenceId, person }) => [evidenceId, person]));
}

/** Those of these sheets whose words one editor released alone and nobody else has read yet. */
export function listUnreadSheets(conn: Conn, publicIds: string[]): Set<string> {
  const rows = conn
    .select({ sheetId: sheets.publicId })
    .from(oneReaderReleases)
    .innerJoin(sheets, eq(sheets.id, oneReaderReleases.sheetId))
    .where(and(inArray(sheets.publicId, publicIds), isNull(oneReaderReleases.secondAt)))
    .all();
  return new Set(rows.map(({ sheetId }) => sheetId));
}

/** False where somebody read it before. */
export function setSecondReader(
  conn: Conn,
  evidenceId: number,
  second: { secondPersonId: number; secondAt: number },
): boolean {
  const result = conn
    .update(oneReaderReleases)
    .set(second)
    .where(and(eq(oneReaderReleases.evidenceId, evidenceId), isNull(oneReaderReleases.secondAt)))
    .run();
  return result.changes === 1;
}

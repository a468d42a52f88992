import 'server-only';
import { and, asc, eq, inArray, isNull } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { Conn } from '@/db/client';
import { clearingLineReasons, lineComments } from '@/db/schema/clearing';
import { people } from '@/db/schema/people';
import { lines, lineVersions, sheets } from '@/db/schema/sheets';

export type CommentRow = typeof lineComments.$inferSelect;

const resolvers = alias(people, 'resolvers');

export function insertComment(conn: Conn, row: typeof lineComments.$inferInsert): CommentRow {
  return conn.insert(lineComments).values(row).returning().get();
}

/** A comment with the sheet it stands on; whether its reader may see that sheet is asked by the sheet. */
export function findComment(conn: Conn, publicId: string) {
  return (
    conn
      .select({ comment: lineComments, sheetId: sheets.publicId, kind: lines.kind })
      .from(lineComments)
      .innerJoin(lines, eq(lines.id, lineComments.lineId))
      .innerJoin(sheets, eq(sheets.id, lines.sheetId))
      .where(eq(lineComments.publicId, publicId))
      .get() ?? null
  );
}

/** Every comment on a sheet, oldest first, with the names of who made and who settled it. */
export function listComments(conn: Conn, sheetId: number) {
  return conn
    .select({
      comment: lineComments,
      kind: lines.kind,
      version: lineVersions.number,
      person: people.name,
      resolvedBy: resolvers.name,
    })
    .from(lineComments)
    .innerJoin(lines, eq(lines.id, lineComments.lineId))
    .innerJoin(lineVersions, eq(lineVersions.id, lineComments.lineVersionId))
    .innerJoin(people, eq(people.id, lineComments.personId))
    .leftJoin(resolvers, eq(resolvers.id, lineComments.resolvedBy))
    .where(eq(lines.sheetId, sheetId))
    .orderBy(asc(lineComments.id))
    .all();
}

/** False where somebody resolved it before. */
export function resolveComment(conn: Conn, id: number, personId: number, now: number): boolean {
  const result = conn
    .update(lineComments)
    .set({ resolvedBy: personId, resolvedAt: now })
    .where(and(eq(lineComments.id, id), isNull(lineComments.resolvedAt)))
    .run();
  return result.changes === 1;
}

/** Of a draft that is discarded; the schema refuses it once the sheet was filed. */
export function deleteCommentsOf(conn: Conn, sheetId: number): void {
  const itsLines = conn.select({ id: lines.id }).from(lines).where(eq(lines.sheetId, sheetId));
  conn.delete(lineComments).where(inArray(lineComments.lineId, itsLines)).run();
}

export function insertLineReason(conn: Conn, row: typeof clearingLineReasons.$inferInsert): void {
  conn.insert(clearingLineReasons).values(row).run();
}

/** Why single lines were sent back in one act, in the order of the lines. */
export function listLineReasons(conn: Conn, clearingId: number) {
  return conn
    .select({ kind: lines.kind, reason: clearingLineReasons.reason })
    .from(clearingLineReasons)
    .innerJoin(lineVersions, eq(lineVersions.id, clearingLineReasons.lineVersionId))
    .innerJoin(lines, eq(lines.id, lineVersions.lineId))
    .where(eq(clearingLineReasons.clearingId, clearingId))
    .orderBy(asc(lines.id))
    .all();
}

import 'server-only';
import { and, asc, eq, inArray, isNull, ne } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { sheetReviews } from '@/db/schema/clearing';
import { sheets } from '@/db/schema/sheets';

type Subject = { id: number; releaseId: number; claimKey: string; language: string };

/** Sheets of the same claim of the same release in other languages. */
export function listSiblings(conn: Conn, { id, releaseId, claimKey, language }: Subject) {
  return conn
    .select({ id: sheets.id, publicId: sheets.publicId, language: sheets.language })
    .from(sheets)
    .where(
      and(
        eq(sheets.releaseId, releaseId),
        eq(sheets.claimKey, claimKey),
        ne(sheets.language, language),
        ne(sheets.id, id),
      ),
    )
    .orderBy(asc(sheets.language), asc(sheets.id))
    .all();
}

export function insertReview(conn: Conn, row: typeof sheetReviews.$inferInsert): void {
  conn.insert(sheetReviews).values(row).run();
}

/** What of these sheets still needs another look, with the language that changed. */
export function listOpenReviews(conn: Conn, sheetIds: number[]) {
  return conn
    .select({ review: sheetReviews, language: sheets.language, causeId: sheets.publicId })
    .from(sheetReviews)
    .innerJoin(sheets, eq(sheets.id, sheetReviews.causeSheetId))
    .where(and(inArray(sheetReviews.sheetId, sheetIds), isNull(sheetReviews.settledAt)))
    .orderBy(asc(sheetReviews.id))
    .all();
}

export function settleReviews(
  conn: Conn,
  sheetId: number,
  settled: { settledBy: number; settledAt: number; settledAs: 'reviewed' | 'filed' },
): number {
  return conn
    .update(sheetReviews)
    .set(settled)
    .where(and(eq(sheetReviews.sheetId, sheetId), isNull(sheetReviews.settledAt)))
    .run().changes;
}

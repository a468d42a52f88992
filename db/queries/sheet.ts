import 'server-only';
import { and, asc, desc, eq, inArray, isNull, notInArray, or, sql } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { corrections } from '@/db/schema/corrections';
import { people } from '@/db/schema/people';
import { pollsters, races } from '@/db/schema/races';
import { releases, releaseVersions } from '@/db/schema/releases';
import { clearingLines, clearings, evidenceSources, lines, lineVersions, sheets } from '@/db/schema/sheets';
import type { LineState } from '@/lib/domain/sheet';
import { isPublic, type Viewer, visible } from './visible';

export type SheetRow = typeof sheets.$inferSelect;
export type LineRow = typeof lines.$inferSelect;
export type LineVersionRow = typeof lineVersions.$inferSelect;

export function insertSheet(conn: Conn, row: typeof sheets.$inferInsert): SheetRow {
  return conn.insert(sheets).values(row).returning().get();
}

export function findSheetBySubmission(conn: Conn, submissionKey: string): SheetRow | null {
  return conn.select().from(sheets).where(eq(sheets.submissionKey, submissionKey)).get() ?? null;
}

/** A sheet whose release this viewer may see, or null. */
export function findSheet(conn: Conn, publicId: string, viewer: Viewer, now: number) {
  return (
    conn
      .select({ sheet: sheets, release: releases, author: people.name, isPublic: isPublic(now) })
      .from(sheets)
      .innerJoin(releases, eq(releases.id, sheets.releaseId))
      .innerJoin(people, eq(people.id, sheets.authorId))
      .where(and(eq(sheets.publicId, publicId), visible(conn, viewer, now)))
      .get() ?? null
  );
}

/** Moves a sheet on from the version the asker saw; false when somebody was faster. */
export function touchSheet(
  conn: Conn,
  id: number,
  version: number,
  set: Partial<typeof sheets.$inferInsert> = {},
): boolean {
  const result = conn
    .update(sheets)
    .set({ ...set, version: version + 1 })
    .where(and(eq(sheets.id, id), eq(sheets.version, version)))
    .run();
  return result.changes === 1;
}

export function insertLine(conn: Conn, row: typeof lines.$inferInsert): LineRow {
  return conn.insert(lines).values(row).returning().get();
}

export function setKnockedOut(conn: Conn, lineId: number, knockedOut: boolean): void {
  conn.update(lines).set({ knockedOut }).where(eq(lines.id, lineId)).run();
}

export function insertLineVersion(conn: Conn, row: typeof lineVersions.$inferInsert): LineVersionRow {
  return conn.insert(lineVersions).values(row).returning().get();
}

const newestVersion = sql<number>`(
  select max(newer.number) from line_versions newer where newer.line_id = ${lines.id}
)`;

/** Every line of a sheet with its newest version, in the order drafted. */
export function listNewestLines(conn: Conn, sheetId: number) {
  return conn
    .select({ line: lines, version: lineVersions, changedBy: people.name })
    .from(lines)
    .innerJoin(lineVersions, and(eq(lineVersions.lineId, lines.id), eq(lineVersions.number, newestVersion)))
    .innerJoin(people, eq(people.id, lineVersions.changedBy))
    .where(eq(lines.sheetId, sheetId))
    .orderBy(asc(lines.id))
    .all();
}

/** The same for many sheets at once, for lists. */
export function listNewestLinesOf(conn: Conn, sheetIds: number[]) {
  return conn
    .select({ line: lines, version: lineVersions })
    .from(lines)
    .innerJoin(lineVersions, and(eq(lineVersions.lineId, lines.id), eq(lineVersions.number, newestVersion)))
    .where(inArray(lines.sheetId, sheetIds))
    .orderBy(asc(lines.id))
    .all();
}

/** What each line of a sheet said in the version before its newest, by line id. */
export function listEarlierTexts(conn: Conn, sheetId: number): Map<number, string> {
  const rows = conn
    .select({ lineId: lines.id, text: lineVersions.text })
    .from(lines)
    .innerJoin(
      lineVersions,
      and(eq(lineVersions.lineId, lines.id), eq(lineVersions.number, sql`${newestVersion} - 1`)),
    )
    .where(eq(lines.sheetId, sheetId))
    .all();
  return new Map(rows.map(({ lineId, text }) => [lineId, text]));
}

/** What each line of a sheet said when it was last filed before its newest version, and when it was last cleared. */
export function listEarlierAgreed(conn: Conn, sheetId: number) {
  const rows = conn
    .select({
      lineId: lines.id,
      text: lineVersions.text,
      state: lineVersions.state,
      filedBy: lineVersions.filedBy,
    })
    .from(lines)
    .innerJoin(
      lineVersions,
      and(eq(lineVersions.lineId, lines.id), sql`${lineVersions.number} < ${newestVersion}`),
    )
    .where(eq(lines.sheetId, sheetId))
    .orderBy(asc(lineVersions.number))
    .all();
  const filed = rows.filter(({ filedBy }) => filedBy !== null);
  const cleared = rows.filter(({ state }) => ['cleared', 'superseded', 'pulled'].includes(state));
  const byLine = (some: typeof rows) => new Map(some.map(({ lineId, text }) => [lineId, text]));
  return { filed: byLine(filed), cleared: byLine(cleared) };
}

/** The cleared words of a sheet, in the order drafted. */
export function listClearedLines(conn: Conn, sheetId: number) {
  return listClearedLinesOf(conn, [sheetId]);
}

/** The same for many sheets at once, for lists. */
export function listClearedLinesOf(conn: Conn, sheetIds: number[]) {
  return conn
    .select({ line: lines, version: lineVersions })
    .from(lines)
    .innerJoin(lineVersions, and(eq(lineVersions.lineId, lines.id), eq(lineVersions.state, 'cleared')))
    .where(inArray(lines.sheetId, sheetIds))
    .orderBy(asc(lines.id))
    .all();
}

export function updateDraftText(
  conn: Conn,
  id: number,
  set: { text?: string; draftText?: string; changedBy: number; changedAt: number; templateVersion?: string },
): boolean {
  const result = conn
    .update(lineVersions)
    .set(set)
    .where(and(eq(lineVersions.id, id), eq(lineVersions.state, 'draft')))
    .run();
  return result.changes === 1;
}

/** Moves line versions from one state to another; false unless every one of them was in it. */
export function moveLineVersions(
  conn: Conn,
  ids: number[],
  from: LineState,
  set: Partial<typeof lineVersions.$inferInsert> & { state: LineState },
): boolean {
  const result = conn
    .update(lineVersions)
    .set({ ...set, version: sql`${lineVersions.version} + 1` })
    .where(and(inArray(lineVersions.id, ids), eq(lineVersions.state, from)))
    .run();
  return result.changes === ids.length;
}

const listColumns = {
  sheet: sheets,
  release: releases,
  race: races.name,
  pollster: pollsters.name,
  fieldStartOn: releaseVersions.fieldStartOn,
  fieldEndOn: releaseVersions.fieldEndOn,
  author: people.name,
};

function listSelect(conn: Conn) {
  return conn
    .select(listColumns)
    .from(sheets)
    .innerJoin(releases, eq(releases.id, sheets.releaseId))
    .innerJoin(races, eq(races.id, releases.raceId))
    .innerJoin(pollsters, eq(pollsters.id, releases.pollsterId))
    .innerJoin(releaseVersions, eq(releaseVersions.id, sheets.releaseVersionId))
    .innerJoin(people, eq(people.id, sheets.authorId));
}

/** Sheets that are being worked on or wait for a reader, newest first. */
export function listOpenSheets(conn: Conn, viewer: Viewer, now: number, limit: number) {
  const open = conn
    .select({ id: lines.sheetId })
    .from(lines)
    .innerJoin(lineVersions, and(eq(lineVersions.lineId, lines.id), eq(lineVersions.number, newestVersion)))
    .where(and(eq(lines.knockedOut, false), inArray(lineVersions.state, ['draft', 'filed', 'sent-back'])));
  return listSelect(conn)
    .where(and(inArray(sheets.id, open), visible(conn, viewer, now)))
    .orderBy(desc(sheets.id))
    .limit(limit)
    .all();
}

const lastClearing = sql`(
  select max(acts.id) from clearings acts where acts.sheet_id = ${sheets.id} and acts.act = 'cleared'
)`;

/** Sheets with cleared words that this viewer may read, newest clearing first. */
export function listClearedSheets(
  conn: Conn,
  viewer: Viewer,
  now: number,
  search: { race: string; pollster: string; limit: number },
) {
  const cleared = conn
    .select({ id: lines.sheetId })
    .from(lines)
    .innerJoin(lineVersions, and(eq(lineVersions.lineId, lines.id), eq(lineVersions.state, 'cleared')));
  return listSelect(conn)
    .where(
      and(
        inArray(sheets.id, cleared),
        visible(conn, viewer, now),
        isNull(releases.archivedAt),
        contains(races.name, search.race),
        contains(pollsters.name, search.pollster),
      ),
    )
    .orderBy(desc(lastClearing), desc(sheets.id))
    .limit(search.limit)
    .all();
}

function contains(column: typeof races.name | typeof pollsters.name, text: string) {
  return text === '' ? undefined : sql`instr(folded(${column}), folded(${text})) > 0`;
}

export function isReleasePublic(conn: Conn, releaseId: number, now: number): boolean {
  return (
    conn
      .select({ id: releases.id })
      .from(releases)
      .where(and(eq(releases.id, releaseId), isPublic(now)))
      .get() !== undefined
  );
}

/** Sheets with words cleared now whose evidence rests on any version of a release, also as the comparison. */
export function countClearedSheetsOn(conn: Conn, releaseId: number): number {
  const row = conn
    .select({ count: sql<number>`count(distinct ${lines.sheetId})` })
    .from(lineVersions)
    .innerJoin(lines, eq(lines.id, lineVersions.lineId))
    .innerJoin(clearingLines, eq(clearingLines.lineVersionId, lineVersions.id))
    .innerJoin(clearings, and(eq(clearings.id, clearingLines.clearingId), eq(clearings.act, 'cleared')))
    .innerJoin(evidenceSources, eq(evidenceSources.evidenceId, clearings.evidenceId))
    .innerJoin(releaseVersions, eq(releaseVersions.id, evidenceSources.releaseVersionId))
    .where(and(eq(lineVersions.state, 'cleared'), eq(releaseVersions.releaseId, releaseId)))
    .get();
  return row?.count ?? 0;
}

/** Sheets of a release rest on its newest version from now on, but for those that wait for a correction. */
export function moveSheetsToVersion(
  conn: Conn,
  releaseId: number,
  releaseVersionId: number,
  questionId: number,
): void {
  const waiting = conn
    .select({ id: corrections.id })
    .from(corrections)
    .where(eq(corrections.state, 'staged'));
  conn
    .update(sheets)
    .set({ releaseVersionId, questionId })
    .where(
      and(
        eq(sheets.releaseId, releaseId),
        or(isNull(sheets.correctionId), notInArray(sheets.correctionId, waiting)),
      ),
    )
    .run();
}

/** Removes a sheet with its lines. The schema refuses it for one that anything was done to. */
export function deleteSheet(conn: Conn, id: number): void {
  const itsLines = conn.select({ id: lines.id }).from(lines).where(eq(lines.sheetId, id));
  conn.delete(lineVersions).where(inArray(lineVersions.lineId, itsLines)).run();
  conn.delete(lines).where(eq(lines.sheetId, id)).run();
  conn.delete(sheets).where(eq(sheets.id, id)).run();
}

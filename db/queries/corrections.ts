import 'server-only';
import { and, asc, desc, eq, inArray, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { Conn } from '@/db/client';
import { correctionEffects } from '@/db/schema/correction-effects';
import { corrections } from '@/db/schema/corrections';
import { people } from '@/db/schema/people';
import { pollsters, races } from '@/db/schema/races';
import { releases, releaseVersions } from '@/db/schema/releases';
import { clearingLines, clearings, evidenceSources, lines, lineVersions, sheets } from '@/db/schema/sheets';
import type { StandIn } from './release';
import type { SheetRow } from './sheet';
import { type Viewer, visible } from './visible';

export type CorrectionRow = typeof corrections.$inferSelect;
export type EffectRow = typeof correctionEffects.$inferSelect;

export function insertCorrection(conn: Conn, row: typeof corrections.$inferInsert): CorrectionRow {
  return conn.insert(corrections).values(row).returning().get();
}

/** Moves a correction out of a state; false where somebody was faster. */
export function settleCorrection(
  conn: Conn,
  id: number,
  set: Partial<typeof corrections.$inferInsert> & { state: CorrectionRow['state'] },
): boolean {
  const result = conn
    .update(corrections)
    .set(set)
    .where(and(eq(corrections.id, id), eq(corrections.state, 'staged')))
    .run();
  return result.changes === 1;
}

/** False where an editor let them out before. */
export function confirmNotices(conn: Conn, id: number, noticesBy: number, noticesAt: number): boolean {
  const result = conn
    .update(corrections)
    .set({ noticesBy, noticesAt })
    .where(
      and(eq(corrections.id, id), eq(corrections.state, 'applied'), sql`${corrections.noticesAt} is null`),
    )
    .run();
  return result.changes === 1;
}

const settlers = alias(people, 'settlers');
const confirmers = alias(people, 'confirmers');

function correctionSelect(conn: Conn) {
  return conn
    .select({
      correction: corrections,
      release: releases,
      race: races.name,
      pollster: pollsters.name,
      createdBy: people.name,
      settledBy: settlers.name,
      noticesBy: confirmers.name,
    })
    .from(corrections)
    .innerJoin(releases, eq(releases.id, corrections.releaseId))
    .innerJoin(races, eq(races.id, releases.raceId))
    .innerJoin(pollsters, eq(pollsters.id, releases.pollsterId))
    .innerJoin(people, eq(people.id, corrections.createdBy))
    .leftJoin(settlers, eq(settlers.id, corrections.settledBy))
    .leftJoin(confirmers, eq(confirmers.id, corrections.noticesBy));
}

export type WholeCorrection = ReturnType<ReturnType<typeof correctionSelect>['all']>[number];

/** A correction of a release that this viewer may see, or null. */
export function findCorrection(
  conn: Conn,
  publicId: string,
  viewer: Viewer,
  now: number,
): WholeCorrection | null {
  return (
    correctionSelect(conn)
      .where(and(eq(corrections.publicId, publicId), visible(conn, viewer, now)))
      .get() ?? null
  );
}

/** Corrections of one release, newest first. */
export function listCorrectionsOf(conn: Conn, releaseId: number): WholeCorrection[] {
  return correctionSelect(conn)
    .where(eq(corrections.releaseId, releaseId))
    .orderBy(desc(corrections.id))
    .all();
}

export function findStagedCorrection(conn: Conn, releaseId: number): CorrectionRow | null {
  return (
    conn
      .select()
      .from(corrections)
      .where(and(eq(corrections.releaseId, releaseId), eq(corrections.state, 'staged')))
      .get() ?? null
  );
}

/** The version that a sheet's words take for current already, while the correction that they wait for is staged. */
export function findStandIn(conn: Conn, correctionId: number | null | undefined): StandIn | null {
  if (correctionId === null || correctionId === undefined) return null;
  return (
    conn
      .select({ releaseId: corrections.releaseId, versionId: corrections.toVersionId })
      .from(corrections)
      .where(and(eq(corrections.id, correctionId), eq(corrections.state, 'staged')))
      .get() ?? null
  );
}

/** Public id of a correction that is staged; null once it is settled. */
export function findStagedId(conn: Conn, id: number | null): string | null {
  if (id === null) return null;
  const row = conn
    .select({ publicId: corrections.publicId })
    .from(corrections)
    .where(and(eq(corrections.id, id), eq(corrections.state, 'staged')))
    .get();
  return row?.publicId ?? null;
}

export type CurrentEvidence = { sheet: SheetRow; evidenceId: number };

/** Sheets with words cleared now, whose evidence rests on any version of a release, also as the comparison. */
export function listCurrentEvidenceOn(conn: Conn, releaseId: number): CurrentEvidence[] {
  return conn
    .selectDistinct({ sheet: sheets, evidenceId: sql<number>`${clearings.evidenceId}` })
    .from(lineVersions)
    .innerJoin(lines, eq(lines.id, lineVersions.lineId))
    .innerJoin(sheets, eq(sheets.id, lines.sheetId))
    .innerJoin(clearingLines, eq(clearingLines.lineVersionId, lineVersions.id))
    .innerJoin(clearings, and(eq(clearings.id, clearingLines.clearingId), eq(clearings.act, 'cleared')))
    .innerJoin(evidenceSources, eq(evidenceSources.evidenceId, clearings.evidenceId))
    .innerJoin(releaseVersions, eq(releaseVersions.id, evidenceSources.releaseVersionId))
    .where(and(eq(lineVersions.state, 'cleared'), eq(releaseVersions.releaseId, releaseId)))
    .orderBy(asc(sheets.id))
    .all();
}

export function insertEffect(conn: Conn, row: typeof correctionEffects.$inferInsert): void {
  conn.insert(correctionEffects).values(row).run();
}

export function listEffects(conn: Conn, correctionId: number) {
  return conn
    .select({ effect: correctionEffects, sheet: sheets })
    .from(correctionEffects)
    .innerJoin(sheets, eq(sheets.id, correctionEffects.sheetId))
    .where(eq(correctionEffects.correctionId, correctionId))
    .orderBy(asc(correctionEffects.sheetId))
    .all();
}

/** What corrections did to what rested on one evidence, newest first. */
export function listEffectsOn(conn: Conn, evidenceId: number) {
  return conn
    .select({ effect: correctionEffects, correction: corrections })
    .from(correctionEffects)
    .innerJoin(corrections, eq(corrections.id, correctionEffects.correctionId))
    .where(eq(correctionEffects.evidenceId, evidenceId))
    .orderBy(desc(corrections.id))
    .all();
}

/** When a correction to this version left the words of a sheet as they were; null where none did. */
export function findFlaggedAt(conn: Conn, sheetId: number, toVersionId: number): number | null {
  const row = conn
    .select({ at: correctionEffects.at })
    .from(correctionEffects)
    .innerJoin(corrections, eq(corrections.id, correctionEffects.correctionId))
    .where(
      and(
        eq(correctionEffects.sheetId, sheetId),
        eq(correctionEffects.effect, 'flagged'),
        eq(corrections.toVersionId, toVersionId),
      ),
    )
    .get();
  return row?.at ?? null;
}

/** Sheets drafted to take the place of others when a correction is applied. */
export function listReplacements(conn: Conn, correctionId: number): SheetRow[] {
  return conn
    .select()
    .from(sheets)
    .where(eq(sheets.correctionId, correctionId))
    .orderBy(asc(sheets.id))
    .all();
}

/** Sheets that corrections pulled or replaced since a moment, of releases that this viewer may see. */
export function listWithdrawnSince(conn: Conn, viewer: Viewer, now: number, since: number) {
  return conn
    .select({
      sheetId: sheets.publicId,
      correctionId: corrections.publicId,
      whose: corrections.whose,
      explanation: corrections.explanation,
      effect: correctionEffects.effect,
      at: correctionEffects.at,
      race: races.name,
      pollster: pollsters.name,
      fieldStartOn: releaseVersions.fieldStartOn,
      fieldEndOn: releaseVersions.fieldEndOn,
      evidenceId: correctionEffects.evidenceId,
    })
    .from(correctionEffects)
    .innerJoin(corrections, eq(corrections.id, correctionEffects.correctionId))
    .innerJoin(sheets, eq(sheets.id, correctionEffects.sheetId))
    .innerJoin(releases, eq(releases.id, sheets.releaseId))
    .innerJoin(races, eq(races.id, releases.raceId))
    .innerJoin(pollsters, eq(pollsters.id, releases.pollsterId))
    .innerJoin(releaseVersions, eq(releaseVersions.id, sheets.releaseVersionId))
    .where(
      and(
        inArray(correctionEffects.effect, ['pulled', 'replaced']),
        sql`${correctionEffects.at} >= ${since}`,
        visible(conn, viewer, now),
      ),
    )
    .orderBy(desc(correctionEffects.at), desc(sheets.id))
    .limit(50)
    .all();
}

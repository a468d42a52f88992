import 'server-only';
import { and, asc, desc, eq, inArray, notInArray } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { people } from '@/db/schema/people';
import {
  clearingLines,
  clearings,
  copies,
  evidence,
  evidenceSources,
  lines,
  lineVersions,
} from '@/db/schema/sheets';

export type EvidenceRow = typeof evidence.$inferSelect;
export type ClearingRow = typeof clearings.$inferSelect;

export function insertEvidence(
  conn: Conn,
  row: typeof evidence.$inferInsert,
  sources: { releaseVersionId: number; part: 'release' | 'comparison' }[],
): EvidenceRow {
  const stored = conn.insert(evidence).values(row).returning().get();
  for (const source of sources)
    conn
      .insert(evidenceSources)
      .values({ ...source, evidenceId: stored.id })
      .run();
  return stored;
}

export function findEvidence(conn: Conn, id: number): EvidenceRow | null {
  return conn.select().from(evidence).where(eq(evidence.id, id)).get() ?? null;
}

export function listEvidenceIds(conn: Conn): number[] {
  return conn
    .select({ id: evidence.id })
    .from(evidence)
    .orderBy(asc(evidence.id))
    .all()
    .map((row) => row.id);
}

export function insertClearing(
  conn: Conn,
  row: typeof clearings.$inferInsert,
  lineVersionIds: number[],
): ClearingRow {
  const act = conn.insert(clearings).values(row).returning().get();
  for (const lineVersionId of lineVersionIds)
    conn.insert(clearingLines).values({ clearingId: act.id, lineVersionId }).run();
  return act;
}

/** The newest act of one kind on a sheet. */
export function findLastAct(conn: Conn, sheetId: number, act: ClearingRow['act']): ClearingRow | null {
  return (
    conn
      .select()
      .from(clearings)
      .where(and(eq(clearings.sheetId, sheetId), eq(clearings.act, act)))
      .orderBy(desc(clearings.id))
      .limit(1)
      .get() ?? null
  );
}

/** Everything done to many sheets, newest first, with names and the hash agreed to; for lists. */
export function listActsOf(conn: Conn, sheetIds: number[]) {
  return conn
    .select({ act: clearings, person: people.name, hash: evidence.hash })
    .from(clearings)
    .innerJoin(people, eq(people.id, clearings.personId))
    .leftJoin(evidence, eq(evidence.id, clearings.evidenceId))
    .where(inArray(clearings.sheetId, sheetIds))
    .orderBy(desc(clearings.id))
    .all();
}

/** Everything done to a sheet, oldest first, with names. */
export function listActs(conn: Conn, sheetId: number) {
  return conn
    .select({ act: clearings, person: people.name })
    .from(clearings)
    .innerJoin(people, eq(people.id, clearings.personId))
    .where(eq(clearings.sheetId, sheetId))
    .orderBy(asc(clearings.id))
    .all();
}

/** Who agreed to one evidence, as what, and to which words as they are stored now. */
export function listAgreements(conn: Conn, evidenceId: number) {
  const acts = conn
    .select()
    .from(clearings)
    .where(and(eq(clearings.evidenceId, evidenceId), inArray(clearings.act, ['filed', 'cleared'])))
    .orderBy(asc(clearings.id))
    .all();
  return acts.map(({ id, act, personId, roles }) => {
    const texts = conn
      .select({ kind: lines.kind, text: lineVersions.text })
      .from(clearingLines)
      .innerJoin(lineVersions, eq(lineVersions.id, clearingLines.lineVersionId))
      .innerJoin(lines, eq(lines.id, lineVersions.lineId))
      .where(eq(clearingLines.clearingId, id))
      .orderBy(asc(lines.id))
      .all();
    return { act, personId, roles, texts };
  });
}

/** Public ids of line versions that count as cleared although nobody cleared them. */
export function listClearedByNobody(conn: Conn): string[] {
  const agreed = conn
    .select({ id: clearingLines.lineVersionId })
    .from(clearingLines)
    .innerJoin(clearings, and(eq(clearings.id, clearingLines.clearingId), eq(clearings.act, 'cleared')));
  return conn
    .select({ publicId: lineVersions.publicId })
    .from(lineVersions)
    .where(and(inArray(lineVersions.state, ['cleared', 'superseded']), notInArray(lineVersions.id, agreed)))
    .all()
    .map((row) => row.publicId);
}

export function insertCopy(conn: Conn, row: typeof copies.$inferInsert): void {
  conn.insert(copies).values(row).run();
}

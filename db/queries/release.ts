import 'server-only';
import { and, asc, desc, eq, inArray, isNull, ne, or } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { people } from '@/db/schema/people';
import { pollsters, races, sponsors } from '@/db/schema/races';
import {
  bases,
  comparisonOverrides,
  questions,
  releases,
  releaseVersions,
  shares,
} from '@/db/schema/releases';
import { isPublic, type Viewer, visible } from './visible';

export type ReleaseRow = typeof releases.$inferSelect;
export type ReleaseVersionRow = typeof releaseVersions.$inferSelect;

export function insertRelease(conn: Conn, row: typeof releases.$inferInsert): ReleaseRow {
  return conn.insert(releases).values(row).returning().get();
}

export type VersionRows = {
  version: typeof releaseVersions.$inferInsert;
  base: Omit<typeof bases.$inferInsert, 'releaseVersionId' | 'position'>;
  question: Omit<typeof questions.$inferInsert, 'baseId' | 'position'>;
  shares: Omit<typeof shares.$inferInsert, 'questionId' | 'position'>[];
};

/** Writes one whole version, which becomes the release's current one unless a correction holds it back. */
export function insertReleaseVersion(
  conn: Conn,
  rows: VersionRows,
  { isCurrent = true }: { isCurrent?: boolean } = {},
): ReleaseVersionRow {
  const version = conn.insert(releaseVersions).values(rows.version).returning().get();
  const base = conn
    .insert(bases)
    .values({ ...rows.base, releaseVersionId: version.id, position: 0 })
    .returning()
    .get();
  const question = conn
    .insert(questions)
    .values({ ...rows.question, baseId: base.id, position: 0 })
    .returning()
    .get();
  for (const [position, row] of rows.shares.entries())
    conn
      .insert(shares)
      .values({ ...row, questionId: question.id, position })
      .run();
  if (isCurrent)
    conn
      .update(releases)
      .set({ currentVersionId: version.id })
      .where(eq(releases.id, version.releaseId))
      .run();
  return version;
}

export function updateRelease(
  conn: Conn,
  id: number,
  version: number,
  set: Partial<typeof releases.$inferInsert>,
): boolean {
  const result = conn
    .update(releases)
    .set({ ...set, version: version + 1 })
    .where(and(eq(releases.id, id), eq(releases.version, version)))
    .run();
  return result.changes === 1;
}

export function freezeVersion(conn: Conn, versionId: number, now: number): void {
  conn
    .update(releaseVersions)
    .set({ frozenAt: now })
    .where(and(eq(releaseVersions.id, versionId), isNull(releaseVersions.frozenAt)))
    .run();
}

export function findReleaseBySubmission(conn: Conn, submissionKey: string): ReleaseRow | null {
  return conn.select().from(releases).where(eq(releases.submissionKey, submissionKey)).get() ?? null;
}

/** A release that this viewer may see, or null: not there and not visible look the same. */
export function findRelease(conn: Conn, publicId: string, viewer: Viewer, now: number): ReleaseRow | null {
  return (
    conn
      .select()
      .from(releases)
      .where(and(eq(releases.publicId, publicId), visible(conn, viewer, now)))
      .get() ?? null
  );
}

const versionColumns = {
  release: releases,
  version: releaseVersions,
  race: races,
  pollster: pollsters,
  sponsor: sponsors,
  base: bases,
  question: questions,
  enteredBy: people.name,
};

function versionSelect(conn: Conn) {
  return conn
    .select(versionColumns)
    .from(releaseVersions)
    .innerJoin(releases, eq(releases.id, releaseVersions.releaseId))
    .innerJoin(races, eq(races.id, releases.raceId))
    .innerJoin(pollsters, eq(pollsters.id, releases.pollsterId))
    .leftJoin(sponsors, eq(sponsors.id, releaseVersions.sponsorId))
    .innerJoin(bases, eq(bases.releaseVersionId, releaseVersions.id))
    .innerJoin(questions, eq(questions.baseId, bases.id))
    .innerJoin(people, eq(people.id, releaseVersions.createdBy));
}

export type WholeVersion = ReturnType<ReturnType<typeof versionSelect>['all']>[number];

export function findWholeVersion(conn: Conn, versionId: number): WholeVersion | null {
  return versionSelect(conn).where(eq(releaseVersions.id, versionId)).get() ?? null;
}

export function findWholeVersionByPublicId(conn: Conn, publicId: string): WholeVersion | null {
  return versionSelect(conn).where(eq(releaseVersions.publicId, publicId)).get() ?? null;
}

export function listShares(conn: Conn, questionId: number) {
  return conn
    .select({ share: shares, enteredBy: people.name })
    .from(shares)
    .innerJoin(people, eq(people.id, shares.enteredBy))
    .where(eq(shares.questionId, questionId))
    .orderBy(asc(shares.position))
    .all();
}

/** The shares of many questions at once, for lists. */
export function listSharesOf(conn: Conn, questionIds: number[]): (typeof shares.$inferSelect)[] {
  return conn
    .select()
    .from(shares)
    .where(inArray(shares.questionId, questionIds))
    .orderBy(asc(shares.questionId), asc(shares.position))
    .all();
}

/** A version that is taken for the current one of its release, before it is. */
export type StandIn = { releaseId: number; versionId: number };

/**
 * Current versions of one race by one pollster, latest field dates first.
 *
 * @param publicAt only those that are out of embargo at this moment; null: every one
 */
export function listVersionsOfSeries(
  conn: Conn,
  raceId: number,
  pollsterId: number,
  publicAt: number | null,
  standIn: StandIn | null = null,
): WholeVersion[] {
  const isCurrent = eq(releases.currentVersionId, releaseVersions.id);
  return versionSelect(conn)
    .where(
      and(
        standIn === null
          ? isCurrent
          : or(and(isCurrent, ne(releases.id, standIn.releaseId)), eq(releaseVersions.id, standIn.versionId)),
        eq(releases.raceId, raceId),
        eq(releases.pollsterId, pollsterId),
        isNull(releases.archivedAt),
        publicAt === null ? undefined : isPublic(publicAt),
      ),
    )
    .orderBy(desc(releaseVersions.fieldEndOn), desc(releaseVersions.fieldStartOn), desc(releases.id))
    .all();
}

export function listReleases(conn: Conn, viewer: Viewer, now: number, limit: number) {
  return versionSelect(conn)
    .where(
      and(
        eq(releases.currentVersionId, releaseVersions.id),
        isNull(releases.archivedAt),
        visible(conn, viewer, now),
      ),
    )
    .orderBy(desc(releases.createdAt), desc(releases.id))
    .limit(limit)
    .all();
}

/** Every version of a release, oldest first, with who entered it. */
export function listVersions(conn: Conn, releaseId: number): WholeVersion[] {
  return versionSelect(conn)
    .where(eq(releaseVersions.releaseId, releaseId))
    .orderBy(asc(releaseVersions.number))
    .all();
}

export function findOverride(conn: Conn, versionId: number) {
  return (
    conn
      .select({ override: comparisonOverrides, person: people.name })
      .from(comparisonOverrides)
      .innerJoin(people, eq(people.id, comparisonOverrides.personId))
      .where(eq(comparisonOverrides.releaseVersionId, versionId))
      .get() ?? null
  );
}

export function insertOverride(conn: Conn, row: typeof comparisonOverrides.$inferInsert): void {
  conn
    .delete(comparisonOverrides)
    .where(eq(comparisonOverrides.releaseVersionId, row.releaseVersionId))
    .run();
  conn.insert(comparisonOverrides).values(row).run();
}

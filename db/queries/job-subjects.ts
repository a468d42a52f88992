import 'server-only';
import { and, asc, count, desc, eq, gt, inArray, isNull, lt } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { embeds, embedVersions } from '@/db/schema/embeds';
import { races } from '@/db/schema/races';
import { releases, releaseVersions } from '@/db/schema/releases';
import { lines, lineVersions, sheets } from '@/db/schema/sheets';
import type { RaceKind } from '@/lib/domain/vocabulary';

/** What the system itself reads by public id, where nobody asks and an embargo hides nothing. */
export function findReleaseRow(conn: Conn, publicId: string) {
  return conn.select().from(releases).where(eq(releases.publicId, publicId)).get() ?? null;
}

export function findSheetRow(conn: Conn, publicId: string) {
  return conn.select().from(sheets).where(eq(sheets.publicId, publicId)).get() ?? null;
}

/** Releases whose embargo lies ahead and was not lifted. */
export function listReleasesUnderEmbargo(conn: Conn, now: number) {
  const rows = conn
    .select({ id: releases.id, publicId: releases.publicId, embargoAt: releases.embargoAt })
    .from(releases)
    .where(and(gt(releases.embargoAt, now), isNull(releases.embargoLiftedAt)))
    .all();
  return rows.flatMap(({ embargoAt, ...release }) => (embargoAt === null ? [] : [{ ...release, embargoAt }]));
}

const isCurrent = and(eq(releases.currentVersionId, releaseVersions.id), isNull(releases.archivedAt));

/** Ids of current versions of all releases below an id, newest first. */
export function listCurrentVersionIds(conn: Conn, before: number | null, limit: number): number[] {
  return conn
    .select({ id: releaseVersions.id })
    .from(releaseVersions)
    .innerJoin(releases, eq(releases.id, releaseVersions.releaseId))
    .where(and(isCurrent, before === null ? undefined : lt(releaseVersions.id, before)))
    .orderBy(desc(releaseVersions.id))
    .limit(limit)
    .all()
    .map(({ id }) => id);
}

export function countCurrentVersions(conn: Conn): number {
  const row = conn
    .select({ count: count() })
    .from(releaseVersions)
    .innerJoin(releases, eq(releases.id, releaseVersions.releaseId))
    .where(isCurrent)
    .get();
  return row?.count ?? 0;
}

/** Sheets of which words are cleared now. */
export function listClearedSheets(conn: Conn) {
  return conn
    .selectDistinct({ sheet: sheets })
    .from(sheets)
    .innerJoin(lines, eq(lines.sheetId, sheets.id))
    .innerJoin(lineVersions, and(eq(lineVersions.lineId, lines.id), eq(lineVersions.state, 'cleared')))
    .all()
    .map(({ sheet }) => sheet);
}

export type EmbedsOf =
  | { of: 'embed'; publicId: string }
  | { of: 'release'; publicId: string }
  /** Of one race, or of every race of some kinds. */
  | { of: 'races'; raceId: number | null; kinds: readonly RaceKind[] };

/** Embeds above an id with the numbers of their versions, oldest first. */
export function listEmbedAddresses(conn: Conn, which: EmbedsOf, after: number, limit: number) {
  const found = conn
    .select({ id: embeds.id, publicId: embeds.publicId })
    .from(embeds)
    .innerJoin(sheets, eq(sheets.id, embeds.sheetId))
    .innerJoin(releases, eq(releases.id, sheets.releaseId))
    .innerJoin(races, eq(races.id, releases.raceId))
    .where(and(gt(embeds.id, after), isAmong(which)))
    .orderBy(asc(embeds.id))
    .limit(limit)
    .all();
  return found.map((embed) => ({ ...embed, versions: numbersOf(conn, embed.id) }));
}

export function countEmbeds(conn: Conn, which: EmbedsOf): number {
  const row = conn
    .select({ count: count() })
    .from(embeds)
    .innerJoin(sheets, eq(sheets.id, embeds.sheetId))
    .innerJoin(releases, eq(releases.id, sheets.releaseId))
    .innerJoin(races, eq(races.id, releases.raceId))
    .where(isAmong(which))
    .get();
  return row?.count ?? 0;
}

function isAmong(which: EmbedsOf) {
  if (which.of === 'embed') return eq(embeds.publicId, which.publicId);
  if (which.of === 'release') return eq(releases.publicId, which.publicId);
  return which.raceId === null ? inArray(races.kind, [...which.kinds]) : eq(races.id, which.raceId);
}

function numbersOf(conn: Conn, embedId: number): number[] {
  return conn
    .select({ number: embedVersions.number })
    .from(embedVersions)
    .where(eq(embedVersions.embedId, embedId))
    .orderBy(asc(embedVersions.number))
    .all()
    .map(({ number }) => number);
}

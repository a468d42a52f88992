import 'server-only';
import { and, asc, desc, eq, inArray, lt, max, sql } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { embeds, embedVersions } from '@/db/schema/embeds';
import { people } from '@/db/schema/people';
import { pollsters, races } from '@/db/schema/races';
import { releases } from '@/db/schema/releases';
import { evidence, sheets } from '@/db/schema/sheets';
import { isPublic, type Viewer, visible } from './visible';

export type EmbedRow = typeof embeds.$inferSelect;
export type EmbedVersionRow = typeof embedVersions.$inferSelect;

export function findEmbedOfSheet(conn: Conn, sheetId: number): EmbedRow | null {
  return conn.select().from(embeds).where(eq(embeds.sheetId, sheetId)).get() ?? null;
}

/** Public ids of embeds by the sheet they were made from, for lists. */
export function listEmbedsOf(conn: Conn, sheetIds: number[]): Map<number, string> {
  const rows = conn
    .select({ sheetId: embeds.sheetId, publicId: embeds.publicId })
    .from(embeds)
    .where(inArray(embeds.sheetId, sheetIds))
    .all();
  return new Map(rows.map(({ sheetId, publicId }) => [sheetId, publicId]));
}

/** Embeds of one claim of one release, in every language. */
export function listEmbedsOfClaim(conn: Conn, claim: { releaseId: number; claimKey: string }) {
  return conn
    .select({ publicId: embeds.publicId, language: sheets.language })
    .from(embeds)
    .innerJoin(sheets, eq(sheets.id, embeds.sheetId))
    .where(and(eq(sheets.releaseId, claim.releaseId), eq(sheets.claimKey, claim.claimKey)))
    .orderBy(asc(sheets.language), asc(embeds.id))
    .all();
}

export function insertEmbed(conn: Conn, row: typeof embeds.$inferInsert): EmbedRow {
  return conn.insert(embeds).values(row).returning().get();
}

/** Adds the next version of an embed; the one that was live becomes superseded. */
export function insertEmbedVersion(conn: Conn, embedId: number, evidenceId: number, now: number): number {
  conn
    .update(embedVersions)
    .set({ state: 'superseded' })
    .where(and(eq(embedVersions.embedId, embedId), eq(embedVersions.state, 'live')))
    .run();
  const last = conn
    .select({ number: max(embedVersions.number) })
    .from(embedVersions)
    .where(eq(embedVersions.embedId, embedId))
    .get();
  const number = (last?.number ?? 0) + 1;
  conn.insert(embedVersions).values({ embedId, number, evidenceId, state: 'live', createdAt: now }).run();
  return number;
}

/** An address stays with its article: from now on it shows what another sheet cleared. */
export function moveEmbed(conn: Conn, embedId: number, sheetId: number): void {
  conn.update(embeds).set({ sheetId }).where(eq(embeds.id, embedId)).run();
}

/** Pulls what an embed shows, and everything it showed before. */
export function pullEmbedVersions(conn: Conn, embedId: number, now: number, unseen: boolean): number {
  return conn
    .update(embedVersions)
    .set({ state: 'pulled', pulledAt: now, pulledUnseen: unseen })
    .where(and(eq(embedVersions.embedId, embedId), inArray(embedVersions.state, ['live', 'superseded'])))
    .run().changes;
}

/**
 * What the public address answers from: the newest version, or the one asked for, with its evidence and whether
 * the embargo is over.
 *
 * @param madeBefore only versions from before this moment; null: whenever made
 */
export function findPublicEmbed(
  conn: Conn,
  publicId: string,
  number: number | null,
  now: number,
  madeBefore: number | null = null,
) {
  return (
    conn
      .select({
        embedId: embeds.publicId,
        version: embedVersions,
        hash: evidence.hash,
        evidenceId: evidence.id,
        embargoAt: releases.embargoAt,
        embargoZone: releases.embargoZone,
        raceId: releases.raceId,
        publicSince: sql<number>`max(${embedVersions.createdAt}, coalesce(${releases.embargoLiftedAt}, ${releases.embargoAt}, 0))`,
        isPublic: isPublic(now),
      })
      .from(embeds)
      .innerJoin(embedVersions, eq(embedVersions.embedId, embeds.id))
      .innerJoin(evidence, eq(evidence.id, embedVersions.evidenceId))
      .innerJoin(sheets, eq(sheets.id, embeds.sheetId))
      .innerJoin(releases, eq(releases.id, sheets.releaseId))
      .where(
        and(
          eq(embeds.publicId, publicId),
          number === null ? undefined : eq(embedVersions.number, number),
          madeBefore === null ? undefined : lt(embedVersions.createdAt, madeBefore),
        ),
      )
      .orderBy(desc(embedVersions.number))
      .limit(1)
      .get() ?? null
  );
}

export function listEmbeds(conn: Conn, viewer: Viewer, now: number, limit: number) {
  return conn
    .select({
      embed: embeds,
      version: embedVersions,
      sheet: sheets,
      release: releases,
      race: races.name,
      pollster: pollsters.name,
      createdBy: people.name,
      evidenceId: embedVersions.evidenceId,
    })
    .from(embeds)
    .innerJoin(embedVersions, eq(embedVersions.embedId, embeds.id))
    .innerJoin(sheets, eq(sheets.id, embeds.sheetId))
    .innerJoin(releases, eq(releases.id, sheets.releaseId))
    .innerJoin(races, eq(races.id, releases.raceId))
    .innerJoin(pollsters, eq(pollsters.id, releases.pollsterId))
    .innerJoin(people, eq(people.id, embeds.createdBy))
    .where(and(inArray(embedVersions.state, ['live', 'pulled']), visible(conn, viewer, now)))
    .orderBy(desc(embeds.id))
    .limit(limit)
    .all();
}

import 'server-only';
import { and, desc, eq, inArray, or, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { Conn } from '@/db/client';
import { languageSignatures, styleActs, styleVersions } from '@/db/schema/house-style';
import { people } from '@/db/schema/people';

export type StyleVersionRow = typeof styleVersions.$inferSelect;
export type StyleActRow = typeof styleActs.$inferSelect;

export function insertStyleVersion(conn: Conn, row: typeof styleVersions.$inferInsert): StyleVersionRow {
  return conn.insert(styleVersions).values(row).returning().get();
}

export function findStyleVersion(conn: Conn, publicId: string): StyleVersionRow | null {
  return conn.select().from(styleVersions).where(eq(styleVersions.publicId, publicId)).get() ?? null;
}

export function findStyleVersionById(conn: Conn, id: number): StyleVersionRow | null {
  return conn.select().from(styleVersions).where(eq(styleVersions.id, id)).get() ?? null;
}

export function findStyleInState(conn: Conn, state: 'in-force' | 'proposed'): StyleVersionRow | null {
  return conn.select().from(styleVersions).where(eq(styleVersions.state, state)).get() ?? null;
}

/** The newest version that carries wording as the product shipped it. */
export function findLatestShipped(conn: Conn): StyleVersionRow | null {
  return (
    conn
      .select()
      .from(styleVersions)
      .where(eq(styleVersions.origin, 'product'))
      .orderBy(desc(styleVersions.id))
      .limit(1)
      .get() ?? null
  );
}

/** Moves a version on, unless it is in another state or was changed since. */
export function updateStyleVersion(
  conn: Conn,
  row: Pick<StyleVersionRow, 'id' | 'version' | 'state'>,
  set: Partial<typeof styleVersions.$inferInsert>,
): boolean {
  const result = conn
    .update(styleVersions)
    .set({ ...set, version: row.version + 1 })
    .where(
      and(
        eq(styleVersions.id, row.id),
        eq(styleVersions.version, row.version),
        eq(styleVersions.state, row.state),
      ),
    )
    .run();
  return result.changes === 1;
}

export function nextStyleNumber(conn: Conn): number {
  const row = conn
    .select({ last: sql<number>`coalesce(max(${styleVersions.number}), 0)` })
    .from(styleVersions)
    .get();
  return (row?.last ?? 0) + 1;
}

const authors = alias(people, 'authors');
const seconds = alias(people, 'seconds');

/** Versions that are or were in force, newest first. */
export function listNumberedStyles(conn: Conn, limit: number) {
  return versionSelect(conn)
    .where(or(eq(styleVersions.state, 'in-force'), eq(styleVersions.state, 'replaced')))
    .orderBy(desc(styleVersions.number))
    .limit(limit)
    .all();
}

/** Drafts and what is proposed, newest first. */
export function listOpenStyles(conn: Conn, limit: number) {
  return versionSelect(conn)
    .where(inArray(styleVersions.state, ['draft', 'proposed']))
    .orderBy(desc(styleVersions.updatedAt))
    .limit(limit)
    .all();
}

function versionSelect(conn: Conn) {
  return conn
    .select({ version: styleVersions, author: authors.name, second: seconds.name })
    .from(styleVersions)
    .leftJoin(authors, eq(authors.id, styleVersions.authorId))
    .leftJoin(seconds, eq(seconds.id, styleVersions.putInForceBy));
}

export function insertStyleAct(conn: Conn, row: typeof styleActs.$inferInsert): void {
  conn.insert(styleActs).values(row).run();
}

export function listStyleActs(conn: Conn, styleVersionId: number) {
  return conn
    .select({ act: styleActs, person: people.name })
    .from(styleActs)
    .innerJoin(people, eq(people.id, styleActs.personId))
    .where(eq(styleActs.styleVersionId, styleVersionId))
    .orderBy(desc(styleActs.id))
    .all();
}

export function insertSignature(conn: Conn, row: typeof languageSignatures.$inferInsert): void {
  conn.insert(languageSignatures).values(row).run();
}

/** The newest act on a language's messages as they are, whoever's. */
export function findSignature(conn: Conn, language: string, packHash: string) {
  return (
    conn
      .select({ signature: languageSignatures, person: people.name })
      .from(languageSignatures)
      .innerJoin(people, eq(people.id, languageSignatures.personId))
      .where(and(eq(languageSignatures.language, language), eq(languageSignatures.packHash, packHash)))
      .orderBy(desc(languageSignatures.id))
      .limit(1)
      .get() ?? null
  );
}

import 'server-only';
import { and, eq, inArray, ne, or } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { findingIndex } from '@/db/schema/releases';

export type FindingIndexRow = typeof findingIndex.$inferInsert;

/** Replaces what lists know of one version under one policy and engine. */
export function replaceFindingIndex(conn: Conn, versionId: number, rows: FindingIndexRow[]): void {
  conn.delete(findingIndex).where(eq(findingIndex.releaseVersionId, versionId)).run();
  for (const row of rows) conn.insert(findingIndex).values(row).run();
}

export function listVerdicts(conn: Conn, versionIds: number[], policyVersion: number, engine: string) {
  if (versionIds.length === 0) return [];
  return conn
    .select({ versionId: findingIndex.releaseVersionId, verdict: findingIndex.verdict })
    .from(findingIndex)
    .where(
      and(
        inArray(findingIndex.releaseVersionId, versionIds),
        eq(findingIndex.policyVersion, policyVersion),
        eq(findingIndex.engine, engine),
      ),
    )
    .all();
}

/** Versions, of those given, whose marks were computed under another policy or by another engine. */
export function listOutdated(conn: Conn, versionIds: number[], policyVersion: number, engine: string) {
  const rows = conn
    .selectDistinct({ versionId: findingIndex.releaseVersionId })
    .from(findingIndex)
    .where(and(inArray(findingIndex.releaseVersionId, versionIds), isOutdated(policyVersion, engine)))
    .all();
  return new Set(rows.map(({ versionId }) => versionId));
}

/** Whether anything of the index was computed under another policy or by another engine. */
export function isIndexOutdated(conn: Conn, policyVersion: number, engine: string): boolean {
  const where = isOutdated(policyVersion, engine);
  return conn.select().from(findingIndex).where(where).limit(1).get() !== undefined;
}

function isOutdated(policyVersion: number, engine: string) {
  return or(ne(findingIndex.policyVersion, policyVersion), ne(findingIndex.engine, engine));
}

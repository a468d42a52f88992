import 'server-only';
import { and, eq, inArray } from 'drizzle-orm';
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

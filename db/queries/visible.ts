import 'server-only';
import { and, eq, exists, isNotNull, isNull, lte, or, type SQL, sql } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { embargoList, releases } from '@/db/schema/releases';
import { type Actor, canReadUnpublished } from '@/lib/domain/roles';

export type Viewer = Pick<Actor, 'personId' | 'roles'>;

/** The embargo is over, or there was none. */
export function isPublic(now: number): SQL {
  return or(isNull(releases.embargoAt), isNotNull(releases.embargoLiftedAt), lte(releases.embargoAt, now))!;
}

/** The viewer, or the copy desk as a whole, is on this release's embargo list. */
export function isOnEmbargoList(conn: Conn, viewer: Viewer): SQL {
  const named = eq(embargoList.personId, viewer.personId);
  const desk = viewer.roles.includes('copy-desk') ? or(named, isNull(embargoList.personId)) : named;
  return exists(
    conn
      .select({ one: sql`1` })
      .from(embargoList)
      .where(and(eq(embargoList.releaseId, releases.id), desk)),
  );
}

/** Releases whose figures this viewer may see now: the one filter of every list, count, search and export. */
export function visible(conn: Conn, viewer: Viewer, now: number): SQL {
  if (canReadUnpublished(viewer)) return sql`1`;
  return or(isPublic(now), isOnEmbargoList(conn, viewer))!;
}

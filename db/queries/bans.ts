import 'server-only';
import { and, desc, eq, gt, isNull, or } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { Conn } from '@/db/client';
import { publicationBans } from '@/db/schema/clearing-calendar';
import { people } from '@/db/schema/people';
import { races } from '@/db/schema/races';

export type BanRow = typeof publicationBans.$inferSelect;

const enders = alias(people, 'enders');

export function insertBan(conn: Conn, row: typeof publicationBans.$inferInsert): BanRow {
  return conn.insert(publicationBans).values(row).returning().get();
}

export function findBan(conn: Conn, publicId: string): BanRow | null {
  return conn.select().from(publicationBans).where(eq(publicationBans.publicId, publicId)).get() ?? null;
}

/** Every ban that was ever entered, the latest end first. */
export function listBans(conn: Conn, limit: number) {
  return conn
    .select({ ban: publicationBans, race: races.name, enteredBy: people.name, endedBy: enders.name })
    .from(publicationBans)
    .innerJoin(people, eq(people.id, publicationBans.enteredBy))
    .leftJoin(enders, eq(enders.id, publicationBans.endedBy))
    .leftJoin(races, eq(races.id, publicationBans.raceId))
    .orderBy(desc(publicationBans.toAt), desc(publicationBans.id))
    .limit(limit)
    .all();
}

/** Bans of one race, or of every race, that are in force or ahead. */
export function listBansOn(conn: Conn, raceId: number, now: number): BanRow[] {
  return conn
    .select()
    .from(publicationBans)
    .where(
      and(
        isNull(publicationBans.endedAt),
        gt(publicationBans.toAt, now),
        or(isNull(publicationBans.raceId), eq(publicationBans.raceId, raceId)),
      ),
    )
    .all();
}

/** False where somebody ended it before. */
export function endBan(
  conn: Conn,
  id: number,
  end: { endedBy: number; endedAt: number; endReason: string },
): boolean {
  const result = conn
    .update(publicationBans)
    .set(end)
    .where(and(eq(publicationBans.id, id), isNull(publicationBans.endedAt)))
    .run();
  return result.changes === 1;
}

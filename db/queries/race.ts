import 'server-only';
import { asc, eq, isNull, sql } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { pollsters, raceOptions, races, raceThresholds, sponsors } from '@/db/schema/races';
import type { ThresholdBase } from '@/lib/domain/vocabulary';

export type RaceRow = typeof races.$inferSelect;

export function findRaceByPublicId(conn: Conn, publicId: string): RaceRow | null {
  return conn.select().from(races).where(eq(races.publicId, publicId)).get() ?? null;
}

export function findRaceById(conn: Conn, id: number): RaceRow {
  return conn.select().from(races).where(eq(races.id, id)).get()!;
}

export function findRaceByName(conn: Conn, name: string): RaceRow | null {
  return (
    conn
      .select()
      .from(races)
      .where(sql`folded(${races.name}) = folded(${name})`)
      .get() ?? null
  );
}

export function listRaces(conn: Conn): RaceRow[] {
  return conn
    .select()
    .from(races)
    .where(isNull(races.archivedAt))
    .orderBy(sql`folded(${races.name})`)
    .all();
}

export function listRaceOptions(conn: Conn, raceId: number): string[] {
  return conn
    .select({ name: raceOptions.name })
    .from(raceOptions)
    .where(eq(raceOptions.raceId, raceId))
    .orderBy(asc(raceOptions.position))
    .all()
    .map((row) => row.name);
}

export function listRaceThresholds(conn: Conn, raceId: number) {
  return conn
    .select({ option: raceOptions.name, pct: raceThresholds.pct, base: raceThresholds.base })
    .from(raceThresholds)
    .innerJoin(raceOptions, eq(raceOptions.id, raceThresholds.raceOptionId))
    .where(eq(raceThresholds.raceId, raceId))
    .orderBy(raceThresholds.id)
    .all();
}

export function insertRace(
  conn: Conn,
  row: typeof races.$inferInsert,
  options: string[],
  thresholds: { option: string; pct: number; base: ThresholdBase }[],
): RaceRow {
  const race = conn.insert(races).values(row).returning().get();
  const ids = new Map<string, number>();
  for (const [position, name] of options.entries()) {
    const option = conn.insert(raceOptions).values({ raceId: race.id, name, position }).returning().get();
    ids.set(name, option.id);
  }
  for (const { option, pct, base } of thresholds) {
    const raceOptionId = ids.get(option)!;
    conn.insert(raceThresholds).values({ raceId: race.id, raceOptionId, pct, base }).run();
  }
  return race;
}

type Named = typeof pollsters | typeof sponsors;

/** The pollster or sponsor of this name whatever its case, or null. */
export function findNamed(conn: Conn, table: 'pollsters' | 'sponsors', name: string) {
  const named: Named = table === 'pollsters' ? pollsters : sponsors;
  return (
    conn
      .select()
      .from(named)
      .where(sql`folded(${named.name}) = folded(${name})`)
      .get() ?? null
  );
}

export function findPollster(conn: Conn, id: number): typeof pollsters.$inferSelect {
  return conn.select().from(pollsters).where(eq(pollsters.id, id)).get()!;
}

export function insertNamed(
  conn: Conn,
  table: 'pollsters' | 'sponsors',
  row: { publicId: string; name: string; createdAt: number },
) {
  const named: Named = table === 'pollsters' ? pollsters : sponsors;
  return conn.insert(named).values(row).returning().get();
}

export function listNames(conn: Conn, table: 'pollsters' | 'sponsors'): string[] {
  const named: Named = table === 'pollsters' ? pollsters : sponsors;
  return conn
    .select({ name: named.name })
    .from(named)
    .orderBy(sql`folded(${named.name})`)
    .all()
    .map((row) => row.name);
}

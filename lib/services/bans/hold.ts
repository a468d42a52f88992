import 'server-only';
import type { Conn } from '@/db/client';
import { listBansOn } from '@/db/queries/bans';
import { findRaceById } from '@/db/queries/race';
import { barOf, bansRace, banStateAt } from '@/lib/domain/bans';
import { formatInstant } from '@/lib/format/date';
import { AppError } from '@/lib/errors';

export type Hold = { jurisdiction: string; untilAt: number; zone: string; rule: string };

/** The bans in force on a race now: each holds its sheets. */
export function holdsOn(conn: Conn, raceId: number, now: number): Hold[] {
  const race = findRaceById(conn, raceId);
  return listBansOn(conn, raceId, now)
    .filter((ban) => bansRace(ban, race) && banStateAt(ban, now) === 'in-force')
    .map(({ jurisdiction, toAt, zone, rule }) => ({ jurisdiction, untilAt: toAt, zone, rule }));
}

export type BanAhead = Hold & { fromAt: number };

/** The bans that will come into force on a race, the nearest first. */
export function bansAheadOn(conn: Conn, raceId: number, now: number): BanAhead[] {
  const race = findRaceById(conn, raceId);
  return listBansOn(conn, raceId, now)
    .filter((ban) => bansRace(ban, race) && banStateAt(ban, now) === 'ahead')
    .map(({ jurisdiction, fromAt, toAt, zone, rule }) => ({
      jurisdiction,
      fromAt,
      untilAt: toAt,
      zone,
      rule,
    }))
    .sort((a, b) => a.fromAt - b.fromAt);
}

/** What of a race is barred now, for what is public. */
export function barOn(conn: Conn, raceId: number, now: number) {
  return barOf(listBansOn(conn, raceId, now), findRaceById(conn, raceId), now);
}

/** @throws AppError `conflict` while a ban on the race is in force */
export function refuseUnderBan(conn: Conn, raceId: number, now: number): void {
  const [hold] = holdsOn(conn, raceId, now);
  if (!hold) return;
  const until = formatInstant(hold.untilAt, hold.zone, 'en-GB');
  throw new AppError(
    'conflict',
    `Publication of these figures is barred in ${hold.jurisdiction} until ${until} (${hold.zone}). Nothing was done.`,
  );
}

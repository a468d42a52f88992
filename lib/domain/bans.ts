import { ELECTION_KINDS, type RaceKind } from './vocabulary';

export const BANNED_FIGURES = ['new-figures', 'all-figures'] as const;
export type BannedFigures = (typeof BANNED_FIGURES)[number];
export const BANNED_FIGURES_NAMES: Record<BannedFigures, string> = {
  'new-figures': 'New figures; what is public already stays',
  'all-figures': 'All figures; what is public is taken down meanwhile',
};

/** A time in which a place bars the publication of the figures of one race, or of every race that ends in a vote. */
export type Ban = {
  raceId: number | null;
  bars: BannedFigures;
  fromAt: number;
  toAt: number;
  endedAt: number | null;
};

type Race = { id: number; kind: RaceKind };

export function bansRace(ban: Pick<Ban, 'raceId'>, race: Race): boolean {
  return ban.raceId === null ? ELECTION_KINDS.includes(race.kind) : ban.raceId === race.id;
}

export type BanState = 'ahead' | 'in-force' | 'over';

/** Its end is the first moment in which it bars nothing; one that an editor ended is over from then on. */
export function banStateAt({ fromAt, toAt, endedAt }: Ban, now: number): BanState {
  if (endedAt !== null || now >= toAt) return 'over';
  return now < fromAt ? 'ahead' : 'in-force';
}

/**
 * What of a race is barred at one moment, of all bans together.
 *
 * @returns `figures` the strictest bar in force or null; `sinceAt` the earliest start among the bans in force;
 *   `untilAt` when the last of them ends; `nextAt` the next start of one ahead
 */
export function barOf(bans: readonly Ban[], race: Race, now: number) {
  const own = bans.filter((ban) => bansRace(ban, race));
  const active = own.filter((ban) => banStateAt(ban, now) === 'in-force');
  const ahead = own.filter((ban) => banStateAt(ban, now) === 'ahead');
  const isAll = active.some(({ bars }) => bars === 'all-figures');
  return {
    figures: active.length === 0 ? null : isAll ? ('all-figures' as const) : ('new-figures' as const),
    sinceAt: active.length === 0 ? null : Math.min(...active.map(({ fromAt }) => fromAt)),
    untilAt: active.length === 0 ? null : Math.max(...active.map(({ toAt }) => toAt)),
    nextAt: ahead.length === 0 ? null : Math.min(...ahead.map(({ fromAt }) => fromAt)),
  };
}

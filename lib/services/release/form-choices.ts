import 'server-only';
import { listNames, listRaceOptions, listRaces, listRaceThresholds } from '@/db/queries/race';
import { type Actor, canLogReleases } from '@/lib/domain/roles';
import type { DeskPolicy } from '@/lib/domain/house-style';
import type { FactThreshold } from '@/lib/domain/release-facts';
import type { RaceKind } from '@/lib/domain/vocabulary';
import type { Policy } from '@/lib/findings/check-types';
import { readEnv } from '@/lib/env';
import { authorize, type Ctx } from '../context';
import { readComparisonBasis, readDeskSettings } from '../setup/desk-settings';

export type RaceChoice = {
  id: string;
  name: string;
  kind: RaceKind;
  options: string[];
  thresholds: FactThreshold[];
};
export type FormChoices = {
  races: RaceChoice[];
  pollsters: string[];
  sponsors: string[];
  zone: string;
  policy: Policy;
  /** Kinds of sample that the desk computes as if random. */
  comparisonBasis: DeskPolicy['comparisonBasis'];
};

/** What the release form offers to choose from. */
export function getFormChoices(actor: Actor, ctx: Pick<Ctx, 'db'>): FormChoices {
  authorize(canLogReleases(actor), 'Only reporters and editors log releases.');
  return {
    races: listRaces(ctx.db).map((race) => ({
      id: race.publicId,
      name: race.name,
      kind: race.kind,
      options: listRaceOptions(ctx.db, race.id),
      thresholds: listRaceThresholds(ctx.db, race.id),
    })),
    pollsters: listNames(ctx.db, 'pollsters'),
    sponsors: listNames(ctx.db, 'sponsors'),
    zone: readEnv().LEADLINE_ZONE,
    policy: readDeskSettings(ctx.db).policy.body,
    comparisonBasis: readComparisonBasis(ctx.db),
  };
}

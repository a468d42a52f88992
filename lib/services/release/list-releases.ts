import 'server-only';
import { listReleases as listRows, listShares } from '@/db/queries/release';
import { listVerdicts } from '@/db/queries/finding-index';
import { valueOf } from '@/lib/domain/disclosed';
import { pctOf } from '@/lib/domain/release-facts';
import { type Actor, canReadUnpublished } from '@/lib/domain/roles';
import type { Population } from '@/lib/domain/vocabulary';
import type { Verdict } from '@/lib/findings/check-types';
import { ENGINE_VERSION } from '@/lib/findings/engine-version';
import { authorize, type Ctx } from '../context';
import { readDeskSettings } from '../setup/desk-settings';
import { factsOfWhole } from './facts';

export type ReleaseListItem = {
  id: string;
  race: string;
  pollster: string;
  population: Population | null;
  n: number | null;
  fieldStartOn: string;
  fieldEndOn: string;
  /** The largest shares as printed, at most three. */
  topShares: { option: string; printed: string }[];
  verdicts: Verdict[];
  embargoAt: number | null;
  isUnderEmbargo: boolean;
  loggedBy: string;
  loggedAt: number;
};

const LIMIT = 200;

export function listReleases(actor: Actor, ctx: Ctx): ReleaseListItem[] {
  authorize(canReadUnpublished(actor), 'Releases are read by reporters and editors.');
  const rows = listRows(ctx.db, actor, ctx.now, LIMIT);
  const policy = readDeskSettings(ctx.db).policy.version;
  const versionIds = rows.map((row) => row.version.id);
  const verdicts = listVerdicts(ctx.db, versionIds, policy, ENGINE_VERSION);
  return rows.map((row) => {
    const facts = factsOfWhole(ctx.db, row);
    const { embargoAt, embargoLiftedAt, publicId } = row.release;
    return {
      id: publicId,
      race: row.race.name,
      pollster: row.pollster.name,
      population: valueOf(facts.population),
      n: valueOf(facts.n),
      fieldStartOn: facts.fieldStartOn,
      fieldEndOn: facts.fieldEndOn,
      topShares: topShares(listShares(ctx.db, row.question.id), facts.decimals),
      verdicts: verdicts.filter((v) => v.versionId === row.version.id).map((v) => v.verdict as Verdict),
      embargoAt,
      isUnderEmbargo: embargoAt !== null && embargoLiftedAt === null && embargoAt > ctx.now,
      loggedBy: row.enteredBy,
      loggedAt: row.version.createdAt,
    };
  });
}

function topShares(rows: ReturnType<typeof listShares>, decimals: number) {
  return rows
    .map(({ share }) => share)
    .filter((share) => share.isAnswer && share.units !== null)
    .sort((a, b) => b.units! - a.units!)
    .slice(0, 3)
    .map((share) => ({ option: share.option, printed: pctOf(share.units!, decimals).toFixed(decimals) }));
}

import 'server-only';
import { listReleases as listRows, listSharesOf } from '@/db/queries/release';
import { listOutdated, listVerdicts } from '@/db/queries/finding-index';
import { pctOf } from '@/lib/domain/release-facts';
import { type Actor, canReadUnpublished } from '@/lib/domain/roles';
import type { Population } from '@/lib/domain/vocabulary';
import type { Verdict } from '@/lib/findings/check-types';
import { ENGINE_VERSION } from '@/lib/findings/engine-version';
import { authorize, type Ctx } from '../context';
import { readDeskSettings } from '../setup/desk-settings';

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
  /** Its marks belong to an earlier policy or engine, and are being computed anew. */
  isBeingRecomputed: boolean;
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
  const outdated = listOutdated(ctx.db, versionIds, policy, ENGINE_VERSION);
  const questionIds = rows.map((row) => row.question.id);
  const shares = listSharesOf(ctx.db, questionIds);
  return rows.map((row) => {
    const { embargoAt, embargoLiftedAt, publicId } = row.release;
    return {
      id: publicId,
      race: row.race.name,
      pollster: row.pollster.name,
      population: row.base.population,
      n: row.base.n,
      fieldStartOn: row.version.fieldStartOn,
      fieldEndOn: row.version.fieldEndOn,
      topShares: topShares(
        shares.filter(({ questionId }) => questionId === row.question.id),
        row.question.decimals,
      ),
      verdicts: verdicts.filter((v) => v.versionId === row.version.id).map((v) => v.verdict as Verdict),
      isBeingRecomputed: outdated.has(row.version.id),
      embargoAt,
      isUnderEmbargo: embargoAt !== null && embargoLiftedAt === null && embargoAt > ctx.now,
      loggedBy: row.enteredBy,
      loggedAt: row.version.createdAt,
    };
  });
}

function topShares(rows: ReturnType<typeof listSharesOf>, decimals: number) {
  return rows
    .filter((share) => share.isAnswer && share.units !== null)
    .sort((a, b) => b.units! - a.units!)
    .slice(0, 3)
    .map((share) => ({ option: share.option, printed: pctOf(share.units!, decimals).toFixed(decimals) }));
}

import 'server-only';
import { isListed, listEmbargoReaders, summarizeEmbargoViews } from '@/db/queries/embargo';
import { findRelease, findWholeVersion, listShares, type ReleaseRow } from '@/db/queries/release';
import { isReleasePublic } from '@/db/queries/sheet';
import { type Actor, canActAsEditor, canReadUnpublished } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { renderMarkdown } from '@/lib/markdown/render-markdown';
import type { HouseStyle } from '@/lib/wording/house-style';
import { authorize, type Ctx } from '../context';
import { type Computed, computeFindings } from './compute-findings';
import { whyNotRevised } from './why-not-revised';

export type EmbargoView = {
  /** Still running now. */
  isRunning: boolean;
  at: number;
  local: string;
  zone: string;
  liftedAt: number | null;
};

export type ReleaseView = Omit<Computed, 'settings' | 'comparison'> & {
  id: string;
  version: number;
  policyVersion: number;
  /** What of house style shows beside the findings and at the choice of a claim. */
  houseStyle: Pick<HouseStyle, 'twiceTheMargin' | 'onePollHeadlines'>;
  comparison: Omit<Computed['comparison'], 'versionId' | 'override'> & {
    override: { reason: string; by: string } | null;
  };
  embargo: EmbargoView | null;
  embargoReaders: { personId: string | null; name: string | null }[];
  /** Readings from the embargo list, told to editors. */
  embargoViews: { name: string; count: number; lastAt: number }[];
  isOnList: boolean;
  enteredBy: Record<string, string>;
  loggedBy: string;
  loggedAt: number;
  methodNoteHtml: string | null;
  isFrozen: boolean;
  /** Why these figures may not change now. */
  whyNotRevised: string | null;
};

/** One release with what its numbers support, for those who may read unpublished figures. */
export function getRelease(actor: Actor, id: string, ctx: Ctx): ReleaseView {
  authorize(canReadUnpublished(actor), 'Releases are read by reporters and editors.');
  const release = findVisibleRelease(actor, id, ctx);
  const versionId = release.currentVersionId!;
  const whole = findWholeVersion(ctx.db, versionId)!;
  const { settings, comparison, ...computed } = computeFindings(ctx.db, versionId, ctx.now);
  const { versionId: _, override, ...chosen } = comparison;
  const { twiceTheMargin, onePollHeadlines } = settings.houseStyle.body;
  return {
    ...computed,
    id: release.publicId,
    version: release.version,
    policyVersion: settings.policy.version,
    houseStyle: { twiceTheMargin, onePollHeadlines },
    comparison: { ...chosen, override: override && { reason: override.reason, by: override.by } },
    embargo: embargoView(release, isReleasePublic(ctx.db, release.id, ctx.now)),
    embargoReaders: listEmbargoReaders(ctx.db, release.id),
    embargoViews: canActAsEditor(actor) ? summarizeEmbargoViews(ctx.db, release.id) : [],
    isOnList: isListed(ctx.db, release.id, actor),
    enteredBy: Object.fromEntries(
      listShares(ctx.db, whole.question.id).map(({ share, enteredBy }) => [share.option, enteredBy]),
    ),
    loggedBy: whole.enteredBy,
    loggedAt: whole.version.createdAt,
    methodNoteHtml: whole.version.methodNote && renderMarkdown(whole.version.methodNote),
    isFrozen: whole.version.frozenAt !== null,
    whyNotRevised: whyNotRevised(ctx.db, release.id),
  };
}

export function findVisibleRelease(actor: Actor, id: string, ctx: Ctx): ReleaseRow {
  const release = findRelease(ctx.db, id, actor, ctx.now);
  if (!release?.currentVersionId) throw new AppError('not-found', 'There is no such release.');
  return release;
}

export function embargoView(release: ReleaseRow, isPublic: boolean): EmbargoView | null {
  if (release.embargoAt === null) return null;
  return {
    isRunning: !isPublic,
    at: release.embargoAt,
    local: release.embargoLocal ?? '',
    zone: release.embargoZone ?? '',
    liftedAt: release.embargoLiftedAt,
  };
}

import 'server-only';
import { findEvidence, findLastAct } from '@/db/queries/clearing';
import { listUnread } from '@/db/queries/one-reader';
import { findTerms } from '@/db/queries/sheet-desk';
import { isReleasePublic, listClearedLines } from '@/db/queries/sheet';
import { isAsPrinted } from '@/lib/domain/as-printed';
import { type Actor, canReadCopyDesk, canReadUnpublished } from '@/lib/domain/roles';
import { inScreenOrder } from '@/lib/domain/sheet';
import { AppError } from '@/lib/errors';
import { findClaim } from '@/lib/findings/claim-key';
import { holdsOn } from '../bans/hold';
import { authorize, type Ctx } from '../context';
import { recordEmbargoViews } from '../release/record-embargo-views';
import type { AsPrintedBody } from './assemble-as-printed';
import { currencyOf } from './currency';
import { standingOf } from './desk-view';
import type { EvidenceBody } from './evidence-body';
import { languagesOf } from './languages';
import { openSheet } from './sheet-state';
import { wantedOf } from './terms';

/**
 * A sheet as data. Everybody with a role gets what is cleared and whether it is still current; reporters and editors
 * get what is being written too. A sheet that is under embargo does not exist for whoever is not on its list.
 */
export function getSheetData(actor: Actor, id: string, ctx: Ctx) {
  authorize(canReadCopyDesk(actor), 'Sheets are read by people with a role.');
  const opened = openSheet(ctx.db, actor, id, ctx.now);
  const { sheet, release } = opened;
  const isDesk = canReadUnpublished(actor);
  const cleared = clearedOf(ctx, opened);
  if (!cleared && !isDesk) throw new AppError('not-found', 'There is no such sheet.');
  if (!isDesk && !isReleasePublic(ctx.db, release.id, ctx.now))
    recordEmbargoViews(ctx, actor, [release.id], `sheet ${id} as data`);
  return {
    id: sheet.publicId,
    releaseId: release.publicId,
    language: sheet.language,
    asPrinted: isAsPrinted(sheet),
    cleared,
    held: holdsOn(ctx.db, release.raceId, ctx.now),
    ...(isDesk ? writtenOf(ctx, opened) : {}),
  };
}

type Opened = ReturnType<typeof openSheet>;

function clearedOf(ctx: Ctx, { sheet, release }: Opened) {
  const lines = inScreenOrder(listClearedLines(ctx.db, sheet.id), ({ line }) => line.kind);
  const act = findLastAct(ctx.db, sheet.id, 'cleared');
  const evidence = act?.evidenceId ? findEvidence(ctx.db, act.evidenceId) : null;
  if (lines.length === 0 || !act || !evidence) return null;
  const body = JSON.parse(evidence.bytes.toString('utf8')) as EvidenceBody | AsPrintedBody;
  const finding = findClaim(body.answer, body.claimKey)?.finding;
  const verdict = finding && 'verdict' in finding ? finding.verdict : null;
  const standing = standingOf({ body, verdict }, findTerms(ctx.db, sheet.id)?.shelfDays ?? null);
  return {
    at: act.at,
    evidence: evidence.hash,
    verdict,
    readers: listUnread(ctx.db, [evidence.id]).size > 0 ? 1 : 2,
    lines: lines.map(({ line, version }) => ({ kind: line.kind, text: version.text })),
    currency: currencyOf(ctx.db, sheet, standing, ctx.now),
    needsReview: languagesOf(ctx.db, sheet, release.publicId).reviews.map(({ language, cause, at }) => ({
      language,
      cause,
      at,
    })),
  };
}

function writtenOf(ctx: Ctx, { sheet, release, state, texts, author }: Opened) {
  return {
    version: sheet.version,
    state,
    author,
    lines: texts,
    wanted: wantedOf(findTerms(ctx.db, sheet.id)),
    languages: languagesOf(ctx.db, sheet, release.publicId).siblings,
  };
}

import 'server-only';
import { findEvidence, type listActsOf } from '@/db/queries/clearing';
import { listOpenReviews } from '@/db/queries/languages';
import { listUnread } from '@/db/queries/one-reader';
import type { listClearedSheets } from '@/db/queries/sheet';
import { listTermsOf } from '@/db/queries/sheet-desk';
import { findClaim } from '@/lib/findings/claim-key';
import { holdsOn } from '../bans/hold';
import type { Ctx } from '../context';
import { currencyOf } from '../sheet/currency';
import { standingOf } from '../sheet/desk-view';
import type { EvidenceBody } from '../sheet/evidence-body';

type Rows = ReturnType<typeof listClearedSheets>;

/** What stands beside cleared words on the copy desk, for many sheets at once. */
export function marksOf(ctx: Ctx, rows: Rows, clearings: ReturnType<typeof listActsOf>) {
  const sheetIds = rows.map(({ sheet }) => sheet.id);
  const evidenceIds = clearings.map(({ act }) => act.evidenceId).filter((id) => id !== null);
  const unread = listUnread(ctx.db, evidenceIds);
  const terms = listTermsOf(ctx.db, sheetIds);
  const reviews = new Set(listOpenReviews(ctx.db, sheetIds).map(({ review }) => review.sheetId));
  return ({ sheet, release }: Rows[number], evidenceId: number | null) => ({
    oneReader: (evidenceId !== null && unread.get(evidenceId)) || null,
    stale: evidenceId === null ? [] : staleOf(ctx, sheet, evidenceId, terms.get(sheet.id)?.shelfDays ?? null),
    needsReview: reviews.has(sheet.id),
    holds: holdsOn(ctx.db, release.raceId, ctx.now),
  });
}

function staleOf(ctx: Ctx, sheet: Rows[number]['sheet'], evidenceId: number, shelfDays: number | null) {
  const body = JSON.parse(findEvidence(ctx.db, evidenceId)!.bytes.toString('utf8')) as EvidenceBody;
  const finding = findClaim(body.answer, body.claimKey)?.finding;
  const verdict = finding && 'verdict' in finding ? finding.verdict : null;
  return currencyOf(ctx.db, sheet, standingOf({ body, verdict }, shelfDays), ctx.now).reasons;
}

import 'server-only';
import { z } from 'zod';
import type { Conn, Tx } from '@/db/client';
import { insertReview, listOpenReviews, listSiblings, settleReviews } from '@/db/queries/languages';
import type { SheetRow } from '@/db/queries/sheet';
import { type Actor, canDraftSheets } from '@/lib/domain/roles';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { openSheet, refuseUnless } from './sheet-state';

export type ReviewCause = 'changed' | 'cleared' | 'pulled';
export type LanguageView = {
  /** What a sheet of the same claim in another language is drafted from. */
  claim: { releaseId: string; key: string };
  /** The same claim in other languages. */
  siblings: { id: string; language: string }[];
  /** What happened to them since this one was last looked at. */
  reviews: { language: string; sheetId: string; cause: ReviewCause; at: number }[];
};

/** The same claim in other languages needs another look; nothing of it is changed or translated. */
export function markSiblings(tx: Tx, sheet: SheetRow, cause: ReviewCause, now: number): void {
  const siblings = listSiblings(tx, sheet);
  const open = listOpenReviews(
    tx,
    siblings.map(({ id }) => id),
  );
  for (const { id } of siblings) {
    const isKnown = open.some(
      ({ review }) => review.sheetId === id && review.causeSheetId === sheet.id && review.cause === cause,
    );
    if (!isKnown) insertReview(tx, { sheetId: id, causeSheetId: sheet.id, cause, at: now });
  }
}

/** Whoever files a sheet anew has looked at it. */
export function settleByFiling(tx: Tx, sheet: SheetRow, actor: Actor, now: number): void {
  settleReviews(tx, sheet.id, { settledBy: actor.personId, settledAt: now, settledAs: 'filed' });
}

/** Says that a sheet still fits, although the same claim changed in another language. */
export function markReviewed(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canDraftSheets(actor), 'Reporters and editors review sheets.');
  const { id } = parse(z.strictObject({ id: z.string().min(1).max(64) }), input);
  transact(ctx, (tx) => {
    const opened = openSheet(tx, actor, id, ctx.now);
    const causes = listOpenReviews(tx, [opened.sheet.id]).map(({ review, language }) => ({
      cause: review.cause,
      language,
    }));
    refuseUnless(causes.length > 0, 'This sheet needs no review now.');
    settleReviews(tx, opened.sheet.id, {
      settledBy: actor.personId,
      settledAt: ctx.now,
      settledAs: 'reviewed',
    });
    const entry = { action: 'reviewed sheet', entity: 'sheet', entityId: id };
    const after = { language: opened.sheet.language, causes };
    appendRecord(tx, { personId: actor.personId, ...entry, after, releaseId: opened.release.id }, ctx.now);
  });
}

export function languagesOf(conn: Conn, sheet: SheetRow, releaseId: string): LanguageView {
  return {
    claim: { releaseId, key: sheet.claimKey },
    siblings: listSiblings(conn, sheet).map(({ publicId, language }) => ({ id: publicId, language })),
    reviews: listOpenReviews(conn, [sheet.id]).map(({ review, language, causeId }) => ({
      language,
      sheetId: causeId,
      cause: review.cause,
      at: review.at,
    })),
  };
}

import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { findEvidence, findLastAct, insertClearing, type ClearingRow } from '@/db/queries/clearing';
import { findStandIn } from '@/db/queries/corrections';
import { type EmbedRow, findEmbedOfSheet, insertEmbedVersion, moveEmbed } from '@/db/queries/embed';
import { listClearedLines, moveLineVersions, type SheetRow, touchSheet } from '@/db/queries/sheet';
import { type Actor, canDraftSheets, isTwoPersonAgreement, type Role } from '@/lib/domain/roles';
import { newId } from '@/lib/security/ids';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { enqueuePurgeIn } from '../jobs/enqueue-purge';
import { refuseUnsigned } from '../house-style/sign-language';
import { refuseUnderBan } from '../bans/hold';
import { assembleSheet } from './assemble-sheet';
import { markSiblings } from './languages';
import { type LineReasons, lineReasons, storeLineReasons } from './line-reasons';
import { overrideIn } from './override-in';
import { MOVED_ON, openSheet, type Opened, refuseUnless } from './sheet-state';
import { enqueueShelfEndIn } from './shelf-end';

export const readerInput = z.strictObject({
  id: z.string().min(1).max(64),
  /** The evidence that was on the screen. */
  hash: z.string().regex(/^[0-9a-f]{64}$/, 'Reload the page and look again.'),
});

export type Cleared =
  | { outcome: 'cleared'; version: number }
  /** Two people agreed; the words become printable with the correction that they wait for. */
  | { outcome: 'agreed'; version: number }
  /** The evidence had changed since filing: the sheet went back to its filer, who agrees anew with one key. */
  | { outcome: 'returned' };

/** The second agreement: words that two people, one of them an editor, have agreed to become printable. */
export function clearSheet(actor: Actor, input: unknown, ctx: Ctx): Cleared {
  authorize(canDraftSheets(actor), 'Only reporters and editors read filed sheets.');
  const { id, hash } = parse(readerInput, input);
  return transact(ctx, (tx) => clearSheetIn(tx, actor, { id, hash }, ctx.now));
}

export function clearSheetIn(
  tx: Tx,
  asker: Actor,
  { id, hash }: { id: string; hash: string },
  now: number,
): Cleared {
  const actor = actingNow(tx, asker);
  authorize(canDraftSheets(actor), 'Only reporters and editors read filed sheets.');
  const opened = openSheet(tx, actor, id, now);
  const filing = filingOf(tx, opened);
  const evidence = findEvidence(tx, filing.evidenceId!)!;
  refuseUnless(evidence.hash === hash, MOVED_ON);
  const filer = { personId: filing.personId, roles: JSON.parse(filing.roles) as Role[] };
  authorize(
    filer.personId !== actor.personId,
    'You filed these words. Somebody else reads them before they are cleared.',
  );
  authorize(
    isTwoPersonAgreement(filer, actor),
    'One of the two who agree has to be an editor. Leave this one to an editor.',
  );
  refuseUnsigned(tx, opened.sheet.language);
  const assembled = assembleSheet(tx, opened.sheet, now);
  if (assembled.withTexts(opened.texts, overrideIn(evidence)).hash !== evidence.hash) {
    endFiling(tx, actor, opened, filing, now, {
      act: 'returned',
      comment: 'Figures, policy or house style changed since filing. Agree to the sheet as it is now.',
    });
    return { outcome: 'returned' };
  }
  refuseUnderBan(tx, opened.release.raceId, now);
  publishIn(tx, actor, opened, evidence.id, now);
  const entry = { action: 'cleared sheet', entity: 'sheet', entityId: opened.sheet.publicId };
  const after = { state: 'cleared', evidence: evidence.hash, texts: opened.texts };
  const before = { state: 'filed', filedBy: filer.personId };
  appendRecord(tx, { personId: actor.personId, ...entry, before, after, releaseId: opened.release.id }, now);
  const outcome = findStandIn(tx, opened.sheet.correctionId) ? 'agreed' : 'cleared';
  return { outcome, version: opened.sheet.version + 1 };
}

/** Words that were filed are printable from here on; what was cleared before is superseded. */
export function publishIn(tx: Tx, actor: Actor, opened: Opened, evidenceId: number, now: number): void {
  const ids = opened.kept.map(({ version }) => version.id);
  if (findStandIn(tx, opened.sheet.correctionId)) {
    // Words on corrected figures wait for the moment in which the old ones go.
    refuseUnless(moveLineVersions(tx, ids, 'filed', { state: 'agreed' }), MOVED_ON);
    insertAct(tx, actor, opened, evidenceId, 'cleared', null, now);
    refuseUnless(touchSheet(tx, opened.sheet.id, opened.sheet.version), MOVED_ON);
    return;
  }
  const isAnew = findLastAct(tx, opened.sheet.id, 'cleared') !== null;
  for (const { version } of listClearedLines(tx, opened.sheet.id))
    refuseUnless(moveLineVersions(tx, [version.id], 'cleared', { state: 'superseded' }), MOVED_ON);
  refuseUnless(moveLineVersions(tx, ids, 'filed', { state: 'cleared' }), MOVED_ON);
  insertAct(tx, actor, opened, evidenceId, 'cleared', null, now);
  refuseUnless(touchSheet(tx, opened.sheet.id, opened.sheet.version), MOVED_ON);
  const embed = findEmbedOfSheet(tx, opened.sheet.id) ?? inheritEmbed(tx, opened.sheet);
  if (embed) {
    const number = insertEmbedVersion(tx, embed.id, evidenceId, now);
    const releaseId = opened.release.id;
    enqueuePurgeIn(tx, { of: 'embed', id: embed.publicId }, `version-${number}`, now, { releaseId });
  }
  enqueueShelfEndIn(tx, opened.sheet, now);
  if (isAnew) markSiblings(tx, opened.sheet, 'cleared', now);
}

/** A replacement that was not ready when its correction was applied takes over the address once it is. */
function inheritEmbed(tx: Tx, { id, replacesSheetId }: SheetRow): EmbedRow | null {
  const embed = replacesSheetId === null ? null : findEmbedOfSheet(tx, replacesSheetId);
  if (!embed || listClearedLines(tx, embed.sheetId).length > 0) return null;
  moveEmbed(tx, embed.id, id);
  return embed;
}

const back = readerInput
  .extend({
    comment: z.string().trim().max(2000, 'At most 2,000 characters.'),
    lines: lineReasons.default([]),
  })
  .refine(({ comment, lines }) => comment.length >= 3 || lines.length > 0, {
    path: ['comment'],
    error: 'Say what should change.',
  });

/** Sends a filed sheet back to its author, with reasons for the whole or for single lines. Its filer may take it back. */
export function sendBack(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canDraftSheets(actor), 'Only reporters and editors read filed sheets.');
  const { id, hash, comment, lines } = parse(back, input);
  transact(ctx, (tx) => {
    const opened = openSheet(tx, actor, id, ctx.now);
    const filing = filingOf(tx, opened);
    refuseUnless(findEvidence(tx, filing.evidenceId!)!.hash === hash, MOVED_ON);
    const filer = { personId: filing.personId, roles: JSON.parse(filing.roles) as Role[] };
    authorize(
      filer.personId === actor.personId || isTwoPersonAgreement(filer, actor),
      'An editor reads this sheet: only they send it back.',
    );
    endFiling(tx, actor, opened, filing, ctx.now, { act: 'sent-back', comment, lines });
  });
}

const CLEARED_ALREADY = 'This sheet is cleared already.';
const NO_LONGER_FILED = 'It is no longer filed: it was taken back or sent back. Reload the page.';

/** The filing that a filed sheet stands on. @throws AppError `conflict` unless it is filed now */
export function filingOf(tx: Tx, opened: Opened): ClearingRow {
  const filing = findLastAct(tx, opened.sheet.id, 'filed');
  refuseUnless(opened.state !== 'cleared', CLEARED_ALREADY);
  refuseUnless(!isBack(tx, opened, filing), NO_LONGER_FILED);
  refuseUnless(
    opened.state === 'filed' && filing !== null && filing.evidenceId !== null,
    'This sheet is not filed.',
  );
  return filing;
}

/** Its last filing ended without being cleared. */
function isBack(tx: Tx, { sheet, state }: Opened, filing: ClearingRow | null): boolean {
  if (filing === null || (state !== 'sent-back' && state !== 'draft')) return false;
  return (findLastAct(tx, sheet.id, 'cleared')?.id ?? 0) < filing.id;
}

export function endFiling(
  tx: Tx,
  actor: Actor,
  opened: Opened,
  filing: ClearingRow,
  now: number,
  end: { act: 'sent-back' | 'returned'; comment: string; lines?: LineReasons },
): void {
  const ids = opened.kept.map(({ version }) => version.id);
  refuseUnless(moveLineVersions(tx, ids, 'filed', { state: 'sent-back' }), MOVED_ON);
  const actId = insertAct(tx, actor, opened, filing.evidenceId!, end.act, end.comment, now);
  storeLineReasons(tx, actId, opened.kept, end.lines ?? []);
  refuseUnless(touchSheet(tx, opened.sheet.id, opened.sheet.version), MOVED_ON);
  const action = end.act === 'returned' ? 'returned sheet to its filer' : 'sent sheet back';
  const entry = { action, entity: 'sheet', entityId: opened.sheet.publicId, reason: end.comment };
  const lines = end.lines?.length ? { lines: end.lines } : {};
  const [before, after] = [{ state: 'filed' }, { state: 'sent-back', ...lines }];
  appendRecord(tx, { personId: actor.personId, ...entry, before, after, releaseId: opened.release.id }, now);
}

export function insertAct(
  tx: Tx,
  actor: Actor,
  opened: Opened,
  evidenceId: number | null,
  act: ClearingRow['act'],
  comment: string | null,
  now: number,
): number {
  const ids = opened.kept.map(({ version }) => version.id);
  const { id } = insertClearing(
    tx,
    {
      publicId: newId(),
      sheetId: opened.sheet.id,
      evidenceId,
      act,
      personId: actor.personId,
      roles: JSON.stringify(actor.roles),
      comment,
      at: now,
    },
    ids,
  );
  return id;
}

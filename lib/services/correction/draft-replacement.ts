import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import {
  type CorrectionRow,
  findCorrection,
  listCurrentEvidenceOn,
  listReplacements,
} from '@/db/queries/corrections';
import { findWholeVersion } from '@/db/queries/release';
import { findSheetBySubmission, type SheetRow } from '@/db/queries/sheet';
import { isAsPrinted } from '@/lib/domain/as-printed';
import { type Actor, canDraftSheets } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/security/ids';
import { authorize, type Ctx, parse, transact } from '../context';
import { submissionKey } from '../release/create-release';
import { assemble } from '../sheet/assemble-evidence';
import { refuseUnless } from '../sheet/sheet-state';
import { storeSheet } from '../sheet/store-sheet';

const id = z.string().min(1).max(64);
const schema = z.strictObject({ submissionKey, correctionId: id, sheetId: id });

/**
 * Drafts the sheet that takes the place of one in print when a staged correction is applied: the same claim in the
 * same language, on the corrected figures.
 */
export function draftReplacement(actor: Actor, input: unknown, ctx: Ctx): { id: string } {
  authorize(canDraftSheets(actor), 'Only reporters and editors draft sheets.');
  const { submissionKey: key, correctionId, sheetId } = parse(schema, input);
  return transact(ctx, (tx) => {
    const again = findSheetBySubmission(tx, key);
    if (again && again.authorId !== actor.personId) throw new AppError('conflict', 'Reload and try again.');
    if (again) return { id: again.publicId };
    const found = findCorrection(tx, correctionId, actor, ctx.now);
    if (!found) throw new AppError('not-found', 'There is no such correction.');
    const { correction } = found;
    refuseUnless(correction.state === 'staged', 'This correction is not staged any more. Reload the page.');
    const replaced = touchedBy(tx, correction, sheetId);
    refuseUnless(
      !listReplacements(tx, correction.id).some(({ replacesSheetId }) => replacesSheetId === replaced.id),
      'A replacement of this sheet is drafted already. Reload the page.',
    );
    const isOwn = replaced.releaseId === correction.releaseId;
    const versionId = isOwn ? correction.toVersionId : replaced.releaseVersionId;
    const subject = {
      publicId: newId(),
      claim: replaced.claim,
      claimKey: replaced.claimKey,
      language: replaced.language,
      releaseVersionId: versionId,
      correctionId: correction.id,
      replacesSheetId: replaced.id,
    };
    const { draft, requestable, draftRequested, computed } = assemble(tx, subject, ctx.now);
    const notices = requestable.filter((kind) => kind === 'correction-notice');
    const whole = findWholeVersion(tx, versionId)!;
    const sheet = storeSheet(
      tx,
      actor,
      {
        ...subject,
        releaseId: replaced.releaseId,
        questionId: whole.question.id,
        submissionKey: key,
      },
      {
        draft: [...draft, ...notices.map((kind) => ({ kind, text: draftRequested(kind) }))],
        templateVersion: computed.settings.houseStyle.body.templateVersion,
        knockedOut: [],
      },
      { release: whole.release.publicId },
      ctx.now,
    );
    return { id: sheet.publicId };
  });
}

/** The sheet in print that this correction touches. Figures as printed claim nothing and are drafted anew afterwards. */
function touchedBy(tx: Tx, { releaseId }: CorrectionRow, sheetId: string): SheetRow {
  const touched = listCurrentEvidenceOn(tx, releaseId).find(({ sheet }) => sheet.publicId === sheetId);
  if (!touched || isAsPrinted(touched.sheet))
    throw new AppError('not-found', 'This correction touches no such sheet.');
  return touched.sheet;
}

import 'server-only';
import { z } from 'zod';
import { findRelease, findWholeVersion } from '@/db/queries/release';
import { findSheetBySubmission, insertLine, insertLineVersion, insertSheet } from '@/db/queries/sheet';
import { AS_PRINTED } from '@/lib/domain/as-printed';
import { type Actor, canDraftSheets } from '@/lib/domain/roles';
import { LANGUAGES } from '@/lib/domain/vocabulary';
import { AppError } from '@/lib/errors';
import { canonicalJson } from '@/lib/security/canonical';
import { newId } from '@/lib/security/ids';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { submissionKey } from '../release/create-release';
import { assembleSheet } from './assemble-sheet';

const schema = z.strictObject({
  submissionKey,
  releaseId: z.string().min(1).max(64),
  language: z.enum(LANGUAGES, 'Choose a language.').default('en'),
});

/** Drafts a sheet that gives a release as it was printed and claims nothing. */
export function createAsPrinted(actor: Actor, input: unknown, ctx: Ctx): { id: string } {
  authorize(canDraftSheets(actor), 'Only reporters and editors draft sheets.');
  const { submissionKey: key, releaseId, language } = parse(schema, input);
  return transact(ctx, (tx) => {
    const before = findSheetBySubmission(tx, key);
    if (before && before.authorId !== actor.personId) throw new AppError('conflict', 'Reload and try again.');
    if (before) return { id: before.publicId };
    const release = findRelease(tx, releaseId, actor, ctx.now);
    const whole = release?.currentVersionId ? findWholeVersion(tx, release.currentVersionId) : null;
    if (!release || !whole) throw new AppError('not-found', 'There is no such release.');
    const subject = {
      publicId: newId(),
      claim: canonicalJson({ kind: AS_PRINTED }),
      claimKey: AS_PRINTED,
      language,
      releaseVersionId: whole.version.id,
    };
    const { draft, templateVersion } = assembleSheet(tx, subject, ctx.now);
    const sheet = insertSheet(tx, {
      ...subject,
      releaseId: release.id,
      questionId: whole.question.id,
      authorId: actor.personId,
      createdAt: ctx.now,
      submissionKey: key,
    });
    for (const { kind, text } of draft)
      insertLineVersion(tx, {
        publicId: newId(),
        lineId: insertLine(tx, { publicId: newId(), sheetId: sheet.id, kind }).id,
        number: 1,
        draftText: text,
        text,
        state: 'draft',
        templateVersion,
        changedBy: actor.personId,
        changedAt: ctx.now,
      });
    const entry = { action: 'drafted sheet', entity: 'sheet', entityId: sheet.publicId };
    const after = { release: releaseId, claim: subject.claim, draft };
    appendRecord(tx, { personId: actor.personId, ...entry, after, releaseId: release.id }, ctx.now);
    return { id: sheet.publicId };
  });
}

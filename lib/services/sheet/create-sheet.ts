import 'server-only';
import { z } from 'zod';
import { findRelease, findWholeVersion } from '@/db/queries/release';
import { findSheetBySubmission } from '@/db/queries/sheet';
import { type Actor, canDraftSheets } from '@/lib/domain/roles';
import type { Claim } from '@/lib/domain/sheet';
import { LANGUAGES } from '@/lib/domain/vocabulary';
import { AppError } from '@/lib/errors';
import type { TestableFinding } from '@/lib/findings/check-types';
import { findClaim } from '@/lib/findings/claim-key';
import { canonicalJson } from '@/lib/security/canonical';
import { newId } from '@/lib/security/ids';
import { isOfTwoReleases } from '@/lib/wording/draft-input';
import { authorize, type Ctx, parse, transact } from '../context';
import { computeFindings } from '../release/compute-findings';
import { submissionKey } from '../release/create-release';
import { assemble } from './assemble-evidence';
import { storeSheet } from './store-sheet';

const schema = z.strictObject({
  submissionKey,
  releaseId: z.string().min(1).max(64),
  claimKey: z.string().min(1, 'Choose what the sheet claims.').max(600),
  language: z.enum(LANGUAGES, 'Choose a language.').default('en'),
});

/**
 * Drafts a sheet for one finding of a release, from the house style in force. Every language of a claim is a sheet of
 * its own: written, filed and cleared by itself, never translated.
 */
export function createSheet(actor: Actor, input: unknown, ctx: Ctx): { id: string } {
  authorize(canDraftSheets(actor), 'Only reporters and editors draft sheets.');
  const { submissionKey: key, releaseId, claimKey, language } = parse(schema, input);
  return transact(ctx, (tx) => {
    const before = findSheetBySubmission(tx, key);
    if (before && before.authorId !== actor.personId) throw new AppError('conflict', 'Reload and try again.');
    if (before) return { id: before.publicId };
    const release = findRelease(tx, releaseId, actor, ctx.now);
    const whole = release?.currentVersionId ? findWholeVersion(tx, release.currentVersionId) : null;
    if (!release || !whole) throw new AppError('not-found', 'There is no such release.');
    const found = findClaim(computeFindings(tx, whole.version.id, ctx.now).answer, claimKey);
    if (!found || found.finding.kind === 'share')
      throw new AppError('invalid', 'This release has no such finding.', {
        fields: { claimKey: 'Choose one of the findings of the release.' },
      });
    const subject = {
      publicId: newId(),
      claim: canonicalJson(claimOf(found.finding)),
      claimKey,
      language,
      releaseVersionId: whole.version.id,
    };
    const { draft, computed } = assemble(tx, subject, ctx.now);
    const style = computed.settings.houseStyle.body;
    // House style files no headline on one poll: the words stay there to be read, knocked out.
    const isAlone = style.onePollHeadlines === 'refuse' && !isOfTwoReleases(found.finding.kind);
    const sheet = storeSheet(
      tx,
      actor,
      { ...subject, releaseId: release.id, questionId: whole.question.id, submissionKey: key },
      { draft, templateVersion: style.templateVersion, knockedOut: isAlone ? ['headline'] : [] },
      { release: releaseId },
      ctx.now,
    );
    return { id: sheet.publicId };
  });
}

function claimOf(finding: TestableFinding): Claim {
  switch (finding.kind) {
    case 'lead':
    case 'lead-change':
      return { kind: finding.kind, pair: [finding.pair[0], finding.pair[1]] };
    case 'change':
      return { kind: 'change', option: finding.option };
    case 'threshold':
      return { kind: 'threshold', option: finding.option, pct: finding.thresholdPct };
  }
}

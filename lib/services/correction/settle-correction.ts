import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import {
  confirmNotices as confirm,
  type CorrectionRow,
  findCorrection,
  listEffects,
  listReplacements,
  settleCorrection,
} from '@/db/queries/corrections';
import { listNewestLines, moveLineVersions } from '@/db/queries/sheet';
import { findWholeVersion } from '@/db/queries/release';
import { rehearse } from '@/db/write';
import { type Actor, canActAsEditor, canLogReleases } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import type { CorrectedItem } from '@/lib/findings/what-changed';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { tellIn } from '../outbox/tell-in';
import { MOVED_ON, refuseUnless } from '../sheet/sheet-state';
import { applyIn, standingBefore } from './apply-in';
import { consequencesOf, hashOfConsequences } from './consequences';
import type { Preview } from './correct-release';
import { recordCorrection } from './record-correction';

const REPORTERS = 'Only reporters and editors correct releases.';
const NO_LONGER_STAGED = 'This correction is not staged any more. Reload the page.';
const id = z.string().min(1).max(64);

/** What applying a staged correction would do now, with what its replacements have become. */
export function previewStaged(actor: Actor, input: unknown, ctx: Ctx): Preview {
  authorize(canLogReleases(actor), REPORTERS);
  const { id: publicId } = parse(z.strictObject({ id }), input);
  return rehearse(ctx.db, (tx) => applyStagedIn(tx, actor, stagedOf(tx, actor, publicId, ctx.now), ctx.now));
}

const applied = z.strictObject({
  id,
  /** Hash of the consequences that were on the screen. */
  seen: z.string().regex(/^[0-9a-f]{64}$/, 'Look at the consequences first.'),
});

/** Old words and new ones swap in one moment: nothing is ever without its correction, and nothing shows both. */
export function applyStaged(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canLogReleases(actor), REPORTERS);
  const { id: publicId, seen } = parse(applied, input);
  transact(ctx, (tx) => {
    const acting = actingNow(tx, actor);
    authorize(canLogReleases(acting), REPORTERS);
    const found = stagedOf(tx, acting, publicId, ctx.now);
    const preview = applyStagedIn(tx, acting, found, ctx.now);
    refuseUnless(
      preview.hash === seen,
      'What rests on this release changed since you looked. Look at the consequences again; nothing was done.',
    );
    const told = { action: 'corrected release', row: found.correction, releaseId: found.release.publicId };
    recordCorrection(tx, acting, { ...told, preview }, ctx.now);
  });
}

type Found = NonNullable<ReturnType<typeof findCorrection>>;

function stagedOf(tx: Tx, actor: Actor, publicId: string, now: number): Found {
  const found = findCorrection(tx, publicId, actor, now);
  if (!found) throw new AppError('not-found', 'There is no such correction.');
  refuseUnless(found.correction.state === 'staged', NO_LONGER_STAGED);
  return found;
}

function applyStagedIn(tx: Tx, actor: Actor, { correction: row, release }: Found, now: number): Preview {
  const before = standingBefore(tx, release.id, now);
  const { pollsterId } = findWholeVersion(tx, row.toVersionId)!.release;
  const effects = applyIn(tx, actor, { row, release, pollsterId }, before, now);
  const set = { state: 'applied' as const, settledBy: actor.personId, settledAt: now };
  refuseUnless(settleCorrection(tx, row.id, set), NO_LONGER_STAGED);
  const changed = JSON.parse(row.changed) as CorrectedItem[];
  const consequences = consequencesOf(tx, release.id, effects);
  return { changed, consequences, hash: hashOfConsequences(changed, consequences) };
}

const withdrawn = z.strictObject({
  id,
  reason: z
    .string()
    .trim()
    .min(10, 'Say in a sentence why it is withdrawn.')
    .max(2000, 'At most 2,000 characters.'),
});

/** Takes back a staged correction: nothing in print changed, and what was drafted for it is put away. */
export function withdrawStaged(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canLogReleases(actor), REPORTERS);
  const { id: publicId, reason } = parse(withdrawn, input);
  transact(ctx, (tx) => {
    const { correction, release } = stagedOf(tx, actor, publicId, ctx.now);
    const set = { state: 'withdrawn' as const, settledBy: actor.personId, settledAt: ctx.now };
    refuseUnless(settleCorrection(tx, correction.id, set), NO_LONGER_STAGED);
    for (const sheet of listReplacements(tx, correction.id)) putAway(tx, sheet.id, reason);
    const entry = {
      action: 'withdrew staged correction',
      entity: 'release',
      entityId: release.publicId,
      reason,
    };
    const after = { correction: correction.publicId, state: 'withdrawn' };
    appendRecord(tx, { personId: actor.personId, ...entry, after, releaseId: release.id }, ctx.now);
  });
}

function putAway(tx: Tx, sheetId: number, reason: string): void {
  for (const { version } of listNewestLines(tx, sheetId)) {
    const change = { state: 'pulled' as const, pullReason: reason };
    if (version.state !== 'pulled')
      refuseUnless(moveLineVersions(tx, [version.id], version.state, change), MOVED_ON);
  }
}

/** An editor lets the printed notices of an applied correction go out. */
export function confirmNotices(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canActAsEditor(actor), 'Only an editor lets correction notices out.');
  const { id: publicId } = parse(z.strictObject({ id }), input);
  transact(ctx, (tx) => {
    const acting = actingNow(tx, actor);
    authorize(canActAsEditor(acting), 'Only an editor lets correction notices out.');
    const found = findCorrection(tx, publicId, acting, ctx.now);
    if (!found) throw new AppError('not-found', 'There is no such correction.');
    const { correction, release } = found;
    refuseUnless(correction.state === 'applied', 'This correction is not applied. Nothing goes out for it.');
    refuseUnless(
      confirm(tx, correction.id, acting.personId, ctx.now),
      'Somebody let these notices out already.',
    );
    const news = { entity: 'release' as const, entityId: release.publicId, releaseId: release.id };
    tellIn(tx, { kind: 'correction-notices', ...news, refs: { correction: correction.publicId } }, ctx.now);
    const entry = { action: 'confirmed correction notices', entity: 'release', entityId: release.publicId };
    const after = { correction: correction.publicId, sheets: noticedBy(tx, correction) };
    appendRecord(tx, { personId: acting.personId, ...entry, after, releaseId: release.id }, ctx.now);
  });
}

function noticedBy(tx: Tx, { id: correctionId }: CorrectionRow): string[] {
  return listEffects(tx, correctionId)
    .filter(({ effect }) => effect.effect !== 'flagged')
    .map(({ sheet }) => sheet.publicId);
}

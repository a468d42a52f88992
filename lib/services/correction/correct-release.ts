import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { findStagedCorrection, insertCorrection } from '@/db/queries/corrections';
import { findPollster } from '@/db/queries/race';
import { findRelease, findWholeVersion, listVersions, updateRelease } from '@/db/queries/release';
import { rehearse } from '@/db/write';
import { type Consequence, CORRECTION_SOURCES } from '@/lib/domain/corrections';
import { releaseInput } from '@/lib/domain/release-input';
import { type Actor, canLogReleases } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { type CorrectedItem, whatChanged } from '@/lib/findings/what-changed';
import { newId } from '@/lib/security/ids';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { factsOf } from '../release/facts';
import { refuseImpossibleFigures } from '../release/refuse-figures';
import { namedId, storeVersion } from '../release/store-version';
import { readDeskSettings } from '../setup/desk-settings';
import { MOVED_ON, refuseUnless } from '../sheet/sheet-state';
import { applyIn, standingBefore } from './apply-in';
import { recordCorrection } from './record-correction';
import { consequencesOf, hashOfConsequences } from './consequences';

const reporters = 'Only reporters and editors correct releases.';
const LOOK_AGAIN =
  'What rests on this release changed since you looked. Look at the consequences again; nothing was done.';

const asked = z.strictObject({
  id: z.string().min(1).max(64),
  version: z.number().int().min(1),
  release: releaseInput,
});

const correction = asked.extend({
  whose: z.enum(CORRECTION_SOURCES, 'Say whose correction it is.'),
  explanation: z
    .string()
    .trim()
    .min(10, 'Say in a sentence what was wrong.')
    .max(2000, 'At most 2,000 characters.'),
  how: z.enum(['now', 'staged']),
  /** Hash of the consequences that were on the screen. */
  seen: z.string().regex(/^[0-9a-f]{64}$/, 'Look at the consequences first.'),
});

type Given = z.output<typeof asked>;
type Told = Pick<z.output<typeof correction>, 'whose' | 'explanation' | 'how'>;

export type Preview = { changed: CorrectedItem[]; consequences: Consequence[]; hash: string };

/** What a correction would do, worked out by doing it and leaving no trace. */
export function previewCorrection(actor: Actor, input: unknown, ctx: Ctx): Preview {
  authorize(canLogReleases(actor), reporters);
  return previewOf(actor, parse(asked, input), ctx);
}

function previewOf(actor: Actor, given: Given, ctx: Ctx): Preview {
  const untold: Told = { whose: 'ours', explanation: '', how: 'now' };
  return rehearse(ctx.db, (tx) => correctIn(tx, actor, given, untold, ctx.now).preview);
}

export type Corrected = { id: string; state: 'applied' | 'staged' };

/** Corrects a release at once, or stages the correction until its replacements are agreed to. */
export function correctRelease(actor: Actor, input: unknown, ctx: Ctx): Corrected {
  authorize(canLogReleases(actor), reporters);
  const { whose, explanation, how, seen, ...given } = parse(correction, input);
  if (how === 'staged') refuseUnless(previewOf(actor, given, ctx).hash === seen, LOOK_AGAIN);
  return transact(ctx, (tx) => {
    const acting = actingNow(tx, actor);
    authorize(canLogReleases(acting), reporters);
    const { row, preview, facts } = correctIn(tx, acting, given, { whose, explanation, how }, ctx.now);
    if (how === 'now') refuseUnless(preview.hash === seen, LOOK_AGAIN);
    const action = how === 'now' ? 'corrected release' : 'staged correction';
    recordCorrection(tx, acting, { action, row, releaseId: given.id, preview, facts }, ctx.now);
    return { id: row.publicId, state: how === 'now' ? 'applied' : 'staged' };
  });
}

function correctIn(tx: Tx, actor: Actor, given: Given, told: Told, now: number) {
  const { release, facts } = openCorrected(tx, actor, given, now);
  const before = standingBefore(tx, release.id, now);
  const stored = storeVersion(tx, given.release, {
    releaseId: release.id,
    number: listVersions(tx, release.id).length + 1,
    personId: actor.personId,
    now,
    isCurrent: false,
  });
  const pollsterId = namedId(tx, 'pollsters', given.release.pollster, now);
  const isNow = told.how === 'now';
  const pollsters = { is: pollsterId, was: release.pollsterId };
  refuseStagedPollster(isNow, pollsters);
  const after = { ...factsOf(tx, stored.id), pollster: pollsterFacts(tx, pollsterId) };
  refuseImpossibleFigures(after, readDeskSettings(tx, [after.sampleSource]).policy.body);
  const changed = whatChanged(
    { ...facts, ...besides(tx, release.currentVersionId!) },
    { ...after, ...besides(tx, stored.id) },
  );
  refuseUnless(changed.length > 0, 'Nothing differs from the version on file.');
  const row = insertCorrection(tx, {
    publicId: newId(),
    releaseId: release.id,
    fromVersionId: release.currentVersionId!,
    toVersionId: stored.id,
    whose: told.whose,
    explanation: told.explanation,
    changed: JSON.stringify(changed),
    state: isNow ? 'applied' : 'staged',
    createdBy: actor.personId,
    createdAt: now,
    ...(isNow ? { settledBy: actor.personId, settledAt: now } : {}),
  });
  const effects = isNow ? applyIn(tx, actor, { row, release, pollsterId }, before, now) : [];
  if (!isNow) refuseUnless(updateRelease(tx, release.id, given.version, {}), MOVED_ON);
  const consequences = consequencesOf(tx, release.id, effects);
  const preview = { changed, consequences, hash: hashOfConsequences(changed, consequences) };
  return { row, preview, facts: { before: facts, after } };
}

/** The release as it stands, which this correction may begin from. */
function openCorrected(tx: Tx, actor: Actor, { id, version, release: given }: Given, now: number) {
  const release = findRelease(tx, id, actor, now);
  if (!release?.currentVersionId) throw new AppError('not-found', 'There is no such release.');
  refuseUnless(
    release.version === version,
    'Somebody changed this release meanwhile. Reload it and look again.',
  );
  refuseUnless(
    findStagedCorrection(tx, release.id) === null,
    'A correction of this release is staged already. Apply it or withdraw it first.',
  );
  const facts = factsOf(tx, release.currentVersionId);
  if (given.race.kind !== 'existing' || given.race.id !== facts.race.id)
    throw new AppError('invalid', 'Some fields need another look.', {
      fields: { 'race.id': 'A release stays with its race. Log it anew for another one.' },
    });
  return { release, facts };
}

/** A name belongs to the release as a whole: words that wait for a new one could not be read beside the old. */
function refuseStagedPollster(isNow: boolean, pollster: { is: number; was: number }): void {
  if (isNow || pollster.is === pollster.was) return;
  throw new AppError('invalid', 'Some fields need another look.', {
    fields: {
      pollster:
        'A correction of the pollster is applied at once: everything that names the wrong one comes down.',
    },
  });
}

function besides(tx: Tx, versionId: number) {
  const { question, version } = findWholeVersion(tx, versionId)!;
  return { sameQuestion: question.sameQuestion, methodNote: version.methodNote };
}

function pollsterFacts(tx: Tx, id: number) {
  const { publicId, name } = findPollster(tx, id);
  return { id: publicId, name };
}

import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { deleteReleaseDraft } from '@/db/queries/release-draft';
import { findRaceByName, findRaceByPublicId, insertRace, type RaceRow } from '@/db/queries/race';
import { findReleaseBySubmission, insertRelease, type ReleaseRow } from '@/db/queries/release';
import { type ReleaseInput, releaseInput } from '@/lib/domain/release-input';
import { type Actor, canLogReleases } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/security/ids';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { enqueueEmbargoEndIn } from '../jobs/enqueue-embargo-end';
import { readDeskSettings } from '../setup/desk-settings';
import { embargoInstant } from './embargo-time';
import { factsOf } from './facts';
import { reindexSeries } from './index-findings';
import { refuseImpossibleFigures } from './refuse-figures';
import { namedId, storeVersion } from './store-version';

export const submissionKey = z.string().regex(/^[\w-]{16,64}$/, 'Reload the form and send it again.');
const schema = z.strictObject({ submissionKey, release: releaseInput });

/** Logs a release. The same form sent twice makes one release and gives the same answer. */
export function createRelease(actor: Actor, input: unknown, ctx: Ctx): { id: string } {
  authorize(canLogReleases(actor), 'Only reporters and editors log releases.');
  const { submissionKey: key, release } = parse(schema, input);
  return transact(ctx, (tx) => {
    const before = findReleaseBySubmission(tx, key);
    if (before) return repeated(before, actor);
    const row = createReleaseIn(tx, actor, release, key, ctx.now);
    deleteReleaseDraft(tx, actor.personId, 'new');
    return { id: row.publicId };
  });
}

function repeated(before: ReleaseRow, actor: Actor): { id: string } {
  if (before.createdBy !== actor.personId)
    throw new AppError('conflict', 'Reload the form and send it again.');
  return { id: before.publicId };
}

export function createReleaseIn(
  tx: Tx,
  actor: Actor,
  input: ReleaseInput,
  key: string,
  now: number,
): ReleaseRow {
  const { race, isNew } = raceOf(tx, input, now);
  const embargo = input.embargo && {
    embargoAt: embargoInstant(input.embargo.local, input.embargo.zone),
    embargoLocal: input.embargo.local,
    embargoZone: input.embargo.zone,
  };
  const release = insertRelease(tx, {
    publicId: newId(),
    raceId: race.id,
    pollsterId: namedId(tx, 'pollsters', input.pollster, now),
    createdBy: actor.personId,
    createdAt: now,
    submissionKey: key,
    ...embargo,
  });
  if (embargo && embargo.embargoAt > now) enqueueEmbargoEndIn(tx, release, embargo.embargoAt, now);
  if (isNew) recordRace(tx, actor, race, input, release.id, now);
  const who = { releaseId: release.id, number: 1, personId: actor.personId, now };
  const version = storeVersion(tx, input, who);
  const facts = factsOf(tx, version.id);
  refuseImpossibleFigures(facts, readDeskSettings(tx, [facts.sampleSource]).policy.body);
  reindexSeries(tx, { ...release, from: facts.fieldEndOn }, now);
  appendRecord(
    tx,
    {
      personId: actor.personId,
      action: 'logged release',
      entity: 'release',
      entityId: release.publicId,
      after: { facts, embargo: input.embargo },
      releaseId: release.id,
    },
    now,
  );
  return release;
}

function raceOf(tx: Tx, input: ReleaseInput, now: number): { race: RaceRow; isNew: boolean } {
  if (input.race.kind === 'existing') {
    const race = findRaceByPublicId(tx, input.race.id);
    if (race) return { race, isNew: false };
    throw fieldError('race.id', 'This race is not on the list any more.');
  }
  const { name, kind, options, thresholds } = input.race.race;
  if (findRaceByName(tx, name))
    throw fieldError('race.race.name', 'A race of this name exists: choose it from the list.');
  const row = { publicId: newId(), name, kind, createdAt: now };
  return { race: insertRace(tx, row, options, thresholds), isNew: true };
}

/** Told as part of the release that brought it, so that an embargo holds the race back too. */
function recordRace(
  tx: Tx,
  actor: Actor,
  race: RaceRow,
  { race: given }: ReleaseInput,
  releaseId: number,
  now: number,
): void {
  const entry = { personId: actor.personId, action: 'added race', entity: 'race', entityId: race.publicId };
  appendRecord(tx, { ...entry, after: given.kind === 'new' ? given.race : null, releaseId }, now);
}

function fieldError(field: string, message: string): AppError {
  return new AppError('invalid', 'Some fields need another look.', { fields: { [field]: message } });
}

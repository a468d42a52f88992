import 'server-only';
import { z } from 'zod';
import { findRelease, findWholeVersion, updateRelease } from '@/db/queries/release';
import { moveSheetsToVersion } from '@/db/queries/sheet';
import { releaseInput } from '@/lib/domain/release-input';
import { type Actor, canLogReleases } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { readDeskSettings } from '../setup/desk-settings';
import { factsOf } from './facts';
import { reindexSeries } from './index-findings';
import { refuseImpossibleFigures } from './refuse-figures';
import { namedId, storeVersion } from './store-version';
import { whyNotRevised } from './why-not-revised';

const schema = z.strictObject({
  id: z.string().min(1).max(64),
  version: z.number().int().min(1),
  release: releaseInput,
});

/**
 * Mends a release on which nothing cleared rests: a new version, the old one kept. Open sheets go over to it, and
 * one that was filed returns to its filer when it is read. Race and embargo stay as they are.
 */
export function reviseRelease(actor: Actor, input: unknown, ctx: Ctx): { version: number } {
  authorize(canLogReleases(actor), 'Only reporters and editors change releases.');
  const { id, version, release: given } = parse(schema, input);
  return transact(ctx, (tx) => {
    const release = findRelease(tx, id, actor, ctx.now);
    if (!release?.currentVersionId) throw new AppError('not-found', 'There is no such release.');
    const before = factsOf(tx, release.currentVersionId);
    if (given.race.kind !== 'existing' || given.race.id !== before.race.id)
      throw new AppError('invalid', 'Some fields need another look.', {
        fields: { 'race.id': 'A release stays with its race. Log it anew for another one.' },
      });
    const whyNot = whyNotRevised(tx, release.id);
    if (whyNot) throw new AppError('conflict', whyNot);
    const pollsterId = namedId(tx, 'pollsters', given.pollster, ctx.now);
    if (!updateRelease(tx, release.id, version, { pollsterId }))
      throw new AppError('conflict', 'Somebody changed this release meanwhile. Reload it and look again.');
    const stored = storeVersion(tx, given, {
      releaseId: release.id,
      number: before.version + 1,
      personId: actor.personId,
      now: ctx.now,
    });
    const after = factsOf(tx, stored.id);
    refuseImpossibleFigures(after, readDeskSettings(tx, [after.sampleSource]).policy.body);
    const from = [before.fieldEndOn, after.fieldEndOn].sort()[0]!;
    for (const series of new Set([release.pollsterId, pollsterId]))
      reindexSeries(tx, { raceId: release.raceId, pollsterId: series, from }, ctx.now);
    moveSheetsToVersion(tx, release.id, stored.id, findWholeVersion(tx, stored.id)!.question.id);
    const entry = { action: 'revised release', entity: 'release', entityId: id, releaseId: release.id };
    appendRecord(tx, { personId: actor.personId, ...entry, before, after }, ctx.now);
    return { version: version + 1 };
  });
}

import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { addEmbargoReader, removeEmbargoReader } from '@/db/queries/embargo';
import { findPersonByPublicId } from '@/db/queries/person';
import { findRelease, type ReleaseRow, updateRelease } from '@/db/queries/release';
import { isReleasePublic } from '@/db/queries/sheet';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { enqueueEmbargoEndIn } from '../jobs/enqueue-embargo-end';
import { factsOf } from './facts';
import { reindexSeries } from './index-findings';

const id = z.string().min(1).max(64);

/** Ends an embargo early, for a written reason. */
export function liftEmbargo(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canActAsEditor(actor), 'Only an editor lifts an embargo.');
  const schema = z.strictObject({
    id,
    version: z.number().int(),
    reason: z.string().trim().min(10, 'Say in a sentence why the embargo ends early.').max(1000),
  });
  const { id: publicId, version, reason } = parse(schema, input);
  transact(ctx, (tx) => {
    const release = embargoedRelease(tx, actor, publicId, ctx.now);
    if (!updateRelease(tx, release.id, version, { embargoLiftedAt: ctx.now }))
      throw new AppError('conflict', 'Somebody changed this release meanwhile. Reload the page.');
    reindexSeries(tx, { ...release, from: factsOf(tx, release.currentVersionId!).fieldEndOn }, ctx.now);
    enqueueEmbargoEndIn(tx, release, ctx.now, ctx.now);
    record(tx, actor, release, 'lifted embargo', ctx.now, {
      before: { embargoAt: release.embargoAt },
      after: { embargoLiftedAt: ctx.now },
      reason,
    });
  });
}

const reader = z.strictObject({
  id,
  /** A person's public id, or null for the whole copy desk. */
  personId: id.nullable(),
  listed: z.boolean(),
});

/** Puts a person or the copy desk on a release's embargo list, or takes them off. */
export function setEmbargoReader(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canActAsEditor(actor), 'Only an editor opens an embargoed release to others.');
  const { id: publicId, personId, listed } = parse(reader, input);
  transact(ctx, (tx) => {
    const release = embargoedRelease(tx, actor, publicId, ctx.now);
    const person = personId === null ? null : findPersonByPublicId(tx, personId);
    if (personId !== null && !person) throw new AppError('not-found', 'There is no such person.');
    const target = person?.id ?? null;
    const row = { releaseId: release.id, personId: target, addedBy: actor.personId, addedAt: ctx.now };
    const changed = listed ? addEmbargoReader(tx, row) : removeEmbargoReader(tx, release.id, target);
    if (!changed) return;
    const action = listed ? 'opened under embargo' : 'closed under embargo';
    record(tx, actor, release, action, ctx.now, { after: { reader: personId ?? 'copy desk', listed } });
  });
}

function embargoedRelease(tx: Tx, actor: Actor, publicId: string, now: number): ReleaseRow {
  const release = findRelease(tx, publicId, actor, now);
  if (!release) throw new AppError('not-found', 'There is no such release.');
  if (isReleasePublic(tx, release.id, now))
    throw new AppError('conflict', 'This release is not under embargo any more.');
  return release;
}

function record(
  tx: Tx,
  actor: Actor,
  release: ReleaseRow,
  action: string,
  now: number,
  change: { before?: unknown; after: unknown; reason?: string },
): void {
  const subject = { entity: 'release', entityId: release.publicId, releaseId: release.id };
  appendRecord(tx, { personId: actor.personId, action, ...subject, ...change }, now);
}

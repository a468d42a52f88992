import 'server-only';
import { findReleaseRow } from '@/db/queries/job-subjects';
import { isReleasePublic } from '@/db/queries/sheet';
import { appendRecord } from '../../history/append-record';
import { tellIn } from '../../outbox/tell-in';
import { factsOf } from '../../release/facts';
import { reindexSeries } from '../../release/index-findings';
import { enqueuePurgeIn } from '../enqueue-purge';
import { FINISHED, type Handler } from '../handler';

/**
 * What follows when an embargo is over: the marks of later polls of its series are renewed, the history says so, and
 * it is told. That its figures are public goes by the clock and never waits for this.
 */
export const embargoEnded: Handler<'embargo-ended'> = (job, ctx) => (tx) => {
  const release = findReleaseRow(tx, job.payload.release);
  if (!release?.currentVersionId || release.embargoAt === null) return FINISHED;
  if (!isReleasePublic(tx, release.id, ctx.now)) throw new Error('this embargo has not ended yet');
  reindexSeries(tx, { ...release, from: factsOf(tx, release.currentVersionId).fieldEndOn }, ctx.now);
  const subject = { entity: 'release' as const, entityId: release.publicId, releaseId: release.id };
  if (release.embargoLiftedAt === null) {
    const change = { before: { underEmbargo: true }, after: { underEmbargo: false } };
    appendRecord(tx, { personId: null, action: 'embargo ended', ...subject, ...change }, ctx.now);
  }
  tellIn(tx, { kind: 'embargo-ended', ...subject }, ctx.now);
  const purge = { of: 'release' as const, id: release.publicId };
  enqueuePurgeIn(tx, purge, 'embargo', ctx.now, { releaseId: release.id });
  return FINISHED;
};

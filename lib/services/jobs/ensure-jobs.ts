import 'server-only';
import { findLatestPolicy } from '@/db/queries/desk';
import { isIndexOutdated } from '@/db/queries/finding-index';
import { listClearedSheets, listReleasesUnderEmbargo } from '@/db/queries/job-subjects';
import { ENGINE_VERSION } from '@/lib/findings/engine-version';
import { type Ctx, transact } from '../context';
import { enqueueShelfEndIn } from '../sheet/shelf-end';
import { enqueueEmbargoEndIn } from './enqueue-embargo-end';
import { enqueueRecomputeIn } from './enqueue-recompute';

/**
 * Promises what a database from before its version of the product could not: marks by the newer engine, and the ends
 * of embargoes and shelf lives that lie ahead. Run at every start; what is promised already stays as it is.
 */
export function ensureJobs(ctx: Ctx): void {
  transact(ctx, (tx) => {
    const policy = findLatestPolicy(tx);
    if (policy && isIndexOutdated(tx, policy.id, ENGINE_VERSION)) enqueueRecomputeIn(tx, ctx.now);
    for (const { embargoAt, ...release } of listReleasesUnderEmbargo(tx, ctx.now))
      enqueueEmbargoEndIn(tx, release, embargoAt, ctx.now);
    for (const sheet of listClearedSheets(tx)) enqueueShelfEndIn(tx, sheet, ctx.now);
  });
}

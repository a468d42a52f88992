import 'server-only';
import { insertEmbargoView } from '@/db/queries/embargo';
import type { Actor } from '@/lib/domain/roles';
import { type Ctx, transact } from '../context';

/** Writes down that a person saw figures under embargo, once for each release, and where. */
export function recordEmbargoViews(ctx: Ctx, actor: Actor, releaseIds: Iterable<number>, what: string): void {
  const seen = [...releaseIds];
  if (seen.length === 0) return;
  const row = { personId: actor.personId, at: ctx.now };
  transact(ctx, (tx) => {
    for (const releaseId of seen) insertEmbargoView(tx, { ...row, releaseId, what });
  });
}

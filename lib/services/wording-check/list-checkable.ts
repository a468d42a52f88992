import 'server-only';
import { listReleases } from '@/db/queries/release';
import { isPublicNow } from './is-held';
import { type Actor, canReadCopyDesk } from '@/lib/domain/roles';
import { authorize, type Ctx } from '../context';

export type CheckableRelease = {
  id: string;
  race: string;
  pollster: string;
  fieldStartOn: string;
  fieldEndOn: string;
  n: number | null;
  isUnderEmbargo: boolean;
};

const LIMIT = 200;

/** Releases that words may be checked against: those whose figures this person may see now, newest first. */
export function listCheckable(actor: Actor, ctx: Ctx): CheckableRelease[] {
  authorize(canReadCopyDesk(actor), 'The wording check is for the people of the desk.');
  return listReleases(ctx.db, actor, ctx.now, LIMIT).map(({ release, version, race, pollster, base }) => ({
    id: release.publicId,
    race: race.name,
    pollster: pollster.name,
    fieldStartOn: version.fieldStartOn,
    fieldEndOn: version.fieldEndOn,
    n: base.n,
    isUnderEmbargo: !isPublicNow(release, ctx.now),
  }));
}

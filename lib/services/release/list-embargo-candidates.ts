import 'server-only';
import { listPeople } from '@/db/queries/person';
import { type Actor, canActAsEditor, canReadUnpublished } from '@/lib/domain/roles';
import { authorize, type Ctx } from '../context';

export type EmbargoCandidate = { id: string; name: string };

/** Whom an editor may put on an embargo list: people who can sign in and do not read unpublished figures anyway. */
export function listEmbargoCandidates(actor: Actor, ctx: Pick<Ctx, 'db'>): EmbargoCandidate[] {
  authorize(canActAsEditor(actor), 'Only an editor opens an embargoed release to others.');
  return listPeople(ctx.db)
    .filter((person) => person.disabledAt === null && !canReadUnpublished(person))
    .map(({ publicId, name }) => ({ id: publicId, name }));
}

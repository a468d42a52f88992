import 'server-only';
import { listPeople as listRows } from '@/db/queries/person';
import { type Actor, canManagePeople, type Role } from '@/lib/domain/roles';
import { authorize, type Ctx } from '../context';

export type PersonView = {
  id: string;
  name: string;
  email: string;
  roles: Role[];
  state: 'active' | 'invited' | 'disabled';
  version: number;
};

export function listPeople(actor: Actor, ctx: Pick<Ctx, 'db'>): PersonView[] {
  authorize(canManagePeople(actor), 'Only an administrator sees the list of people.');
  return listRows(ctx.db).map((row) => ({
    id: row.publicId,
    name: row.name,
    email: row.email,
    roles: row.roles,
    state: row.disabledAt !== null ? 'disabled' : row.passwordHash === null ? 'invited' : 'active',
    version: row.version,
  }));
}

import 'server-only';
import type { Db } from '@/db/client';
import { findSession, listRoles } from '@/db/queries/person';
import type { Actor } from '@/lib/domain/roles';
import { sha256 } from '@/lib/security/ids';

/** Who a session id belongs to now: person and roles are read at every request. */
export function readSession(token: string, ctx: { db: Db; now: number }): Actor | null {
  const found = findSession(ctx.db, sha256(token), ctx.now);
  if (!found || found.person.disabledAt !== null) return null;
  return {
    personId: found.person.id,
    publicId: found.person.publicId,
    name: found.person.name,
    roles: listRoles(ctx.db, found.person.id),
    sessionId: found.session.id,
  };
}

import 'server-only';
import { deleteSession, findSession } from '@/db/queries/person';
import { sha256 } from '@/lib/security/ids';
import { type Ctx, transact } from '../context';
import { appendRecord } from '../history/append-record';

export function signOut(token: string, ctx: Ctx): void {
  transact(ctx, (tx) => {
    const found = findSession(tx, sha256(token), ctx.now);
    if (deleteSession(tx, sha256(token)) === 0 || !found) return;
    const { id, publicId } = found.person;
    appendRecord(tx, { personId: id, action: 'signed out', entity: 'person', entityId: publicId }, ctx.now);
  });
}

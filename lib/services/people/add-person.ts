import 'server-only';
import { z } from 'zod';
import { findPersonByEmail, insertPerson, replaceRoles } from '@/db/queries/person';
import { type Actor, canManagePeople } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { newCode, newId, normalizeCode, sha256 } from '@/lib/security/ids';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { personFields } from './person-fields';

export const CODE_LIFETIME = 7 * 24 * 60 * 60_000;

const schema = z.strictObject({
  name: personFields.name,
  email: personFields.email,
  roles: personFields.roles,
});

/** Adds a person. The sign-in code is in the answer, once, and nowhere else. */
export function addPerson(actor: Actor, input: unknown, ctx: Ctx): { id: string; code: string } {
  authorize(canManagePeople(actor), 'Only an administrator adds people.');
  const { name, email, roles } = parse(schema, input);
  return transact(ctx, (tx) => {
    if (findPersonByEmail(tx, email))
      throw new AppError('invalid', 'Nobody was added.', {
        fields: { email: 'Somebody with this e-mail address is on the list already.' },
      });
    const publicId = newId();
    const code = newCode();
    const id = insertPerson(tx, {
      publicId,
      name,
      email,
      codeHash: sha256(normalizeCode(code)),
      codeExpiresAt: ctx.now + CODE_LIFETIME,
      createdAt: ctx.now,
    });
    replaceRoles(tx, id, roles);
    appendRecord(
      tx,
      {
        personId: actor.personId,
        action: 'added person',
        entity: 'person',
        entityId: publicId,
        after: { name, roles },
      },
      ctx.now,
    );
    return { id: publicId, code };
  });
}

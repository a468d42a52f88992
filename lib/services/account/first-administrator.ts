import 'server-only';
import { z } from 'zod';
import { countPeople, insertFirstCode, insertPerson, replaceRoles, useFirstCode } from '@/db/queries/person';
import { ROLES } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { newCode, newId, normalizeCode, sha256 } from '@/lib/security/ids';
import { hashPassword } from '@/lib/security/password';
import { passwordProblem } from '@/lib/security/password-rules';
import { type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { personFields } from '../people/person-fields';

/** The one-time code for the console of an empty newsroom; a new one at each start until it is used. */
export function prepareFirstAdministrator(ctx: Ctx): string | null {
  return transact(ctx, (tx) => {
    if (countPeople(tx) > 0) return null;
    const code = newCode();
    insertFirstCode(tx, sha256(normalizeCode(code)));
    return code;
  });
}

export function needsFirstAdministrator(ctx: Pick<Ctx, 'db'>): boolean {
  return countPeople(ctx.db) === 0;
}

const schema = z.strictObject({
  code: z.string().min(1, 'Type the code that the console printed.').max(100),
  name: personFields.name,
  email: personFields.email,
  password: z.string().max(1024),
});

/** Makes the first person of an empty newsroom, who holds the administrator's and the editor's role. */
export async function createFirstAdministrator(input: unknown, ctx: Ctx): Promise<{ email: string }> {
  const { code, name, email, password } = parse(schema, input);
  const problem = passwordProblem(password, [name, email]);
  if (problem)
    throw new AppError('invalid', 'Some fields need another look.', { fields: { password: problem } });
  // Before the costly hash: anybody may knock here, and after the first start nobody has business.
  if (countPeople(ctx.db) > 0) throw taken();
  const passwordHash = await hashPassword(password);
  return transact(ctx, (tx) => {
    if (countPeople(tx) > 0) throw taken();
    if (!useFirstCode(tx, sha256(normalizeCode(code)), ctx.now))
      throw new AppError('invalid', 'No account was made.', {
        fields: { code: 'This is not the code that the console printed at the last start.' },
      });
    const publicId = newId();
    const id = insertPerson(tx, { publicId, name, email, passwordHash, createdAt: ctx.now });
    replaceRoles(tx, id, ['administrator', 'editor']);
    const after = { name, roles: ROLES.filter((role) => role === 'administrator' || role === 'editor') };
    appendRecord(
      tx,
      { personId: id, action: 'became first administrator', entity: 'person', entityId: publicId, after },
      ctx.now,
    );
    return { email };
  });
}

const taken = () => new AppError('conflict', 'This newsroom has an administrator already.');

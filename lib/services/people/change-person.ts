import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import {
  countActiveAdministrators,
  deleteSessionsOf,
  findPersonByPublicId,
  type PersonWithRoles,
  replaceRoles,
  updatePerson,
} from '@/db/queries/person';
import { type Actor, canManagePeople } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { newCode, normalizeCode, sha256 } from '@/lib/security/ids';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { CODE_LIFETIME } from './add-person';
import { personFields } from './person-fields';

const target = { id: z.string().min(1).max(64), version: personFields.version };

/** Sets the roles a person holds; it counts at that person's next request. */
export function setRoles(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canManagePeople(actor), 'Only an administrator changes roles.');
  const { id, version, roles } = parse(z.strictObject({ ...target, roles: personFields.roles }), input);
  transact(ctx, (tx) => {
    const person = seenPerson(tx, id, version);
    touch(tx, person, {});
    replaceRoles(tx, person.id, roles);
    refuseNoAdministrator(tx);
    const [before, after] = [{ roles: person.roles }, { roles }];
    record(tx, actor, person, 'changed roles', before, after, ctx.now);
  });
}

/** Disables or enables a person. Disabling ends every session at once. */
export function setDisabled(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canManagePeople(actor), 'Only an administrator disables people.');
  const { id, version, disabled } = parse(z.strictObject({ ...target, disabled: z.boolean() }), input);
  transact(ctx, (tx) => {
    const person = seenPerson(tx, id, version);
    const was = person.disabledAt !== null;
    if (was === disabled)
      throw new AppError(
        'conflict',
        `This person is ${disabled ? 'disabled' : 'active'} already. Reload the page.`,
      );
    touch(tx, person, { disabledAt: disabled ? ctx.now : null });
    if (disabled) deleteSessionsOf(tx, person.id);
    refuseNoAdministrator(tx);
    const action = disabled ? 'disabled person' : 'enabled person';
    record(tx, actor, person, action, { disabled: was }, { disabled }, ctx.now);
  });
}

/** A fresh one-time code: the old password and every session end. */
export function renewCode(actor: Actor, input: unknown, ctx: Ctx): { code: string } {
  authorize(canManagePeople(actor), 'Only an administrator hands out sign-in codes.');
  const { id, version } = parse(z.strictObject(target), input);
  return transact(ctx, (tx) => {
    const person = seenPerson(tx, id, version);
    const code = newCode();
    touch(tx, person, {
      passwordHash: null,
      codeHash: sha256(normalizeCode(code)),
      codeExpiresAt: ctx.now + CODE_LIFETIME,
    });
    deleteSessionsOf(tx, person.id);
    record(tx, actor, person, 'renewed sign-in code', undefined, undefined, ctx.now);
    return { code };
  });
}

function seenPerson(tx: Tx, id: string, version: number): PersonWithRoles {
  const person = findPersonByPublicId(tx, id);
  if (!person) throw new AppError('not-found', 'There is no such person.');
  if (person.version !== version)
    throw new AppError('conflict', 'Somebody changed this person meanwhile. Reload the page and look again.');
  return person;
}

function touch(tx: Tx, person: PersonWithRoles, set: Parameters<typeof updatePerson>[3]): void {
  if (!updatePerson(tx, person.id, person.version, set))
    throw new AppError('conflict', 'Somebody changed this person meanwhile. Reload the page and look again.');
}

function refuseNoAdministrator(tx: Tx): void {
  if (countActiveAdministrators(tx) === 0)
    throw new AppError(
      'conflict',
      'Somebody has to stay administrator. Give the role to another person first.',
    );
}

function record(
  tx: Tx,
  actor: Actor,
  person: PersonWithRoles,
  action: string,
  before: unknown,
  after: unknown,
  now: number,
): void {
  appendRecord(
    tx,
    { personId: actor.personId, action, entity: 'person', entityId: person.publicId, before, after },
    now,
  );
}

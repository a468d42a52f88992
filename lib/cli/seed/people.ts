import type { Db } from '@/db/client';
import { findPersonByEmail } from '@/db/queries/person';
import type { Actor, Role } from '@/lib/domain/roles';
import { newSecret } from '@/lib/security/ids';
import {
  createFirstAdministrator,
  prepareFirstAdministrator,
} from '@/lib/services/account/first-administrator';
import { redeemCode } from '@/lib/services/account/set-password';
import { addPerson } from '@/lib/services/people/add-person';
import { setRoles } from '@/lib/services/people/change-person';
import type { DemoAccount } from '../accounts';

/** The invented people of an invented newspaper. */
const PEOPLE = {
  harrow: { name: 'Ned Harrow', roles: ['administrator'] },
  quill: { name: 'Rhea Quill', roles: ['reporter'] },
  quent: { name: 'Jory Quent', roles: ['reporter'] },
  reed: { name: 'Marten Reed', roles: ['editor'] },
  varn: { name: 'Isolde Varn', roles: ['editor', 'reporter'] },
  oake: { name: 'Tamsin Oake', roles: ['copy-desk'] },
} satisfies Record<string, { name: string; roles: Role[] }>;

export type PersonKey = keyof typeof PEOPLE;
export type Staff = Record<PersonKey, Actor>;

const emailOf = (key: string) => `${key}@averil-courier.example`;

/** Makes the staff through the doors that people use: console code, invitation codes, chosen passwords. */
export async function seedPeople(
  db: Db,
  now: number,
  chosen: string | undefined,
): Promise<{ staff: Staff; accounts: DemoAccount[] }> {
  const ctx = { db, now };
  const passwords = Object.fromEntries(
    Object.keys(PEOPLE).map((key) => [key, chosen ?? newSecret().slice(0, 20)]),
  ) as Record<PersonKey, string>;
  const { name } = PEOPLE.harrow;
  const code = prepareFirstAdministrator(ctx)!;
  const first = { code, name, email: emailOf('harrow'), password: passwords.harrow };
  await createFirstAdministrator(first, ctx);
  const admin = actorOf(db, 'harrow');
  for (const [key, person] of others()) {
    const added = addPerson(admin, { name: person.name, email: emailOf(key), roles: person.roles }, ctx);
    await redeemCode({ code: added.code, password: passwords[key], address: 'first start' }, ctx);
  }
  // The first administrator starts as an editor too; this newsroom keeps the two apart.
  const { version } = findPersonByEmail(db, emailOf('harrow'))!;
  setRoles(admin, { id: admin.publicId, version, roles: PEOPLE.harrow.roles }, ctx);
  const keys = Object.keys(PEOPLE) as PersonKey[];
  return {
    staff: Object.fromEntries(keys.map((key) => [key, actorOf(db, key)])) as Staff,
    accounts: keys.map((key) => ({
      name: PEOPLE[key].name,
      email: emailOf(key),
      password: passwords[key],
      roles: [...PEOPLE[key].roles],
    })),
  };
}

function others() {
  return (Object.entries(PEOPLE) as [PersonKey, { name: string; roles: Role[] }][]).filter(
    ([key]) => key !== 'harrow',
  );
}

function actorOf(db: Db, key: PersonKey): Actor {
  const person = findPersonByEmail(db, emailOf(key))!;
  return {
    personId: person.id,
    publicId: person.publicId,
    name: person.name,
    roles: person.roles,
    sessionId: 0,
  };
}

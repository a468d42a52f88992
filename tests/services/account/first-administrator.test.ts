import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import {
  createFirstAdministrator,
  needsFirstAdministrator,
  prepareFirstAdministrator,
} from '@/lib/services/account/first-administrator';
import { readSession } from '@/lib/services/account/read-session';
import { signIn } from '@/lib/services/account/sign-in';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';

const PASSWORD = 'lantern harbour quill seven';
const ada = { name: 'Ada Fenn', email: 'ada@courier.example', password: PASSWORD };

let desk: TestDatabase;
beforeEach(() => {
  desk = freshDatabase();
});
afterEach(() => desk.closeAndRemove());

const preparedCode = () => {
  const code = prepareFirstAdministrator(desk.ctx());
  if (code === null) throw new Error('an empty newsroom got no code');
  return code;
};

describe('the first administrator', () => {
  it('is made with the code of the console, and is an editor too', async () => {
    expect(needsFirstAdministrator(desk.ctx())).toBe(true);
    await createFirstAdministrator({ ...ada, code: preparedCode() }, desk.ctx());
    expect(needsFirstAdministrator(desk.ctx())).toBe(false);
    const signedIn = await signIn({ email: ada.email, password: PASSWORD, address: '' }, desk.ctx());
    if (!signedIn.ok) throw new Error('the first administrator cannot sign in');
    expect(readSession(signedIn.token, desk.ctx())?.roles).toEqual(['administrator', 'editor']);
  });

  it('is made once, also when two ask at the same moment', async () => {
    const code = preparedCode();
    const both = await Promise.allSettled([
      createFirstAdministrator({ ...ada, code }, desk.ctx()),
      createFirstAdministrator({ ...ada, email: 'bela@courier.example', code }, desk.ctx()),
    ]);
    expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect(prepareFirstAdministrator(desk.ctx())).toBeNull();
  });

  it('is not made with another code, nor with one of an earlier start', async () => {
    const earlier = preparedCode();
    preparedCode();
    for (const code of [earlier, 'AAAAA-AAAAA-AAAAA-AAAAA'])
      await expect(createFirstAdministrator({ ...ada, code }, desk.ctx())).rejects.toMatchObject({
        code: 'invalid',
        fields: { code: expect.any(String) },
      });
    expect(needsFirstAdministrator(desk.ctx())).toBe(true);
  });

  it('is not made with a weak password, and the code stays good', async () => {
    const code = preparedCode();
    await expect(
      createFirstAdministrator({ ...ada, password: 'short', code }, desk.ctx()),
    ).rejects.toMatchObject({
      fields: { password: expect.any(String) },
    });
    expect(await createFirstAdministrator({ ...ada, code }, desk.ctx())).toEqual({ email: ada.email });
  });

  it('is not made where somebody is on the list already', async () => {
    const code = preparedCode();
    makePerson(desk.db, { name: 'Edda Marsh', roles: ['editor'] });
    await expect(createFirstAdministrator({ ...ada, code }, desk.ctx())).rejects.toMatchObject({
      code: 'conflict',
    });
  });
});

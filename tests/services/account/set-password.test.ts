import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { readSession } from '@/lib/services/account/read-session';
import { changePassword, redeemCode } from '@/lib/services/account/set-password';
import { signIn } from '@/lib/services/account/sign-in';
import { addPerson } from '@/lib/services/people/add-person';
import { setDisabled } from '@/lib/services/people/change-person';
import {
  freshDatabase,
  makePerson,
  makePersonWithPassword,
  type TestDatabase,
} from '@/tests/support/database';

const OLD = 'lantern harbour quill seven';
const NEW = 'seven quills on the harbour';

let desk: TestDatabase;
let rolf: Awaited<ReturnType<typeof makePersonWithPassword>>;

beforeEach(async () => {
  desk = freshDatabase();
  rolf = await makePersonWithPassword(desk.db, { name: 'Rolf Quill', roles: ['reporter'], password: OLD });
});
afterEach(() => desk.closeAndRemove());

const opens = async (password: string) =>
  (await signIn({ email: rolf.email, password, address: '192.0.2.1' }, desk.ctx())).ok;

describe('changing one’s password', () => {
  it('ends every session and makes the old one worthless', async () => {
    const other = await signIn({ email: rolf.email, password: OLD, address: '192.0.2.1' }, desk.ctx());
    if (!other.ok) throw new Error('the right password was refused');
    await changePassword(rolf, { current: OLD, next: NEW }, desk.ctx());
    expect(readSession(rolf.token, desk.ctx())).toBeNull();
    expect(readSession(other.token, desk.ctx())).toBeNull();
    expect([await opens(OLD), await opens(NEW)]).toEqual([false, true]);
  });

  it('asks for the one in use, and changes nothing without it', async () => {
    await expect(changePassword(rolf, { current: 'wrong', next: NEW }, desk.ctx())).rejects.toMatchObject({
      code: 'invalid',
      fields: { current: 'This is not your current password.' },
    });
    expect(readSession(rolf.token, desk.ctx())).not.toBeNull();
    expect(await opens(OLD)).toBe(true);
  });

  it('stops after ten wrong guesses, the right one included', async () => {
    for (let count = 0; count < 10; count += 1)
      await expect(changePassword(rolf, { current: 'wrong', next: NEW }, desk.ctx())).rejects.toMatchObject({
        code: 'invalid',
      });
    await expect(changePassword(rolf, { current: OLD, next: NEW }, desk.ctx())).rejects.toMatchObject({
      code: 'too-many',
    });
    await changePassword(rolf, { current: OLD, next: NEW }, desk.ctx(15 * 60_000));
    expect(await opens(NEW)).toBe(true);
  });

  it('works once when it is sent twice at the same moment', async () => {
    const twice = await Promise.allSettled([
      changePassword(rolf, { current: OLD, next: NEW }, desk.ctx()),
      changePassword(rolf, { current: OLD, next: `${NEW} again` }, desk.ctx()),
    ]);
    expect(twice.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
  });

  it('is refused to a person who was disabled meanwhile', async () => {
    const administrator = makePerson(desk.db, { name: 'Ada Fenn', roles: ['administrator'] });
    setDisabled(administrator, { id: rolf.publicId, version: 1, disabled: true }, desk.ctx());
    await expect(changePassword(rolf, { current: OLD, next: NEW }, desk.ctx())).rejects.toMatchObject({
      code: 'conflict',
    });
  });
});

describe('a new password', () => {
  it.each([
    ['of 14 characters', 'a1 b2 c3 d4 e5'],
    ['of one letter', 'a'.repeat(20)],
    ['of a common word and digits', 'password1234567890'],
    ['of common words', 'CorrectHorseBatteryStaple'],
    ['of one’s own name', 'RolfQuillRolfQuill'],
    ['longer than 256 characters', 'abcdefghij '.repeat(24)],
  ])('%s is refused at its field', async (_, next) => {
    await expect(changePassword(rolf, { current: OLD, next }, desk.ctx())).rejects.toMatchObject({
      code: 'invalid',
      fields: { next: expect.any(String) },
    });
    expect(readSession(rolf.token, desk.ctx())).not.toBeNull();
  });

  it('of 15 characters in any script is accepted, typed in either Unicode form', async () => {
    await changePassword(rolf, { current: OLD, next: 'fünf Möwen über' }, desk.ctx());
    expect(await opens('fünf Möwen über'.normalize('NFD'))).toBe(true);
  });
});

describe('a sign-in code', () => {
  it('of somebody who is disabled opens nothing', async () => {
    const administrator = makePerson(desk.db, { name: 'Ada Fenn', roles: ['administrator'] });
    const person = { name: 'Cora Pell', email: 'cora@courier.example', roles: ['copy-desk'] };
    const { id, code } = addPerson(administrator, person, desk.ctx());
    setDisabled(administrator, { id, version: 1, disabled: true }, desk.ctx());
    const input = { code, password: NEW, address: '192.0.2.1' };
    await expect(redeemCode(input, desk.ctx())).rejects.toMatchObject({ code: 'invalid' });
  });

  it('can be guessed ten times from one address, no more', async () => {
    const input = { code: 'AAAAA-AAAAA-AAAAA-AAAAA', password: NEW, address: '192.0.2.1' };
    for (let count = 0; count < 10; count += 1)
      await expect(redeemCode(input, desk.ctx())).rejects.toMatchObject({ code: 'invalid' });
    await expect(redeemCode(input, desk.ctx())).rejects.toMatchObject({ code: 'too-many' });
    const elsewhere = redeemCode({ ...input, address: '192.0.2.2' }, desk.ctx());
    await expect(elsewhere).rejects.toMatchObject({ code: 'invalid' });
  });

  it('is not used up by a password that is too weak', async () => {
    const administrator = makePerson(desk.db, { name: 'Ada Fenn', roles: ['administrator'] });
    const person = { name: 'Cora Pell', email: 'cora@courier.example', roles: ['copy-desk'] };
    const { code } = addPerson(administrator, person, desk.ctx());
    const weak = redeemCode({ code, password: 'Cora Pell Cora Pell', address: '192.0.2.1' }, desk.ctx());
    await expect(weak).rejects.toMatchObject({ fields: { password: expect.any(String) } });
    expect(await redeemCode({ code, password: NEW, address: '192.0.2.1' }, desk.ctx())).toEqual({
      email: 'cora@courier.example',
    });
  });
});

import { afterAll, describe, expect, it } from 'vitest';
import { redeemCode } from '@/lib/services/account/set-password';
import { signIn } from '@/lib/services/account/sign-in';
import { listHistory } from '@/lib/services/history/list-history';
import { addPerson } from '@/lib/services/people/add-person';
import { listPeople } from '@/lib/services/people/list-people';
import { freshDatabase, HOUR, makePerson } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const administrator = makePerson(desk.db, { name: 'Ada Fenn', roles: ['administrator'] });
const editor = makePerson(desk.db, { name: 'Edda Marsh', roles: ['reporter', 'editor', 'copy-desk'] });
const PASSWORD = 'lantern harbour quill seven';
const cora = { name: 'Cora Pell', email: 'cora@courier.example', roles: ['copy-desk'] };
const named = (email: string) => listPeople(administrator, desk.ctx()).find((one) => one.email === email);

describe('adding a person', () => {
  it('answers with a one-time code that opens the account once', async () => {
    const { code } = addPerson(administrator, cora, desk.ctx());
    expect(code).toMatch(/^([A-Z2-9]{5}-){3}[A-Z2-9]{5}$/);
    expect(named(cora.email)).toMatchObject({ name: 'Cora Pell', roles: ['copy-desk'], state: 'invited' });

    const input = { code: code.toLowerCase(), password: PASSWORD, address: '192.0.2.7' };
    expect(await redeemCode(input, desk.ctx())).toEqual({ email: cora.email });
    expect(named(cora.email)?.state).toBe('active');
    const again = redeemCode({ ...input, password: `${PASSWORD} eight` }, desk.ctx());
    await expect(again).rejects.toMatchObject({ code: 'invalid', fields: { code: expect.any(String) } });
    const signedIn = await signIn(
      { email: cora.email, password: PASSWORD, address: '192.0.2.7' },
      desk.ctx(),
    );
    expect(signedIn.ok).toBe(true);
  });

  it('keeps the code out of the history and the list', () => {
    const { code } = addPerson(administrator, { ...cora, email: 'dora@courier.example' }, desk.ctx());
    const written = JSON.stringify([
      listHistory(administrator, {}, desk.ctx()),
      named('dora@courier.example'),
    ]);
    expect(written).not.toContain(code);
    expect(written).toContain('added person');
  });

  it('refuses a code that is older than seven days', async () => {
    const { code } = addPerson(administrator, { ...cora, email: 'late@courier.example' }, desk.ctx());
    const late = redeemCode({ code, password: PASSWORD, address: '192.0.2.8' }, desk.ctx(7 * 24 * HOUR));
    await expect(late).rejects.toMatchObject({ code: 'invalid' });
  });

  it('says at the field that somebody has the address, however it is spelled', () => {
    const twice = { ...cora, email: ' ADA.Fenn@courier.example ' };
    expect(fieldsOf(() => addPerson(administrator, twice, desk.ctx()))).toEqual({
      email: 'Somebody with this e-mail address is on the list already.',
    });
  });

  it('is refused to whoever is no administrator, with every other role too, and nothing is written', () => {
    const before = listPeople(administrator, desk.ctx()).length;
    const input = { ...cora, email: 'no@courier.example' };
    expect(refusal(() => addPerson(editor, input, desk.ctx()))[0]).toBe('forbidden');
    expect(listPeople(administrator, desk.ctx())).toHaveLength(before);
  });

  it.each([
    ['no name', { ...cora, name: '  ' }, 'name'],
    ['a name of 81 letters', { ...cora, name: 'x'.repeat(81) }, 'name'],
    ['no address', { ...cora, email: 'cora' }, 'email'],
    ['no role', { ...cora, roles: [] }, 'roles'],
    ['an unknown role', { ...cora, roles: ['owner'] }, 'roles.0'],
    ['a field too many', { ...cora, isAdmin: true }, ''],
    ['nothing at all', null, ''],
    ['a text', 'cora', ''],
  ])('refuses %s at its field', (_, input, field) => {
    expect(Object.keys(fieldsOf(() => addPerson(administrator, input, desk.ctx())))).toEqual([field]);
  });
});

function fieldsOf(act: () => unknown): object {
  try {
    act();
  } catch (error) {
    return (error as { fields?: object }).fields ?? {};
  }
  throw new Error('the act was not refused');
}

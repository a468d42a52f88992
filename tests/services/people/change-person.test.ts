import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { findPersonByPublicId } from '@/db/queries/person';
import { readSession } from '@/lib/services/account/read-session';
import { redeemCode } from '@/lib/services/account/set-password';
import { signIn } from '@/lib/services/account/sign-in';
import { listHistory } from '@/lib/services/history/list-history';
import { renewCode, setDisabled, setRoles } from '@/lib/services/people/change-person';
import {
  freshDatabase,
  makePerson,
  makePersonWithPassword,
  type TestDatabase,
} from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';

type Person = ReturnType<typeof makePerson>;

let desk: TestDatabase;
let administrator: Person;
let editor: Person;

beforeEach(() => {
  desk = freshDatabase();
  administrator = makePerson(desk.db, { name: 'Ada Fenn', roles: ['administrator'] });
  editor = makePerson(desk.db, { name: 'Edda Marsh', roles: ['editor'] });
});
afterEach(() => desk.closeAndRemove());

const at = (person: Person) => ({ id: person.publicId, version: versionOf(person) });
const versionOf = (person: Person) => findPersonByPublicId(desk.db, person.publicId)!.version;

describe('roles', () => {
  it('count at the next request of an open session', () => {
    expect(readSession(editor.token, desk.ctx())?.roles).toEqual(['editor']);
    setRoles(administrator, { ...at(editor), roles: ['copy-desk', 'reporter'] }, desk.ctx());
    expect(readSession(editor.token, desk.ctx())?.roles).toEqual(['copy-desk', 'reporter']);
  });

  it('are written into the history with what they were', () => {
    setRoles(administrator, { ...at(editor), roles: ['reporter'] }, desk.ctx());
    expect(listHistory(administrator, {}, desk.ctx()).entries[0]).toMatchObject({
      action: 'changed roles',
      person: 'Ada Fenn',
      about: 'Edda Marsh',
      before: { roles: ['editor'] },
      after: { roles: ['reporter'] },
    });
  });

  it('refuse to leave the desk without an administrator', () => {
    const act = () => setRoles(administrator, { ...at(administrator), roles: ['editor'] }, desk.ctx());
    expect(refusal(act)).toEqual([
      'conflict',
      'Somebody has to stay administrator. Give the role to another person first.',
    ]);
    expect(readSession(administrator.token, desk.ctx())?.roles).toEqual(['administrator']);
    expect(versionOf(administrator)).toBe(1);
  });

  it('count a disabled administrator as none', () => {
    const second = makePerson(desk.db, { name: 'Bela Tarn', roles: ['administrator'] });
    setDisabled(administrator, { ...at(second), disabled: true }, desk.ctx());
    const act = () => setRoles(administrator, { ...at(administrator), roles: ['editor'] }, desk.ctx());
    expect(refusal(act)[0]).toBe('conflict');
  });
});

describe('disabling', () => {
  it('ends every session at once, and enabling brings none back', () => {
    setDisabled(administrator, { ...at(editor), disabled: true }, desk.ctx());
    expect(readSession(editor.token, desk.ctx())).toBeNull();
    setDisabled(administrator, { ...at(editor), disabled: false }, desk.ctx());
    expect(readSession(editor.token, desk.ctx())).toBeNull();
  });

  it('refuses the right password like a wrong one, until the person is enabled again', async () => {
    const password = 'lantern harbour quill seven';
    const rolf = await makePersonWithPassword(desk.db, { name: 'Rolf Quill', roles: ['reporter'], password });
    const input = { email: rolf.email, password, address: '192.0.2.1' };
    setDisabled(administrator, { ...at(rolf), disabled: true }, desk.ctx());
    expect(await signIn(input, desk.ctx())).toEqual({ ok: false, throttled: false });
    setDisabled(administrator, { ...at(rolf), disabled: false }, desk.ctx());
    expect(await signIn(input, desk.ctx())).toMatchObject({ ok: true, name: 'Rolf Quill' });
  });

  it('refuses the last administrator', () => {
    const act = () => setDisabled(administrator, { ...at(administrator), disabled: true }, desk.ctx());
    expect(refusal(act)[0]).toBe('conflict');
    expect(readSession(administrator.token, desk.ctx())).not.toBeNull();
  });

  it('refuses what is so already', () => {
    expect(refusal(() => setDisabled(administrator, { ...at(editor), disabled: false }, desk.ctx()))).toEqual(
      ['conflict', 'This person is active already. Reload the page.'],
    );
  });
});

describe('a new code', () => {
  it('ends the sessions and the password, and lets the person choose another', async () => {
    const old = 'lantern harbour quill seven';
    const rolf = await makePersonWithPassword(desk.db, {
      name: 'Rolf Quill',
      roles: ['reporter'],
      password: old,
    });
    const { code } = renewCode(administrator, at(rolf), desk.ctx());
    expect(readSession(rolf.token, desk.ctx())).toBeNull();
    const address = '192.0.2.1';
    expect((await signIn({ email: rolf.email, password: old, address }, desk.ctx())).ok).toBe(false);
    const password = 'seven quills on the harbour';
    await redeemCode({ code, password, address }, desk.ctx());
    expect((await signIn({ email: rolf.email, password, address }, desk.ctx())).ok).toBe(true);
  });

  it('makes the code before it worthless', async () => {
    const first = renewCode(administrator, at(editor), desk.ctx());
    renewCode(administrator, at(editor), desk.ctx());
    const input = { code: first.code, password: 'lantern harbour quill seven', address: '192.0.2.1' };
    await expect(redeemCode(input, desk.ctx())).rejects.toMatchObject({ code: 'invalid' });
  });
});

const verbs: [string, (actor: Person, target: { id: string; version: number }) => unknown][] = [
  ['changing roles', (actor, target) => setRoles(actor, { ...target, roles: ['reporter'] }, desk.ctx())],
  ['disabling', (actor, target) => setDisabled(actor, { ...target, disabled: true }, desk.ctx())],
  ['a new code', (actor, target) => renewCode(actor, target, desk.ctx())],
];

describe.each(verbs)('%s', (_, act) => {
  it('is refused to whoever is no administrator, with every other role and about oneself too', () => {
    editor = makePerson(desk.db, { name: 'Alma Tay', roles: ['reporter', 'editor', 'copy-desk'] });
    const entries = listHistory(editor, {}, desk.ctx()).entries.length;
    expect(refusal(() => act(editor, at(administrator)))[0]).toBe('forbidden');
    expect(refusal(() => act(editor, at(editor)))[0]).toBe('forbidden');
    expect(listHistory(editor, {}, desk.ctx()).entries).toHaveLength(entries);
  });

  it('is refused where the person was changed since the page was made, and when it is sent twice', () => {
    const seen = at(editor);
    act(administrator, seen);
    expect(refusal(() => act(administrator, seen))).toEqual([
      'conflict',
      'Somebody changed this person meanwhile. Reload the page and look again.',
    ]);
    expect(versionOf(editor)).toBe(2);
  });

  it('is refused for a person who is not there, and for input that no page sends', () => {
    expect(refusal(() => act(administrator, { id: 'nobody', version: 1 }))[0]).toBe('not-found');
    expect(refusal(() => act(administrator, { id: '', version: 0 }))[0]).toBe('invalid');
  });
});

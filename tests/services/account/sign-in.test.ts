import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { readSession } from '@/lib/services/account/read-session';
import { SESSION_LIFETIME, signIn } from '@/lib/services/account/sign-in';
import { signOut } from '@/lib/services/account/sign-out';
import { listHistory } from '@/lib/services/history/list-history';
import {
  freshDatabase,
  makePerson,
  makePersonWithPassword,
  type TestDatabase,
} from '@/tests/support/database';

const MINUTE = 60_000;
const PASSWORD = 'lantern harbour quill seven';
const KNOWN = 'rolf.quill@courier.example';
const UNKNOWN = 'nobody@courier.example';

let desk: TestDatabase;
beforeEach(async () => {
  desk = freshDatabase();
  await makePersonWithPassword(desk.db, { name: 'Rolf Quill', roles: ['reporter'], password: PASSWORD });
});
afterEach(() => desk.closeAndRemove());

/** One try; each from its own address unless the test names one. */
let tries = 0;
const attempt = (email: string, password: string, { address = `a${(tries += 1)}`, later = 0 } = {}) =>
  signIn({ email, password, address }, desk.ctx(later));

describe('signing in', () => {
  it('sweeps out sessions that have run out, and only those', async () => {
    const begun = () =>
      desk.db.$client.prepare('select created_at - ? from sessions order by 1').pluck().all(desk.ctx().now);
    desk.db.$client.prepare('delete from sessions').run();
    const after = SESSION_LIFETIME + MINUTE / 2;
    for (const later of [0, MINUTE, after]) await attempt(KNOWN, PASSWORD, { later });
    expect(begun()).toEqual([MINUTE, after]);
  });

  it('opens a session for twelve hours', async () => {
    const result = await attempt(' Rolf.Quill@Courier.example', PASSWORD);
    if (!result.ok) throw new Error('the right password was refused');
    expect(readSession(result.token, desk.ctx())).toMatchObject({ name: 'Rolf Quill', roles: ['reporter'] });
    expect(readSession(result.token, desk.ctx(SESSION_LIFETIME - 1))).not.toBeNull();
    expect(readSession(result.token, desk.ctx(SESSION_LIFETIME))).toBeNull();
  });

  it('opens nothing for a session id that was made up', () => {
    expect(readSession('made-up', desk.ctx())).toBeNull();
    expect(readSession('', desk.ctx())).toBeNull();
  });

  it('ends with signing out, and a second sign-out changes nothing', async () => {
    const result = await attempt(KNOWN, PASSWORD);
    if (!result.ok) throw new Error('the right password was refused');
    signOut(result.token, desk.ctx());
    signOut(result.token, desk.ctx());
    expect(readSession(result.token, desk.ctx())).toBeNull();
    const actions = historyActions();
    expect(actions.filter((action) => action === 'signed out')).toHaveLength(1);
  });

  it('gives one answer to a wrong password, an unknown account and one without a password', async () => {
    makePerson(desk.db, { name: 'Ina Vited', roles: ['reporter'] });
    const answers = [
      await attempt(KNOWN, 'wrong'),
      await attempt(UNKNOWN, 'wrong'),
      await attempt('ina.vited@courier.example', ''),
    ];
    expect(answers).toEqual(Array(3).fill({ ok: false, throttled: false }));
  });

  it('writes a failure into the history without telling whose account it was', async () => {
    await attempt(KNOWN, 'wrong');
    await attempt(UNKNOWN, 'wrong');
    const failures = entries().filter((entry) => entry.action === 'sign-in failed');
    expect(failures).toHaveLength(2);
    expect(JSON.stringify(failures)).not.toMatch(/rolf|nobody|wrong/i);
  });
});

describe('the throttle', () => {
  it.each([
    ['an account', KNOWN],
    ['an account that does not exist', UNKNOWN],
  ])('stops the sixth try in a quarter of an hour for %s, wherever it comes from', async (_, email) => {
    const answers = [];
    for (let count = 0; count < 6; count += 1) answers.push(await attempt(email, 'wrong'));
    expect(answers).toEqual([
      ...Array(5).fill({ ok: false, throttled: false }),
      { ok: false, throttled: true },
    ]);
  });

  it('refuses the right password too while it lasts, and not a moment longer', async () => {
    for (let count = 0; count < 5; count += 1) await attempt(KNOWN, 'wrong');
    expect(await attempt(KNOWN, PASSWORD, { later: 15 * MINUTE - 1 })).toEqual({
      ok: false,
      throttled: true,
    });
    expect((await attempt(KNOWN, PASSWORD, { later: 15 * MINUTE })).ok).toBe(true);
  });

  it('holds for many tries at the same moment', async () => {
    const answers = await Promise.all(Array.from({ length: 12 }, () => attempt(KNOWN, 'wrong')));
    expect(answers.filter((answer) => !answer.ok && !answer.throttled)).toHaveLength(5);
  });

  it('stops the twenty-first try from one address, whichever accounts it names', async () => {
    const one = (count: number) =>
      attempt(`guess${count}@courier.example`, 'wrong', { address: '203.0.113.9' });
    for (let count = 0; count < 20; count += 1)
      expect(await one(count)).toEqual({ ok: false, throttled: false });
    expect(await one(20)).toEqual({ ok: false, throttled: true });
    const elsewhere = await attempt('guess21@courier.example', 'wrong', { address: '203.0.113.10' });
    expect(elsewhere).toEqual({ ok: false, throttled: false });
  });

  it('forgets the failures of an account once it signs in', async () => {
    for (let round = 0; round < 2; round += 1) {
      for (let count = 0; count < 4; count += 1) await attempt(KNOWN, 'wrong');
      expect((await attempt(KNOWN, PASSWORD)).ok).toBe(true);
    }
  });
});

function entries() {
  const reader = makePerson(desk.db, {
    name: `Reader ${(tries += 1)}`,
    roles: ['editor'],
    email: `r${tries}@x.example`,
  });
  return listHistory(reader, {}, desk.ctx()).entries;
}

function historyActions(): string[] {
  return entries().map((entry) => entry.action);
}

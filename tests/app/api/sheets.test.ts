import { afterAll, beforeEach, describe, expect, it, vi } from 'vitest';
import * as publicRoute from '@/app/api/v1/sheets/[id]/route';
import * as deskRoute from '@/app/api/desk/sheets/[id]/route';
import { getDb } from '@/db/client';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const browser = vi.hoisted(() => ({ token: null as { sid: string } | null }));
vi.mock('next/headers', () => ({
  cookies: async () => ({ getAll: () => [] }),
  headers: async () => new Headers(),
}));
vi.mock('next-auth/jwt', () => ({ getToken: async () => browser.token }));

const desk = freshDatabase();
vi.stubEnv('LEADLINE_DATA', desk.folder);
vi.stubEnv('LEADLINE_ORIGIN', 'http://localhost:3000');
vi.useFakeTimers({ now: desk.ctx().now, toFake: ['Date'] });
const on = sheetDesk(desk.db);
const reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
const editor = makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] });
const copyDesk = makePerson(desk.db, { name: 'Tamsin Oake', roles: ['copy-desk'] });
const administrator = makePerson(desk.db, { name: 'Ned Harrow', roles: ['administrator'] });
const releaseId = logRelease(desk.db, reporter);
afterAll(() => {
  getDb().$client.close();
  desk.closeAndRemove();
  vi.useRealTimers();
  vi.unstubAllEnvs();
});

let id: string;
beforeEach(() => {
  id = on.draft(reporter, releaseId);
  on.file(reporter, id);
});
const stateOf = () => getSheet(editor, id, desk.ctx()).state;
const context = () => ({ params: Promise.resolve({ id }) });

async function read(person: { token: string } | null) {
  browser.token = person && { sid: person.token };
  const response = await publicRoute.GET(new Request(`http://localhost:3000/api/v1/sheets/${id}`), context());
  return { status: response.status, body: (await response.json()) as Record<string, unknown> };
}

describe('GET /api/v1/sheets/{id}', () => {
  it('gives what is cleared to everybody with a role, what is written to reporters and editors alone', async () => {
    expect((await read(null)).status).toBe(401);
    expect((await read(copyDesk)).status).toBe(404);
    expect((await read(reporter)).body).toMatchObject({ state: 'filed', cleared: null });
    on.clear(editor, id);
    const { status, body } = await read(copyDesk);
    expect([status, body]).toMatchObject([
      200,
      { cleared: { readers: 2, currency: { isCurrent: true, reasons: [] } }, held: [] },
    ]);
    expect(body).not.toHaveProperty('state');
    expect((await read(administrator)).body).not.toHaveProperty('state');
  });

  it('changes nothing, and no other method of it exists: nothing is cleared through it', async () => {
    expect(Object.keys(publicRoute)).toEqual(['GET']);
    await read(editor);
    expect(stateOf()).toBe('filed');
  });
});

describe('PUT /api/desk/sheets/{id}', () => {
  async function save(person: { token: string }, body: unknown, site = 'same-origin') {
    browser.token = { sid: person.token };
    const headers = { 'Content-Type': 'application/json', 'Sec-Fetch-Site': site };
    const init = { method: 'PUT', headers, body: JSON.stringify(body) };
    const response = await deskRoute.PUT(
      new Request(`http://localhost:3000/api/desk/sheets/${id}`, init),
      context(),
    );
    return response.status;
  }

  it('saves no word of a filed or cleared sheet, by nobody, so that what was agreed to stands', async () => {
    const before = getSheet(editor, id, desk.ctx());
    const { version, lines } = on.filing(reporter, id, { headline: 'Other words' });
    for (const person of [reporter, editor]) expect(await save(person, { version, lines })).toBe(409);
    on.clear(editor, id);
    for (const person of [reporter, editor])
      expect(await save(person, { version: version + 1, lines })).toBe(409);
    const after = getSheet(editor, id, desk.ctx());
    expect([after.state, after.hash]).toEqual(['cleared', before.hash]);
    expect(after.lines.map(({ text }) => text)).toEqual(before.lines.map(({ text }) => text));
  });

  it('saves the words of a draft once for each version, for its author, from this site', async () => {
    id = on.draft(reporter, releaseId);
    const { version, lines } = on.filing(reporter, id, { headline: 'Other words' });
    expect(await save(reporter, { version, lines }, 'cross-site')).toBe(403);
    expect(await save(copyDesk, { version, lines })).toBe(403);
    expect(await save(reporter, { version, lines, state: 'cleared' })).toBe(422);
    expect(await save(reporter, { version, lines })).toBe(200);
    expect(await save(reporter, { version, lines }), 'the same request again').toBe(409);
    expect(stateOf()).toBe('draft');
  });
});

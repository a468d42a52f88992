import { encode } from 'next-auth/jwt';
import { afterAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { POST as signInPost } from '@/app/api/auth/[...nextauth]/route';
import { readRoute, writeRoute } from '@/lib/auth/desk-route';
import type { Role } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { setDisabled, setRoles } from '@/lib/services/people/change-person';
import { freshDatabase, makePerson } from '@/tests/support/database';

const SECRET = 'a secret of this test alone';
const jar = vi.hoisted(() => ({ cookie: null as string | null }));
vi.mock('next/headers', () => ({
  headers: async () => new Headers(),
  cookies: async () => ({
    getAll: () => (jar.cookie ? [{ name: 'next-auth.session-token', value: jar.cookie }] : []),
  }),
}));

const desk = freshDatabase();
afterAll(desk.closeAndRemove);
const administrator = makePerson(desk.db, { name: 'Ned Harrow', roles: ['administrator'] });

type Person = ReturnType<typeof makePerson>;
let count = 0;
const somebody = (...roles: Role[]) =>
  makePerson(desk.db, { name: `Reader ${String.fromCharCode(97 + count++)}`, roles });

beforeEach(() => {
  vi.stubEnv('NEXTAUTH_SECRET', SECRET);
  (globalThis as { leadlineDb?: unknown }).leadlineDb = desk.db;
  jar.cookie = null;
  return () => vi.unstubAllEnvs();
});

async function as({ token }: Pick<Person, 'token'>, secret = SECRET) {
  jar.cookie = await encode({ token: { sid: token }, secret });
}

const echo = writeRoute((actor, body) => ({ name: actor.name, roles: actor.roles, body }));
const context = { params: Promise.resolve({}) };
const OURS = { 'sec-fetch-site': 'same-origin', 'content-type': 'application/json' };

async function send(body: BodyInit, headers: Record<string, string> = OURS) {
  const init = { method: 'POST', body, headers, duplex: 'half' } as RequestInit;
  const response = await echo(new Request('http://localhost:3000/api/desk/x', init), context);
  const json = (await response.json()) as { title?: string; detail?: string; name?: string; roles?: Role[] };
  return { status: response.status, headers: response.headers, json };
}

describe('a handler that changes something', () => {
  it('runs for whoever is signed in, and lets nobody keep the answer', async () => {
    await as(somebody('reporter'));
    const { status, headers, json } = await send('{"a":1}');
    expect([status, json]).toMatchObject([200, { roles: ['reporter'], body: { a: 1 } }]);
    expect(headers.get('cache-control')).toBe('private, no-store');
  });

  it('answers a problem to nobody, to a stranger’s token and to a session id that was made up', async () => {
    const refused = [401, { title: 'not-signed-in' }];
    expect(await send('{}').then(({ status, json }) => [status, json])).toMatchObject(refused);
    await as(somebody('editor'), 'another secret');
    expect(await send('{}').then(({ status, json }) => [status, json])).toMatchObject(refused);
    await as({ token: 'made up' });
    const { status, headers } = await send('{}');
    expect([status, headers.get('content-type')]).toEqual([401, 'application/problem+json']);
    expect(headers.get('cache-control')).toBe('private, no-store');
  });

  it.each([
    ['from another site', '{}', { ...OURS, 'sec-fetch-site': 'cross-site' }, 403],
    ['from nowhere', '{}', { 'content-type': 'application/json' }, 403],
    ['as a form could send it', '{}', { ...OURS, 'content-type': 'text/plain' }, 422],
    ['under a kind that only begins alike', '{}', { ...OURS, 'content-type': 'application/jsonp' }, 422],
    ['that is no JSON', '{', OURS, 422],
    ['that is no UTF-8', new Uint8Array([0x22, 0xff, 0x22]), OURS, 422],
    ['of more than half a megabyte', `"${'x'.repeat(512 * 1024)}"`, OURS, 413],
  ])('refuses a body %s, and repeats nothing of it', async (_, body, headers, expected) => {
    await as(somebody('editor'));
    const { status, json } = await send(body, headers);
    expect(status).toBe(expected);
    expect(json.detail).not.toMatch(/x{10}/);
  });

  it('takes very deep JSON for what it is', async () => {
    await as(somebody('editor'));
    const deep = writeRoute((_, body) => Array.isArray(body));
    const init = { method: 'POST', body: '['.repeat(100_000) + ']'.repeat(100_000), headers: OURS };
    const response = await deep(new Request('http://localhost:3000/api/desk/x', init), context);
    expect(await response.json()).toBe(true);
  });

  it('counts the role that is held when the body has come, and no session that ended meanwhile', async () => {
    const slow = somebody('editor');
    await as(slow);
    const sentWhile = (meanwhile: () => void) => {
      const body = new ReadableStream({
        pull(controller) {
          meanwhile();
          controller.enqueue(new TextEncoder().encode('{}'));
          controller.close();
        },
      });
      return send(body);
    };
    const demote = () =>
      setRoles(administrator, { id: slow.publicId, version: 1, roles: ['reporter'] }, desk.ctx());
    expect((await sentWhile(demote)).json.roles).toEqual(['reporter']);
    const disable = () =>
      setDisabled(administrator, { id: slow.publicId, version: 2, disabled: true }, desk.ctx());
    expect((await sentWhile(disable)).status).toBe(401);
  });
});

describe('a handler that reads', () => {
  const ask = (read: Parameters<typeof readRoute>[0]) =>
    readRoute(read)(new Request('http://localhost:3000/api/desk/x?a=1'), context);

  it('answers a refusal as a problem of its own status', async () => {
    await as(somebody('copy-desk'));
    const response = await ask(() => {
      throw new AppError('forbidden', 'Sheets are read by reporters and editors.');
    });
    expect([response.status, response.headers.get('content-type')]).toEqual([
      403,
      'application/problem+json',
    ]);
    expect(await response.json()).toMatchObject({
      status: 403,
      detail: 'Sheets are read by reporters and editors.',
    });
  });

  it('keeps what went wrong inside to the log', async () => {
    await as(somebody('editor'));
    const told = vi.spyOn(console, 'error').mockImplementation(() => undefined);
    const response = await ask(() => {
      throw new Error('SQLITE_CORRUPT at 0x12');
    });
    expect(response.status).toBe(500);
    expect(await response.text()).not.toContain('SQLITE');
    expect(told).toHaveBeenCalledOnce();
  });
});

describe('the sign-in handler', () => {
  it('does not read what no sign-in needs', async () => {
    const headers = { 'content-type': 'application/json', 'content-length': String(17 * 1024) };
    const request = new Request('http://localhost:3000/api/auth/callback/credentials', {
      method: 'POST',
      headers,
    });
    expect((await signInPost(request, context)).status).toBe(413);
  });
});

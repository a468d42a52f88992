import { afterAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { POST } from '@/app/api/v1/check/route';
import { getDb } from '@/db/client';
import { ENGINE_VERSION } from '@/lib/findings/engine-version';
import { freshDatabase, makePerson } from '@/tests/support/database';

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
afterAll(() => {
  getDb().$client.close();
  desk.closeAndRemove();
  vi.useRealTimers();
  vi.unstubAllEnvs();
});

beforeEach(() => {
  const name = `Cora ${Math.random()
    .toString(36)
    .replace(/[^a-z]/g, '')}`;
  browser.token = { sid: makePerson(desk.db, { name, roles: ['copy-desk'] }).token };
});

const DOCUMENT = {
  release: {
    sampleSource: 'probability',
    n: 1012,
    design: 'weighted',
    decimals: 0,
    shares: [
      { option: 'Alder', pct: 47 },
      { option: 'Brook', pct: 41 },
    ],
  },
};

async function ask(body: string, headers: Record<string, string> = {}) {
  const sent = { 'Content-Type': 'application/json', 'Sec-Fetch-Site': 'same-origin', ...headers };
  const request = new Request('http://localhost:3000/api/v1/check', { method: 'POST', headers: sent, body });
  const response = await POST(request);
  const { status } = response;
  return { status, headers: response.headers, body: (await response.json()) as Record<string, unknown> };
}

describe('POST /api/v1/check', () => {
  it('answers the check document, for nobody’s cache', async () => {
    const { status, headers, body } = await ask(JSON.stringify(DOCUMENT));
    expect(status).toBe(200);
    expect(headers.get('cache-control')).toBe('private, no-store');
    expect(body).toMatchObject({ engine: ENGINE_VERSION, base: { basis: 'sampling' } });
    expect(body.findings).toHaveLength(3);
  });

  it('refuses a fault with its path as an extra member of the problem', async () => {
    const release = { ...DOCUMENT.release, n: 10.5 };
    const { status, headers, body } = await ask(JSON.stringify({ release }));
    expect(status).toBe(422);
    expect(headers.get('content-type')).toBe('application/problem+json');
    expect(body).toMatchObject({
      status: 422,
      detail: 'The sample size is a whole number of at least 1.',
      error: { path: 'release.n', message: 'The sample size is a whole number of at least 1.' },
    });
  });

  it.each([
    ['text that is not JSON', '{', {}],
    ['an empty body', '', {}],
    ['JSON of another type', '{}', { 'Content-Type': 'text/plain' }],
    ['a JSON value that is no object', '[1]', {}],
  ])('refuses %s with the empty path', async (_, body, headers) => {
    const answer = await ask(body, headers);
    expect(answer.status).toBe(422);
    expect(answer.body.error).toMatchObject({ path: '' });
  });

  it('refuses more than 64 KB', async () => {
    const { status, body } = await ask(JSON.stringify({ ...DOCUMENT, more: 'x'.repeat(65 * 1024) }));
    expect(status).toBe(413);
    expect(body.error).toBeUndefined();
  });

  it('refuses whoever is not signed in', async () => {
    browser.token = null;
    expect((await ask(JSON.stringify(DOCUMENT))).status).toBe(401);
    browser.token = { sid: 'nobody’s' };
    expect((await ask(JSON.stringify(DOCUMENT))).status).toBe(401);
  });

  it('refuses a request that another site made', async () => {
    expect((await ask(JSON.stringify(DOCUMENT), { 'Sec-Fetch-Site': 'cross-site' })).status).toBe(403);
  });

  it('asks to come back later after sixty in one breath', async () => {
    const answers = await Promise.all(Array.from({ length: 61 }, () => ask(JSON.stringify(DOCUMENT))));
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(60);
    const late = answers.find(({ status }) => status === 429);
    expect(late?.headers.get('retry-after')).toBe('1');
  });
});

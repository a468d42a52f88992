import { afterAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { POST } from '@/app/api/v1/wording-check/route';
import { getDb } from '@/db/client';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { givenRelease } from '@/tests/support/given-release';
import { logRelease } from '@/tests/support/release';

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
const reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
const releaseId = logRelease(desk.db, reporter);
afterAll(() => {
  getDb().$client.close();
  desk.closeAndRemove();
  vi.useRealTimers();
  vi.unstubAllEnvs();
});
beforeEach(() => {
  browser.token = { sid: reporter.token };
});

async function ask(body: unknown, headers: Record<string, string> = {}) {
  const sent = { 'Content-Type': 'application/json', 'Sec-Fetch-Site': 'same-origin', ...headers };
  const text = typeof body === 'string' ? body : JSON.stringify(body);
  const url = 'http://localhost:3000/api/v1/wording-check';
  const response = await POST(new Request(url, { method: 'POST', headers: sent, body: text }));
  const { status } = response;
  return { status, headers: response.headers, body: (await response.json()) as Record<string, unknown> };
}

describe('POST /api/v1/wording-check', () => {
  it('answers with marks, what cannot be judged and the releases used, for nobody’s cache', async () => {
    const { status, headers, body } = await ask({
      text: 'Alder leads.',
      language: 'en',
      releases: [releaseId, givenRelease()],
    });
    expect(status).toBe(200);
    expect(headers.get('cache-control')).toBe('private, no-store');
    expect(Object.keys(body).sort()).toEqual(['cannotJudge', 'marks', 'releases']);
    expect(body.releases).toMatchObject([{ id: releaseId }, { id: null, pollster: 'Kelmouth Research' }]);
  });

  it('refuses a fault with its path as an extra member of the problem', async () => {
    const { status, headers, body } = await ask({ text: 'x', releases: [givenRelease(10.5)] });
    expect(status).toBe(422);
    expect(headers.get('content-type')).toBe('application/problem+json');
    expect(body.error).toMatchObject({ path: 'releases[0].release.n' });
  });

  it('refuses text that is not JSON with the empty path', async () => {
    const { status, body } = await ask('{');
    expect([status, body.error]).toMatchObject([422, { path: '' }]);
  });

  it('knows no release that is not there', async () => {
    expect((await ask({ text: 'x', releases: ['nothing'] })).status).toBe(404);
  });

  it('refuses whoever is not signed in or has no role, and other sites', async () => {
    expect((await ask({ text: 'x' }, { 'Sec-Fetch-Site': 'cross-site' })).status).toBe(403);
    browser.token = { sid: makePerson(desk.db, { name: 'Ned Void', roles: [] }).token };
    expect((await ask({ text: 'x' })).status).toBe(403);
    browser.token = null;
    expect((await ask({ text: 'x' })).status).toBe(401);
  });

  it('refuses more than 256 KB', async () => {
    expect((await ask({ text: 'x', more: 'x'.repeat(257 * 1024) })).status).toBe(413);
  });

  it('asks to come back later after ninety in one breath', async () => {
    browser.token = { sid: makePerson(desk.db, { name: 'Hal Rush', roles: ['reporter'] }).token };
    const answers = await Promise.all(Array.from({ length: 91 }, () => ask({ text: '' })));
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(90);
    expect(answers.find(({ status }) => status === 429)?.headers.get('retry-after')).toBe('1');
  });
});

import { expect, test } from './support';

test('the health of the desk is open to anyone and kept by no cache', async ({ request }) => {
  const answer = await request.get('/api/health');
  expect(answer.status()).toBe(200);
  expect(answer.headers()['cache-control']).toContain('no-store');
  expect(await answer.json()).toMatchObject({ database: 'ok' });
  // The process that runs jobs starts beside the server, which never waits for it.
  const jobs = async () => ((await (await request.get('/api/health')).json()) as { jobs: string }).jobs;
  await expect.poll(jobs, { timeout: 30_000 }).toBe('answering');
});

test('no page may be framed, and each page has a nonce of its own', async ({ request }) => {
  const policies = await Promise.all(
    ['/sign-in', '/sign-in', '/no-such-page'].map(async (path) => {
      const answer = await request.get(path, { headers: { 'x-nonce': 'known', purpose: 'prefetch' } });
      return answer.headers()['content-security-policy'] ?? '';
    }),
  );
  for (const policy of policies) expect(policy).toContain("frame-ancestors 'none'");
  expect(policies.join(' ')).not.toContain('nonce-known');
  expect(new Set(policies).size).toBe(3);
});

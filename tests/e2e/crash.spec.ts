import { spawnSync } from 'node:child_process';
import { expect, test } from '@playwright/test';
import { PASSWORD, readDatabase, signInByFetch, startServer, temporaryFolder } from './own-server';

const PORT = 3111;
/** When the process is killed: so many milliseconds after so many answers; fixed, so that it can be repeated. */
const MOMENTS = [
  { answers: 2, delay: 0 },
  { answers: 5, delay: 3 },
  { answers: 9, delay: 11 },
  { answers: 3, delay: 19 },
];

test('a kill -9 right after an answer loses nothing that was answered', async () => {
  test.setTimeout(180_000);
  const { folder, remove } = temporaryFolder();
  let acknowledged = 0;
  for (const moment of MOMENTS) {
    const server = await startServer(PORT, folder);
    const sheet = readDatabase(folder, clearedSheet);
    const cookie = await signInByFetch(server.origin, 'oake@averil-courier.example');
    const before = readDatabase(folder, countCopies);
    expect(before).toBeGreaterThanOrEqual(acknowledged);
    acknowledged = before;
    let answered = 0;
    let killed: Promise<unknown> = Promise.resolve();
    for (;;) {
      const answer = await fetch(`${server.origin}/api/desk/copy/${sheet}`, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json', 'Sec-Fetch-Site': 'same-origin', Cookie: cookie },
        body: JSON.stringify({ kinds: ['caveat'], form: 'plain' }),
      }).catch(() => null);
      if (!answer) break;
      expect(answer.status).toBe(200);
      acknowledged += 1;
      answered += 1;
      if (answered === moment.answers)
        killed = new Promise((resolve) => setTimeout(() => resolve(server.end('SIGKILL')), moment.delay));
    }
    await killed;
    // In one snapshot: a commit under way at the kill may become readable only after the first look.
    const { copies: kept, records } = readDatabase(folder, countBoth);
    expect(kept).toBeGreaterThanOrEqual(acknowledged);
    // The one that was under way when the process died may be there too, never half of it.
    expect(kept).toBeLessThanOrEqual(acknowledged + 1);
    expect(records).toBe(kept);
    expect(command('record:verify', folder)).toContain('history whole');
  }
  const planned = MOMENTS.reduce((sum, { answers }) => sum + answers, 0);
  expect(acknowledged).toBeGreaterThanOrEqual(planned);
  expect(command('evidence:verify', folder)).toContain('0 problems');
  remove();
});

test('an empty newsroom is opened by whoever has the code on the console, and stops cleanly', async ({
  page,
}) => {
  test.setTimeout(120_000);
  const { folder, remove } = temporaryFolder();
  const server = await startServer(PORT, folder, ['--empty']);
  const [code] = server.printed().match(/[A-Z0-9]{5}(-[A-Z0-9]{5}){3}/)!;
  expect(readDatabase(folder, (db) => db.prepare('select count(*) from people').pluck().get())).toBe(0);
  await page.goto(server.origin);
  await page.waitForURL(/\/first$/);
  await page.getByLabel('Code from the console').fill(code);
  await page.getByLabel('Your name').fill('Ned Harrow');
  await page.getByLabel('Email', { exact: true }).fill('harrow@averil-courier.example');
  await page.getByLabel('Password', { exact: true }).fill(PASSWORD);
  await page.getByRole('button').last().click();
  await page.waitForURL(/\/sign-in/);
  await page.getByLabel('Email', { exact: true }).fill('harrow@averil-courier.example');
  await page.getByLabel('Password', { exact: true }).fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Releases');
  expect(await server.end('SIGTERM')).toBe(0);
  remove();
});

function command(name: string, folder: string): string {
  const { stdout, stderr } = spawnSync('npm', ['run', '-s', name], {
    env: { ...process.env, LEADLINE_DATA: folder, NODE_OPTIONS: '' },
    encoding: 'utf8',
  });
  return stdout + stderr;
}

const clearedSheet: Parameters<typeof readDatabase<string>>[1] = (db) =>
  db
    .prepare(
      `select s.public_id from sheets s join releases r on r.id = s.release_id
       join lines l on l.sheet_id = s.id join line_versions v on v.line_id = l.id
       where v.state = 'cleared' and r.embargo_at is null limit 1`,
    )
    .pluck()
    .get() as string;

const countCopies: Parameters<typeof readDatabase<number>>[1] = (db) =>
  db.prepare('select count(*) from copies').pluck().get() as number;

const countCopyRecords: Parameters<typeof readDatabase<number>>[1] = (db) =>
  db.prepare(`select count(*) from records where action = 'copied'`).pluck().get() as number;

const countBoth: Parameters<typeof readDatabase<{ copies: number; records: number }>>[1] = (db) =>
  db.transaction(() => ({ copies: countCopies(db), records: countCopyRecords(db) }))();

import type { Browser, Page } from '@playwright/test';
import { type OwnServer, PASSWORD, readDatabase, startServer, temporaryFolder } from './own-server';
import { expect, test } from './support';

/** A desk of its own: another policy would change the verdicts of every other test. */
const PORT = 3113;
const ORIGIN = `http://localhost:${PORT}`;

// A page that is not for everybody answers 403 or 404.
test.use({ expectedErrors: [/status of (403|404)/] });

const { folder, remove } = temporaryFolder();
let server: OwnServer;
test.beforeAll(async () => {
  test.setTimeout(120_000);
  server = await startServer(PORT, folder);
});
test.afterAll(async () => {
  await server.end('SIGTERM');
  remove();
});

async function deskOf(browser: Browser, who: string): Promise<Page> {
  const page = await (await browser.newContext()).newPage();
  await page.goto(`${ORIGIN}/sign-in`);
  await page.getByLabel('Email', { exact: true }).fill(`${who}@averil-courier.example`);
  await page.getByLabel('Password', { exact: true }).fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => url.pathname !== '/sign-in');
  return page;
}
const processOf = (page: Page) => page.getByRole('region', { name: 'State of the process' });
const pidOf = () =>
  readDatabase(folder, (db) => db.prepare('select pid from job_process').pluck().get() as number);

test('a change of policy has every finding computed anew, and an administrator sees it done', async ({
  browser,
}) => {
  test.setTimeout(240_000);
  const [reed, varn, harrow] = [
    await deskOf(browser, 'reed'),
    await deskOf(browser, 'varn'),
    await deskOf(browser, 'harrow'),
  ];
  await harrow.goto(`${ORIGIN}/jobs`);
  await expect(processOf(harrow)).toContainText(/answered \d+ seconds? ago/);

  await reed.goto(`${ORIGIN}/house-style`);
  await reed.getByRole('button', { name: 'Change house style' }).click();
  await reed.waitForURL(/\/edit$/);
  const draft = new URL(reed.url()).pathname.replace('/edit', '');
  await reed.getByLabel('Margin of indifference, points').fill('2');
  await reed.getByLabel('Note for the second editor').fill('A lead of less than two points is no lead.');
  await reed.getByRole('button', { name: 'Propose this version' }).click();
  await reed.waitForURL(`${ORIGIN}${draft}`);
  await varn.goto(`${ORIGIN}${draft}`);
  await varn.getByRole('button', { name: 'Put in force' }).click();
  await expect(varn.getByRole('heading', { name: 'Version 2' })).toBeVisible();

  // The page refreshes itself: nobody reloads it.
  const row = harrow
    .getByRole('table', { name: 'Ended last' })
    .getByRole('row')
    .filter({ hasText: 'Findings computed anew' });
  await expect(row).toContainText('Done', { timeout: 30_000 });
  await expect(row).toContainText(/(\d+) of \1 done/);
  await varn.goto(`${ORIGIN}/releases`);
  await expect(varn.getByText('Being computed anew')).toHaveCount(0);
});

test('the process that runs jobs comes back when it is killed, and nothing else is down meanwhile', async ({
  browser,
}) => {
  test.setTimeout(120_000);
  const page = await deskOf(browser, 'harrow');
  await page.goto(`${ORIGIN}/jobs`);
  const before = pidOf();
  process.kill(before, 'SIGKILL');
  expect((await page.request.get(`${ORIGIN}/api/health`)).status()).toBe(200);
  await expect.poll(pidOf, { timeout: 30_000 }).not.toBe(before);
  await expect(processOf(page)).toContainText(/answered \d+ seconds? ago/);
  const health = await page.request.get(`${ORIGIN}/api/health`);
  expect(await health.json()).toMatchObject({ database: 'ok', jobs: 'answering' });
});

test('nobody but an administrator reads of jobs', async ({ browser }) => {
  const page = await deskOf(browser, 'reed');
  const answer = await page.goto(`${ORIGIN}/jobs`);
  expect(answer?.status()).toBe(403);
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('This page is not open to you');
  expect((await page.request.get(`${ORIGIN}/api/v1/jobs`)).status()).toBe(403);
});

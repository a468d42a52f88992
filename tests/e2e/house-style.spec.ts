import type { Browser, Page } from '@playwright/test';
import { type OwnServer, PASSWORD, startServer, temporaryFolder } from './own-server';
import { expect, test } from './support';

/** A desk of its own: what is put in force here would change the words of every other test. */
const PORT = 3112;
const ORIGIN = `http://localhost:${PORT}`;
const TAIL = 'by {pollster}, but the poll cannot settle it';
const FIGURE =
  '{among, select, several {Of the two, {a} has} other {{a} has}} the higher figure, {aShare} to {bShare} for {b}, in poll';

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

/** Drafts a sheet from the first fragile lead of the desk and gives its headline. */
async function fragileHeadline(page: Page): Promise<string> {
  await page.goto(`${ORIGIN}/releases`);
  const links = await page.getByRole('row').getByRole('link').all();
  const places = await Promise.all(links.map((link) => link.getAttribute('href')));
  for (const place of new Set(places.filter((one) => /^\/releases\/[\w-]{22}$/.test(one ?? '')))) {
    await page.goto(`${ORIGIN}/lines/new?release=${place!.split('/').at(-1)}`);
    const fragile = page.getByRole('radio', { name: /minus.*fragile/i });
    if ((await fragile.count()) === 0) continue;
    await fragile.first().check();
    await page.getByRole('button', { name: 'Draft the sheet' }).click();
    await page.waitForURL(/\/lines\/[\w-]{22}$/);
    return page.getByLabel('Headline claim', { exact: true }).inputValue();
  }
  throw new Error('the demo has no fragile lead');
}

test('a changed sentence is refused for “leads”, mended, put in force by a second editor, and drafted with', async ({
  browser,
}) => {
  test.setTimeout(240_000);
  const [reed, varn, quill, oake, harrow] = [
    await deskOf(browser, 'reed'),
    await deskOf(browser, 'varn'),
    await deskOf(browser, 'quill'),
    await deskOf(browser, 'oake'),
    await deskOf(browser, 'harrow'),
  ];

  // Everybody reads what is in force; only editors change it.
  for (const page of [quill, oake, harrow]) {
    await page.goto(`${ORIGIN}/house-style`);
    await expect(page.getByText('Version 1 is in force')).toBeVisible();
    await expect(page.getByRole('button', { name: 'Change house style' })).toHaveCount(0);
  }

  await reed.goto(`${ORIGIN}/house-style`);
  await reed.getByRole('button', { name: 'Change house style' }).click();
  await reed.waitForURL(/\/edit$/);
  const draft = new URL(reed.url()).pathname.replace('/edit', '');
  const sentence = reed.getByLabel('Fragile', { exact: true });
  await sentence.fill(`{a} leads {b}, {aShare} to {bShare}, in poll ${TAIL}`);
  await expect(reed.getByText('“leads” says more than the verdict Fragile supports.')).toBeVisible();
  await reed.getByLabel('Note for the second editor').fill('A fragile lead is told by its figure.');
  await reed.getByRole('button', { name: 'Propose this version' }).click();
  await expect(reed.getByRole('heading', { name: 'This version cannot be proposed yet' })).toBeVisible();

  // What was refused is still there after the page was left.
  await reed.reload();
  await expect(sentence).toHaveValue(/\{a\} leads \{b\}/);
  await sentence.fill('');
  await sentence.fill(`${FIGURE} ${TAIL.replace('{pollster}', '')}`);
  await sentence.evaluate(
    (field: HTMLTextAreaElement, at) => field.setSelectionRange(at, at),
    `${FIGURE} by `.length,
  );
  await reed.getByLabel('Insert into Fragile').selectOption('pollster');
  await expect(sentence).toHaveValue(`${FIGURE} ${TAIL}`);
  await expect(reed.getByRole('list', { name: 'Fragile, filled' }).getByRole('listitem')).toHaveCount(3);
  await expect(reed.getByRole('list', { name: 'Fragile, filled' })).toContainText('has the higher figure');
  await reed.getByRole('button', { name: 'Look through what is live' }).click();
  await expect(reed.getByText(/live sheets? looked at/)).toBeVisible();
  await reed.getByLabel('Note for the second editor').fill('A fragile lead is told by its figure.');
  await reed.getByRole('button', { name: 'Propose this version' }).click();
  await reed.waitForURL(`${ORIGIN}${draft}`);
  await expect(reed.getByText('You proposed this version. It waits for another editor.')).toBeVisible();
  await expect(reed.getByRole('button', { name: 'Put in force' })).toHaveCount(0);

  // A reporter is told nothing of a proposal.
  expect((await quill.goto(`${ORIGIN}${draft}`))?.status()).toBe(404);
  expect((await varn.goto(`${ORIGIN}${draft}/edit`))?.status()).toBe(403);

  await varn.goto(`${ORIGIN}/house-style`);
  await varn.getByRole('link', { name: 'Read what is proposed' }).click();
  await expect(varn.getByText('English: Headline claim · Lead, Fragile')).toBeVisible();
  await varn.getByRole('button', { name: 'Put in force' }).click();
  await expect(varn.getByRole('heading', { name: 'Version 2' })).toBeVisible();

  await quill.goto(`${ORIGIN}/house-style`);
  await expect(
    quill.getByText(/Version 2 is in force since .* by Marten Reed and Isolde Varn/),
  ).toBeVisible();
  expect(await fragileHeadline(quill)).toMatch(/ has the higher figure, .* but the poll cannot settle it$/);
});

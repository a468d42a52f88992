import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { accountWith, expect, signIn, test } from './support';

// Pages of other roles answer 403 and unknown ones 404, on purpose.
test.use({ expectedErrors: [/status of (403|404)/] });

const SCREENS: Record<string, string[]> = {
  reporter: ['/releases', '/releases/new', '/lines', '/copy-desk', '/embeds', '/history', '/account'],
  editor: ['/lines/night-list', '/releases/bans', '/house-style', '/wording-check'],
  'copy-desk': ['/copy-desk', '/embeds', '/releases'],
  administrator: ['/people', '/history', '/no-such-page'],
};

for (const [role, paths] of Object.entries(SCREENS))
  test(`what a ${role} opens has no fault that axe finds, and fits 320 px by day and night`, async ({
    page,
  }) => {
    test.setTimeout(300_000);
    await signIn(page, accountWith(role));
    for (const path of paths) await look(page, path);
    if (role !== 'reporter') return;
    for (const list of ['/releases', '/lines']) {
      await page.goto(list);
      await look(page, await firstOf(page, list));
    }
    await page.goto('/releases');
    const unprinted = page.getByRole('row').filter({ hasText: 'Bridge-toll' }).filter({ hasText: 'Quillon' });
    await unprinted.getByRole('link').click();
    await look(page, (await page.getByRole('link', { name: 'Change figures' }).getAttribute('href'))!);
  });

test('the door and a public chart have no fault that axe finds, and fit 320 px', async ({
  page,
  request,
}) => {
  for (const path of ['/sign-in', '/invitation']) await look(page, path);
  await signIn(page, accountWith('copy-desk'));
  await page.goto('/embeds');
  const address = await page.locator('main a[href*="/embed/"]').first().getAttribute('href');
  expect((await request.get(address!)).headers()['set-cookie']).toBeUndefined();
  await look(page, address!);
});

test('a page of another role is refused with 403, an unknown one with 404, and no desk page is kept by a cache', async ({
  page,
}) => {
  await signIn(page, accountWith('copy-desk'));
  for (const [path, status] of [
    ['/releases', 403],
    ['/people', 403],
    ['/history', 403],
    ['/lines', 403],
    ['/copy-desk', 200],
    ['/no-such-page', 404],
  ] as const) {
    const answer = await page.goto(path);
    expect([path, answer?.status()]).toEqual([path, status]);
    expect(answer?.headers()['cache-control']).toContain('no-store');
  }
  const refused = await page.request.get('/api/desk/queue');
  expect(refused.status()).toBe(403);
  expect(refused.headers()['content-type']).toContain('application/problem+json');
});

/** The page of the first thing in a list. */
async function firstOf(page: Page, list: string): Promise<string> {
  const links = page.locator(`main a[href^="${list}/"]`);
  await expect(links.first()).toBeVisible();
  const places = await links.evaluateAll((all) => all.map((link) => link.getAttribute('href')!));
  return places.find((place) => /\/[\w-]{22}$/.test(place))!;
}

/** One reading of a page, looked at in two widths and two kinds of light. */
async function look(page: Page, path: string): Promise<void> {
  await page.goto(path, { waitUntil: 'networkidle' });
  for (const [width, colorScheme] of [
    [1280, 'light'],
    [320, 'dark'],
  ] as const) {
    await page.setViewportSize({ width, height: 800 });
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
    const { violations } = await new AxeBuilder({ page }).analyze();
    const faults = violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`);
    expect(faults, `${path} at ${width} px`).toEqual([]);
    const over = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    );
    expect(over, `${path} scrolls sideways at ${width} px`).toBeLessThanOrEqual(0);
  }
}

import type { Page } from '@playwright/test';
import { deskOf, expect, test } from './support';

// Pages of other roles answer 403 on purpose.
test.use({ expectedErrors: [/status of 403/] });

async function draft(page: Page): Promise<string> {
  await page.goto('/releases');
  await page.getByRole('row').filter({ hasText: 'Norwater Polls' }).getByRole('link').first().click();
  await page
    .getByRole('link', { name: /Draft a sheet/ })
    .first()
    .click();
  await page.getByRole('radio').first().check();
  await page.getByRole('button', { name: 'Draft the sheet' }).click();
  await page.waitForURL(/\/lines\/[\w-]{22}$/);
  return page.url();
}

test('two people work on one sheet: a time, a comment, who is there, a reason for a line, then agreement', async ({
  browser,
}) => {
  test.setTimeout(180_000);
  const reporter = await deskOf(browser, 'Rhea Quill');
  const editor = await deskOf(browser, 'Marten Reed');
  const sheet = await draft(reporter);
  await reporter.getByText('When it is wanted', { exact: true }).click();
  await reporter.getByLabel('Wanted by').fill('2031-05-04T11:30');
  await reporter.getByRole('button', { name: 'Set', exact: true }).click();
  await expect(reporter.getByText(/^Wanted by 4 May 2031, 11:30/)).toBeVisible();
  await reporter.getByRole('button', { name: 'File', exact: true }).click();
  await expect(reporter.getByText('You filed this; somebody else reads it.')).toBeVisible();

  await editor.goto(sheet);
  await expect(editor.getByText('Rhea Quill has this sheet open too.')).toBeVisible();
  await editor.getByText('Comments (0 open)').click();
  await editor.getByLabel(/^Its words/).fill('Alder');
  await editor.getByLabel('What about them?').fill('Name the pollster first.');
  await editor.getByRole('button', { name: 'Comment', exact: true }).click();
  await expect(editor.getByText('Comments (1 open)')).toBeVisible();
  await editor.keyboard.press('Escape');
  const mark = editor.getByRole('link', { name: 'Alder comment 1' });
  await expect(mark).toHaveAccessibleDescription('Comment 1 by Marten Reed: Name the pollster first.');
  await mark.press('Enter');
  await expect(editor.getByRole('listitem').filter({ hasText: 'Name the pollster first.' })).toBeFocused();
  await editor.keyboard.press('Escape');
  await editor.getByRole('button', { name: 'Send back' }).click();
  const dialog = editor.getByRole('dialog');
  await dialog.getByText('Reasons for single lines').click();
  await dialog.getByLabel('Body sentence').fill('The base is missing.');
  await dialog.getByRole('button', { name: 'Send back' }).click();
  await expect(editor.getByRole('heading', { name: 'Sent back to Rhea Quill' })).toBeVisible();

  await reporter.goto(sheet);
  await expect(reporter.getByText('The base is missing.')).toBeVisible();
  await reporter.getByRole('button', { name: /^Settle/ }).click();
  await expect(reporter.getByText(/^Settled by Rhea Quill/)).toBeVisible();
  await reporter.getByRole('button', { name: 'File', exact: true }).click();
  await expect(reporter.getByText('You filed this; somebody else reads it.')).toBeVisible();
  await editor.goto(sheet);
  await editor.getByRole('button', { name: 'Clear for publication' }).click();
  await expect(editor.getByText('Cleared for publication.').first()).toBeVisible();
});

test('the fullest filed sheet is read at 1280 by 800 without scrolling, and fits a phone', async ({
  browser,
}) => {
  const editor = await deskOf(browser, 'Marten Reed');
  await editor.setViewportSize({ width: 1280, height: 800 });
  await editor.goto('/lines');
  await editor
    .getByRole('link', { name: /^Alder 49% in poll by Kelmouth Research/ })
    .first()
    .click();
  await editor.waitForURL(/\/lines\/[\w-]{22}$/);
  const parts = [
    editor.getByRole('region', { name: 'Headline claim' }),
    editor.getByRole('region', { name: 'Method note' }),
    editor.getByRole('region', { name: 'Alt text' }),
    editor.locator('.verdict'),
    editor.getByText('Test of the change', { exact: true }),
    editor.getByText('Read in', { exact: true }),
    editor.getByText('Ticked', { exact: true }),
    editor.getByText(/^Disclosure: \d+ of 12 known/),
    editor.getByText('Bans', { exact: true }),
    editor.getByText('Embeds held', { exact: true }),
    editor.getByRole('link', { name: /comment 1$/ }),
    editor.getByRole('button', { name: 'Clear for publication' }),
  ];
  for (const part of parts) {
    await expect(part).toBeVisible();
    const box = (await part.boundingBox())!;
    expect(box.y, `${part}`).toBeGreaterThanOrEqual(0);
    expect(box.y + box.height, `${part}`).toBeLessThanOrEqual(800);
  }
  const heightOf = () => editor.evaluate(() => document.documentElement.scrollHeight);
  expect(await heightOf()).toBeLessThanOrEqual(800);
  // The bar is at the foot of the page, and lies over none of the words.
  const [print, bar] = await Promise.all(
    [editor.locator('.reading-print'), editor.getByRole('region', { name: 'Next step' })].map((place) =>
      place.boundingBox(),
    ),
  );
  expect(print!.y + print!.height).toBeLessThanOrEqual(bar!.y);

  await editor.setViewportSize({ width: 320, height: 640 });
  const over = await editor.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect(over).toBeLessThanOrEqual(0);
});

test('the keys of a sheet go to their places and press nothing; ? opens their list', async ({ browser }) => {
  test.setTimeout(120_000);
  const reporter = await deskOf(browser, 'Rhea Quill');
  await draft(reporter);
  // The keys work once the page's script runs.
  await expect(async () => {
    await reporter.keyboard.press('Alt+Shift+E');
    await expect(reporter.locator('#evidence')).toBeFocused({ timeout: 500 });
  }).toPass({ timeout: 20_000 });
  await reporter.keyboard.press('Alt+Shift+N');
  await expect(reporter.getByRole('button', { name: 'File', exact: true })).toBeFocused();
  await expect(reporter.getByRole('heading', { name: 'Draft by Rhea Quill' })).toBeVisible();
  await reporter.keyboard.press('?');
  await expect(reporter.getByRole('dialog', { name: 'Keys of this page' })).toBeVisible();
});

test('an editor keeps the night list and the bans; others read them or are refused', async ({ browser }) => {
  test.setTimeout(150_000);
  const editor = await deskOf(browser, 'Marten Reed');
  await editor.goto('/lines/night-list');
  await editor.getByLabel('Editor', { exact: true }).selectOption({ label: 'Isolde Varn' });
  await editor.getByLabel('From').fill('00:00');
  await editor.getByLabel('To', { exact: true }).fill('23:59');
  for (const day of await editor.getByLabel('When').locator('option').allTextContents()) {
    if (!day.startsWith('Every')) continue;
    await editor.getByLabel('When').selectOption({ label: day });
    break;
  }
  await editor.getByRole('button', { name: 'Put on the list' }).click();
  await expect(editor.getByRole('row').filter({ hasText: 'Isolde Varn' })).toBeVisible();

  await editor.goto('/releases/bans');
  await editor.getByLabel('Place').fill('Lanternholm');
  await editor.getByLabel('From').fill('2031-05-01T00:00');
  await editor.getByLabel('To', { exact: true }).fill('2031-05-05T21:00');
  await editor.getByLabel('The rule').fill('Electoral code, section 7, read by our lawyers.');
  await editor.getByRole('button', { name: 'Enter the ban' }).click();
  await expect(editor.getByRole('region', { name: 'Ahead' })).toContainText('Lanternholm');
  const copyDesk = await deskOf(browser, 'Tamsin Oake');
  expect((await copyDesk.goto('/lines/night-list'))?.status()).toBe(403);
  expect((await copyDesk.goto('/releases/bans'))?.status()).toBe(200);
  await expect(copyDesk.getByRole('button', { name: 'Enter the ban' })).toHaveCount(0);
});

test('figures as printed are drafted from a release, edited by nobody and cleared by two', async ({
  browser,
}) => {
  test.setTimeout(120_000);
  const reporter = await deskOf(browser, 'Rhea Quill');
  const editor = await deskOf(browser, 'Marten Reed');
  await reporter.goto('/releases');
  await reporter.getByRole('row').filter({ hasText: 'Norwater Polls' }).getByRole('link').first().click();
  await reporter
    .getByRole('link', { name: /Draft a sheet/ })
    .first()
    .click();
  await reporter.getByRole('button', { name: 'Give the figures as printed' }).click();
  await reporter.waitForURL(/\/lines\/[\w-]{22}$/);
  await expect(reporter.getByRole('heading', { name: 'Figures as printed' })).toBeVisible();
  await reporter.getByRole('button', { name: 'File', exact: true }).click();
  await expect(reporter.getByText('You filed this; somebody else reads it.')).toBeVisible();
  await editor.goto(reporter.url());
  await editor.getByRole('button', { name: 'Clear for publication' }).click();
  await expect(editor.getByText('These words are printable.')).toBeVisible();
});

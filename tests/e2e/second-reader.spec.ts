import type { Page } from '@playwright/test';
import { deskOf, expect, test } from './support';

// Of two who clear at once one is told that somebody was faster.
test.use({ expectedErrors: [/status of 409/] });

async function draftAndFile(page: Page): Promise<string> {
  await page.goto('/releases');
  await page.getByRole('row').filter({ hasText: 'Norwater Polls' }).getByRole('link').first().click();
  await page
    .getByRole('link', { name: /Draft a sheet/ })
    .first()
    .click();
  await page.getByRole('radio').first().check();
  await page.getByRole('button', { name: 'Draft the sheet' }).click();
  await page.waitForURL(/\/lines\/[\w-]{22}$/);
  await page.getByRole('button', { name: 'File', exact: true }).click();
  await expect(page.getByText('You filed this; somebody else reads it.')).toBeVisible();
  return page.url();
}

test('an editor who changes filed words needs the author’s agreement, given with one key', async ({
  browser,
}) => {
  test.setTimeout(120_000);
  const reporter = await deskOf(browser, 'Rhea Quill');
  const editor = await deskOf(browser, 'Marten Reed');
  const sheet = await draftAndFile(reporter);

  await editor.goto(sheet);
  await editor.getByRole('button', { name: 'Change the words' }).click();
  const body = editor.getByLabel('Body sentence', { exact: true });
  await body.fill(`${await body.inputValue()} The election is in spring.`);
  await editor.getByRole('button', { name: 'File the changed words' }).click();
  await expect(editor.getByText('You filed this; somebody else reads it.')).toBeVisible();
  await expect(editor.getByRole('button', { name: /clear/i })).toHaveCount(0);

  await reporter.goto(sheet);
  await expect(reporter.getByText('The election is in spring.').first()).toBeVisible();
  await reporter.getByRole('button', { name: 'Agree and clear' }).click();
  await expect(reporter.getByText('Cleared for publication.').first()).toBeVisible();
});

test('two editors who clear at the same moment make one clearing, and the second is told', async ({
  browser,
}) => {
  test.setTimeout(120_000);
  const reporter = await deskOf(browser, 'Rhea Quill');
  const editors = [await deskOf(browser, 'Marten Reed'), await deskOf(browser, 'Isolde Varn')];
  const sheet = await draftAndFile(reporter);
  for (const editor of editors) await editor.goto(sheet);
  await Promise.all(
    editors.map((editor) => editor.getByRole('button', { name: 'Clear for publication' }).click()),
  );
  for (const editor of editors)
    await expect(editor.getByText(/Cleared for publication\.|cleared already/).first()).toBeVisible();
  await reporter.goto(sheet);
  await expect(reporter.getByText(/cleared it/)).toHaveCount(1);
});

test('a reporter cannot clear what another reporter filed', async ({ browser }) => {
  const writer = await deskOf(browser, 'Rhea Quill');
  const other = await deskOf(browser, 'Jory Quent');
  const sheet = await draftAndFile(writer);
  await other.goto(sheet);
  await expect(other.getByText(/so an editor clears it/)).toBeVisible();
  await expect(other.getByRole('button', { name: /clear for publication/i })).toHaveCount(0);
});

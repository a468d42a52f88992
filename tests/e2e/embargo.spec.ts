import { accountWith, expect, signIn, test } from './support';

// An embargoed chart answers 404 on purpose, and a page of another role 403.
test.use({ expectedErrors: [/status of (403|404)/] });

const POLLSTER = 'Kelmouth Research';
const RACE = 'Averil Assembly';

test('what is under embargo stays with reporters and editors until it is opened, and the public waits', async ({
  browser,
}) => {
  test.setTimeout(120_000);
  const permissions = ['clipboard-read', 'clipboard-write'];
  const [editor, copyDesk] = await Promise.all(
    ['editor', 'copy-desk'].map(async (role) => {
      const page = await (await browser.newContext({ permissions })).newPage();
      await signIn(page, accountWith(role));
      return page;
    }),
  );
  if (!editor || !copyDesk) throw new Error('two people were expected');
  const search = `/copy-desk?${new URLSearchParams({ race: RACE, pollster: POLLSTER })}`;

  await editor.goto('/embeds');
  const entry = editor
    .getByText(/answers 404 until the embargo ends/)
    .locator('xpath=ancestor::*[self::li or self::article or self::section][1]');
  const address = (await entry.textContent())!.match(/http:\/\/localhost:\d+\/embed\/[\w-]{22}/)![0];
  const unknown = address.replace(/[\w-]{22}$/, 'A'.repeat(22));
  const [hidden, never] = await Promise.all(
    [address, unknown].map(async (url) => {
      const answer = await copyDesk.request.get(url);
      const { date: _, ...headers } = answer.headers();
      return { status: answer.status(), headers, body: await answer.text() };
    }),
  );
  expect(hidden!.status).toBe(404);
  expect(hidden).toEqual(never);

  await copyDesk.goto(search);
  await expect(copyDesk.getByText('No cleared sheet fits that search')).toBeVisible();

  await editor.goto(search);
  await expect(editor.getByRole('complementary', { name: /embargo/i }).first()).toBeVisible();
  await expect(editor.getByRole('button', { name: /Plain/ }).first()).toBeDisabled();

  await editor.goto('/releases');
  await editor.getByRole('row').filter({ hasText: 'EMBARGO' }).getByRole('link').first().click();
  await editor.getByLabel('Open it to').selectOption({ label: 'The whole copy desk' });
  await editor.getByRole('button', { name: 'Put on the list' }).click();
  await expect(editor.getByRole('button', { name: /Take off/ })).toBeVisible();

  await copyDesk.goto(search);
  await expect(copyDesk.getByRole('complementary', { name: /embargo/i }).first()).toBeVisible();
  await copyDesk.getByRole('button', { name: /Plain/ }).first().click();
  await expect(copyDesk.getByText(/^Copied/).first()).toBeVisible();
  expect((await copyDesk.request.get(address)).status()).toBe(404);

  await editor.getByRole('button', { name: 'Lift the embargo' }).click();
  const dialog = editor.getByRole('dialog');
  await dialog.getByRole('textbox').fill('The pollster published the figures early.');
  await dialog.getByRole('button', { name: 'Lift the embargo' }).click();
  await expect(editor.getByRole('complementary', { name: /embargo/i })).toHaveCount(0);
  expect((await copyDesk.request.get(address)).status()).toBe(200);
});

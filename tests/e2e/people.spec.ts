import { accountWith, expect, signIn, test } from './support';

// Wrong passwords, and somebody whose role was taken away, are refused on purpose.
test.use({ expectedErrors: [/status of (401|403)/] });

const CHOSEN = 'lanterns over nine quiet piers';

test('a person is added, signs in with a code, loses a role and is disabled, each at the next request', async ({
  page,
  browser,
}) => {
  await signIn(page, accountWith('administrator'));
  await page.goto('/people');
  await page.getByRole('button', { name: 'Add a person' }).click();
  const adding = page.getByRole('dialog');
  await adding.getByLabel('Name').fill('Petra Lund');
  await adding.getByLabel('Email').fill('lund@averil-courier.example');
  await adding.getByLabel('Reporter').check();
  await adding.getByLabel('Copy desk').check();
  await adding.getByRole('button', { name: 'Add and show the code' }).click();
  const code = (await adding.getByLabel('Sign-in code').textContent())!.trim();
  await page.keyboard.press('Escape');

  const context = await browser.newContext();
  const theirs = await context.newPage();
  await theirs.goto('/invitation');
  await theirs.getByLabel('Sign-in code').fill(code);
  await theirs.getByLabel('New password').fill('password123456789');
  await theirs.getByRole('button', { name: 'Set the password' }).click();
  await expect(theirs.getByText(/one of the first that would be tried/).first()).toBeVisible();
  await theirs.getByLabel('New password').fill(CHOSEN);
  await theirs.getByRole('button', { name: 'Set the password' }).click();
  await theirs.waitForURL(/\/sign-in/);
  const account = { name: 'Petra Lund', email: 'lund@averil-courier.example', password: CHOSEN, roles: [] };
  await signIn(theirs, account);
  await expect(theirs.getByRole('heading', { level: 1 })).toHaveText('Releases');

  await page.reload();
  const row = page.getByRole('row', { name: /Petra Lund/ });
  await row.getByRole('button').click();
  const changing = page.getByRole('dialog');
  await changing.getByLabel('Reporter').uncheck();
  await changing.getByRole('button', { name: 'Save the roles' }).click();
  await expect(row).not.toContainText('Reporter');
  const refused = await theirs.goto('/releases');
  expect(refused?.status()).toBe(403);
  await expect(theirs.getByRole('heading', { level: 1 })).toHaveText('This page is not open to you');

  await row.getByRole('button').click();
  await page.getByRole('dialog').getByRole('button', { name: 'Disable…' }).click();
  await page.getByRole('button', { name: 'Disable Petra Lund' }).click();
  await expect(row).toContainText(/disabled/i);
  await theirs.goto('/copy-desk');
  await theirs.waitForURL(/\/sign-in/);
  await context.close();
});

test('the door gives one answer to a wrong password and to an unknown account', async ({ page }) => {
  const tries = [
    ['quent@averil-courier.example', 'not the password of anybody'],
    ['nobody@averil-courier.example', 'not the password of anybody'],
  ] as const;
  const answers: string[] = [];
  for (const [email, password] of tries) {
    await page.goto('/sign-in');
    await page.getByLabel('Email', { exact: true }).fill(email);
    await page.getByLabel('Password', { exact: true }).fill(password);
    const answered = page.waitForResponse((response) => response.url().includes('/callback/credentials'));
    await page.getByRole('button', { name: 'Sign in' }).click();
    answers.push(String((await answered).status()));
    const refusal = page.getByText(/do not open a desk/);
    answers.push((await refusal.first().textContent())!);
  }
  expect(answers.slice(0, 2)).toEqual(answers.slice(2));
});

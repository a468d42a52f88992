import { accountWith, expect, signIn, test } from './support';

test('a reporter mends the figures of a release on which nothing printed rests', async ({ page }) => {
  await signIn(page, accountWith('reporter'));
  await page.goto('/releases');
  const row = page.getByRole('row').filter({ hasText: 'Bridge-toll' }).filter({ hasText: 'Quillon' });
  await row.getByRole('link').click();
  await page.getByRole('link', { name: 'Change figures' }).click();
  await expect(page.getByLabel('Sample size', { exact: true })).toHaveValue('1950');
  await page.getByLabel('Sample size', { exact: true }).fill('many');
  await page.getByRole('button', { name: 'Save as version 2' }).click();
  await expect(page.getByText(/whole number of people/).first()).toBeVisible();
  await page.getByLabel('Sample size', { exact: true }).fill('1,905');
  await page.getByRole('button', { name: 'Save as version 2' }).click();
  await page.waitForURL(/\/releases\/[\w-]{22}$/);
  await expect(page.locator('main')).toContainText('1,905');
  await expect(page.getByText(/version 2/)).toBeVisible();
});

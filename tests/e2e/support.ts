import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { type Browser, type Cookie, expect, type Page, test as base } from '@playwright/test';
import { browserTests } from '../../playwright.config';

export { expect };
export type Account = { name: string; email: string; password: string; roles: string[] };

type Watched = {
  /** Console errors a test provokes on purpose, as patterns; every other one fails the test. */
  expectedErrors: RegExp[];
  watchConsole: void;
};

export const test = base.extend<Watched>({
  expectedErrors: async ({}, provide) => provide([]),
  watchConsole: [
    async ({ context, expectedErrors }, provide) => {
      const seen: string[] = [];
      context.on('console', (message) => {
        if (message.type() === 'error') seen.push(`${message.text()} (${message.location().url})`);
      });
      context.on('weberror', (error) => seen.push(String(error.error())));
      await provide();
      const unexpected = seen.filter((text) => !expectedErrors.some((pattern) => pattern.test(text)));
      expect(unexpected, 'the page wrote errors to the console').toEqual([]);
    },
    { auto: true },
  ],
});

/** The demo people with their passwords, as the first start wrote them. */
export function readAccounts(): Account[] {
  return JSON.parse(readFileSync(join(browserTests.dataFolder, 'accounts.json'), 'utf8')) as Account[];
}

/** The first demo person who holds a role, and holds no other where `only` is set. */
export function accountWith(role: string, { only = true } = {}): Account {
  const account = readAccounts().find(({ roles }) => roles.includes(role) && (!only || roles.length === 1));
  if (!account) throw new Error(`no demo account is ${only ? 'only ' : ''}${role}`);
  return account;
}

/** Sessions opened at the door before, by the address of their person: later pages of that person carry them on. */
const opened = new Map<string, Cookie[]>();

/** Signs a person in; through the door the first time, with the session of that time afterwards. */
export async function signIn(page: Page, { email, password }: Account): Promise<void> {
  const kept = opened.get(email);
  if (kept) return page.context().addCookies(kept);
  await page.goto('/sign-in');
  await page.getByLabel('Email', { exact: true }).fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => url.pathname !== '/sign-in');
  opened.set(email, await page.context().cookies());
}

/** A page of one of the demo people, in a browser of their own. */
export async function deskOf(browser: Browser, name: string): Promise<Page> {
  const account = readAccounts().find((one) => one.name === name);
  if (!account) throw new Error(`no demo account is called ${name}`);
  const page = await (await browser.newContext()).newPage();
  await signIn(page, account);
  return page;
}

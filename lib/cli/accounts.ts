import { existsSync, readFileSync } from 'node:fs';
import { z } from 'zod';
import { writePrivately } from './data-folder';

const account = z.object({
  name: z.string(),
  email: z.string(),
  password: z.string(),
  roles: z.array(z.string()),
});

/** A person of the demo newsroom, with the password made for the first sign-in. */
export type DemoAccount = z.infer<typeof account>;

export function writeAccounts(file: string, accounts: readonly DemoAccount[]): void {
  writePrivately(file, `${JSON.stringify(accounts, null, 2)}\n`);
}

export function readAccounts(file: string): DemoAccount[] {
  return existsSync(file) ? z.array(account).parse(JSON.parse(readFileSync(file, 'utf8'))) : [];
}

export function describeAccounts(accounts: readonly DemoAccount[]): string[] {
  const width = (texts: string[]) => Math.max(...texts.map((text) => text.length));
  const emailWidth = width(accounts.map(({ email }) => email));
  const passwordWidth = width(accounts.map(({ password }) => password));
  return accounts.map(
    ({ email, password, roles, name }) =>
      `  ${email.padEnd(emailWidth)}  ${password.padEnd(passwordWidth)}  ${name} (${roles.join(', ')})`,
  );
}

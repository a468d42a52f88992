import { existsSync } from 'node:fs';
import { parseArgs } from 'node:util';
import { type Db, getDb } from '@/db/client';
import { appVersion, type Env, readEnv } from '@/lib/env';
import { prepareFirstAdministrator } from '@/lib/services/account/first-administrator';
import { describeAccounts, readAccounts } from './accounts';
import { type DataFolder, openDataFolder } from './data-folder';
import { makeReady } from './first-start';

export type Desk = { env: Env; data: DataFolder; db: Db; firstCode: string | null };

/** What the shell says goes before what a file .env says. */
export function readSettings(): Env {
  if (existsSync('.env')) process.loadEnvFile('.env');
  return readEnv();
}

/** Everything that must stand before the first request: the folder, its lock, the secret, the database. */
export async function prepareDesk(env: Env, args: string[]): Promise<Desk> {
  const { values } = parseArgs({ args, options: { empty: { type: 'boolean', default: false } } });
  const data = openDataFolder(env.LEADLINE_DATA);
  try {
    shareSettings(env, data);
    await makeReady(data, values.empty ? null : (db) => seed(db, env));
    const db = getDb();
    return { env, data, db, firstCode: prepareFirstAdministrator({ db, now: Date.now() }) };
  } catch (error) {
    data.release();
    throw error;
  }
}

/** Next and its children read the environment themselves: it must say what was decided here. */
function shareSettings(env: Env, data: DataFolder): void {
  process.env.LEADLINE_DATA = env.LEADLINE_DATA;
  process.env.LEADLINE_ORIGIN = env.LEADLINE_ORIGIN;
  process.env.NEXTAUTH_URL = env.LEADLINE_ORIGIN;
  process.env.NEXTAUTH_SECRET = data.secret;
}

async function seed(db: Db, env: Env) {
  process.stdout.write('First start: making the demo newsroom\n');
  const { seedDemo } = await import('./seed/index');
  return seedDemo({ db, now: Date.now(), password: env.DEMO_PASSWORD });
}

export function announce({ env, data, firstCode }: Desk): void {
  const accounts = readAccounts(data.accounts);
  const lines = [`Leadline ${appVersion} is ready at ${env.LEADLINE_ORIGIN}`];
  if (firstCode)
    lines.push('', 'Nobody is here yet. This code makes the first administrator, once:', `  ${firstCode}`);
  if (accounts.length > 0) {
    lines.push(
      '',
      `Demo accounts, as made at the first start (${data.accounts}):`,
      ...describeAccounts(accounts),
    );
  }
  process.stdout.write(`${lines.join('\n')}\n`);
}

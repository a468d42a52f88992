import { existsSync, mkdirSync, readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { databaseFile, openDatabase, type Db } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { ensureJobs } from '@/lib/services/jobs/ensure-jobs';
import { ensureDeskSettings } from '@/lib/services/setup/desk-settings';
import { type DemoAccount, writeAccounts } from './accounts';
import { type DataFolder, moveIntoPlace } from './data-folder';

export type Seed = (db: Db) => Promise<DemoAccount[]>;

/**
 * Leaves the desk's database in its place, on the newest schema. At the very first start it is filled beside
 * its place and moved there last, so that a start which is cut short leaves nothing half made.
 */
export async function makeReady(data: DataFolder, seed: Seed | null): Promise<void> {
  if (!existsSync(data.database)) await makeDatabase(data, seed);
  const db = openDatabase(data.database);
  migrateDatabase(db);
  ensureDeskSettings({ db, now: Date.now() });
  ensureJobs({ db, now: Date.now() });
  db.$client.close();
}

async function makeDatabase(data: DataFolder, seed: Seed | null): Promise<void> {
  const workshop = join(data.folder, 'first-start');
  rmSync(workshop, { recursive: true, force: true });
  mkdirSync(workshop, { mode: 0o700 });
  const unfinished = databaseFile(workshop);

  const db = openDatabase(unfinished);
  try {
    migrateDatabase(db);
    if (seed) writeAccounts(data.accounts, await seed(db));
    db.$client.pragma('wal_checkpoint(TRUNCATE)');
  } finally {
    db.$client.close();
  }
  moveEverything(workshop, data);
}

/** What stands beside the database goes first: once the database is in place the start is done. */
function moveEverything(workshop: string, data: DataFolder): void {
  const database = databaseFile(workshop);
  for (const name of readdirSync(workshop)) {
    const file = join(workshop, name);
    if (!file.startsWith(database)) moveIntoPlace(file, join(data.folder, name));
  }
  for (const end of ['-wal', '-shm']) rmSync(data.database + end, { force: true });
  moveIntoPlace(database, data.database);
  rmSync(workshop, { recursive: true, force: true });
}

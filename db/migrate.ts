import 'server-only';
import { migrate } from 'drizzle-orm/better-sqlite3/migrator';
import { join } from 'node:path';
import type { Db } from './client';

/** Brings a database to the newest schema. Run before anything else opens it. */
export function migrateDatabase(db: Db, root: string = process.cwd()): void {
  migrate(db, { migrationsFolder: join(root, 'drizzle') });
}

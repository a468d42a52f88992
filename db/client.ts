import 'server-only';
import { join } from 'node:path';
import Database from 'better-sqlite3';
import { type BetterSQLite3Database, drizzle } from 'drizzle-orm/better-sqlite3';
import { readEnv } from '@/lib/env';

export type Db = BetterSQLite3Database & { $client: Database.Database };
export type Tx = Parameters<Parameters<Db['transaction']>[0]>[0];
/** What a query runs on: the database, or the transaction it is part of. */
export type Conn = Db | Tx;

export function databaseFile(dataFolder: string): string {
  return join(dataFolder, 'leadline.db');
}

/** Opens one connection with the settings every connection must have. */
export function openDatabase(file: string): Db {
  const client = new Database(file);
  client.pragma('journal_mode = WAL');
  client.pragma('synchronous = FULL');
  client.pragma('foreign_keys = ON');
  client.pragma('busy_timeout = 5000');
  // SQLite itself knows the case of ASCII alone.
  client.function('folded', { deterministic: true }, (text) =>
    typeof text === 'string' ? text.normalize('NFKC').toLowerCase() : null,
  );
  return drizzle(client);
}

const kept = globalThis as typeof globalThis & { leadlineDb?: Db };

/** This process's connection to the desk's database. */
export function getDb(): Db {
  kept.leadlineDb ??= openDatabase(databaseFile(readEnv().LEADLINE_DATA));
  return kept.leadlineDb;
}

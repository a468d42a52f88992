import { existsSync, mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { openDatabase } from '@/db/client';
import { readAccounts } from '@/lib/cli/accounts';
import { type DataFolder, openDataFolder } from '@/lib/cli/data-folder';
import { makeReady, type Seed } from '@/lib/cli/first-start';

let data: DataFolder;
beforeEach(() => {
  data = openDataFolder(mkdtempSync(join(tmpdir(), 'leadline-first-')));
});
afterEach(() => rmSync(data.folder, { recursive: true, force: true }));

const person = {
  name: 'Ada Thorne',
  email: 'ada@courier.example',
  password: 'a long secret',
  roles: ['editor'],
};
const seed: Seed = async (db) => {
  db.$client.exec("CREATE TABLE seeded (word TEXT); INSERT INTO seeded VALUES ('yes')");
  writeFileSync(join(data.folder, 'first-start', 'history-head.json'), '{}');
  return [person];
};

describe('the first start', () => {
  it('migrates, seeds and only then puts the database in its place', async () => {
    const watched = vi.fn(async (...args: Parameters<Seed>) => {
      expect(existsSync(data.database)).toBe(false);
      return seed(...args);
    });
    await makeReady(data, watched);
    const db = openDatabase(data.database);
    expect(db.$client.prepare('SELECT word FROM seeded').pluck().get()).toBe('yes');
    expect(db.$client.pragma('journal_mode', { simple: true })).toBe('wal');
    expect(readAccounts(data.accounts)).toEqual([person]);
    expect(existsSync(join(data.folder, 'history-head.json'))).toBe(true);
    expect(readdirSync(data.folder)).not.toContain('first-start');
    db.$client.close();
  });

  it('leaves no database when the seeding fails, and starts afresh the next time', async () => {
    const broken: Seed = async (db) => {
      db.$client.exec('CREATE TABLE half (word TEXT)');
      throw new Error('the pier is closed');
    };
    await expect(makeReady(data, broken)).rejects.toThrow('the pier is closed');
    expect(existsSync(data.database)).toBe(false);

    await makeReady(data, seed);
    const db = openDatabase(data.database);
    const tables = db.$client
      .prepare("SELECT name FROM sqlite_master WHERE name IN ('half', 'seeded')")
      .pluck();
    expect(tables.all()).toEqual(['seeded']);
    db.$client.close();
  });

  it('makes no accounts for a desk without a demo', async () => {
    await makeReady(data, null);
    expect(existsSync(data.database)).toBe(true);
    expect(existsSync(data.accounts)).toBe(false);
  });
});

describe('a later start', () => {
  it('keeps the data and seeds nothing', async () => {
    await makeReady(data, seed);
    const again = vi.fn(seed);
    await makeReady(data, again);
    const db = openDatabase(data.database);
    expect(again).not.toHaveBeenCalled();
    expect(db.$client.prepare('SELECT word FROM seeded').pluck().get()).toBe('yes');
    db.$client.close();
  });
});

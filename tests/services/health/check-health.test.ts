import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { openDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { appVersion } from '@/lib/env';
import { checkHealth } from '@/lib/services/health/check-health';

const folder = mkdtempSync(join(tmpdir(), 'leadline-health-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('the health of the desk', () => {
  it('is good when the database answers', () => {
    const db = openDatabase(join(folder, 'good.db'));
    migrateDatabase(db);
    expect(checkHealth(() => db)).toEqual({ version: appVersion, database: 'ok' });
    db.$client.close();
  });

  it('is bad when the connection is gone', () => {
    const db = openDatabase(join(folder, 'closed.db'));
    db.$client.close();
    expect(checkHealth(() => db).database).toBe('unreadable');
  });

  it('is bad when the file is no database', () => {
    const file = join(folder, 'broken.db');
    writeFileSync(file, 'tide tables '.repeat(500));
    expect(checkHealth(() => openDatabase(file)).database).toBe('unreadable');
  });

  it('is bad when the database is empty', () => {
    const db = openDatabase(join(folder, 'empty.db'));
    expect(checkHealth(() => db).database).toBe('unreadable');
    db.$client.close();
  });
});

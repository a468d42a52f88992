import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { openDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { appVersion } from '@/lib/env';
import { checkHealth } from '@/lib/services/health/check-health';
import { beat, enterJobProcess } from '@/lib/services/jobs/job-process';
import { NOW } from '@/tests/support/database';

const folder = mkdtempSync(join(tmpdir(), 'leadline-health-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('the health of the desk', () => {
  it('is good when the database answers', () => {
    const db = openDatabase(join(folder, 'good.db'));
    migrateDatabase(db);
    expect(checkHealth(NOW, () => db)).toEqual({ version: appVersion, database: 'ok', jobs: 'silent' });
    db.$client.close();
  });

  it('says whether the process that runs jobs lives, and is good without it', () => {
    const db = openDatabase(join(folder, 'jobs.db'));
    migrateDatabase(db);
    enterJobProcess({ db, now: NOW }, 1, () => false);
    const at = (later: number) => checkHealth(NOW + later, () => db);
    expect(at(15_000)).toEqual({ version: appVersion, database: 'ok', jobs: 'answering' });
    expect(at(15_001)).toEqual({ version: appVersion, database: 'ok', jobs: 'silent' });
    beat({ db, now: NOW + 20_000 }, 1);
    expect(at(21_000).jobs).toBe('answering');
    beat({ db, now: NOW + 90_000 }, 2);
    expect(at(90_000).jobs).toBe('silent');
    db.$client.close();
  });

  it('is bad when the connection is gone', () => {
    const db = openDatabase(join(folder, 'closed.db'));
    db.$client.close();
    expect(checkHealth(NOW, () => db).database).toBe('unreadable');
  });

  it('is bad when the file is no database', () => {
    const file = join(folder, 'broken.db');
    writeFileSync(file, 'tide tables '.repeat(500));
    expect(checkHealth(NOW, () => openDatabase(file)).database).toBe('unreadable');
  });

  it('is bad when the database is empty', () => {
    const db = openDatabase(join(folder, 'empty.db'));
    expect(checkHealth(NOW, () => db).database).toBe('unreadable');
    db.$client.close();
  });
});

import { mkdtempSync, readdirSync, readFileSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { describeAccounts, readAccounts, writeAccounts } from '@/lib/cli/accounts';
import { openDataFolder } from '@/lib/cli/data-folder';

let parent: string;
beforeEach(() => {
  parent = mkdtempSync(join(tmpdir(), 'leadline-data-'));
});
afterEach(() => rmSync(parent, { recursive: true, force: true }));

const modeOf = (path: string) => (statSync(path).mode & 0o777).toString(8);

describe('the data folder', () => {
  it('is made for its owner alone, with a secret only the owner can read', () => {
    const folder = join(parent, 'a', 'b');
    const data = openDataFolder(folder);
    expect(modeOf(folder)).toBe('700');
    expect(modeOf(join(folder, 'secret'))).toBe('600');
    expect(data.secret).toMatch(/^[\w-]{43}$/);
    data.release();
  });

  it('keeps its secret from one start to the next', () => {
    const first = openDataFolder(parent);
    first.release();
    const second = openDataFolder(parent);
    expect(second.secret).toBe(first.secret);
    second.release();
  });

  it('makes another secret for another desk', () => {
    const one = openDataFolder(join(parent, 'one'));
    const two = openDataFolder(join(parent, 'two'));
    expect(one.secret).not.toBe(two.secret);
  });
});

describe('the accounts file', () => {
  const accounts = [
    {
      name: 'Ada Thorne',
      email: 'ada@courier.example',
      password: 'a long enough secret',
      roles: ['reporter'],
    },
    { name: 'Bo Lind', email: 'bo@courier.example', password: 'another secret here', roles: ['editor'] },
  ];

  it('is readable by its owner alone and leaves nothing half written beside it', () => {
    const file = join(parent, 'accounts.json');
    writeAccounts(file, accounts);
    expect(modeOf(file)).toBe('600');
    expect(readdirSync(parent)).toEqual(['accounts.json']);
    expect(JSON.parse(readFileSync(file, 'utf8'))).toEqual(accounts);
  });

  it('is empty for a desk that has no demo', () => {
    expect(readAccounts(join(parent, 'accounts.json'))).toEqual([]);
  });

  it('is printed one person a line, with the password and the roles', () => {
    const [first] = describeAccounts(accounts);
    expect(first).toBe('  ada@courier.example  a long enough secret  Ada Thorne (reporter)');
  });
});

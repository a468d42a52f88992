import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { FolderInUse, lockFolder } from '@/lib/cli/lock';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'leadline-lock-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

const hold = (content: string) => writeFileSync(join(folder, 'lock'), content);

describe('the lock of a data folder', () => {
  it('refuses a second start and says who holds the folder', () => {
    lockFolder(folder);
    expect(() => lockFolder(folder)).toThrow(FolderInUse);
    expect(() => lockFolder(folder)).toThrow(`is already in use by process ${process.pid}`);
  });

  it('is free again after it was released', () => {
    lockFolder(folder)();
    expect(readdirSync(folder)).toEqual([]);
    expect(lockFolder(folder)).toBeTypeOf('function');
  });

  it('is taken over from a process that died', () => {
    hold(JSON.stringify({ pid: 2 ** 30, mark: 'gone' }));
    lockFolder(folder);
    expect(JSON.parse(readFileSync(join(folder, 'lock'), 'utf8'))).toMatchObject({ pid: process.pid });
    expect(readdirSync(folder)).toEqual(['lock']);
  });

  it('is taken over when another process now has the dead one’s number', () => {
    hold(JSON.stringify({ pid: process.ppid, mark: 'an earlier boot' }));
    expect(lockFolder(folder)).toBeTypeOf('function');
  });

  it('is taken over when a power cut left it unreadable', () => {
    hold('');
    expect(lockFolder(folder)).toBeTypeOf('function');
  });

  it('removes only its own lock', () => {
    const release = lockFolder(folder);
    hold('somebody else’s');
    release();
    expect(readFileSync(join(folder, 'lock'), 'utf8')).toBe('somebody else’s');
  });
});

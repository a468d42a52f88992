import {
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  utimesSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { FAKE_BUCKET_ENDPOINT } from '@/lib/fakes/bucket';
import { startFakes, stopFakes } from '@/lib/fakes/start';
import { readEnv } from '@/lib/env';
import { sha256 } from '@/lib/security/ids';
import { bucketStore } from '@/lib/storage/bucket-store';
import { diskStore } from '@/lib/storage/disk-store';
import { type FileStore, pathOf } from '@/lib/storage/file-store';
import { openStore } from '@/lib/storage/open-store';

const folder = mkdtempSync(join(tmpdir(), 'leadline-files-'));
const settings = {
  bucket: 'averil-courier',
  endpoint: FAKE_BUCKET_ENDPOINT,
  region: 'us-east-1',
  key: 'invented-key',
  secret: 'invented-secret',
};
beforeAll(() => void startFakes(folder));
afterAll(() => {
  stopFakes();
  rmSync(folder, { recursive: true, force: true });
});

const hashesOf = async (store: FileStore) => {
  const hashes: string[] = [];
  for await (const { hash } of store.list()) hashes.push(hash);
  return hashes.sort();
};
const text = (words: string) => Buffer.from(words, 'utf8');

describe.each<[string, () => FileStore]>([
  ['a folder', () => diskStore(join(folder, 'files'))],
  ['a bucket', () => bucketStore(settings)],
])('files in %s', (_, open) => {
  const store = open();

  it('lie under the hash of their bytes, and come back as they were', async () => {
    const bytes = Buffer.from([0, 255, 10, 13, 0]);
    const { hash } = await store.put(bytes);
    expect(hash).toBe(sha256(bytes));
    expect(await store.has(hash)).toBe(true);
    expect(await store.get(hash)).toEqual(bytes);
    await store.remove(hash);
    expect(await store.has(hash)).toBe(false);
    expect(await store.get(hash)).toBeNull();
    await store.remove(hash);
  });

  it('are kept once, also where two are stored at the same moment', async () => {
    const puts = await Promise.all([1, 2, 3].map(() => store.put(text('press note'))));
    expect(new Set(puts.map(({ hash }) => hash)).size).toBe(1);
    expect(await hashesOf(store)).toEqual([sha256('press note')]);
    await store.remove(sha256('press note'));
  });

  it('are all listed, however many', async () => {
    const expected = await Promise.all(
      Array.from({ length: 130 }, async (_, at) => (await store.put(text(`page ${at}`))).hash),
    );
    expect(await hashesOf(store)).toEqual(expected.sort());
  }, 60_000);

  it('have no other names than hashes', async () => {
    await expect(store.get('../secret')).rejects.toThrow(
      new RangeError('pathOf requires a SHA-256 in hexadecimal'),
    );
  });
});

describe('a folder', () => {
  it('has two levels, holds nothing unfinished, and is listed without what is not ours', async () => {
    const own = join(folder, 'own');
    const store = diskStore(own);
    expect(await hashesOf(store)).toEqual([]);
    const { hash } = await store.put(text('method note'));
    const file = join(own, pathOf(hash));
    expect(readFileSync(file, 'utf8')).toBe('method note');
    expect(readdirSync(join(file, '..'))).toEqual([hash]);
    expect(statSync(file).mode & 0o777).toBe(0o600);
    mkdirSync(join(own, 'zz'));
    writeFileSync(join(own, 'zz', 'notes.txt'), 'x');
    expect(await hashesOf(store)).toEqual([hash]);
  });

  it('counts a file that is stored again as changed now, so that it is no old orphan', async () => {
    const own = join(folder, 'again');
    const store = diskStore(own);
    const { hash } = await store.put(text('late row'));
    utimesSync(join(own, pathOf(hash)), 1, 1);
    await store.put(text('late row'));
    for await (const { changedAt } of store.list()) expect(changedAt).toBeGreaterThan(1_000_000_000_000);
  });
});

describe('the store of a desk', () => {
  it('is a folder beside the database unless a bucket is set', async () => {
    const env = { LEADLINE_DATA: join(folder, 'desk') };
    const { hash } = await (await openStore(readEnv(env))).put(text('on disk'));
    expect(readFileSync(join(env.LEADLINE_DATA, 'files', pathOf(hash)), 'utf8')).toBe('on disk');
    const bucket = {
      ...env,
      LEADLINE_BUCKET: settings.bucket,
      LEADLINE_BUCKET_ENDPOINT: settings.endpoint,
      LEADLINE_BUCKET_KEY: settings.key,
      LEADLINE_BUCKET_SECRET: settings.secret,
    };
    const { hash: there } = await (await openStore(readEnv(bucket))).put(text('in a bucket'));
    expect(await bucketStore(settings).has(there)).toBe(true);
    expect(await diskStore(join(env.LEADLINE_DATA, 'files')).has(there)).toBe(false);
  });
});

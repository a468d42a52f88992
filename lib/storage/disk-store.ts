import { existsSync } from 'node:fs';
import { link, mkdir, open, readdir, readFile, rm, stat, utimes } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { newId, sha256 } from '@/lib/security/ids';
import { type FileStore, isHash, pathOf } from './file-store';

/** Files in a folder. Each is whole and on disk under its name before `put` resolves, whatever happens meanwhile. */
export function diskStore(folder: string): FileStore {
  const fileOf = (hash: string) => join(folder, pathOf(hash));
  return {
    async put(bytes) {
      const hash = sha256(Buffer.from(bytes));
      const file = fileOf(hash);
      const parent = dirname(file);
      await mkdir(parent, { recursive: true, mode: 0o700 });
      const unfinished = join(parent, `.${newId()}.new`);
      try {
        await writeThrough(unfinished, bytes);
        await linkOrRefresh(unfinished, file);
      } finally {
        await rm(unfinished, { force: true });
      }
      for (const level of [parent, dirname(parent), folder]) await syncFolder(level);
      return { hash };
    },
    get: async (hash) => readFile(fileOf(hash)).catch(absentIsNull),
    has: async (hash) => (await stat(fileOf(hash)).catch(absentIsNull)) !== null,
    list: () => walk(folder),
    remove: async (hash) => rm(fileOf(hash), { force: true }),
  };
}

async function writeThrough(file: string, bytes: Uint8Array): Promise<void> {
  const handle = await open(file, 'wx', 0o600);
  try {
    await handle.writeFile(bytes);
    await handle.sync();
  } finally {
    await handle.close();
  }
}

/** Never replaces a file: what is there under the hash has the same bytes, and counts as young again. */
async function linkOrRefresh(unfinished: string, file: string): Promise<void> {
  const now = new Date();
  await link(unfinished, file).catch(async (error: NodeJS.ErrnoException) => {
    if (error.code !== 'EEXIST') throw error;
    await utimes(file, now, now);
  });
}

async function syncFolder(folder: string): Promise<void> {
  const handle = await open(folder, 'r');
  try {
    await handle.sync();
  } finally {
    await handle.close();
  }
}

async function* walk(folder: string) {
  if (!existsSync(folder)) return;
  for (const entry of await readdir(folder, { recursive: true, withFileTypes: true })) {
    if (!entry.isFile() || !isHash(entry.name)) continue;
    const { mtimeMs } = await stat(join(entry.parentPath, entry.name));
    yield { hash: entry.name, changedAt: Math.floor(mtimeMs) };
  }
}

function absentIsNull(error: NodeJS.ErrnoException): null {
  if (error.code === 'ENOENT') return null;
  throw error;
}

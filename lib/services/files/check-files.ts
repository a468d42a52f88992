import 'server-only';
import type { Db } from '@/db/client';
import { findFile, listFiles } from '@/db/queries/files';
import { sha256 } from '@/lib/security/ids';
import type { FileStore } from '@/lib/storage/file-store';

const DAY_MS = 24 * 60 * 60_000;

export type FilesChecked = {
  checked: number;
  /** Rows without bytes. */
  missing: string[];
  /** Bytes that are not those of their name. */
  damaged: string[];
  /** Bytes without a row. */
  orphans: string[];
  removed: string[];
};

/**
 * Holds the rows and the stored bytes against each other, reading every byte.
 * @param removeOrphans removes bytes without a row that are older than a day: younger ones may be on their way to one
 */
export async function checkFiles(
  db: Db,
  store: FileStore,
  { now, removeOrphans = false }: { now: number; removeOrphans?: boolean },
): Promise<FilesChecked> {
  const found: FilesChecked = { checked: 0, missing: [], damaged: [], orphans: [], removed: [] };
  const onStore = new Map<string, number>();
  for await (const { hash, changedAt } of store.list()) onStore.set(hash, changedAt);
  // Read after the listing: a row that is written meanwhile has its bytes there already.
  const named = new Set(listFiles(db).map(({ hash }) => hash));
  for (const hash of named) {
    const bytes = await store.get(hash);
    found.checked += 1;
    if (!bytes) found.missing.push(hash);
    else if (sha256(bytes) !== hash) found.damaged.push(hash);
  }
  for (const [hash, changedAt] of onStore) {
    if (named.has(hash)) continue;
    found.orphans.push(hash);
    if (!removeOrphans || now - changedAt < DAY_MS || findFile(db, hash)) continue;
    await store.remove(hash);
    found.removed.push(hash);
  }
  return found;
}

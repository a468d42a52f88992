import 'server-only';
import type { Tx } from '@/db/client';
import { type FileRow, findFile, insertFile } from '@/db/queries/files';
import { type Actor, canLogReleases } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { sha256 } from '@/lib/security/ids';
import type { FileStore } from '@/lib/storage/file-store';
import { type FileType, sniffType } from '@/lib/storage/sniff-type';
import { actingNow, authorize, type Ctx, transact } from '../context';
import { appendRecord } from '../history/append-record';

export const MAX_FILE_BYTES = 20 * 1024 * 1024;

export type StoredBytes = { hash: string; size: number; type: FileType };

/** Keeps a file: its bytes first, the row that names them after, so that no row ever lacks its bytes. */
export async function storeFile(
  actor: Actor,
  bytes: Uint8Array,
  ctx: Ctx,
  store: FileStore,
): Promise<{ hash: string }> {
  const stored = await putBytes(actor, bytes, store);
  transact(ctx, (tx) => storeFileIn(tx, actor, stored, ctx.now));
  return { hash: stored.hash };
}

/** The first half, outside any transaction. @throws AppError `forbidden`, `too-large`, `invalid` */
export async function putBytes(actor: Actor, bytes: Uint8Array, store: FileStore): Promise<StoredBytes> {
  authorize(canLogReleases(actor), 'Only reporters and editors store files.');
  if (bytes.byteLength > MAX_FILE_BYTES) throw new AppError('too-large', 'A file may have at most 20 MB.');
  const type = sniffType(bytes);
  if (!type)
    throw new AppError(
      'invalid',
      'Files are kept as PDF, picture (PNG, JPEG, WebP), spreadsheet or plain text.',
    );
  const { hash } = await store.put(bytes);
  return { hash, size: bytes.byteLength, type };
}

/** The second half, inside the change that uses the file. The same bytes are kept once. */
export function storeFileIn(tx: Tx, asker: Actor, { hash, size, type }: StoredBytes, now: number): FileRow {
  const actor = actingNow(tx, asker);
  authorize(canLogReleases(actor), 'Only reporters and editors store files.');
  const before = findFile(tx, hash);
  if (before) return before;
  const row = insertFile(tx, { hash, size, type, createdBy: actor.personId, createdAt: now });
  const entry = { action: 'stored file', entity: 'file', entityId: hash, after: { size, type } };
  appendRecord(tx, { personId: actor.personId, ...entry }, now);
  return row;
}

/** The bytes of a file that a row names. @throws Error where they are gone or damaged */
export async function readStoredFile(row: Pick<FileRow, 'hash'>, store: FileStore): Promise<Buffer> {
  const bytes = await store.get(row.hash);
  if (!bytes) throw new Error(`the bytes of file ${row.hash} are gone`);
  if (sha256(bytes) !== row.hash) throw new Error(`the bytes of file ${row.hash} were changed`);
  return bytes;
}

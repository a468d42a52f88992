import 'server-only';
import { closeSync, fsyncSync, openSync, readFileSync, renameSync, writeSync } from 'node:fs';
import { dirname, join } from 'node:path';
import type { Db } from '@/db/client';
import { findLastRecord, findRecord } from '@/db/queries/record';

export type Head = { seq: number; hash: string };

/** The head's file beside the database, or null for a database in memory. */
export function headFile(db: Db): string | null {
  return db.$client.memory ? null : join(dirname(db.$client.name), 'history-head.json');
}

/**
 * Writes the head of the history to its file, whole or not at all. A head that the history no longer holds stays: it
 * is the witness that something was cut.
 */
export function keepHead(db: Db): void {
  const file = headFile(db);
  const last = file && findLastRecord(db);
  if (!file || !last) return;
  const kept = readHead(file);
  if (kept?.seq === last.seq) return;
  if (kept && findRecord(db, kept.seq)?.hash !== kept.hash) return;
  const draft = `${file}.${process.pid}.new`;
  const handle = openSync(draft, 'w', 0o600);
  writeSync(handle, `${JSON.stringify({ seq: last.seq, hash: last.hash })}\n`);
  fsyncSync(handle);
  closeSync(handle);
  renameSync(draft, file);
}

export function readHead(file: string): Head | null {
  try {
    const { seq, hash } = JSON.parse(readFileSync(file, 'utf8')) as Head;
    return Number.isInteger(seq) && typeof hash === 'string' ? { seq, hash } : null;
  } catch {
    return null;
  }
}

import 'server-only';
import type { Tx } from '@/db/client';
import { findLastRecord, insertRecord, type RecordRow } from '@/db/queries/record';
import { canonicalJson, hashOf } from '@/lib/security/canonical';
import { sha256 } from '@/lib/security/ids';

export const FIRST_HASH = '0'.repeat(64);

export type Entry = {
  personId: number | null;
  action: string;
  entity: string;
  entityId: string;
  before?: unknown;
  after?: unknown;
  reason?: string;
  releaseId?: number;
};

/** Appends one entry to the history, chained to the one before it, inside the change that it tells of. */
export function appendRecord(tx: Tx, entry: Entry, now: number): void {
  const last = findLastRecord(tx);
  const body = {
    seq: (last?.seq ?? 0) + 1,
    at: now,
    personId: entry.personId,
    action: entry.action,
    entity: entry.entity,
    entityId: entry.entityId,
    before: entry.before === undefined ? null : canonicalJson(entry.before),
    after: entry.after === undefined ? null : canonicalJson(entry.after),
    reason: entry.reason ?? null,
    releaseId: entry.releaseId ?? null,
    rowHash: hashOf(entry.after ?? null),
    previousHash: last?.hash ?? FIRST_HASH,
  };
  insertRecord(tx, { ...body, hash: recordHash(body) });
}

/** h_i = SHA-256(h_{i−1} and the entry as canonical JSON). */
export function recordHash(body: Omit<RecordRow, 'hash'>): string {
  return sha256(canonicalJson(body));
}

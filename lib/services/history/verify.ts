import 'server-only';
import type { Db } from '@/db/client';
import { listAllRecords } from '@/db/queries/record';
import { sha256 } from '@/lib/security/ids';
import { FIRST_HASH, recordHash } from './append-record';
import type { Head } from './head';

export type Verified = { ok: true; head: Head | null } | { ok: false; problem: string };

/** Walks the whole history: no gap, no changed byte, and every head that was kept elsewhere is in it. */
export function verifyHistory(db: Db, heads: { name: string; head: Head }[]): Verified {
  const rows = listAllRecords(db);
  let previous = FIRST_HASH;
  for (const [index, row] of rows.entries()) {
    const { hash, ...body } = row;
    if (row.seq !== index + 1) return { ok: false, problem: `entry ${index + 1} is missing` };
    if (row.previousHash !== previous || recordHash(body) !== hash)
      return { ok: false, problem: `entry ${row.seq} was changed` };
    if (row.rowHash !== sha256(row.after ?? 'null'))
      return { ok: false, problem: `entry ${row.seq} no longer fits the row that it tells of` };
    previous = hash;
  }
  for (const { name, head } of heads) {
    const row = rows[head.seq - 1];
    if (!row)
      return {
        ok: false,
        problem: `the history ends at ${rows.length}, but ${name} knows entry ${head.seq}`,
      };
    if (row.hash !== head.hash)
      return { ok: false, problem: `entry ${head.seq} is not the one that ${name} knows` };
  }
  const last = rows.at(-1);
  return { ok: true, head: last ? { seq: last.seq, hash: last.hash } : null };
}

import 'server-only';
import type { Db, Tx } from './client';

/**
 * The one way to write: a synchronous transaction that takes the write lock at once, so that what it reads
 * first cannot change before it writes.
 */
export function write<T>(db: Db, fn: (tx: Tx) => T): T {
  return db.transaction(fn, { behavior: 'immediate' });
}

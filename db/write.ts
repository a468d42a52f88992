import 'server-only';
import type { Db, Tx } from './client';

/**
 * The one way to write: a synchronous transaction that takes the write lock at once, so that what it reads
 * first cannot change before it writes.
 */
export function write<T>(db: Db, fn: (tx: Tx) => T): T {
  return db.transaction(fn, { behavior: 'immediate' });
}

class Undone extends Error {
  constructor(readonly value: unknown) {
    super('undone on purpose');
  }
}

/** Runs a write for what it would do, and leaves no trace of it. */
export function rehearse<T>(db: Db, fn: (tx: Tx) => T): T {
  try {
    return write(db, (tx) => {
      throw new Undone(fn(tx));
    });
  } catch (error) {
    if (error instanceof Undone) return error.value as T;
    throw error;
  }
}

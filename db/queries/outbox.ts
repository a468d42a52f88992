import 'server-only';
import { asc, isNull } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { outbox } from '@/db/schema/records';

export type OutboxRow = typeof outbox.$inferSelect;

export function insertOutbox(conn: Conn, row: typeof outbox.$inferInsert): void {
  conn.insert(outbox).values(row).run();
}

/** What was not sent yet, oldest first. */
export function listUnsent(conn: Conn, limit: number): OutboxRow[] {
  return conn
    .select()
    .from(outbox)
    .where(isNull(outbox.sentAt))
    .orderBy(asc(outbox.createdAt), asc(outbox.id))
    .limit(limit)
    .all();
}

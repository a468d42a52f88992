import 'server-only';
import { and, eq } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { releaseDrafts } from '@/db/schema/releases';

const mine = (personId: number, key: string) =>
  and(eq(releaseDrafts.personId, personId), eq(releaseDrafts.key, key));

export function findReleaseDraft(conn: Conn, personId: number, key: string) {
  return conn.select().from(releaseDrafts).where(mine(personId, key)).get() ?? null;
}

export function upsertReleaseDraft(conn: Conn, row: typeof releaseDrafts.$inferInsert): void {
  conn
    .insert(releaseDrafts)
    .values(row)
    .onConflictDoUpdate({
      target: [releaseDrafts.personId, releaseDrafts.key],
      set: { body: row.body, updatedAt: row.updatedAt },
    })
    .run();
}

export function deleteReleaseDraft(conn: Conn, personId: number, key: string): void {
  conn.delete(releaseDrafts).where(mine(personId, key)).run();
}

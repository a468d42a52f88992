import 'server-only';
import { asc, eq } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { files } from '@/db/schema/files';

export type FileRow = typeof files.$inferSelect;

export function findFile(conn: Conn, hash: string): FileRow | null {
  return conn.select().from(files).where(eq(files.hash, hash)).get() ?? null;
}

export function insertFile(conn: Conn, row: typeof files.$inferInsert): FileRow {
  return conn.insert(files).values(row).returning().get();
}

export function listFiles(conn: Conn): FileRow[] {
  return conn.select().from(files).orderBy(asc(files.id)).all();
}

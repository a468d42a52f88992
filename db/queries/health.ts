import 'server-only';
import { sql } from 'drizzle-orm';
import type { Conn } from '../client';

/** Reads from the file itself; throws when it cannot be read. */
export function readSchemaVersion(conn: Conn): number {
  return conn.get<{ schema_version: number }>(sql`PRAGMA schema_version`).schema_version;
}

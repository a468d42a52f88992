import 'server-only';
import { desc, eq } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { houseStyles, policies } from '@/db/schema/sheets';

export function findLatestPolicy(conn: Conn) {
  return conn.select().from(policies).orderBy(desc(policies.id)).limit(1).get() ?? null;
}

export function insertPolicy(conn: Conn, body: string, createdAt: number): number {
  return conn.insert(policies).values({ body, createdAt }).returning({ id: policies.id }).get().id;
}

export function findLatestHouseStyle(conn: Conn) {
  return conn.select().from(houseStyles).orderBy(desc(houseStyles.id)).limit(1).get() ?? null;
}

export function findHouseStyle(conn: Conn, id: number) {
  return conn.select().from(houseStyles).where(eq(houseStyles.id, id)).get() ?? null;
}

export function insertHouseStyle(conn: Conn, body: string, createdAt: number): number {
  return conn.insert(houseStyles).values({ body, createdAt }).returning({ id: houseStyles.id }).get().id;
}

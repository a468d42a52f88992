import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { onCallShifts } from '@/db/schema/clearing-calendar';
import { people } from '@/db/schema/people';

export type ShiftRow = typeof onCallShifts.$inferSelect;

export function insertShift(conn: Conn, row: typeof onCallShifts.$inferInsert): ShiftRow {
  return conn.insert(onCallShifts).values(row).returning().get();
}

export function findShift(conn: Conn, publicId: string): ShiftRow | null {
  return conn.select().from(onCallShifts).where(eq(onCallShifts.publicId, publicId)).get() ?? null;
}

/** Shifts that were not taken off, with whose they are. */
export function listShifts(conn: Conn) {
  return conn
    .select({
      shift: onCallShifts,
      personId: people.id,
      publicId: people.publicId,
      name: people.name,
      disabledAt: people.disabledAt,
    })
    .from(onCallShifts)
    .innerJoin(people, eq(people.id, onCallShifts.personId))
    .where(isNull(onCallShifts.removedAt))
    .orderBy(asc(onCallShifts.onDay), asc(onCallShifts.weekday), asc(onCallShifts.fromTime))
    .all();
}

/** False where somebody took it off before. */
export function removeShift(conn: Conn, id: number, removedBy: number, removedAt: number): boolean {
  const result = conn
    .update(onCallShifts)
    .set({ removedBy, removedAt })
    .where(and(eq(onCallShifts.id, id), isNull(onCallShifts.removedAt)))
    .run();
  return result.changes === 1;
}

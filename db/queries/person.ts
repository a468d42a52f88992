import 'server-only';
import { and, eq, gt, isNull, lt, sql } from 'drizzle-orm';
import type { Conn } from '@/db/client';
import { firstAdministratorCodes, people, personRoles, sessions, signInFailures } from '@/db/schema/people';
import type { Role } from '@/lib/domain/roles';

export type PersonRow = typeof people.$inferSelect;
export type PersonWithRoles = PersonRow & { roles: Role[] };

export function findPersonByEmail(conn: Conn, email: string): PersonWithRoles | null {
  return withRoles(conn, conn.select().from(people).where(eq(people.email, email)).get());
}

export function findPersonByPublicId(conn: Conn, publicId: string): PersonWithRoles | null {
  return withRoles(conn, conn.select().from(people).where(eq(people.publicId, publicId)).get());
}

export function findPerson(conn: Conn, id: number): PersonWithRoles | null {
  return withRoles(conn, conn.select().from(people).where(eq(people.id, id)).get());
}

export function findPersonByCodeHash(conn: Conn, codeHash: string): PersonWithRoles | null {
  return withRoles(conn, conn.select().from(people).where(eq(people.codeHash, codeHash)).get());
}

function withRoles(conn: Conn, person: PersonRow | undefined): PersonWithRoles | null {
  return person ? { ...person, roles: listRoles(conn, person.id) } : null;
}

export function listRoles(conn: Conn, personId: number): Role[] {
  return conn
    .select({ role: personRoles.role })
    .from(personRoles)
    .where(eq(personRoles.personId, personId))
    .orderBy(personRoles.role)
    .all()
    .map((row) => row.role);
}

export function listPeople(conn: Conn): PersonWithRoles[] {
  const rows = conn
    .select()
    .from(people)
    .orderBy(sql`${people.name} collate nocase`)
    .all();
  return rows.map((row) => ({ ...row, roles: listRoles(conn, row.id) }));
}

export function countActiveAdministrators(conn: Conn): number {
  const row = conn
    .select({ count: sql<number>`count(*)` })
    .from(people)
    .innerJoin(personRoles, eq(personRoles.personId, people.id))
    .where(and(eq(personRoles.role, 'administrator'), isNull(people.disabledAt)))
    .get();
  return row?.count ?? 0;
}

export function countPeople(conn: Conn): number {
  return (
    conn
      .select({ count: sql<number>`count(*)` })
      .from(people)
      .get()?.count ?? 0
  );
}

export function insertPerson(conn: Conn, row: typeof people.$inferInsert): number {
  return conn.insert(people).values(row).returning({ id: people.id }).get().id;
}

/** Updates a person whose version is the one the asker saw; false when it moved on. */
export function updatePerson(
  conn: Conn,
  id: number,
  version: number,
  set: Partial<typeof people.$inferInsert>,
): boolean {
  const result = conn
    .update(people)
    .set({ ...set, version: version + 1 })
    .where(and(eq(people.id, id), eq(people.version, version)))
    .run();
  return result.changes === 1;
}

export function replaceRoles(conn: Conn, personId: number, roles: readonly Role[]): void {
  conn.delete(personRoles).where(eq(personRoles.personId, personId)).run();
  for (const role of roles) conn.insert(personRoles).values({ personId, role }).run();
}

export function insertSession(conn: Conn, row: typeof sessions.$inferInsert): void {
  conn.insert(sessions).values(row).run();
}

export function findSession(conn: Conn, tokenHash: string, now: number) {
  return (
    conn
      .select({ session: sessions, person: people })
      .from(sessions)
      .innerJoin(people, eq(people.id, sessions.personId))
      .where(and(eq(sessions.tokenHash, tokenHash), gt(sessions.expiresAt, now)))
      .get() ?? null
  );
}

export function deleteSession(conn: Conn, tokenHash: string): number {
  return conn.delete(sessions).where(eq(sessions.tokenHash, tokenHash)).run().changes;
}

export function deleteSessionsOf(conn: Conn, personId: number): number {
  return conn.delete(sessions).where(eq(sessions.personId, personId)).run().changes;
}

export function deleteExpiredSessions(conn: Conn, now: number): void {
  conn.delete(sessions).where(lt(sessions.expiresAt, now)).run();
}

export function countFailures(conn: Conn, bucket: string, since: number): number {
  return (
    conn
      .select({ count: sql<number>`count(*)` })
      .from(signInFailures)
      .where(and(eq(signInFailures.bucket, bucket), gt(signInFailures.at, since)))
      .get()?.count ?? 0
  );
}

export function insertFailure(conn: Conn, bucket: string, at: number): number {
  return conn.insert(signInFailures).values({ bucket, at }).returning({ id: signInFailures.id }).get().id;
}

export function deleteFailure(conn: Conn, id: number): void {
  conn.delete(signInFailures).where(eq(signInFailures.id, id)).run();
}

export function deleteFailures(conn: Conn, bucket: string): void {
  conn.delete(signInFailures).where(eq(signInFailures.bucket, bucket)).run();
}

export function deleteFailuresBefore(conn: Conn, before: number): void {
  conn.delete(signInFailures).where(lt(signInFailures.at, before)).run();
}

export function insertFirstCode(conn: Conn, codeHash: string): void {
  conn.delete(firstAdministratorCodes).run();
  conn.insert(firstAdministratorCodes).values({ codeHash }).run();
}

export function useFirstCode(conn: Conn, codeHash: string, now: number): boolean {
  const result = conn
    .update(firstAdministratorCodes)
    .set({ usedAt: now })
    .where(and(eq(firstAdministratorCodes.codeHash, codeHash), isNull(firstAdministratorCodes.usedAt)))
    .run();
  return result.changes === 1;
}

import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type Db, databaseFile, openDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { findSession, insertPerson, insertSession, replaceRoles } from '@/db/queries/person';
import { write } from '@/db/write';
import type { Actor, Role } from '@/lib/domain/roles';
import { newId, newSecret, sha256 } from '@/lib/security/ids';
import { hashPassword } from '@/lib/security/password';
import { ensureDeskSettings } from '@/lib/services/setup/desk-settings';

/** An invented Thursday morning; tests add to it. */
export const NOW = Date.UTC(2026, 8, 17, 8, 0);
export const HOUR = 60 * 60_000;

export type TestDatabase = {
  db: Db;
  /** The data folder: the database, and the head of its history beside it. */
  folder: string;
  /** What a service is called with, `later` milliseconds after NOW. */
  ctx: (later?: number) => { db: Db; now: number };
  closeAndRemove: () => void;
};

/** A fresh, migrated database in a folder of its own. One per test file, or one per test. */
export function freshDatabase(): TestDatabase {
  const folder = mkdtempSync(join(tmpdir(), 'leadline-test-'));
  const db = openDatabase(databaseFile(folder));
  migrateDatabase(db);
  ensureDeskSettings({ db, now: NOW });
  return {
    db,
    folder,
    ctx: (later = 0) => ({ db, now: NOW + later }),
    closeAndRemove: () => {
      db.$client.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

type NewPerson = { name: string; roles: readonly Role[]; email?: string };

/** A person with an open session. `token` is the session's, as a signed-in browser would carry it. */
export function makePerson(db: Db, { name, roles, email = emailOf(name) }: NewPerson) {
  return addPerson(db, { name, roles, email }, null);
}

/** The same with a password, for tests of signing in; slower, since the password is really hashed. */
export async function makePersonWithPassword(db: Db, person: NewPerson & { password: string }) {
  const { name, roles, email = emailOf(name), password } = person;
  return addPerson(db, { name, roles, email }, await hashPassword(password));
}

export function emailOf(name: string): string {
  return `${name.toLowerCase().replace(/[^a-z]+/g, '.')}@courier.example`;
}

function addPerson(db: Db, person: Required<NewPerson>, passwordHash: string | null) {
  const publicId = newId();
  const token = newSecret();
  const { name, roles, email } = person;
  return write(db, (tx): Actor & { token: string; email: string } => {
    const personId = insertPerson(tx, { publicId, name, email, passwordHash, createdAt: NOW });
    replaceRoles(tx, personId, roles);
    const sessionId = insertSessionOf(tx, personId, token);
    return { personId, publicId, name, roles, sessionId, token, email };
  });
}

function insertSessionOf(tx: Parameters<typeof insertSession>[0], personId: number, token: string): number {
  const tokenHash = sha256(token);
  insertSession(tx, { tokenHash, personId, createdAt: NOW, expiresAt: NOW + 365 * 24 * HOUR });
  const found = findSession(tx, tokenHash, NOW);
  if (!found) throw new Error('the session of a test person was not stored');
  return found.session.id;
}

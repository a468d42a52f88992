import 'server-only';
import {
  countFailures,
  deleteExpiredSessions,
  deleteFailure,
  deleteFailures,
  deleteFailuresBefore,
  findPersonByEmail,
  insertFailure,
  insertSession,
} from '@/db/queries/person';
import { newSecret, sha256 } from '@/lib/security/ids';
import { passwordMatches } from '@/lib/security/password';
import { type Ctx, transact } from '../context';
import { appendRecord } from '../history/append-record';

const MINUTE = 60_000;
export const SESSION_LIFETIME = 12 * 60 * MINUTE;
const WINDOW = 15 * MINUTE;
const MAX_PER_ACCOUNT = 5;
const MAX_PER_ADDRESS = 20;

export type SignInInput = { email: string; password: string; address: string };
export type SignInResult = { ok: true; token: string; name: string } | { ok: false; throttled: boolean };

/**
 * Checks a password and opens a session. The answer is the same for a wrong password, an unknown account and a
 * disabled one; failures are counted per account name (existing or not) and per address.
 */
export async function signIn(input: SignInInput, ctx: Ctx): Promise<SignInResult> {
  const email = normalizeEmail(input.email);
  const accountBucket = `account:${sha256(email)}`;
  const addressBucket = `address:${sha256(input.address)}`;
  // Counted before the hash is checked, so that many at once cannot all slip under the limit.
  const counted = transact(ctx, (tx) => {
    const since = ctx.now - WINDOW;
    deleteFailuresBefore(tx, since);
    deleteExpiredSessions(tx, ctx.now);
    if (countFailures(tx, accountBucket, since) >= MAX_PER_ACCOUNT) return null;
    if (countFailures(tx, addressBucket, since) >= MAX_PER_ADDRESS) return null;
    insertFailure(tx, accountBucket, ctx.now);
    return { id: insertFailure(tx, addressBucket, ctx.now) };
  });
  if (!counted) return { ok: false, throttled: true };

  const person = findPersonByEmail(ctx.db, email);
  const matches = await passwordMatches(person?.passwordHash ?? null, input.password);
  const token = newSecret();
  const opened = transact(ctx, (tx) => {
    const now = findPersonByEmail(tx, email);
    const good =
      matches && now !== null && now.disabledAt === null && now.passwordHash === person?.passwordHash;
    if (!good) {
      appendRecord(
        tx,
        { personId: null, action: 'sign-in failed', entity: 'account', entityId: sha256(email).slice(0, 16) },
        ctx.now,
      );
      return null;
    }
    deleteFailures(tx, accountBucket);
    deleteFailure(tx, counted.id);
    insertSession(tx, {
      tokenHash: sha256(token),
      personId: now.id,
      createdAt: ctx.now,
      expiresAt: ctx.now + SESSION_LIFETIME,
    });
    appendRecord(
      tx,
      { personId: now.id, action: 'signed in', entity: 'person', entityId: now.publicId },
      ctx.now,
    );
    return { name: now.name };
  });
  return opened ? { ok: true, token, name: opened.name } : { ok: false, throttled: false };
}

export function normalizeEmail(email: string): string {
  return email.normalize('NFC').trim().toLowerCase();
}

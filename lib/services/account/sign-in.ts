import 'server-only';
import {
  countFailures,
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
  const buckets = [
    { key: `account:${sha256(email)}`, max: MAX_PER_ACCOUNT },
    { key: `address:${sha256(input.address)}`, max: MAX_PER_ADDRESS },
  ];
  // Counted before the hash is checked, so that many at once cannot all slip under the limit.
  const throttled = transact(ctx, (tx) => {
    if (buckets.some(({ key, max }) => countFailures(tx, key, ctx.now - WINDOW) >= max)) return true;
    for (const { key } of buckets) insertFailure(tx, key, ctx.now);
    deleteFailuresBefore(tx, ctx.now - WINDOW);
    return false;
  });
  if (throttled) return { ok: false, throttled: true };

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
    deleteFailures(tx, buckets[0]!.key);
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

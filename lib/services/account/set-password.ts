import 'server-only';
import { z } from 'zod';
import {
  countFailures,
  deleteFailures,
  deleteSessionsOf,
  findPerson,
  findPersonByCodeHash,
  insertFailure,
  updatePerson,
} from '@/db/queries/person';
import type { Actor } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { normalizeCode, sha256 } from '@/lib/security/ids';
import { hashPassword, passwordMatches } from '@/lib/security/password';
import { passwordProblem } from '@/lib/security/password-rules';
import { type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';

const WINDOW = 15 * 60_000;
const MAX_TRIES = 10;

const change = z.strictObject({
  current: z.string().min(1, 'Type the password you have now.').max(256),
  next: z.string().max(1024),
});

/** Changes one's own password. Every session of the person ends, this one too. */
export async function changePassword(actor: Actor, input: unknown, ctx: Ctx): Promise<void> {
  const { current, next } = parse(change, input);
  refuseWeak(next, [actor.name]);
  const bucket = `password:${actor.personId}`;
  limitTries(bucket, ctx);
  const person = findPerson(ctx.db, actor.personId);
  const stored = person?.passwordHash ?? null;
  if (!person || !(await passwordMatches(stored, current)))
    throw new AppError('invalid', 'The password was not changed.', {
      fields: { current: 'This is not your current password.' },
    });
  const passwordHash = await hashPassword(next);
  transact(ctx, (tx) => {
    const now = findPerson(tx, actor.personId);
    if (
      !now ||
      now.disabledAt !== null ||
      now.passwordHash !== stored ||
      !updatePerson(tx, now.id, now.version, { passwordHash })
    )
      throw new AppError('conflict', 'Your account changed meanwhile. Sign in again.');
    deleteSessionsOf(tx, now.id);
    deleteFailures(tx, bucket);
    const { publicId } = now;
    appendRecord(
      tx,
      { personId: now.id, action: 'changed password', entity: 'person', entityId: publicId },
      ctx.now,
    );
  });
}

const redeem = z.strictObject({
  code: z.string().min(1, 'Type the sign-in code.').max(100),
  password: z.string().max(1024),
  address: z.string().max(200),
});

/** Uses a one-time sign-in code to choose a password. Returns the e-mail to sign in with. */
export async function redeemCode(input: unknown, ctx: Ctx): Promise<{ email: string }> {
  const { code, password, address } = parse(redeem, input);
  refuseWeak(password, []);
  const bucket = `code:${sha256(address)}`;
  limitTries(bucket, ctx);
  const passwordHash = await hashPassword(password);
  return transact(ctx, (tx) => {
    const person = findPersonByCodeHash(tx, sha256(normalizeCode(code)));
    if (!person || person.disabledAt !== null || (person.codeExpiresAt ?? 0) <= ctx.now)
      throw new AppError('invalid', 'No password was set.', {
        fields: { code: 'This code is not valid, or was used already. Ask an administrator for a new one.' },
      });
    refuseWeak(password, [person.name, person.email]);
    const set = { passwordHash, codeHash: null, codeExpiresAt: null };
    if (!updatePerson(tx, person.id, person.version, set)) throw new AppError('conflict', 'Try once more.');
    deleteSessionsOf(tx, person.id);
    deleteFailures(tx, bucket);
    appendRecord(
      tx,
      { personId: person.id, action: 'chose a password', entity: 'person', entityId: person.publicId },
      ctx.now,
    );
    return { email: person.email };
  });
}

function refuseWeak(password: string, personal: string[]): void {
  const problem = passwordProblem(password, personal);
  if (problem)
    throw new AppError('invalid', 'The password was not changed.', {
      fields: { next: problem, password: problem },
    });
}

function limitTries(bucket: string, ctx: Ctx): void {
  const blocked = transact(ctx, (tx) => {
    if (countFailures(tx, bucket, ctx.now - WINDOW) >= MAX_TRIES) return true;
    insertFailure(tx, bucket, ctx.now);
    return false;
  });
  if (blocked) throw new AppError('too-many', 'Too many tries. Wait a quarter of an hour.');
}

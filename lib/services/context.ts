import 'server-only';
import { z } from 'zod';
import type { Db, Tx } from '@/db/client';
import { findPerson } from '@/db/queries/person';
import { write } from '@/db/write';
import type { Actor } from '@/lib/domain/roles';
import { AppError, type FieldErrors } from '@/lib/errors';
import { keepHead } from './history/head';

/** What every service is called with beside who asks and what for. Nobody else reads the clock. */
export type Ctx = { db: Db; now: number };

export function authorize(allowed: boolean, message: string): void {
  if (!allowed) throw new AppError('forbidden', message);
}

/** Parses hostile input; every refusal is a message at its field. */
export function parse<T extends z.ZodType>(schema: T, input: unknown): z.output<T> {
  const result = schema.safeParse(input);
  if (result.success) return result.data;
  const fields: FieldErrors = {};
  for (const issue of result.error.issues) fields[issue.path.join('.')] ??= issue.message;
  throw new AppError('invalid', 'Some fields need another look.', { fields });
}

/**
 * One synchronous transaction, then the head of the history is kept outside the database too. By then the act is on
 * disk and is answered as done, whatever becomes of the head's file; the next act writes it.
 */
export function transact<T>(ctx: Ctx, fn: (tx: Tx) => T): T {
  const value = write(ctx.db, fn);
  try {
    keepHead(ctx.db);
  } catch (error) {
    console.error(
      new Error('the head of the history could not be kept beside the database', { cause: error }),
    );
  }
  return value;
}

/**
 * The same person with the roles held at this moment, read inside the transaction: for acts that count by role.
 * @throws AppError `not-signed-in` where the person was disabled meanwhile
 */
export function actingNow(tx: Tx, actor: Actor): Actor {
  const person = findPerson(tx, actor.personId);
  if (!person || person.disabledAt !== null)
    throw new AppError('not-signed-in', 'Your account was disabled. Nothing was done.');
  return { ...actor, roles: person.roles };
}

export type Verb<Input, Output> = (actor: Actor, input: Input, ctx: Ctx) => Output;

import 'server-only';
import { headers } from 'next/headers';
import type { Actor } from '@/lib/domain/roles';
import { type ActionResult, AppError, toActionFailure } from '@/lib/errors';
import { requestContext } from '@/lib/services/account/request-context';
import { requireActor } from './actor';
import { sameOrigin } from './same-origin';

type Ctx = ReturnType<typeof requestContext>;

/** Runs a server action for whoever is signed in; a refusal comes back as a value, never as a thrown error. */
export async function deskAction<T>(
  run: (actor: Actor, ctx: Ctx) => T | Promise<T>,
): Promise<ActionResult<T>> {
  return guarded(async (ctx) => run(await requireActor(), ctx));
}

/** The same for the doors, where nobody is signed in yet. */
export async function doorAction<T>(
  run: (ctx: Ctx, address: string) => T | Promise<T>,
): Promise<ActionResult<T>> {
  const address = (await headers()).get('x-forwarded-for') ?? '';
  return guarded(async (ctx) => run(ctx, address));
}

async function guarded<T>(run: (ctx: Ctx) => Promise<T>): Promise<ActionResult<T>> {
  try {
    sameOrigin(await headers());
    return { ok: true, value: await run(requestContext()) };
  } catch (error) {
    if (!(error instanceof AppError)) console.error(error);
    return toActionFailure(error);
  }
}

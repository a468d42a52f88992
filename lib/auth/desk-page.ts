import 'server-only';
import { forbidden, notFound, redirect } from 'next/navigation';
import type { Actor } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { requestContext } from '@/lib/services/account/request-context';
import { requireUser } from './actor';

/**
 * Reads what a desk page shows, for whoever is signed in. A refusal becomes the designed page with its real
 * status: the door, 403 or 404. Call it before anything of the page streams.
 */
export async function deskPage<T>(
  read: (actor: Actor, ctx: ReturnType<typeof requestContext>) => T | Promise<T>,
): Promise<T> {
  const actor = await requireUser();
  try {
    return await read(actor, requestContext());
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    if (error.code === 'not-signed-in') redirect('/sign-in');
    if (error.code === 'forbidden') forbidden();
    if (error.code === 'not-found' || error.code === 'invalid') notFound();
    throw error;
  }
}

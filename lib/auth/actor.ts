import 'server-only';
import { cookies, headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { getToken } from 'next-auth/jwt';
import type { Actor } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { readSession } from '@/lib/services/account/read-session';
import { requestContext } from '@/lib/services/account/request-context';

/** Who is asking, read from the database; null when nobody is signed in. */
export async function findActor(): Promise<Actor | null> {
  const jar = await cookies();
  const token = await getToken({
    req: {
      cookies: Object.fromEntries(jar.getAll().map(({ name, value }) => [name, value])),
      headers: Object.fromEntries(await headers()),
    } as unknown as Parameters<typeof getToken>[0]['req'],
  });
  return typeof token?.sid === 'string' ? readSession(token.sid, requestContext()) : null;
}

/** For pages: sends whoever is not signed in to the door. */
export async function requireUser(): Promise<Actor> {
  const actor = await findActor();
  if (!actor) redirect('/sign-in');
  return actor;
}

/** For handlers and actions. @throws AppError `not-signed-in` */
export async function requireActor(): Promise<Actor> {
  const actor = await findActor();
  if (!actor) throw new AppError('not-signed-in', 'Your session has ended. Sign in again; nothing is lost.');
  return actor;
}

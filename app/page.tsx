import { redirect } from 'next/navigation';
import { findActor } from '@/lib/auth/actor';
import { needsFirstAdministrator } from '@/lib/services/account/first-administrator';
import { requestContext } from '@/lib/services/account/request-context';
import { homeOf } from './(desk)/_components/sections';

/** No page of its own: whoever comes is sent to where their work is. */
export default async function Start(): Promise<never> {
  const actor = await findActor();
  if (actor) redirect(homeOf(actor));
  redirect(needsFirstAdministrator(requestContext()) ? '/first' : '/sign-in');
}

'use server';

import { doorAction } from '@/lib/auth/desk-action';
import { createFirstAdministrator } from '@/lib/services/account/first-administrator';

export async function makeFirstAdministrator(input: unknown) {
  return doorAction((ctx) => createFirstAdministrator(input, ctx));
}

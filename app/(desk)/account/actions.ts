'use server';

import { deskAction } from '@/lib/auth/desk-action';
import { changePassword } from '@/lib/services/account/set-password';

export async function changePasswordAction(input: unknown) {
  return deskAction((actor, ctx) => changePassword(actor, input, ctx));
}

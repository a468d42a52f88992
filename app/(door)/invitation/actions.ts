'use server';

import { doorAction } from '@/lib/auth/desk-action';
import { redeemCode } from '@/lib/services/account/set-password';

/** The e-mail stays here: whoever holds a code is not told whose it was. */
export async function redeemInvitation(input: { code: string; password: string }) {
  return doorAction(async (ctx, address) => {
    await redeemCode({ ...input, address: address.slice(0, 200) }, ctx);
  });
}

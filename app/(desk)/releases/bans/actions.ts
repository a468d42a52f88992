'use server';

import { deskAction } from '@/lib/auth/desk-action';
import { endBan, enterBan } from '@/lib/services/bans/bans';

export async function enterBanAction(input: unknown) {
  return deskAction((actor, ctx) => enterBan(actor, input, ctx));
}

export async function endBanAction(input: unknown) {
  return deskAction((actor, ctx) => endBan(actor, input, ctx));
}

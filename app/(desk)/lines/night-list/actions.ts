'use server';

import { deskAction } from '@/lib/auth/desk-action';
import { addShift, removeShift } from '@/lib/services/on-call/on-call';

export async function addShiftAction(input: unknown) {
  return deskAction((actor, ctx) => addShift(actor, input, ctx));
}

export async function removeShiftAction(input: unknown) {
  return deskAction((actor, ctx) => removeShift(actor, input, ctx));
}

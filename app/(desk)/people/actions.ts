'use server';

import { deskAction } from '@/lib/auth/desk-action';
import { addPerson } from '@/lib/services/people/add-person';
import { renewCode, setDisabled, setRoles } from '@/lib/services/people/change-person';

export async function addPersonAction(input: unknown) {
  return deskAction((actor, ctx) => addPerson(actor, input, ctx));
}

export async function setRolesAction(input: unknown) {
  return deskAction((actor, ctx) => setRoles(actor, input, ctx));
}

export async function setDisabledAction(input: unknown) {
  return deskAction((actor, ctx) => setDisabled(actor, input, ctx));
}

export async function renewCodeAction(input: unknown) {
  return deskAction((actor, ctx) => renewCode(actor, input, ctx));
}

'use server';

import { deskAction } from '@/lib/auth/desk-action';
import { proposeStyle } from '@/lib/services/house-style/propose';
import { putStyleInForce, sendStyleBack } from '@/lib/services/house-style/put-in-force';
import { signLanguage, withdrawSignature } from '@/lib/services/house-style/sign-language';
import {
  bringUpToDate,
  startStyleDraft,
  takeUpStyle,
  withdrawStyle,
} from '@/lib/services/house-style/start-draft';

export async function startStyleDraftAction() {
  return deskAction((actor, ctx) => startStyleDraft(actor, ctx));
}

export async function takeUpStyleAction(input: unknown) {
  return deskAction((actor, ctx) => takeUpStyle(actor, input, ctx));
}

export async function bringUpToDateAction(input: unknown) {
  return deskAction((actor, ctx) => bringUpToDate(actor, input, ctx));
}

export async function withdrawStyleAction(input: unknown) {
  return deskAction((actor, ctx) => withdrawStyle(actor, input, ctx));
}

export async function proposeStyleAction(input: unknown) {
  return deskAction((actor, ctx) => proposeStyle(actor, input, ctx));
}

export async function putStyleInForceAction(input: unknown) {
  return deskAction((actor, ctx) => putStyleInForce(actor, input, ctx));
}

export async function sendStyleBackAction(input: unknown) {
  return deskAction((actor, ctx) => sendStyleBack(actor, input, ctx));
}

export async function signLanguageAction(input: unknown) {
  return deskAction((actor, ctx) => signLanguage(actor, input, ctx));
}

export async function withdrawSignatureAction(input: unknown) {
  return deskAction((actor, ctx) => withdrawSignature(actor, input, ctx));
}

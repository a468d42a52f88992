'use server';

import { deskAction } from '@/lib/auth/desk-action';
import { createRelease } from '@/lib/services/release/create-release';
import { liftEmbargo, setEmbargoReader } from '@/lib/services/release/embargo';
import { overrideComparison } from '@/lib/services/release/override-comparison';
import { reviseRelease } from '@/lib/services/release/revise-release';

export async function logReleaseAction(input: unknown) {
  return deskAction((actor, ctx) => createRelease(actor, input, ctx));
}

export async function reviseReleaseAction(input: unknown) {
  return deskAction((actor, ctx) => reviseRelease(actor, input, ctx));
}

export async function liftEmbargoAction(input: unknown) {
  return deskAction((actor, ctx) => liftEmbargo(actor, input, ctx));
}

export async function setEmbargoReaderAction(input: unknown) {
  return deskAction((actor, ctx) => setEmbargoReader(actor, input, ctx));
}

export async function overrideComparisonAction(input: unknown) {
  return deskAction((actor, ctx) => overrideComparison(actor, input, ctx));
}

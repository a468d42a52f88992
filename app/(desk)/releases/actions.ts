'use server';

import { deskAction } from '@/lib/auth/desk-action';
import { correctRelease, previewCorrection } from '@/lib/services/correction/correct-release';
import { draftReplacement } from '@/lib/services/correction/draft-replacement';
import { applyStaged, confirmNotices, withdrawStaged } from '@/lib/services/correction/settle-correction';
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

export async function previewCorrectionAction(input: unknown) {
  return deskAction((actor, ctx) => previewCorrection(actor, input, ctx));
}

export async function correctReleaseAction(input: unknown) {
  return deskAction((actor, ctx) => correctRelease(actor, input, ctx));
}

export async function draftReplacementAction(input: unknown) {
  return deskAction((actor, ctx) => draftReplacement(actor, input, ctx));
}

export async function applyStagedAction(input: unknown) {
  return deskAction((actor, ctx) => applyStaged(actor, input, ctx));
}

export async function withdrawStagedAction(input: unknown) {
  return deskAction((actor, ctx) => withdrawStaged(actor, input, ctx));
}

export async function confirmNoticesAction(input: unknown) {
  return deskAction((actor, ctx) => confirmNotices(actor, input, ctx));
}

'use server';

import { deskAction } from '@/lib/auth/desk-action';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { addLine } from '@/lib/services/sheet/add-line';
import { changeFiledSheet, reviseSheet } from '@/lib/services/sheet/change-filed';
import { clearSheet, sendBack } from '@/lib/services/sheet/clear-sheet';
import { addComment, resolveComment } from '@/lib/services/sheet/comment';
import { createAsPrinted } from '@/lib/services/sheet/create-as-printed';
import { createSheet } from '@/lib/services/sheet/create-sheet';
import { discardSheet } from '@/lib/services/sheet/discard-sheet';
import { fileSheet } from '@/lib/services/sheet/file-sheet';
import { markReviewed } from '@/lib/services/sheet/languages';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { readSecond, releaseAlone } from '@/lib/services/sheet/release-alone';
import { setTerms } from '@/lib/services/sheet/terms';

export async function createSheetAction(input: unknown) {
  return deskAction((actor, ctx) => createSheet(actor, input, ctx));
}

export async function addLineAction(input: unknown) {
  return deskAction((actor, ctx) => addLine(actor, input, ctx));
}

export async function fileSheetAction(input: unknown) {
  return deskAction((actor, ctx) => fileSheet(actor, input, ctx));
}

export async function changeFiledSheetAction(input: unknown) {
  return deskAction((actor, ctx) => changeFiledSheet(actor, input, ctx));
}

export async function clearSheetAction(input: unknown) {
  return deskAction((actor, ctx) => clearSheet(actor, input, ctx));
}

export async function sendBackAction(input: unknown) {
  return deskAction((actor, ctx) => sendBack(actor, input, ctx));
}

export async function pullSheetAction(input: unknown) {
  return deskAction((actor, ctx) => pullSheet(actor, input, ctx));
}

export async function reviseSheetAction(input: unknown) {
  return deskAction((actor, ctx) => reviseSheet(actor, input, ctx));
}

export async function createEmbedAction(input: unknown) {
  return deskAction((actor, ctx) => createEmbed(actor, input, ctx));
}

export async function discardSheetAction(input: unknown) {
  return deskAction((actor, ctx) => discardSheet(actor, input, ctx));
}

export async function addCommentAction(input: unknown) {
  return deskAction((actor, ctx) => addComment(actor, input, ctx));
}

export async function resolveCommentAction(input: unknown) {
  return deskAction((actor, ctx) => resolveComment(actor, input, ctx));
}

export async function setTermsAction(input: unknown) {
  return deskAction((actor, ctx) => setTerms(actor, input, ctx));
}

export async function markReviewedAction(input: unknown) {
  return deskAction((actor, ctx) => markReviewed(actor, input, ctx));
}

export async function createAsPrintedAction(input: unknown) {
  return deskAction((actor, ctx) => createAsPrinted(actor, input, ctx));
}

export async function releaseAloneAction(input: unknown) {
  return deskAction((actor, ctx) => releaseAlone(actor, input, ctx));
}

export async function readSecondAction(input: unknown) {
  return deskAction((actor, ctx) => readSecond(actor, input, ctx));
}

'use server';

import { deskAction } from '@/lib/auth/desk-action';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { changeFiledSheet, reviseSheet } from '@/lib/services/sheet/change-filed';
import { clearSheet, sendBack } from '@/lib/services/sheet/clear-sheet';
import { createSheet } from '@/lib/services/sheet/create-sheet';
import { discardSheet } from '@/lib/services/sheet/discard-sheet';
import { fileSheet } from '@/lib/services/sheet/file-sheet';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';

export async function createSheetAction(input: unknown) {
  return deskAction((actor, ctx) => createSheet(actor, input, ctx));
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

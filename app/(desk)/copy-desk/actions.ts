'use server';

import { deskAction } from '@/lib/auth/desk-action';
import { createEmbed } from '@/lib/services/embed/create-embed';

export async function createEmbedAction(input: unknown) {
  return deskAction((actor, ctx) => createEmbed(actor, input, ctx));
}

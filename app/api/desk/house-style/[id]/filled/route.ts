import { writeRoute } from '@/lib/auth/desk-route';
import { fillSentence } from '@/lib/services/house-style/fill-sentence';

/** A sentence as three releases would print it. */
export const POST = writeRoute((actor, body, ctx, { id }) =>
  fillSentence(actor, { ...(body as object), id }, ctx),
);

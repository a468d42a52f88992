import { writeRoute } from '@/lib/auth/desk-route';
import { saveStyleDraft } from '@/lib/services/house-style/save-draft';

/** What an editor decides while typing; refused decisions are kept beside the draft. */
export const PUT = writeRoute((actor, body, ctx, { id }) =>
  saveStyleDraft(actor, { ...(body as object), id }, ctx),
);

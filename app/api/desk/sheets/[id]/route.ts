import { writeRoute } from '@/lib/auth/desk-route';
import { saveLines } from '@/lib/services/sheet/edit-lines';

export const PUT = writeRoute((actor, body, ctx, { id }) =>
  saveLines(actor, { ...(body instanceof Object ? body : { body }), id }, ctx),
);

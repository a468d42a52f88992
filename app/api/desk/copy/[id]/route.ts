import { writeRoute } from '@/lib/auth/desk-route';
import { copyLines } from '@/lib/services/copy/copy-lines';

export const POST = writeRoute((actor, body, ctx, { id }) =>
  copyLines(actor, { ...(body instanceof Object ? body : { body }), id }, ctx),
);

import { writeRoute } from '@/lib/auth/desk-route';
import { markPresent } from '@/lib/services/sheet/presence';

/** An open page says that it is open, and learns who else has the sheet open. */
export const POST = writeRoute((actor, body, ctx, { id }) =>
  markPresent(actor, { ...(body instanceof Object ? body : { body }), id }, ctx),
);

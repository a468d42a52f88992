import { readRoute } from '@/lib/auth/desk-route';
import { listOpenSheets } from '@/lib/services/sheet/list-open-sheets';

export const GET = readRoute((actor, _params, ctx) => ({
  sheets: listOpenSheets(actor, ctx),
  readAt: ctx.now,
}));

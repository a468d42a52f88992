import { readRoute } from '@/lib/auth/desk-route';
import { onCallAt } from '@/lib/services/on-call/on-call';
import { listOpenSheets } from '@/lib/services/sheet/list-open-sheets';

export const GET = readRoute((actor, _params, ctx) => ({
  sheets: listOpenSheets(actor, ctx),
  onCall: onCallAt(ctx.db, ctx.now).map(({ name }) => name),
  readAt: ctx.now,
}));

import { readRoute } from '@/lib/auth/desk-route';
import { previewLive } from '@/lib/services/house-style/preview-live';

/** What would read differently among live sheets under a version, one step of the list at a time. */
export const GET = readRoute((actor, { id }, ctx, query) =>
  previewLive(actor, { id, from: query.get('from') ?? 0 }, ctx),
);

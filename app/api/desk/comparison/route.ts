import { writeRoute } from '@/lib/auth/desk-route';
import { previewComparison } from '@/lib/services/release/preview-comparison';

/** What a release that is still being typed would be compared with. Writes nothing; a POST for its length. */
export const POST = writeRoute((actor, body, ctx) => previewComparison(actor, body, ctx));

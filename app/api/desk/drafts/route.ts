import { readRoute, writeRoute } from '@/lib/auth/desk-route';
import { discardReleaseDraft, getReleaseDraft, saveReleaseDraft } from '@/lib/services/release/draft';

/** What this person has typed into the release form and not yet sent. */
export const GET = readRoute((actor, _params, ctx) => getReleaseDraft(actor, ctx));
export const PUT = writeRoute((actor, body, ctx) => saveReleaseDraft(actor, body, ctx));
export const DELETE = writeRoute((actor, _body, ctx) => discardReleaseDraft(actor, ctx));

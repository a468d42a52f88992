import 'server-only';
import { z } from 'zod';
import { deleteReleaseDraft, findReleaseDraft, upsertReleaseDraft } from '@/db/queries/release-draft';
import { type Actor, canLogReleases } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { authorize, type Ctx, parse, transact } from '../context';

const MAX_DRAFT = 100_000;
const KEY = 'new';

const schema = z.strictObject({
  body: z
    .string()
    .max(MAX_DRAFT, 'This draft is too large to keep.')
    .refine(isJsonObject, 'A draft is the form as JSON.'),
  /** The `savedAt` of the draft that was typed on; null where there was none. */
  basedOn: z.number().int().nullable(),
});

/**
 * Keeps what a person has typed so far, unless something else was kept since `basedOn`. Drafts are private and never
 * part of the history.
 */
export function saveReleaseDraft(actor: Actor, input: unknown, ctx: Ctx): { savedAt: number } {
  authorize(canLogReleases(actor), 'Only reporters and editors log releases.');
  const { body, basedOn } = parse(schema, input);
  return transact(ctx, (tx) => {
    const kept = findReleaseDraft(tx, actor.personId, KEY);
    if (kept?.body === body) return { savedAt: kept.updatedAt };
    if (kept && kept.updatedAt !== basedOn)
      throw new AppError('conflict', 'This draft was changed in another tab.');
    // Two saves within one tick of the clock are still told apart.
    const savedAt = Math.max(ctx.now, (kept?.updatedAt ?? 0) + 1);
    upsertReleaseDraft(tx, { personId: actor.personId, key: KEY, body, updatedAt: savedAt });
    return { savedAt };
  });
}

export function getReleaseDraft(
  actor: Actor,
  ctx: Pick<Ctx, 'db'>,
): { body: unknown; savedAt: number } | null {
  authorize(canLogReleases(actor), 'Only reporters and editors log releases.');
  const row = findReleaseDraft(ctx.db, actor.personId, KEY);
  return row && { body: JSON.parse(row.body) as unknown, savedAt: row.updatedAt };
}

export function discardReleaseDraft(actor: Actor, ctx: Ctx): void {
  authorize(canLogReleases(actor), 'Only reporters and editors log releases.');
  transact(ctx, (tx) => deleteReleaseDraft(tx, actor.personId, KEY));
}

function isJsonObject(text: string): boolean {
  try {
    const value: unknown = JSON.parse(text);
    return typeof value === 'object' && value !== null && !Array.isArray(value);
  } catch {
    return false;
  }
}

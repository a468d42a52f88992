import 'server-only';
import { z } from 'zod';
import { deleteReleaseDraft, findReleaseDraft, upsertReleaseDraft } from '@/db/queries/release-draft';
import { type Actor, canLogReleases } from '@/lib/domain/roles';
import { authorize, type Ctx, parse, transact } from '../context';

const MAX_DRAFT = 100_000;
const KEY = 'new';

const schema = z.strictObject({
  body: z
    .string()
    .max(MAX_DRAFT, 'This draft is too large to keep.')
    .refine(isJsonObject, 'A draft is the form as JSON.'),
});

/** Keeps what a person has typed so far. Drafts are private and never part of the history. */
export function saveReleaseDraft(actor: Actor, input: unknown, ctx: Ctx): { savedAt: number } {
  authorize(canLogReleases(actor), 'Only reporters and editors log releases.');
  const { body } = parse(schema, input);
  transact(ctx, (tx) =>
    upsertReleaseDraft(tx, { personId: actor.personId, key: KEY, body, updatedAt: ctx.now }),
  );
  return { savedAt: ctx.now };
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

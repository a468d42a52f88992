import 'server-only';
import { z } from 'zod';
import {
  findStyleVersionById,
  insertStyleVersion,
  listOpenStyles,
  updateStyleVersion,
} from '@/db/queries/house-style';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import { canonicalJson } from '@/lib/security/canonical';
import { newId } from '@/lib/security/ids';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { carriedOver } from './leaves';
import {
  agreedHash,
  bodyOf,
  currentStyle,
  EDITORS_ONLY,
  MOVED_ON,
  openOwnDraft,
  openStyle,
  recordAct,
  refuseUnless,
} from './open-version';

export const target = z.strictObject({ id: z.string().min(1).max(64), version: z.number().int().min(1) });

/** A draft of what is in force for this editor; the one that they have already, where there is one. */
export function startStyleDraft(actor: Actor, ctx: Ctx): { id: string } {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  return transact(ctx, (tx) => {
    authorize(canActAsEditor(actingNow(tx, actor)), EDITORS_ONLY);
    const own = listOpenStyles(tx, 200).find(
      ({ version }) => version.state === 'draft' && version.authorId === actor.personId,
    );
    if (own) return { id: own.version.publicId };
    const base = currentStyle(tx);
    const body = bodyOf(base);
    const row = insertStyleVersion(tx, {
      publicId: newId(),
      origin: 'desk',
      state: 'draft',
      authorId: actor.personId,
      houseStyle: canonicalJson(body.style),
      policy: canonicalJson(body.policy),
      basedOnId: base.id,
      createdAt: ctx.now,
      updatedAt: ctx.now,
    });
    const entry = { action: 'started house style draft', entity: 'house style version' };
    const after = { basedOn: base.number };
    appendRecord(tx, { personId: actor.personId, ...entry, entityId: row.publicId, after }, ctx.now);
    return { id: row.publicId };
  });
}

/** Makes a draft that came from the product this editor's own. */
export function takeUpStyle(actor: Actor, input: unknown, ctx: Ctx): { version: number } {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  const { id, version } = parse(target, input);
  return transact(ctx, (tx) => {
    authorize(canActAsEditor(actingNow(tx, actor)), EDITORS_ONLY);
    const row = openStyle(tx, actor, id);
    refuseUnless(row.state === 'draft' && row.authorId === null, 'Somebody has taken up this draft already.');
    const set = { authorId: actor.personId, updatedAt: ctx.now };
    refuseUnless(row.version === version && updateStyleVersion(tx, row, set), MOVED_ON);
    const entry = { action: 'took up house style draft', entity: 'house style version' };
    appendRecord(tx, { personId: actor.personId, ...entry, entityId: id }, ctx.now);
    return { version: version + 1 };
  });
}

/** Carries a draft's decisions over to what has come into force since it was started. */
export function bringUpToDate(
  actor: Actor,
  input: unknown,
  ctx: Ctx,
): { version: number; contested: string[] } {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  const { id, version } = parse(target, input);
  return transact(ctx, (tx) => {
    const row = openOwnDraft(tx, actingNow(tx, actor), id, version);
    const now = currentStyle(tx);
    if (row.basedOnId === now.id) return { version, contested: [] };
    const base = row.basedOnId === null ? now : findStyleVersionById(tx, row.basedOnId)!;
    const { body, contested } = carriedOver(bodyOf(base), bodyOf(row), bodyOf(now));
    const set = {
      houseStyle: canonicalJson(body.style),
      policy: canonicalJson(body.policy),
      basedOnId: now.id,
      updatedAt: ctx.now,
    };
    refuseUnless(updateStyleVersion(tx, row, set), MOVED_ON);
    const entry = { action: 'brought house style draft up to date', entity: 'house style version' };
    const after = { basedOn: now.number, contested };
    appendRecord(tx, { personId: actor.personId, ...entry, entityId: id, after }, ctx.now);
    return { version: version + 1, contested };
  });
}

/** Puts a draft aside for good: one's own, or one of the product's that nobody took up. */
export function withdrawStyle(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  const { id, version } = parse(target, input);
  transact(ctx, (tx) => {
    const acting = actingNow(tx, actor);
    authorize(canActAsEditor(acting), EDITORS_ONLY);
    const row = openStyle(tx, acting, id);
    authorize(
      row.authorId === null || row.authorId === actor.personId,
      'This draft is another editor’s. Only they withdraw it.',
    );
    refuseUnless(row.state === 'draft', 'Only a draft is withdrawn; what is proposed is sent back first.');
    const set = { state: 'withdrawn' as const, updatedAt: ctx.now };
    refuseUnless(row.version === version && updateStyleVersion(tx, row, set), MOVED_ON);
    const act = { act: 'withdrawn' as const, hash: agreedHash(row), before: 'draft', after: 'withdrawn' };
    recordAct(tx, acting, row, act, ctx.now);
  });
}

import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { findLastAct } from '@/db/queries/clearing';
import { deletePresenceUntil, insertLook, listOthersPresent, putPresence } from '@/db/queries/sheet-desk';
import { type Actor, canDraftSheets, isTwoPersonAgreement, type Role } from '@/lib/domain/roles';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { openSheet, type Opened } from './sheet-state';

const schema = z.strictObject({
  id: z.string().min(1).max(64),
  doing: z.enum(['reading', 'writing']),
});

/** Somebody counts as having a sheet open for so long after their page last said so. */
export const PRESENT_MS = 45_000;

export type Present = { others: { name: string; doing: 'reading' | 'writing' }[] };

/**
 * An open page says that it is open, and learns who else is there. Nobody is locked out by it. The first time that
 * somebody who may be the second reader opens a filing stops its clock.
 */
export function markPresent(actor: Actor, input: unknown, ctx: Ctx): Present {
  authorize(canDraftSheets(actor), 'Sheets are written and read by reporters and editors.');
  const { id, doing } = parse(schema, input);
  return transact(ctx, (tx) => {
    const opened = openSheet(tx, actor, id, ctx.now);
    deletePresenceUntil(tx, ctx.now - PRESENT_MS);
    putPresence(tx, { sheetId: opened.sheet.id, personId: actor.personId, doing, seenAt: ctx.now });
    if (opened.state === 'filed') look(tx, actingNow(tx, actor), opened, ctx.now);
    return { others: listOthersPresent(tx, opened.sheet.id, actor.personId, ctx.now - PRESENT_MS) };
  });
}

function look(tx: Tx, actor: Actor, { sheet, release }: Opened, now: number): void {
  const filing = findLastAct(tx, sheet.id, 'filed');
  if (!filing) return;
  const filer = { personId: filing.personId, roles: JSON.parse(filing.roles) as Role[] };
  if (!isTwoPersonAgreement(filer, actor)) return;
  if (!insertLook(tx, { clearingId: filing.id, personId: actor.personId, at: now })) return;
  const entry = { action: 'opened filed sheet', entity: 'sheet', entityId: sheet.publicId };
  appendRecord(tx, { personId: actor.personId, ...entry, releaseId: release.id }, now);
}

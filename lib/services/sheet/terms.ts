import 'server-only';
import { z } from 'zod';
import { findTerms, putTerms, type TermsRow } from '@/db/queries/sheet-desk';
import { type Actor, canActAsEditor, canDraftSheets } from '@/lib/domain/roles';
import type { Wanted } from '@/lib/domain/wanted';
import { AppError } from '@/lib/errors';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { wallInstant } from '../wall-time';
import { openSheet, refuseUnless } from './sheet-state';
import { enqueueShelfEndIn } from './shelf-end';

const schema = z.strictObject({
  id: z.string().min(1).max(64),
  wanted: z
    .strictObject({
      local: z.string().regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}$/, 'Type the date and the time.'),
      zone: z.string().trim().min(1, 'Choose a time zone.').max(64),
    })
    .nullable(),
  /** Days after the field dates in which the words keep; null: as house style says. */
  shelfDays: z
    .number({ error: 'Type a number of days.' })
    .int('Whole days.')
    .min(1, 'At least one day.')
    .max(3650, 'At most ten years.')
    .nullable(),
});

/** When a sheet is wanted, and how long its words keep once cleared: its author's and the editors' to say. */
export function setTerms(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canDraftSheets(actor), 'Reporters and editors say when a sheet is wanted.');
  const { id, wanted, shelfDays } = parse(schema, input);
  const wantedAt = wanted && wantedInstant(wanted);
  transact(ctx, (tx) => {
    const opened = openSheet(tx, actor, id, ctx.now);
    authorize(
      canActAsEditor(actor) || opened.sheet.authorId === actor.personId,
      'Its author or an editor says when a sheet is wanted.',
    );
    refuseUnless(opened.state !== 'pulled', 'These words were pulled. Nothing of them is wanted.');
    const before = findTerms(tx, opened.sheet.id);
    if (wantedAt !== null && wantedAt <= ctx.now && wantedAt !== before?.wantedAt)
      throw new AppError('invalid', 'The time needs another look.', {
        fields: { 'wanted.local': 'That time has passed.' },
      });
    putTerms(tx, {
      sheetId: opened.sheet.id,
      wantedAt,
      wantedLocal: wanted?.local ?? null,
      wantedZone: wanted?.zone ?? null,
      shelfDays,
      setBy: actor.personId,
      setAt: ctx.now,
    });
    enqueueShelfEndIn(tx, opened.sheet, ctx.now);
    const entry = { action: 'set terms of sheet', entity: 'sheet', entityId: id };
    const change = { before: before && toldOf(before), after: { wanted, wantedAt, shelfDays } };
    appendRecord(
      tx,
      { personId: actor.personId, ...entry, ...change, releaseId: opened.release.id },
      ctx.now,
    );
  });
}

export function wantedOf(terms: TermsRow | null | undefined): Wanted | null {
  if (!terms || terms.wantedAt === null || terms.wantedLocal === null || terms.wantedZone === null)
    return null;
  return { at: terms.wantedAt, local: terms.wantedLocal, zone: terms.wantedZone };
}

function toldOf(terms: TermsRow) {
  const wanted = wantedOf(terms);
  return {
    wanted: wanted && { local: wanted.local, zone: wanted.zone },
    wantedAt: terms.wantedAt,
    shelfDays: terms.shelfDays,
  };
}

function wantedInstant({ local, zone }: { local: string; zone: string }): number {
  return wallInstant(local, zone, {
    local: 'wanted.local',
    zone: 'wanted.zone',
    whole: 'The time needs another look.',
    inUtc: 'Give it in UTC.',
  });
}

import 'server-only';
import { z } from 'zod';
import type { Conn } from '@/db/client';
import { findShift, insertShift, listShifts, removeShift as remove } from '@/db/queries/on-call';
import { findPersonByPublicId, listPeople, listRoles } from '@/db/queries/person';
import { type Shift, turnAt } from '@/lib/domain/on-call';
import { type Actor, canActAsEditor, canReadUnpublished } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/security/ids';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { wallInstant } from '../wall-time';

const id = z.string().min(1, 'Choose an editor.').max(64);
const time = z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/, 'Type a time such as 22:00.');
const schema = z
  .strictObject({
    personId: id,
    /** A day of every week, or one date. */
    when: z.union([
      z.strictObject({ weekday: z.number().int().min(1).max(7) }),
      z.strictObject({ onDay: z.string().regex(/^\d{4}-\d{2}-\d{2}$/, 'Type the date.') }),
    ]),
    fromTime: time,
    toTime: time,
    zone: z.string().trim().min(1).max(64),
  })
  .refine(({ fromTime, toTime }) => fromTime !== toTime, {
    path: ['toTime'],
    error: 'A turn ends at another time than it begins.',
  });

/** Puts an editor on the night list, every week on one day or for one date. */
export function addShift(actor: Actor, input: unknown, ctx: Ctx): { id: string } {
  authorize(canActAsEditor(actor), 'Editors keep the night list.');
  const { personId, when, fromTime, toTime, zone } = parse(schema, input);
  const [weekday, onDay] = 'weekday' in when ? [when.weekday, null] : [null, when.onDay];
  refuseImpossible(onDay, fromTime, zone);
  return transact(ctx, (tx) => {
    const person = findPersonByPublicId(tx, personId);
    if (!person || person.disabledAt !== null || !person.roles.includes('editor'))
      throw new AppError('invalid', 'The night list needs another look.', {
        fields: { personId: 'Only an editor of this desk is on call.' },
      });
    const times = { weekday, onDay, fromTime, toTime, zone };
    const shift = insertShift(tx, {
      publicId: newId(),
      personId: person.id,
      ...times,
      addedBy: actor.personId,
      addedAt: ctx.now,
    });
    const entry = { action: 'put on night list', entity: 'shift', entityId: shift.publicId };
    appendRecord(tx, { personId: actor.personId, ...entry, after: { person: personId, ...times } }, ctx.now);
    return { id: shift.publicId };
  });
}

export function removeShift(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canActAsEditor(actor), 'Editors keep the night list.');
  const { id: publicId } = parse(z.strictObject({ id }), input);
  transact(ctx, (tx) => {
    const shift = findShift(tx, publicId);
    if (!shift) throw new AppError('not-found', 'There is no such turn.');
    if (!remove(tx, shift.id, actor.personId, ctx.now))
      throw new AppError('conflict', 'This turn was taken off already.');
    const { weekday, onDay, fromTime, toTime, zone } = shift;
    const entry = { action: 'took off night list', entity: 'shift', entityId: publicId };
    const before = { weekday, onDay, fromTime, toTime, zone };
    appendRecord(tx, { personId: actor.personId, ...entry, before }, ctx.now);
  });
}

export type ShiftView = Shift & { id: string; name: string; isOnNow: boolean; mayBeCalled: boolean };
export type NightList = {
  shifts: ShiftView[];
  /** On call now, with the end of each turn. */
  now: OnCall[];
  /** Whom an editor may put on the list. */
  editors: { id: string; name: string }[];
};
export type OnCall = { id: string; name: string; until: number };

export function getNightList(actor: Actor, ctx: Ctx): NightList {
  authorize(canReadUnpublished(actor), 'The night list is read by reporters and editors.');
  const shifts = listShifts(ctx.db).map((row): ShiftView => {
    const { weekday, onDay, fromTime, toTime, zone, publicId } = row.shift;
    const shift = { weekday, onDay, fromTime, toTime, zone };
    const mayBeCalled = isEditorNow(ctx.db, row);
    const isOnNow = mayBeCalled && turnAt(shift, ctx.now) !== null;
    return { ...shift, id: publicId, name: row.name, isOnNow, mayBeCalled };
  });
  const editors = canActAsEditor(actor)
    ? listPeople(ctx.db).filter((one) => one.disabledAt === null && one.roles.includes('editor'))
    : [];
  return {
    shifts,
    now: onCallAt(ctx.db, ctx.now),
    editors: editors.map(({ publicId, name }) => ({ id: publicId, name })),
  };
}

/** Editors on call at an instant, each once, with the later end where turns overlap. */
export function onCallAt(conn: Conn, now: number): OnCall[] {
  const on = new Map<string, OnCall>();
  for (const row of listShifts(conn)) {
    const turn = turnAt(row.shift, now);
    if (!turn || !isEditorNow(conn, row)) continue;
    const until = Math.max(turn.to, on.get(row.publicId)?.until ?? 0);
    on.set(row.publicId, { id: row.publicId, name: row.name, until });
  }
  return [...on.values()];
}

/** A role that was taken away since takes its holder off call. */
function isEditorNow(conn: Conn, row: { personId: number; disabledAt: number | null }): boolean {
  return row.disabledAt === null && listRoles(conn, row.personId).includes('editor');
}

/** A date that does not exist, a zone that does not, or a turn that would begin at a time that does not. */
function refuseImpossible(onDay: string | null, fromTime: string, zone: string): void {
  wallInstant(onDay === null ? '2000-01-01T12:00' : `${onDay}T${fromTime}`, zone, {
    local: 'when.onDay',
    zone: 'zone',
    whole: 'The night list needs another look.',
    inUtc: 'Begin at another time, or in the zone Etc/UTC.',
  });
}

import 'server-only';
import { z } from 'zod';
import { endBan as end, findBan, insertBan, listBans as listRows } from '@/db/queries/bans';
import { findRaceByPublicId, listRaces } from '@/db/queries/race';
import { type BannedFigures, BANNED_FIGURES, type BanState, banStateAt } from '@/lib/domain/bans';
import { type Actor, canActAsEditor, canReadCopyDesk } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/security/ids';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { enqueuePurgeIn } from '../jobs/enqueue-purge';
import { wallInstant } from '../wall-time';

const id = z.string().min(1).max(64);
const local = z.string().regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}$/, 'Type the date and the time.');
const schema = z.strictObject({
  jurisdiction: z.string().trim().min(2, 'Say which place bars it.').max(120, 'At most 120 characters.'),
  /** Null: every race that ends in a vote. */
  raceId: id.nullable(),
  bars: z.enum(BANNED_FIGURES),
  fromLocal: local,
  toLocal: local,
  zone: z.string().trim().min(1, 'Choose a time zone.').max(64),
  rule: z
    .string()
    .trim()
    .min(10, 'Name the law or the order, and who of the newsroom read it.')
    .max(1000, 'At most 1,000 characters.'),
});

/** Enters a time in which a place bars poll figures, as the newsroom and its lawyers read their own law. */
export function enterBan(actor: Actor, input: unknown, ctx: Ctx): { id: string } {
  authorize(canActAsEditor(actor), 'Editors enter publication bans.');
  const { raceId, fromLocal, toLocal, ...given } = parse(schema, input);
  const [fromAt, toAt] = [
    wallInstant(fromLocal, given.zone, wordsFor('fromLocal')),
    wallInstant(toLocal, given.zone, wordsFor('toLocal')),
  ];
  refuseField(toAt > fromAt, 'toLocal', 'A ban ends after it begins.');
  refuseField(toAt > ctx.now, 'toLocal', 'That time has passed.');
  return transact(ctx, (tx) => {
    const race = raceId === null ? null : findRaceByPublicId(tx, raceId);
    if (raceId !== null && !race) throw new AppError('not-found', 'There is no such race.');
    const ban = insertBan(tx, {
      publicId: newId(),
      raceId: race?.id ?? null,
      ...given,
      ...{ fromAt, fromLocal, toAt, toLocal },
      enteredBy: actor.personId,
      enteredAt: ctx.now,
    });
    const purge = { of: 'ban' as const, id: ban.publicId };
    enqueuePurgeIn(tx, purge, 'begins', ctx.now, { runAt: Math.max(fromAt, ctx.now) });
    enqueuePurgeIn(tx, purge, 'ends', ctx.now, { runAt: toAt });
    const entry = { action: 'entered ban', entity: 'ban', entityId: ban.publicId };
    const after = { ...given, race: raceId, fromLocal, toLocal, fromAt, toAt };
    appendRecord(tx, { personId: actor.personId, ...entry, after }, ctx.now);
    return { id: ban.publicId };
  });
}

const ending = z.strictObject({
  id,
  reason: z.string().trim().min(10, 'Say in a sentence why it ends.').max(1000, 'At most 1,000 characters.'),
});

/** Ends a ban before its time, or one that was entered wrongly. */
export function endBan(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canActAsEditor(actor), 'Editors end publication bans.');
  const { id: publicId, reason } = parse(ending, input);
  transact(ctx, (tx) => {
    const ban = findBan(tx, publicId);
    if (!ban) throw new AppError('not-found', 'There is no such ban.');
    const before = banStateAt(ban, ctx.now);
    const isEnded =
      before !== 'over' && end(tx, ban.id, { endedBy: actor.personId, endedAt: ctx.now, endReason: reason });
    if (!isEnded) throw new AppError('conflict', 'This ban is over already.');
    enqueuePurgeIn(tx, { of: 'ban', id: publicId }, 'ended', ctx.now);
    const entry = { action: 'ended ban', entity: 'ban', entityId: publicId, reason };
    const change = { before: { state: before, toAt: ban.toAt }, after: { endedAt: ctx.now } };
    appendRecord(tx, { personId: actor.personId, ...entry, ...change }, ctx.now);
  });
}

export type BanView = {
  id: string;
  jurisdiction: string;
  /** Null: every race that ends in a vote. */
  race: string | null;
  bars: BannedFigures;
  fromAt: number;
  toAt: number;
  zone: string;
  rule: string;
  enteredBy: string;
  enteredAt: number;
  ended: { by: string; at: number; reason: string } | null;
  state: BanState;
};

const LIMIT = 200;

export function listBans(actor: Actor, ctx: Ctx): BanView[] {
  authorize(canReadCopyDesk(actor), 'Publication bans are read by people with a role.');
  return listRows(ctx.db, LIMIT).map(({ ban, race, enteredBy, endedBy }) => ({
    id: ban.publicId,
    jurisdiction: ban.jurisdiction,
    race,
    bars: ban.bars,
    fromAt: ban.fromAt,
    toAt: ban.toAt,
    zone: ban.zone,
    rule: ban.rule,
    enteredBy,
    enteredAt: ban.enteredAt,
    ended: ban.endedAt === null ? null : { by: endedBy ?? '', at: ban.endedAt, reason: ban.endReason ?? '' },
    state: banStateAt(ban, ctx.now),
  }));
}

/** What the form of a ban offers. */
export function listBanRaces(actor: Actor, ctx: Pick<Ctx, 'db'>): { id: string; name: string }[] {
  if (!canActAsEditor(actor)) return [];
  return listRaces(ctx.db).map(({ publicId, name }) => ({ id: publicId, name }));
}

function wordsFor(field: 'fromLocal' | 'toLocal') {
  return { local: field, zone: 'zone', whole: 'Some fields need another look.', inUtc: 'Give it in UTC.' };
}

function refuseField(isFine: boolean, field: string, message: string): void {
  if (!isFine)
    throw new AppError('invalid', 'Some fields need another look.', { fields: { [field]: message } });
}

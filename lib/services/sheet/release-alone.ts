import 'server-only';
import { z } from 'zod';
import type { Conn } from '@/db/client';
import { findEvidence, findLastAct } from '@/db/queries/clearing';
import { findOneReader, insertOneReader, setSecondReader } from '@/db/queries/one-reader';
import { touchSheet } from '@/db/queries/sheet';
import { isAsPrinted, NIGHT } from '@/lib/domain/as-printed';
import { type Actor, canActAsEditor, canDraftSheets } from '@/lib/domain/roles';
import { isWithinNight, wallTime } from '@/lib/domain/wall-clock';
import { readEnv } from '@/lib/env';
import { refuseUnderBan } from '../bans/hold';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { refuseUnsigned } from '../house-style/sign-language';
import { readDeskSettings } from '../setup/desk-settings';
import { publishIn, readerInput } from './clear-sheet';
import { applyEdits, openForWriting } from './edit-lines';
import { fileIn } from './file-sheet';
import { MOVED_ON, openSheet, refuseUnless } from './sheet-state';

const schema = z.strictObject({
  id: z.string().min(1).max(64),
  version: z.number().int().min(1),
  basisHash: z.string().regex(/^[0-9a-f]{64}$/),
});

const NOT_ALLOWED =
  'Two people agree before anything is published: this desk has not switched the night rule on.';
const NOT_NIGHT = `One editor alone releases figures as printed only between ${NIGHT.from} and ${NIGHT.to}.`;

/** The desk's night rule: at night one editor alone releases figures as printed, marked until a second has read them. */
export function releaseAlone(asker: Actor, input: unknown, ctx: Ctx): { version: number } {
  authorize(canActAsEditor(asker), 'Only an editor releases figures alone.');
  const seen = parse(schema, input);
  return transact(ctx, (tx) => {
    const actor = actingNow(tx, asker);
    authorize(canActAsEditor(actor), 'Only an editor releases figures alone.');
    const before = openForWriting(tx, actor, seen.id, seen.version, ctx.now);
    refuseUnless(isAsPrinted(before.sheet), 'Only figures as printed are released by one reader.');
    authorize(isNightRuleOn(tx), NOT_ALLOWED);
    refuseUnless(isNight(ctx.now), NOT_NIGHT);
    refuseUnsigned(tx, before.sheet.language);
    refuseUnderBan(tx, before.release.raceId, ctx.now);
    applyEdits(tx, actor, before, [], ctx.now);
    fileIn(tx, actor, seen, ctx.now, 'filed sheet');
    const opened = openSheet(tx, actor, seen.id, ctx.now);
    const evidenceId = findLastAct(tx, opened.sheet.id, 'filed')!.evidenceId!;
    insertOneReader(tx, {
      evidenceId,
      sheetId: opened.sheet.id,
      personId: actor.personId,
      houseStyleId: readDeskSettings(tx).houseStyle.version,
      localTime: wallTime(ctx.now, readEnv().LEADLINE_ZONE),
      nightFrom: NIGHT.from,
      nightTo: NIGHT.to,
      zone: readEnv().LEADLINE_ZONE,
      at: ctx.now,
    });
    publishIn(tx, actor, opened, evidenceId, ctx.now);
    const entry = { action: 'released as one reader', entity: 'sheet', entityId: seen.id };
    const after = { state: 'cleared', readers: 1, texts: opened.texts };
    appendRecord(tx, { personId: actor.personId, ...entry, after, releaseId: opened.release.id }, ctx.now);
    return { version: opened.sheet.version + 1 };
  });
}

/** Reads for a second time what one editor released at night; from then on two people stand behind it. */
export function readSecond(asker: Actor, input: unknown, ctx: Ctx): void {
  authorize(canDraftSheets(asker), 'Reporters and editors read released figures.');
  const { id, hash } = parse(readerInput, input);
  transact(ctx, (tx) => {
    const actor = actingNow(tx, asker);
    authorize(canDraftSheets(actor), 'Reporters and editors read released figures.');
    const opened = openSheet(tx, actor, id, ctx.now);
    const cleared = findLastAct(tx, opened.sheet.id, 'cleared');
    const released = cleared?.evidenceId ? findOneReader(tx, cleared.evidenceId) : null;
    refuseUnless(
      released !== null && released.secondAt === null,
      'Two people have read these words already.',
    );
    refuseUnless(opened.state === 'cleared', 'These words are not released now.');
    refuseUnless(findEvidence(tx, released.evidenceId)!.hash === hash, MOVED_ON);
    authorize(released.personId !== actor.personId, 'You released these words. Somebody else reads them.');
    const second = { secondPersonId: actor.personId, secondAt: ctx.now };
    refuseUnless(setSecondReader(tx, released.evidenceId, second), MOVED_ON);
    refuseUnless(touchSheet(tx, opened.sheet.id, opened.sheet.version), MOVED_ON);
    const entry = { action: 'read as second reader', entity: 'sheet', entityId: id };
    const change = { before: { readers: 1 }, after: { readers: 2, evidence: hash } };
    appendRecord(
      tx,
      { personId: actor.personId, ...entry, ...change, releaseId: opened.release.id },
      ctx.now,
    );
  });
}

export function isNight(now: number): boolean {
  return isWithinNight(wallTime(now, readEnv().LEADLINE_ZONE), NIGHT.from, NIGHT.to);
}

/** A house style from before there was such a switch has it off. */
export function isNightRuleOn(conn: Conn): boolean {
  return readDeskSettings(conn).houseStyle.body.asPrintedNight === true;
}

import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { listJobsIn } from '@/db/queries/jobs';
import { listUnsent } from '@/db/queries/outbox';
import { findLastRecord } from '@/db/queries/record';
import type { Actor, Role } from '@/lib/domain/roles';
import { ESCALATES_AFTER_MS } from '@/lib/domain/look';
import { liftEmbargo } from '@/lib/services/release/embargo';
import { getRelease } from '@/lib/services/release/get-release';
import { listReleases } from '@/lib/services/release/list-releases';
import { markPresent } from '@/lib/services/sheet/presence';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { setTerms } from '@/lib/services/sheet/terms';
import { freshDatabase, HOUR, makePerson, NOW, type TestDatabase } from '@/tests/support/database';
import { logRelease, sharesOf } from '@/tests/support/release';
import { runDueJobs } from '@/tests/support/run-jobs';
import { sheetDesk } from '@/tests/support/sheet';

const DAY = 24 * HOUR;
/** Two hours after NOW. */
const embargo = { local: '2026-09-17T10:00', zone: 'Etc/UTC' };
const LIFTS = 2 * HOUR;

let desk: TestDatabase;
let reporter: Actor;
let editor: Actor;
beforeEach(() => {
  desk = freshDatabase();
  const person = (name: string, ...roles: Role[]) => makePerson(desk.db, { name, roles });
  reporter = person('Rolf Quill', 'reporter');
  editor = person('Edda Marsh', 'editor');
});
afterEach(() => desk.closeAndRemove());

const run = (later: number) => runDueJobs(desk.db, NOW + later);
const told = () =>
  listUnsent(desk.db, 50).flatMap(({ channel, kind, entityId }) =>
    channel === 'mail' ? [{ kind, entityId }] : [],
  );
const waiting = () =>
  listJobsIn(desk.db, ['waiting'], 'soonest', 50, editor, NOW).map(({ job }) => job.idempotencyKey);

describe('the end of an embargo', () => {
  const held = () => {
    const before = logRelease(desk.db, reporter, { embargo });
    const race = { kind: 'existing' as const, id: getRelease(reporter, before, desk.ctx()).facts.race.id };
    const shares = sharesOf([
      ['Alder', '52'],
      ['Brook', '35'],
      ['Someone else', '5'],
      ['Don’t know', '8', false],
    ]);
    const dates = { fieldStartOn: '2026-09-14', fieldEndOn: '2026-09-16', sameQuestion: true };
    const later = logRelease(desk.db, reporter, { race, shares, ...dates });
    return { before, later };
  };
  const marksOf = (id: string, later: number) =>
    listReleases(reporter, desk.ctx(later)).find((release) => release.id === id)!.verdicts.length;

  it('renews the marks of later polls by itself when the hour passes, once, and says so', async () => {
    const { before, later } = held();
    const withoutComparison = marksOf(later, 0);
    expect(await run(LIFTS - 1)).toEqual([]);
    expect(marksOf(later, LIFTS)).toBe(withoutComparison);
    expect(await run(LIFTS)).toEqual([]);
    expect(marksOf(later, LIFTS)).toBeGreaterThan(withoutComparison);
    expect(told()).toEqual([{ kind: 'embargo-ended', entityId: before }]);
    expect(findLastRecord(desk.db)).toMatchObject({
      personId: null,
      action: 'embargo ended',
      entityId: before,
      at: NOW + LIFTS,
    });
    await run(LIFTS + DAY);
    expect(told()).toHaveLength(1);
  });

  it('follows at once where an editor lifts it, without a second entry in the history', async () => {
    const { before } = held();
    liftEmbargo(editor, { id: before, version: 1, reason: 'The pollster published it early.' }, desk.ctx());
    await run(0);
    expect(told()).toEqual([{ kind: 'embargo-ended', entityId: before }]);
    expect(findLastRecord(desk.db)?.action).toBe('lifted embargo');
    await run(LIFTS);
    expect(told()).toHaveLength(1);
  });

  it('is not promised for a release without one', () => {
    logRelease(desk.db, reporter);
    expect(waiting()).toEqual([]);
  });
});

describe('the end of a shelf life', () => {
  const days = (id: string, shelfDays: number | null) =>
    setTerms(editor, { id, wanted: null, shelfDays }, desk.ctx());
  /** Field dates end on 13 September: five days after, on the 18th, the words are old. */
  const cleared = () => {
    const on = sheetDesk(desk.db);
    const id = on.draft(reporter, logRelease(desk.db, reporter));
    on.file(reporter, id);
    days(id, 5);
    on.clear(editor, id);
    return id;
  };
  const ENDS = Date.UTC(2026, 8, 18) - NOW;
  const shelfNews = () => told().filter(({ kind }) => kind === 'shelf-ended');

  it('is told at the first moment of the day on which words are old, once', async () => {
    const id = cleared();
    await run(ENDS - 1);
    expect(shelfNews()).toEqual([]);
    await run(ENDS);
    await run(ENDS + DAY);
    expect(shelfNews()).toEqual([{ kind: 'shelf-ended', entityId: id }]);
  });

  it('moves with the days that are set for the sheet', async () => {
    const id = cleared();
    days(id, 7);
    await run(ENDS + DAY);
    expect(shelfNews()).toEqual([]);
    await run(ENDS + 2 * DAY);
    expect(shelfNews()).toHaveLength(1);
  });

  it('of words that were pulled is told by nobody', async () => {
    const id = cleared();
    pullSheet(editor, { id, reason: 'A batch of interviews is checked again.' }, desk.ctx());
    await run(ENDS);
    expect(shelfNews()).toEqual([]);
    expect(told().filter(({ kind }) => kind === 'sheet-pulled')).toEqual([
      { kind: 'sheet-pulled', entityId: id },
    ]);
  });

  it('is promised only where words keep for a number of days', () => {
    const on = sheetDesk(desk.db);
    on.cleared(reporter, editor, logRelease(desk.db, reporter));
    expect(waiting().filter((key) => key.startsWith('shelf'))).toEqual([]);
  });
});

describe('a filed sheet that nobody opens', () => {
  const filed = () => {
    const on = sheetDesk(desk.db);
    const id = on.draft(reporter, logRelease(desk.db, reporter));
    on.file(reporter, id);
    return { on, id };
  };

  it('is told after ten minutes', async () => {
    const { id } = filed();
    await run(ESCALATES_AFTER_MS - 1);
    expect(told()).toEqual([]);
    await run(ESCALATES_AFTER_MS);
    expect(told()).toEqual([{ kind: 'filing-unread', entityId: id }]);
  });

  it('is not told where a second person opened it', async () => {
    const { id } = filed();
    markPresent(editor, { id, doing: 'reading' }, desk.ctx(60_000));
    await run(ESCALATES_AFTER_MS);
    expect(told()).toEqual([]);
  });

  it('is not told where it was cleared or came back meanwhile', async () => {
    const { on, id } = filed();
    on.sendBack(editor, id, 'Say how many had no opinion.');
    await run(ESCALATES_AFTER_MS);
    expect(told()).toEqual([]);
    on.file(reporter, id);
    on.clear(editor, id);
    await run(2 * ESCALATES_AFTER_MS);
    expect(told()).toEqual([]);
  });
});

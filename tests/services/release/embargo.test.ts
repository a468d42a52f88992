import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { Actor } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { liftEmbargo, setEmbargoReader } from '@/lib/services/release/embargo';
import { embargoInstant } from '@/lib/services/release/embargo-time';
import { getRelease } from '@/lib/services/release/get-release';
import { listEmbargoCandidates } from '@/lib/services/release/list-embargo-candidates';
import { listReleases } from '@/lib/services/release/list-releases';
import { freshDatabase, HOUR, makePerson, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease } from '@/tests/support/release';

const REASON = 'The pollster published it an hour early.';
/** NOW is 08:00 UTC of that day. */
const HELD = { embargo: { local: '2026-09-17T12:00', zone: 'UTC' }, publishedOn: '2026-09-17' };

let desk: TestDatabase;
let reporter: Actor;
let editor: Actor;
let copyDesk: Actor;
let id: string;
beforeEach(() => {
  desk = freshDatabase();
  reporter = makePerson(desk.db, { name: 'Rita Quill', roles: ['reporter'] });
  editor = makePerson(desk.db, { name: 'Edda Stone', roles: ['editor'] });
  copyDesk = makePerson(desk.db, { name: 'Cora Lane', roles: ['copy-desk'] });
  id = logRelease(desk.db, reporter, HELD);
});
afterEach(() => desk.closeAndRemove());

const embargoOf = (later = 0) => getRelease(reporter, id, desk.ctx(later)).embargo;

describe('an embargo', () => {
  it('runs to its hour in its own zone, and not longer', () => {
    expect(embargoOf()).toMatchObject({ isRunning: true, local: '2026-09-17T12:00', zone: 'UTC' });
    expect(embargoOf(4 * HOUR - 1)?.isRunning).toBe(true);
    expect(embargoOf(4 * HOUR)?.isRunning).toBe(false);
    expect(listReleases(reporter, desk.ctx())[0]?.isUnderEmbargo).toBe(true);
    expect(listReleases(reporter, desk.ctx(4 * HOUR))[0]?.isUnderEmbargo).toBe(false);
  });

  it('is lifted early by an editor, for a written reason', () => {
    liftEmbargo(editor, { id, version: 1, reason: REASON }, desk.ctx(HOUR));
    expect(embargoOf(HOUR)).toMatchObject({ isRunning: false, liftedAt: desk.ctx(HOUR).now });
  });

  it('is not lifted by a reporter, without a reason, or from an older page', () => {
    const lift = (actor: Actor, change: object) => () =>
      liftEmbargo(actor, { id, version: 1, reason: REASON, ...change }, desk.ctx());
    expect(refusal(lift(reporter, {}))[0]).toBe('forbidden');
    expect(refusal(lift(editor, { reason: 'early' }))[0]).toBe('invalid');
    expect(refusal(lift(editor, { version: 7 }))[0]).toBe('conflict');
    expect(refusal(lift(editor, { id: 'nothing' }))[0]).toBe('not-found');
    expect(embargoOf()?.isRunning).toBe(true);
  });

  it('is not lifted twice', () => {
    liftEmbargo(editor, { id, version: 1, reason: REASON }, desk.ctx());
    const again = () => liftEmbargo(editor, { id, version: 2, reason: REASON }, desk.ctx(1));
    expect(refusal(again)[0]).toBe('conflict');
  });
});

describe('the embargo list', () => {
  const set = (actor: Actor, personId: string | null, listed = true, later = 0) =>
    setEmbargoReader(actor, { id, personId, listed }, desk.ctx(later));
  const readers = () => getRelease(editor, id, desk.ctx()).embargoReaders.map(({ name }) => name);

  it('takes on a person and the whole copy desk, once each, and lets them go', () => {
    set(editor, copyDesk.publicId);
    set(editor, copyDesk.publicId);
    set(editor, null);
    expect(readers()).toEqual(['Cora Lane', null]);
    set(editor, null, false);
    expect(readers()).toEqual(['Cora Lane']);
  });

  it('is the editor’s, for people who exist, while the embargo runs', () => {
    expect(refusal(() => set(reporter, copyDesk.publicId))[0]).toBe('forbidden');
    expect(refusal(() => set(editor, 'nobody'))[0]).toBe('not-found');
    expect(refusal(() => set(editor, copyDesk.publicId, true, 4 * HOUR))[0]).toBe('conflict');
    expect(readers()).toEqual([]);
  });

  it('offers people who do not read unpublished figures anyway', () => {
    makePerson(desk.db, { name: 'Ada Minn', roles: ['administrator'] });
    expect(listEmbargoCandidates(editor, desk.ctx()).map(({ name }) => name)).toEqual([
      'Ada Minn',
      'Cora Lane',
    ]);
    expect(refusal(() => listEmbargoCandidates(reporter, desk.ctx()))[0]).toBe('forbidden');
  });
});

describe('the wall time of an embargo', () => {
  it('is read on the clocks of its zone', () => {
    expect(embargoInstant('2026-09-17T12:00', 'Europe/Vienna')).toBe(Date.UTC(2026, 8, 17, 10));
    expect(embargoInstant('2026-12-17T12:00', 'Europe/Vienna')).toBe(Date.UTC(2026, 11, 17, 11));
    expect(embargoInstant('2026-12-17T12:00', 'Asia/Kathmandu')).toBe(Date.UTC(2026, 11, 17, 6, 15));
  });

  it.each([
    ['does not exist, when the clocks go forward', '2026-03-29T02:30', 'Europe/Vienna', 'embargo.local'],
    ['happens twice, when the clocks go back', '2026-10-25T02:30', 'Europe/Vienna', 'embargo.local'],
    ['is on no calendar', '2026-02-30T12:00', 'UTC', 'embargo.local'],
    ['has no such hour', '2026-02-20T24:30', 'UTC', 'embargo.local'],
    ['lies in no zone', '2026-09-17T12:00', 'Averil/Coast', 'embargo.zone'],
    ['lies at a bare offset, which no screen could show', '2026-09-17T12:00', '+05:00', 'embargo.zone'],
  ])('is refused at its field where it %s', (_, local, zone, field) => {
    const race = { kind: 'existing' as const, id: getRelease(reporter, id, desk.ctx()).facts.race.id };
    const log = () => logRelease(desk.db, reporter, { race, embargo: { local, zone } });
    expect(refusal(log)[0]).toBe('invalid');
    expect(fieldsOf(log)).toContain(field);
    expect(listReleases(reporter, desk.ctx())).toHaveLength(1);
  });

  it('is the ends of the changing hour, which happen once', () => {
    expect(embargoInstant('2026-03-29T03:00', 'Europe/Vienna')).toBe(Date.UTC(2026, 2, 29, 1));
    expect(embargoInstant('2026-10-25T03:00', 'Europe/Vienna')).toBe(Date.UTC(2026, 9, 25, 2));
  });
});

function fieldsOf(act: () => unknown): string[] {
  try {
    act();
  } catch (error) {
    return error instanceof AppError ? Object.keys(error.fields) : [];
  }
  return [];
}

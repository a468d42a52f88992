import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { findLatestHouseStyle, insertHouseStyle } from '@/db/queries/desk';
import { write } from '@/db/write';
import type { ReleaseFormValues } from '@/lib/domain/release-input';
import { listCopyDesk } from '@/lib/services/copy/list-copy-desk';
import { getRelease } from '@/lib/services/release/get-release';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { getSheetData } from '@/lib/services/sheet/sheet-data';
import { setTerms } from '@/lib/services/sheet/terms';
import { freshDatabase, HOUR, makePerson, type TestDatabase } from '@/tests/support/database';
import { logRelease, typed } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

let desk: TestDatabase;
let on: ReturnType<typeof sheetDesk>;
let people: Record<'reporter' | 'editor' | 'copyDesk', ReturnType<typeof makePerson>>;
let [earlier, releaseId, sheet] = ['', '', ''];
let race: ReleaseFormValues['race'];

const WEEK_BEFORE = { fieldStartOn: '2026-08-10', fieldEndOn: '2026-08-13', publishedOn: '2026-08-16' };
const AFTER = { fieldStartOn: '2026-09-14', fieldEndOn: '2026-09-16', publishedOn: '2026-09-17' };

beforeEach(() => {
  desk = freshDatabase();
  on = sheetDesk(desk.db);
  people = {
    reporter: makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] }),
    editor: makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] }),
    copyDesk: makePerson(desk.db, { name: 'Tamsin Oake', roles: ['copy-desk'] }),
  };
  earlier = logRelease(desk.db, people.reporter, WEEK_BEFORE);
  race = { kind: 'existing', id: getRelease(people.reporter, earlier, desk.ctx()).facts.race.id };
  releaseId = logRelease(desk.db, people.reporter, { race });
  sheet = on.draft(people.reporter, releaseId, 'change:Alder');
  on.file(people.reporter, sheet);
  on.clear(people.editor, sheet);
});
afterEach(() => desk.closeAndRemove());

/** The reasons as an editor, the copy desk and the interface for programs are told them: the same everywhere. */
function reasons(later = 0) {
  const ctx = desk.ctx(later);
  const told = getSheet(people.editor, sheet, ctx).desk.currency!.reasons;
  const item = listCopyDesk(people.copyDesk, { race: '', pollster: '' }, ctx).find(({ id }) => id === sheet);
  const data = getSheetData(people.copyDesk, sheet, ctx).cleared!.currency;
  expect(item!.stale).toEqual(told);
  expect(data).toEqual({ isCurrent: told.length === 0, reasons: told });
  return told.map(({ reason, ...rest }) => ('part' in rest ? `${reason} ${rest.part}` : reason));
}

describe('cleared words', () => {
  it('are current, and stay so beside a later poll that does not compare', () => {
    expect(reasons()).toEqual([]);
    logRelease(desk.db, people.reporter, { race, ...AFTER, population: typed('adults') });
    logRelease(desk.db, people.reporter, { race, ...AFTER, pollster: 'Norwater Polls' });
    expect(reasons()).toEqual([]);
  });

  it('are made old by a later comparable poll, and by one under embargo only from its hour', () => {
    const embargo = { local: '2026-09-17T09:00', zone: 'UTC' };
    logRelease(desk.db, people.reporter, { race, ...AFTER, embargo });
    expect(reasons(HOUR - 1)).toEqual([]);
    expect(reasons(HOUR)).toEqual(['newer-release']);
  });

  /** As a correction leaves it: another version is the current one. The service that mends refuses under cleared words. */
  it.each(['release', 'comparison'])('are made old by a new version of their %s', (part) => {
    const [corrected, other] = part === 'release' ? [releaseId, earlier] : [earlier, releaseId];
    desk.db.$client
      .prepare(
        `update releases set current_version_id = (select current_version_id from releases where public_id = ?)
         where public_id = ?`,
      )
      .run(other, corrected);
    expect(reasons()).toEqual([`new-version ${part}`]);
  });

  it('are made old by a ladder that no longer has their verb, and not by one that they do not use', () => {
    const put = (change: Record<string, string[]>) => {
      const style = JSON.parse(findLatestHouseStyle(desk.db)!.body) as { ladder: Record<string, string[]> };
      const body = JSON.stringify({ ...style, ladder: { ...style.ladder, ...change } });
      write(desk.db, (tx) => insertHouseStyle(tx, body, desk.ctx().now));
    };
    put({ holds: ['is well ahead of'] });
    expect(reasons()).toEqual([]);
    const { verdict } = getSheet(people.editor, sheet, desk.ctx()).finding;
    put({ [verdict]: ['is near'] });
    expect(reasons()).toEqual(['ladder']);
  });

  it('are made old by the end of their shelf life, on the day of the desk', () => {
    setTerms(people.editor, { id: sheet, wanted: null, shelfDays: 5 }, desk.ctx());
    expect(reasons(16 * HOUR - 1)).toEqual([]);
    expect(reasons(16 * HOUR)).toEqual(['shelf-life']);
  });
});

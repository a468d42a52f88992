import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { findLatestHouseStyle, insertHouseStyle } from '@/db/queries/desk';
import { write } from '@/db/write';
import { enterBan } from '@/lib/services/bans/bans';
import { answerEmbed } from '@/lib/services/embed/answer';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { listEmbeds } from '@/lib/services/embed/list-embeds';
import { listHistory } from '@/lib/services/history/list-history';
import { getRelease } from '@/lib/services/release/get-release';
import { reviseSheet } from '@/lib/services/sheet/change-filed';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { freshDatabase, HOUR, makePerson, NOW, type TestDatabase } from '@/tests/support/database';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

let desk: TestDatabase;
let on: ReturnType<typeof sheetDesk>;
let people: Record<'reporter' | 'editor' | 'copyDesk', ReturnType<typeof makePerson>>;
let [sheet, releaseId, embed] = ['', '', ''];

/** On 17 September 2026 from 12:00 to 20:00 in Vienna: two to ten hours after the tests begin. */
const [BEGINS, ENDS] = [2 * HOUR, 10 * HOUR];
const UNTIL = NOW + ENDS;

function start(embargo: { local: string; zone: string } | null = null): void {
  releaseId = logRelease(desk.db, people.reporter, { embargo });
  sheet = on.cleared(people.reporter, people.editor, releaseId);
  embed = createEmbed(people.editor, { sheetId: sheet }, desk.ctx()).id;
}
beforeEach(() => {
  desk = freshDatabase();
  on = sheetDesk(desk.db);
  people = {
    reporter: makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] }),
    editor: makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] }),
    copyDesk: makePerson(desk.db, { name: 'Tamsin Oake', roles: ['copy-desk'] }),
  };
});
afterEach(() => desk.closeAndRemove());

const ban = (bars: 'new-figures' | 'all-figures') =>
  enterBan(
    people.editor,
    {
      jurisdiction: 'Averil Coast',
      raceId: getRelease(people.reporter, releaseId, desk.ctx()).facts.race.id,
      bars,
      fromLocal: '2026-09-17T12:00',
      toLocal: '2026-09-17T20:00',
      zone: 'Europe/Vienna',
      rule: 'Electoral code, section 7, read by our lawyers.',
    },
    desk.ctx(),
  );
const listed = (later: number) => listEmbeds(people.copyDesk, desk.ctx(later))[0];
const statusAt = (later: number) =>
  answerEmbed({ path: `/embed/${embed}`, query: new URLSearchParams(), headers: {} }, desk.ctx(later)).status;
const onSheet = (later: number) => getSheet(people.editor, sheet, desk.ctx(later)).desk;

describe('an embed that is held', () => {
  it('waits for its embargo, on its list and on the sheets of its claim', () => {
    start({ local: '2026-09-17T14:00', zone: 'Europe/Vienna' });
    expect(onSheet(0).heldEmbeds).toEqual([
      {
        id: embed,
        language: 'en',
        hold: { kind: 'embargo', untilAt: NOW + 4 * HOUR, zone: 'Europe/Vienna' },
      },
    ]);
    expect([statusAt(4 * HOUR - 1), statusAt(4 * HOUR)]).toEqual([404, 200]);
    expect(onSheet(4 * HOUR).heldEmbeds).toEqual([]);
  });

  it('is taken down by a ban on all figures, from its first millisecond to its last', () => {
    start();
    ban('all-figures');
    for (const free of [BEGINS - 1, ENDS]) expect([statusAt(free), listed(free)?.hold]).toEqual([200, null]);
    for (const later of [BEGINS, ENDS - 1])
      expect([statusAt(later), listed(later)?.hold]).toEqual([410, { kind: 'taken-down', untilAt: UNTIL }]);
  });

  it('is frozen at the version from before by a ban on new figures', () => {
    start();
    reviseSheet(people.reporter, { id: sheet, version: onScreen().version }, desk.ctx());
    on.file(people.reporter, sheet, { headline: 'Other words' });
    on.clear(people.editor, sheet);
    ban('new-figures');
    expect(listed(BEGINS)).toMatchObject({
      version: 2,
      hold: { kind: 'frozen', version: 2, untilAt: UNTIL },
    });
    expect(onSheet(BEGINS).heldEmbeds.map(({ hold }) => hold.kind)).toEqual(['frozen']);
    expect(onSheet(0)).toMatchObject({ holds: [], bansAhead: [{ jurisdiction: 'Averil Coast' }] });
    expect(onSheet(BEGINS)).toMatchObject({ holds: [{ jurisdiction: 'Averil Coast' }], bansAhead: [] });
  });

  it('is not shown where its embargo ends under the ban: that would be a new figure', () => {
    start({ local: '2026-09-17T15:00', zone: 'Europe/Vienna' });
    ban('new-figures');
    const later = 6 * HOUR;
    expect([statusAt(later), listed(later)?.hold]).toEqual([404, { kind: 'not-shown', untilAt: UNTIL }]);
  });

  it('is nothing that a pulled embed can be', () => {
    start();
    ban('all-figures');
    pullSheet(people.editor, { id: sheet, reason: 'The pollster checks a batch.' }, desk.ctx());
    expect(listed(BEGINS)).toMatchObject({ state: 'pulled', hold: null });
  });
});

describe('words that one person read', () => {
  /** The row that the night rule writes, for the evidence of a claim: no service releases one so. */
  function releasedAlone(): void {
    const style = JSON.parse(findLatestHouseStyle(desk.db)!.body) as object;
    const styleId = write(desk.db, (tx) => {
      insertHouseStyle(tx, JSON.stringify({ ...style, asPrintedNight: true }), desk.ctx().now);
      return findLatestHouseStyle(tx)!.id;
    });
    desk.db.$client
      .prepare(
        `insert into one_reader_releases (evidence_id, sheet_id, person_id, house_style_id, local_time, night_from, night_to, zone, at)
         select e.id, e.sheet_id, ?, ?, '23:00', '22:00', '06:00', 'Etc/UTC', 5 from evidence e order by e.id desc limit 1`,
      )
      .run(people.editor.personId, styleId);
  }

  it('say so on the list of embeds and in the history, where figures that are barred are told too', () => {
    start();
    releasedAlone();
    expect(listed(0)?.oneReader).toBe('Marten Reed');
    ban('new-figures');
    const entries = (later: number) => listHistory(people.editor, {}, desk.ctx(later)).entries;
    const marks = (entity: string, later: number) =>
      entries(later)
        .find((entry) => entry.entity === entity)
        ?.marks.map(({ kind }) => kind);
    expect(marks('sheet', 0)).toEqual(['one-reader']);
    expect(marks('sheet', BEGINS)).toEqual(['one-reader', 'barred']);
    expect(marks('embed', BEGINS)).toEqual(['barred']);
    expect(marks('release', BEGINS)).toEqual([]);
    expect(marks('sheet', ENDS)).toEqual(['one-reader']);
    desk.db.$client
      .prepare('update one_reader_releases set second_person_id = ?, second_at = 9')
      .run(people.reporter.personId);
    expect([listed(0)?.oneReader, marks('sheet', 0)]).toEqual([null, []]);
  });
});

function onScreen() {
  return getSheet(people.reporter, sheet, desk.ctx());
}

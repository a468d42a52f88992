import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { embargoEnd } from '@/components/lines/embargo-band';
import { enterBan, listBans } from '@/lib/services/bans/bans';
import { copyLines } from '@/lib/services/copy/copy-lines';
import { listCopyDesk } from '@/lib/services/copy/list-copy-desk';
import { answerEmbed } from '@/lib/services/embed/answer';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { listEmbeds } from '@/lib/services/embed/list-embeds';
import { liftEmbargo } from '@/lib/services/release/embargo';
import { getRelease } from '@/lib/services/release/get-release';
import { getSheetData } from '@/lib/services/sheet/sheet-data';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { freshDatabase, makePerson, NOW, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const ZONE = 'Europe/Vienna';
/** Vienna skips 02:00 to 03:00 on 28 March 2027 and repeats it on 25 October 2026. */
const EDGES = [
  ['the second before the hour that is skipped', '2027-03-28T01:59:59', Date.UTC(2027, 2, 28, 0, 59, 59)],
  ['the first second after the hour that is skipped', '2027-03-28T03:00:00', Date.UTC(2027, 2, 28, 1)],
  ['the second before the hour that is repeated', '2026-10-25T01:59:59', Date.UTC(2026, 9, 24, 23, 59, 59)],
  ['the first second after the hour that is repeated', '2026-10-25T03:00', Date.UTC(2026, 9, 25, 2)],
] as const;
/** In the two hours of one name only UTC can tell which is meant. */
const REPEATED = [
  ['the first of two equal hours', '2026-10-25T00:30:10', Date.UTC(2026, 9, 25, 0, 30, 10)],
  ['the second of two equal hours', '2026-10-25T01:30:10', Date.UTC(2026, 9, 25, 1, 30, 10)],
] as const;

let desk: TestDatabase;
let on: ReturnType<typeof sheetDesk>;
let people: Record<'reporter' | 'editor' | 'copyDesk', ReturnType<typeof makePerson>>;
let [releaseId, sheet, embed] = ['', '', ''];
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

function start(embargo: { local: string; zone: string } | null): void {
  releaseId = logRelease(desk.db, people.reporter, { embargo });
  sheet = on.cleared(people.reporter, people.editor, releaseId);
  embed = createEmbed(people.editor, { sheetId: sheet }, desk.ctx()).id;
}

/** What every channel answers at one instant. */
function channels(at: number) {
  const ctx = { db: desk.db, now: at };
  const allowed = (act: () => unknown) => {
    try {
      act();
      return true;
    } catch {
      return false;
    }
  };
  const copy = { id: sheet, kinds: ['headline'], form: 'plain' };
  return {
    embed: ['', '/chart.svg', '/data.json'].map(
      (part) =>
        answerEmbed({ path: `/embed/${embed}${part}`, query: new URLSearchParams(), headers: {} }, ctx)
          .status,
    ),
    copyDesk: listCopyDesk(people.copyDesk, { race: '', pollster: '' }, ctx).length,
    copied: allowed(() => copyLines(people.copyDesk, copy, ctx)),
    data: allowed(() => getSheetData(people.copyDesk, sheet, ctx)),
    state: listEmbeds(people.editor, ctx)[0]?.state,
    band: getSheet(people.editor, sheet, ctx).embargo?.isRunning,
  };
}
const CLOSED = {
  embed: [404, 404, 404],
  copyDesk: 0,
  copied: false,
  data: false,
  state: 'waiting',
  band: true,
};
const OPEN = { embed: [200, 200, 200], copyDesk: 1, copied: true, data: true, state: 'live', band: false };

describe('an embargo near a change of the clocks', () => {
  it.each([
    ...EDGES.map(([name, local, at]) => [name, local, ZONE, at] as const),
    ...REPEATED.map(([name, local, at]) => [name, local, 'UTC', at] as const),
  ])('at %s (%s in %s) ends in every channel in the same millisecond', (_, local, zone, at) => {
    start({ local, zone });
    expect(channels(at - 1)).toEqual(CLOSED);
    expect(channels(at)).toEqual(OPEN);
    expect(getRelease(people.reporter, releaseId, desk.ctx()).embargo).toMatchObject({ local, zone, at });
  });

  it.each([
    ['skipped', '2027-03-28T02:30:10', /does not exist/],
    ['repeated', '2026-10-25T02:30:10', /happens twice/],
  ])('is not guessed in the hour that is %s', (_, local, message) => {
    expect(() => start({ local, zone: ZONE })).toThrow(
      expect.objectContaining({ fields: { 'embargo.local': expect.stringMatching(message) } }),
    );
  });

  it('is shown to the second on both clocks, the repeated hour told apart by UTC', () => {
    expect(REPEATED.map(([, , at]) => embargoEnd({ at, zone: ZONE }))).toEqual([
      '25 October 2026, 02:30:10 in Europe/Vienna (00:30:10 UTC)',
      '25 October 2026, 02:30:10 in Europe/Vienna (01:30:10 UTC)',
    ]);
  });

  it.each(REPEATED)('is lifted early within %s, for a reason, in every channel at once', (_, __, at) => {
    start({ local: '2026-10-25T03:00', zone: ZONE });
    const lift = { id: releaseId, version: 1, reason: 'The pollster published it in the night.' };
    expect(channels(at)).toEqual(CLOSED);
    expect(refusal(() => liftEmbargo(people.reporter, lift, { db: desk.db, now: at }))[0]).toBe('forbidden');
    liftEmbargo(people.editor, lift, { db: desk.db, now: at });
    expect(channels(at)).toEqual(OPEN);
  });
});

describe('a ban near a change of the clocks', () => {
  const bar = (fromLocal: string, toLocal: string) =>
    enterBan(
      people.editor,
      {
        jurisdiction: 'Averil Coast',
        raceId: null,
        bars: 'all-figures',
        ...{ fromLocal, toLocal, zone: ZONE },
        rule: 'Electoral code, section 7, read by our lawyers.',
      },
      desk.ctx(),
    );
  const stands = (at: number) => {
    const { embed: statuses, copied } = channels(at);
    return { status: statuses[0], copied };
  };

  it.each([
    ['over the hour that is skipped, 30 minutes', '2027-03-28T01:45', '2027-03-28T03:15', 0.5],
    ['over the hour that is repeated, 150 minutes', '2026-10-25T01:45', '2026-10-25T03:15', 2.5],
  ])('holds sheets and takes charts down %s', (_, from, to, hours) => {
    start(null);
    bar(from, to);
    const [ban] = listBans(people.editor, desk.ctx());
    expect((ban!.toAt - ban!.fromAt) / 3_600_000).toBe(hours);
    const other = on.draft(people.reporter, releaseId);
    on.file(people.reporter, other);
    for (const at of [ban!.fromAt, ban!.toAt - 1]) {
      expect(stands(at)).toEqual({ status: 410, copied: false });
      expect(refusal(() => on.clear(people.editor, other, at - NOW))[1]).toContain('barred in Averil Coast');
    }
    for (const at of [ban!.fromAt - 1, ban!.toAt]) expect(stands(at)).toEqual({ status: 200, copied: true });
    expect(on.clear(people.editor, other, ban!.toAt - NOW).outcome).toBe('cleared');
  });

  it.each([
    ['2027-03-28T02:30', '2027-03-28T05:00', 'fromLocal'],
    ['2026-10-24T20:00', '2026-10-25T02:30', 'toLocal'],
  ])('is refused from %s to %s at the field that is skipped or repeated', (from, to, field) => {
    start(null);
    expect(() => bar(from, to)).toThrow(
      expect.objectContaining({ fields: { [field]: expect.stringMatching(/not exist|twice/) } }),
    );
  });
});

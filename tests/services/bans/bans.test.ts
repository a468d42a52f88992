import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { endBan, enterBan, listBans } from '@/lib/services/bans/bans';
import { copyLines } from '@/lib/services/copy/copy-lines';
import { answerEmbed } from '@/lib/services/embed/answer';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { getRelease } from '@/lib/services/release/get-release';
import { reviseSheet } from '@/lib/services/sheet/change-filed';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { freshDatabase, HOUR, makePerson, NOW, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

let desk: TestDatabase;
let on: ReturnType<typeof sheetDesk>;
let people: Record<'reporter' | 'editor' | 'copyDesk', ReturnType<typeof makePerson>>;
let [sheet, raceId, embed, releaseId]: string[] = [];

beforeEach(() => {
  desk = freshDatabase();
  on = sheetDesk(desk.db);
  people = {
    reporter: makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] }),
    editor: makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] }),
    copyDesk: makePerson(desk.db, { name: 'Tamsin Oake', roles: ['copy-desk'] }),
  };
  releaseId = logRelease(desk.db, people.reporter);
  raceId = getRelease(people.reporter, releaseId, desk.ctx()).facts.race.id;
  sheet = on.cleared(people.reporter, people.editor, releaseId);
  embed = createEmbed(people.editor, { sheetId: sheet }, desk.ctx()).id;
});
afterEach(() => desk.closeAndRemove());

/** From 12:00 to 20:00 in Vienna: 10:00 to 18:00 UTC, two to ten hours after the tests begin. */
const ban = (change: object = {}) => ({
  jurisdiction: 'Averil Coast',
  raceId,
  bars: 'new-figures',
  fromLocal: '2026-09-17T12:00',
  toLocal: '2026-09-17T20:00',
  zone: 'Europe/Vienna',
  rule: 'Electoral code, section 7, read by our lawyers.',
  ...change,
});
const [BEGINS, ENDS] = [2 * HOUR, 10 * HOUR];
const ask = (later: number, path = `/embed/${embed}`) =>
  answerEmbed({ path, query: new URLSearchParams(), headers: {} }, desk.ctx(later));
const copy = (later: number) =>
  copyLines(people.copyDesk, { id: sheet, kinds: ['headline'], form: 'plain' }, desk.ctx(later));

describe('a ban', () => {
  it('is entered and ended by editors, with a rule and a reason, and stays in the list', () => {
    for (const actor of [people.reporter, people.copyDesk])
      expect(refusal(() => enterBan(actor, ban(), desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => enterBan(people.editor, ban({ rule: 'law' }), desk.ctx()))[0]).toBe('invalid');
    expect(refusal(() => enterBan(people.editor, ban({ toLocal: '2026-09-17T12:00' }), desk.ctx()))[0]).toBe(
      'invalid',
    );
    expect(
      refusal(() => enterBan(people.editor, ban({ fromLocal: '2027-03-28T02:30' }), desk.ctx()))[0],
    ).toBe('invalid');
    const { id } = enterBan(people.editor, ban(), desk.ctx());
    const end = { id, reason: 'The court lifted the order today.' };
    expect(refusal(() => endBan(people.reporter, end, desk.ctx()))[0]).toBe('forbidden');
    endBan(people.editor, end, desk.ctx(BEGINS));
    expect(refusal(() => endBan(people.editor, end, desk.ctx(BEGINS)))[0]).toBe('conflict');
    expect(listBans(people.copyDesk, desk.ctx())[0]).toMatchObject({
      state: 'over',
      ended: { by: 'Marten Reed' },
    });
    expect(() => desk.db.$client.prepare("update publication_bans set rule = 'x'").run()).toThrow(
      /never rewritten/,
    );
    expect(() => desk.db.$client.prepare('delete from publication_bans').run()).toThrow(/kept/);
  });

  it('holds sheets from its first millisecond to its last, in the service and in the database', () => {
    enterBan(people.editor, ban(), desk.ctx());
    const other = on.draft(people.reporter, releaseId!);
    on.file(people.reporter, other);
    copy(BEGINS - 1);
    for (const later of [BEGINS, ENDS - 1]) {
      expect(refusal(() => copy(later))[1]).toContain(
        'barred in Averil Coast until 17 September 2026, 20:00',
      );
      expect(refusal(() => on.clear(people.editor, other, later))[0]).toBe('conflict');
    }
    const filing = desk.db.$client
      .prepare("select * from clearings where act = 'filed' order by id desc")
      .get() as {
      sheet_id: number;
      evidence_id: number;
    };
    const raw = () =>
      desk.db.$client
        .prepare(
          "insert into clearings (public_id, sheet_id, evidence_id, act, person_id, roles, at) values ('raw', ?, ?, 'cleared', ?, '[\"editor\"]', ?)",
        )
        .run(filing.sheet_id, filing.evidence_id, people.editor.personId, NOW + BEGINS);
    expect(raw).toThrow(/publication is barred/);
    expect(getSheet(people.editor, other, desk.ctx(BEGINS)).desk.holds[0]?.jurisdiction).toBe('Averil Coast');
    copy(ENDS);
    expect(on.clear(people.editor, other, ENDS).outcome).toBe('cleared');
  });

  it('on every race that ends in a vote holds this one too, and one on another race does not', () => {
    const elsewhere = logRelease(desk.db, people.reporter, {
      race: {
        kind: 'new',
        race: {
          name: 'Harbour approval',
          kind: 'approval',
          options: ['Alder', 'Brook', 'Someone else'],
          thresholds: [],
        },
      },
    });
    const other = getRelease(people.reporter, elsewhere, desk.ctx()).facts.race.id;
    enterBan(people.editor, ban({ raceId: other }), desk.ctx());
    copy(BEGINS);
    enterBan(people.editor, ban({ raceId: null }), desk.ctx());
    expect(refusal(() => copy(BEGINS))[0]).toBe('conflict');
  });
});

describe('a public chart under a ban', () => {
  it('stays as it was where only new figures are barred, and shows nothing that came after', () => {
    const before = ask(0);
    enterBan(people.editor, ban(), desk.ctx());
    expect(ask(BEGINS)).toMatchObject({ status: 200, body: before.body });
    reviseSheet(
      people.reporter,
      { id: sheet, version: getSheet(people.reporter, sheet!, desk.ctx()).version },
      desk.ctx(),
    );
    on.file(people.reporter, sheet!, { headline: 'Other words' });
    on.clear(people.editor, sheet!, BEGINS - 1);
    enterBan(people.editor, ban({ fromLocal: '2026-09-17T10:30' }), desk.ctx());
    expect(ask(BEGINS)).toMatchObject({ status: 200, body: before.body });
    expect(ask(BEGINS, `/embed/${embed}@2`).status).toBe(404);
    expect(ask(ENDS).body).not.toEqual(before.body);
  });

  it('is taken down without a figure where all are barred, and back afterwards', () => {
    enterBan(people.editor, ban({ bars: 'all-figures' }), desk.ctx());
    for (const part of ['', '/chart.svg', '/data.json']) {
      const held = ask(BEGINS, `/embed/${embed}${part}`);
      expect([held.status, held.headers['Cache-Control']]).toEqual([410, 'no-store']);
      expect(String(held.body).replace(/<style>.*<\/style>|#\w+/gs, '')).not.toMatch(/47|41|Alder/);
    }
    expect(ask(ENDS).status).toBe(200);
  });

  it('is kept by no cache beyond the moment at which a ban begins', () => {
    enterBan(people.editor, ban({ bars: 'all-figures' }), desk.ctx());
    const lifetimes = (later: number) => ask(later).headers['Cache-Control']?.match(/\d+/g)?.map(Number);
    expect(lifetimes(0)).toEqual([30, 30, 300]);
    expect(lifetimes(BEGINS - 100_000)).toEqual([30, 30, 70]);
    expect(lifetimes(BEGINS - 40_500)).toEqual([30, 10, 10]);
    expect(lifetimes(BEGINS - 999)).toEqual([0, 0, 0]);
  });
});

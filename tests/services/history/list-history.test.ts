import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { listEmbargoViews } from '@/db/queries/embargo';
import { findRelease } from '@/db/queries/release';
import type { Role } from '@/lib/domain/roles';
import { listHistory, PAGE_SIZE } from '@/lib/services/history/list-history';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { addPerson } from '@/lib/services/people/add-person';
import { liftEmbargo, setEmbargoReader } from '@/lib/services/release/embargo';
import { freshDatabase, HOUR, makePerson, NOW } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease, sharesOf } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const person = (name: string, ...roles: Role[]) => makePerson(desk.db, { name, roles });
const administrator = person('Ada Fenn', 'administrator');
const editor = person('Edda Marsh', 'editor');
const otherEditor = person('Isolde Varn', 'editor');
const on = sheetDesk(desk.db);
const reporter = person('Rolf Quill', 'reporter');
const copyDesk = person('Cora Pell', 'copy-desk');
const both = person('Bela Tarn', 'administrator', 'reporter');

/** Ten minutes past the hour, two hours after NOW, as typed in a form in UTC. */
const embargo = { local: '2026-09-17T10:10', zone: 'Etc/UTC' };
const LIFTS = 2 * HOUR + 10 * 60_000;

describe('the history', () => {
  it('is open to reporters, editors and administrators, and to nobody else', () => {
    for (const reader of [reporter, editor, administrator])
      expect(listHistory(reader, {}, desk.ctx()).entries.length).toBeGreaterThan(0);
    expect(refusal(() => listHistory(copyDesk, {}, desk.ctx()))[0]).toBe('forbidden');
  });

  it('tells who did what, when, before, after and why, newest first', () => {
    const { entries, head } = listHistory(editor, {}, desk.ctx());
    expect(entries.map(({ seq }) => seq)).toEqual([2, 1]);
    expect(entries[1]).toMatchObject({
      seq: 1,
      at: NOW,
      person: 'Leadline',
      action: 'set policy',
      entity: 'policy',
      before: null,
      reason: null,
      hidden: false,
    });
    expect(head).toEqual({ seq: 2, hash: entries[0]?.hash });
  });

  it.each([
    ['before', { before: '0' }],
    ['before', { before: 'x' }],
    ['entityId', { entityId: ['a', 'b'] }],
    ['', { page: '2' }],
  ])('refuses an address that no page leads to, at %s', (_, input) => {
    expect(refusal(() => listHistory(editor, input, desk.ctx()))[0]).toBe('invalid');
  });
});

describe('what an embargo hides', () => {
  let early: string;
  let listed: string;

  beforeAll(() => {
    early = logRelease(desk.db, editor, { embargo });
    listed = logRelease(desk.db, editor, { embargo, race: anotherRace('Bridge toll') });
    setEmbargoReader(editor, { id: listed, personId: administrator.publicId, listed: true }, desk.ctx());
  });

  const entryOf = (id: string, reader: typeof editor, later = 0) =>
    listHistory(reader, { entityId: id }, desk.ctx(later)).entries.at(-1)!;

  it('is what changed, from an administrator, until the hour', () => {
    expect(entryOf(early, administrator)).toMatchObject({
      action: 'logged release',
      person: 'Edda Marsh',
      before: null,
      after: null,
      reason: null,
      hidden: true,
    });
    expect(entryOf(early, administrator, LIFTS - 1).hidden).toBe(true);
    expect(entryOf(early, administrator, LIFTS)).toMatchObject({ hidden: false, after: expect.anything() });
  });

  it('is nothing from a reporter, an editor, or an administrator who is one of them too', () => {
    for (const reader of [reporter, editor, both]) expect(entryOf(early, reader).hidden).toBe(false);
  });

  it('is nothing from an administrator on the embargo list of that release', () => {
    expect(entryOf(listed, administrator).hidden).toBe(false);
    expect(entryOf(early, administrator).hidden).toBe(true);
  });

  it('is the race that an early release brought with it', () => {
    const name = 'Quay levy';
    const race = {
      kind: 'new' as const,
      race: { name, kind: 'issue' as const, options: ['For'], thresholds: [] },
    };
    logRelease(desk.db, editor, { embargo, race, shares: sharesOf([['For', '51']]) });
    const added = (later: number) =>
      listHistory(administrator, { entity: 'race' }, desk.ctx(later)).entries[0]!;
    expect(added(LIFTS - 1)).toMatchObject({ action: 'added race', hidden: true, after: null });
    expect(added(LIFTS)).toMatchObject({ hidden: false, after: { name } });
  });

  it('is read from its list by name only, and each such reading is recorded', () => {
    const release = findRelease(desk.db, listed, editor, desk.ctx().now)!;
    const before = listEmbargoViews(desk.db, release.id).length;
    listHistory(editor, { entityId: listed }, desk.ctx(5));
    listHistory(administrator, { entityId: listed }, desk.ctx(7));
    expect(listEmbargoViews(desk.db, release.id).slice(before)).toEqual([
      { name: administrator.name, at: desk.ctx(7).now, what: 'history' },
    ]);
  });

  it('leaves no figure of the release anywhere in the page', () => {
    const page = JSON.stringify(listHistory(administrator, { entityId: early }, desk.ctx()));
    expect(page).not.toMatch(/Alder|Kelmouth|1012/);
  });

  it('ends at once when an editor lifts it, and the reason is told', () => {
    const reason = 'The pollster put it on its own page.';
    liftEmbargo(editor, { id: early, version: 1, reason }, desk.ctx());
    expect(entryOf(early, administrator).hidden).toBe(false);
    const [newest] = listHistory(administrator, { entityId: early }, desk.ctx()).entries;
    expect(newest).toMatchObject({ action: 'lifted embargo', reason });
  });
});

describe('what an entry is about', () => {
  const abouts = (reader: typeof editor, entityId: string, later = 0) =>
    new Set(listHistory(reader, { entityId }, desk.ctx(later)).entries.map(({ about }) => about));

  it('is named by race and pollster for a release, its sheets and its embeds', () => {
    const release = logRelease(desk.db, editor, { race: anotherRace('Harbour board') });
    const sheet = on.cleared(editor, otherEditor, release);
    const embed = createEmbed(editor, { sheetId: sheet }, desk.ctx()).id;
    for (const id of [release, sheet, embed])
      for (const reader of [reporter, administrator])
        expect(abouts(reader, id)).toEqual(new Set(['Harbour board, Kelmouth Research']));
  });

  it('is not named, while an embargo holds, to who may not see the release', () => {
    const release = logRelease(desk.db, editor, { embargo, race: anotherRace('Ferry fares') });
    const sheet = on.draft(editor, release);
    for (const id of [release, sheet]) {
      expect(abouts(administrator, id, LIFTS - 1)).toEqual(new Set([null]));
      expect(abouts(administrator, id, LIFTS)).toEqual(new Set(['Ferry fares, Kelmouth Research']));
      expect(abouts(reporter, id)).toEqual(new Set(['Ferry fares, Kelmouth Research']));
    }
    const page = JSON.stringify(listHistory(administrator, { entity: 'sheet' }, desk.ctx()));
    expect(page).not.toContain('Ferry fares');
  });

  it('is a person by name, and nothing more is said of anything else', () => {
    const added = { name: 'Nora Sill', email: 'nora@courier.example', roles: ['reporter'] };
    addPerson(administrator, added, desk.ctx());
    const newest = (entity: string) => listHistory(administrator, { entity }, desk.ctx()).entries[0]?.about;
    expect(newest('person')).toBe('Nora Sill');
    expect(newest('policy')).toBeNull();
    expect(newest('race')).toBeNull();
  });
});

describe('paging', () => {
  beforeAll(() => {
    for (let count = 0; count < PAGE_SIZE + 5; count += 1) {
      const added = { name: `Reader ${count}`, email: `r${count}@courier.example`, roles: ['reporter'] };
      addPerson(administrator, added, desk.ctx());
    }
  });

  it('goes through everything once, without a gap', () => {
    const seen: number[] = [];
    let before: number | null = null;
    do {
      const page = listHistory(editor, before === null ? {} : { before: String(before) }, desk.ctx());
      seen.push(...page.entries.map(({ seq }) => seq));
      before = page.older;
    } while (before !== null);
    expect(seen).toEqual(Array.from({ length: seen.length }, (_, at) => seen.length - at));
    expect(seen.length).toBeGreaterThan(PAGE_SIZE);
  });

  it('stays with one thing when asked for it', () => {
    const { entries, older } = listHistory(editor, { entity: 'policy', entityId: '1' }, desk.ctx());
    expect(entries.map(({ action }) => action)).toEqual(['set policy']);
    expect(older).toBeNull();
  });
});

function anotherRace(name: string) {
  return {
    kind: 'new' as const,
    race: {
      name,
      kind: 'candidate' as const,
      options: ['Alder', 'Brook', 'Someone else'],
      thresholds: [],
    },
  };
}

import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { listEmbargoViews } from '@/db/queries/embargo';
import { listAllRecords } from '@/db/queries/record';
import { findRelease } from '@/db/queries/release';
import { copyLines } from '@/lib/services/copy/copy-lines';
import { listCopyDesk } from '@/lib/services/copy/list-copy-desk';
import { liftEmbargo, setEmbargoReader } from '@/lib/services/release/embargo';
import { getRelease } from '@/lib/services/release/get-release';
import { freshDatabase, HOUR, makePerson } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { GOVERNOR, logRelease, releaseForm } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const { db } = desk;
const on = sheetDesk(db);
const reporter = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
const copyDesk = makePerson(db, { name: 'Tamsin Oake', roles: ['copy-desk'] });
const named = makePerson(db, { name: 'Wil Arden', roles: ['copy-desk'] });
const administrator = makePerson(db, { name: 'Ned Harrow', roles: ['administrator'] });

const all = { race: '', pollster: '' };
const listed = (actor: typeof editor, search = all, later = 0) =>
  listCopyDesk(actor, search, desk.ctx(later)).map(({ id }) => id);
const copy = (actor: typeof editor, id: string, change: object = {}, later = 0) =>
  copyLines(actor, { id, kinds: ['body'], form: 'plain', ...change }, desk.ctx(later));

let openRelease: string;
let open: string;
let newer: string;
let embargoed: string;
let embargoedRelease: string;

beforeAll(() => {
  openRelease = logRelease(db, reporter);
  open = on.cleared(reporter, editor, openRelease, 1000);
  const bridge = {
    ...GOVERNOR,
    race: { ...(GOVERNOR as { race: object }).race, name: 'Bridge toll' },
  } as typeof GOVERNOR;
  newer = on.cleared(
    reporter,
    editor,
    logRelease(db, reporter, { race: bridge, pollster: 'Norwater Polls' }),
    2000,
  );
  const assembly = {
    ...GOVERNOR,
    race: { ...(GOVERNOR as { race: object }).race, name: 'Assembly' },
  } as typeof GOVERNOR;
  const embargo = { local: '2026-09-17T12:00', zone: 'Etc/UTC' };
  embargoedRelease = logRelease(db, reporter, { ...releaseForm(), race: assembly, embargo });
  embargoed = on.cleared(reporter, editor, embargoedRelease, 3000);
});

describe('the copy desk', () => {
  it('has cleared sheets, the one cleared last on top, however often the others were changed', () => {
    expect(listed(copyDesk)).toEqual([newer, open]);
  });

  it('is searched by race and pollster, in any case', () => {
    expect(listed(copyDesk, { race: 'BRIDGE', pollster: '' })).toEqual([newer]);
    expect(listed(copyDesk, { race: '', pollster: 'kelmouth' })).toEqual([open]);
    expect(listed(copyDesk, { race: '%', pollster: '' })).toEqual([]);
  });

  it('has nothing that is filed or drafted only', () => {
    const draft = on.draft(reporter, embargoedRelease);
    on.file(reporter, draft);
    expect(listed(editor)).not.toContain(draft);
  });

  it('is closed to people without a role', () => {
    const nobody = { ...administrator, roles: [] };
    expect(refusal(() => listed(nobody))[0]).toBe('forbidden');
    expect(refusal(() => copy(nobody, open))[0]).toBe('forbidden');
  });
});

describe('copying', () => {
  it('gives plain words, rich text or Markdown, and records who took what', () => {
    const { plain, html } = copy(copyDesk, open, { kinds: ['body', 'caveat'], form: 'rich' });
    expect(plain.split('\n\n').length).toBeGreaterThan(1);
    expect(html).toMatch(/^<p>.*<\/p>$/s);
    expect(copy(copyDesk, open, { form: 'markdown' }).html).toBeNull();
    expect(copy(copyDesk, open)).toMatchObject({ html: null });
    expect(listAllRecords(db).at(-1)).toMatchObject({
      action: 'copied',
      entityId: open,
      personId: copyDesk.personId,
      after: '{"form":"plain","kinds":["body"],"underEmbargo":false}',
    });
    const rows = db.$client.prepare('select form, under_embargo from copies where person_id = ?');
    expect(rows.all(copyDesk.personId)).toHaveLength(4);
  });

  it('is refused for words that are not cleared, unknown, or asked for in another form', () => {
    const draft = on.draft(reporter, openRelease);
    expect(refusal(() => copy(reporter, draft))[0]).toBe('conflict');
    expect(refusal(() => copy(copyDesk, 'nothing'))[0]).toBe('not-found');
    expect(refusal(() => copy(copyDesk, open, { form: 'pdf' }))[0]).toBe('invalid');
    expect(refusal(() => copy(copyDesk, open, { kinds: [] }))[0]).toBe('invalid');
  });
});

describe('under embargo', () => {
  const list = (personId: string | null, isListed: boolean) =>
    setEmbargoReader(editor, { id: embargoedRelease, personId, listed: isListed }, desk.ctx());

  it('an administrator sees and copies only what the list opens to that person', () => {
    expect(listed(administrator)).toEqual([newer, open]);
    expect(refusal(() => copy(administrator, embargoed))[0]).toBe('not-found');
    list(administrator.publicId, true);
    expect(listed(administrator)).toEqual([embargoed, newer, open]);
    expect(copy(administrator, embargoed).plain).not.toBe('');
    list(administrator.publicId, false);
    expect(listed(administrator)).toEqual([newer, open]);
  });

  it('the copy desk is blind, and reporters and editors see but do not copy', () => {
    expect(listed(copyDesk)).not.toContain(embargoed);
    expect(refusal(() => copy(copyDesk, embargoed))[0]).toBe('not-found');
    const [first] = listCopyDesk(editor, all, desk.ctx());
    expect(first).toMatchObject({ id: embargoed, mayCopy: false, embargo: { isRunning: true } });
    for (const actor of [editor, reporter])
      expect(refusal(() => copy(actor, embargoed))).toEqual([
        'forbidden',
        'This release is under embargo. Only people on its list copy from it before the hour.',
      ]);
  });

  it('whoever is on the list reads and copies, and both are recorded', () => {
    list(named.publicId, true);
    expect(listed(named)).toContain(embargoed);
    expect(listed(copyDesk)).not.toContain(embargoed);
    expect(copy(named, embargoed).plain).not.toBe('');
    const release = findRelease(db, embargoedRelease, editor, desk.ctx().now)!;
    expect(listEmbargoViews(db, release.id)).toContainEqual({
      name: 'Wil Arden',
      at: desk.ctx().now,
      what: `copy desk: sheet ${embargoed}`,
    });
    const told = (actor: typeof editor) => getRelease(actor, embargoedRelease, desk.ctx()).embargoViews;
    expect(told(editor)).toContainEqual({ name: 'Wil Arden', count: 1, lastAt: desk.ctx().now });
    expect(told(reporter)).toEqual([]);
    const row = db.$client.prepare('select under_embargo as under from copies order by id desc limit 1');
    expect(row.get()).toEqual({ under: 1 });
    list(named.publicId, false);
    expect(listed(named)).not.toContain(embargoed);
    expect(refusal(() => copy(named, embargoed))[0]).toBe('not-found');
  });

  it('the copy desk as a whole can be on the list, which is not yet an editor’s copy', () => {
    list(null, true);
    expect(copy(copyDesk, embargoed).plain).not.toBe('');
    expect(refusal(() => copy(editor, embargoed))[0]).toBe('forbidden');
    list(editor.publicId, true);
    expect(copy(editor, embargoed).plain).not.toBe('');
    list(null, false);
    list(editor.publicId, false);
  });

  it('everybody copies once the hour has come', () => {
    expect(listed(copyDesk, all, 4 * HOUR - 1)).not.toContain(embargoed);
    expect(listed(copyDesk, all, 4 * HOUR)).toContain(embargoed);
    expect(copy(copyDesk, embargoed, {}, 4 * HOUR).plain).not.toBe('');
  });

  it('everybody copies once an editor has lifted it, with a reason', () => {
    const release = findRelease(db, embargoedRelease, editor, desk.ctx().now)!;
    const input = {
      id: embargoedRelease,
      version: release.version,
      reason: 'Another paper broke it at nine.',
    };
    expect(refusal(() => liftEmbargo(reporter, input, desk.ctx()))[0]).toBe('forbidden');
    liftEmbargo(editor, input, desk.ctx());
    expect(copy(copyDesk, embargoed).plain).not.toBe('');
  });
});

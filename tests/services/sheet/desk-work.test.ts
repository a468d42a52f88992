import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { insertHouseStyle } from '@/db/queries/desk';
import { findLatestHouseStyle } from '@/db/queries/desk';
import { listAllRecords } from '@/db/queries/record';
import { sheets } from '@/db/schema/sheets';
import { insertSheet } from '@/db/queries/sheet';
import { write } from '@/db/write';
import { newId } from '@/lib/security/ids';
import { addComment, resolveComment } from '@/lib/services/sheet/comment';
import { sendBack } from '@/lib/services/sheet/clear-sheet';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { markReviewed } from '@/lib/services/sheet/languages';
import { listOpenSheets } from '@/lib/services/sheet/list-open-sheets';
import { markPresent, PRESENT_MS } from '@/lib/services/sheet/presence';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { getSheetData } from '@/lib/services/sheet/sheet-data';
import { setTerms } from '@/lib/services/sheet/terms';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease, sharesOf } from '@/tests/support/release';
import { getRelease } from '@/lib/services/release/get-release';
import { LEAD, sheetDesk } from '@/tests/support/sheet';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);
const { db } = desk;
const on = sheetDesk(db);
const reporter = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const colleague = makePerson(db, { name: 'Jory Quent', roles: ['reporter'] });
const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
const otherEditor = makePerson(db, { name: 'Isolde Varn', roles: ['editor'] });
const copyDesk = makePerson(db, { name: 'Tamsin Oake', roles: ['copy-desk'] });
const releaseId = logRelease(db, reporter);
const MINUTE = 60_000;

let id: string;
beforeEach(() => {
  id = on.draft(reporter, releaseId);
});
const see = (actor = reporter, later = 0) => getSheet(actor, id, desk.ctx(later));
const textOf = (kind: string) => see().lines.find((line) => line.kind === kind)!.text;
const note = (actor = reporter, quote = 'Alder', body = 'Say which Alder.') => {
  const start = textOf('headline').indexOf(quote);
  return addComment(
    actor,
    { id, kind: 'headline', start, end: start + quote.length, quote, body },
    desk.ctx(),
  ).id;
};

describe('a comment on a passage', () => {
  it('is found again when the words change, and says so when they are gone', () => {
    note();
    on.file(reporter, id, { headline: 'In this poll it is Alder, 47 to 41' });
    expect(see().desk.comments[0]).toMatchObject({
      by: 'Rhea Quill',
      anchor: { kind: 'placed', start: 19, end: 24 },
    });
    on.sendBack(editor, id, 'Name nobody.');
    on.file(reporter, id, { headline: 'Two are near each other' });
    expect(see().desk.comments[0]?.anchor).toEqual({ kind: 'changed' });
  });

  it('is in the history, and in no evidence and no public answer', () => {
    const body = 'A secret between the two of us.';
    note(reporter, 'Alder', body);
    on.file(reporter, id);
    on.clear(editor, id);
    expect(
      listAllRecords(db).some(
        ({ action, after }) => action === 'commented on sheet' && after?.includes(body),
      ),
    ).toBe(true);
    const bytes = db.$client.prepare('select bytes from evidence').all() as { bytes: Buffer }[];
    expect(bytes.some((row) => row.bytes.toString('utf8').includes(body))).toBe(false);
    expect(JSON.stringify(getSheetData(copyDesk, id, desk.ctx()))).not.toContain(body);
  });

  it('is made by reporters and editors on words that stand there, while they are written or read', () => {
    const made = { id, kind: 'headline', start: 0, end: 5, quote: 'Nope!', body: 'x' };
    expect(refusal(() => addComment(copyDesk, made, desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => addComment(editor, made, desk.ctx()))[0]).toBe('conflict');
    on.file(reporter, id);
    on.clear(editor, id);
    expect(refusal(() => note(editor))[1]).toBe('Comments are made while words are being written or read.');
  });

  it('is settled once, by who made it, the author or an editor', () => {
    const [first, second] = [note(editor), note(colleague)];
    expect(refusal(() => resolveComment(colleague, { id: first }, desk.ctx()))[0]).toBe('forbidden');
    resolveComment(reporter, { id: first }, desk.ctx());
    resolveComment(colleague, { id: second }, desk.ctx());
    expect(refusal(() => resolveComment(editor, { id: first }, desk.ctx()))[0]).toBe('conflict');
    expect(see().desk.comments.map(({ resolved }) => resolved?.by)).toEqual(['Rhea Quill', 'Jory Quent']);
    expect(() => db.$client.prepare("update line_comments set body = 'other'").run()).toThrow(
      /never rewritten/,
    );
  });

  it('changes no agreement: a sheet is cleared on the hash from before it', () => {
    on.file(reporter, id);
    const hash = on.hashOf(editor, id);
    note(editor);
    expect(on.hashOf(editor, id)).toBe(hash);
    expect(on.clear(editor, id).outcome).toBe('cleared');
  });
});

describe('a sheet that is sent back', () => {
  it('carries a reason for single lines, and needs at least one of any kind', () => {
    on.file(reporter, id);
    const hash = on.hashOf(editor, id);
    const back = { id, hash, comment: '' };
    expect(refusal(() => sendBack(editor, back, desk.ctx()))[0]).toBe('invalid');
    const lines = [{ kind: 'body', reason: 'The base is missing.' }];
    expect(refusal(() => sendBack(editor, { ...back, lines: [...lines, ...lines] }, desk.ctx()))[0]).toBe(
      'invalid',
    );
    sendBack(editor, { ...back, lines }, desk.ctx());
    expect(see().desk.lineReasons).toEqual(lines);
  });
});

describe('the time by which a sheet is wanted', () => {
  const at = (local: string, zone = 'Europe/Vienna') => ({ id, wanted: { local, zone }, shelfDays: null });

  it('orders the queue: overdue first, then the nearest, then what nobody set a time for', () => {
    const [soon, late] = [id, on.draft(reporter, releaseId)];
    setTerms(reporter, { ...at('2026-09-17T11:30'), id: soon }, desk.ctx());
    setTerms(editor, { ...at('2026-09-17T10:30'), id: late }, desk.ctx());
    const none = on.draft(reporter, releaseId);
    const order = listOpenSheets(reporter, desk.ctx(40 * MINUTE)).map((sheet) => sheet.id);
    expect(order.slice(0, 2)).toEqual([late, soon]);
    expect(order.indexOf(none)).toBeGreaterThan(1);
  });

  it('is a wall time that exists once, told as typed', () => {
    for (const [local, message] of [
      ['2027-03-28T02:30', /does not exist/],
      ['2026-10-25T02:30', /happens twice/],
      ['2026-09-17T09:59', /has passed/],
    ] as const) {
      const ask = () => setTerms(reporter, at(local), desk.ctx());
      expect(ask).toThrow(
        expect.objectContaining({ fields: { 'wanted.local': expect.stringMatching(message) } }),
      );
    }
    setTerms(reporter, at('2026-10-25T03:30'), desk.ctx());
    expect(see().desk.wanted).toEqual({
      at: Date.UTC(2026, 9, 25, 2, 30),
      local: '2026-10-25T03:30',
      zone: 'Europe/Vienna',
    });
  });

  it('is set by its author and editors, and not on pulled words', () => {
    const terms = at('2026-09-18T10:00');
    expect(refusal(() => setTerms(copyDesk, terms, desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => setTerms(colleague, terms, desk.ctx()))[0]).toBe('forbidden');
    on.file(reporter, id);
    on.clear(editor, id);
    pullSheet(editor, { id, reason: 'The pollster checks a batch.' }, desk.ctx());
    expect(refusal(() => setTerms(editor, terms, desk.ctx()))[0]).toBe('conflict');
  });
});

describe('an open page', () => {
  it('is told to others for 45 seconds, and locks nobody out', () => {
    markPresent(editor, { id, doing: 'reading' }, desk.ctx());
    const others = (later: number) =>
      markPresent(otherEditor, { id, doing: 'writing' }, desk.ctx(later)).others;
    expect(others(PRESENT_MS - 1)).toEqual([{ name: 'Marten Reed', doing: 'reading' }]);
    expect(others(PRESENT_MS)).toEqual([]);
    expect(refusal(() => markPresent(copyDesk, { id, doing: 'reading' }, desk.ctx()))[0]).toBe('forbidden');
  });

  it('of a second reader stops the clock of a filing; without one it escalates after ten minutes', () => {
    on.file(reporter, id);
    const look = (later: number) =>
      listOpenSheets(editor, desk.ctx(later)).find((sheet) => sheet.id === id)?.look;
    for (const actor of [reporter, colleague]) markPresent(actor, { id, doing: 'reading' }, desk.ctx(MINUTE));
    expect(look(10 * MINUTE - 1)?.kind).toBe('waiting');
    expect(look(10 * MINUTE)).toEqual({ kind: 'escalated', since: desk.ctx(10 * MINUTE).now });
    markPresent(editor, { id, doing: 'reading' }, desk.ctx(11 * MINUTE));
    markPresent(otherEditor, { id, doing: 'reading' }, desk.ctx(12 * MINUTE));
    expect(look(30 * MINUTE)).toEqual({ kind: 'looked-at', at: desk.ctx(11 * MINUTE).now });
    expect(() => db.$client.prepare('update sheet_looks set at = 1').run()).toThrow(/never rewritten/);
  });
});

describe('the same claim in another language', () => {
  /** The other language as its rows stand; its words are written by people who read it. */
  function sibling(): string {
    const own = db
      .select()
      .from(sheets)
      .all()
      .find((row) => row.publicId === id)!;
    const { id: _, ...row } = own;
    return write(db, (tx) =>
      insertSheet(tx, { ...row, publicId: newId(), submissionKey: newId(), language: 'es' }),
    ).publicId;
  }
  const reviewsOf = (sheet: string) => listReviews(sheet);
  const listReviews = (sheet: string) =>
    db.$client
      .prepare(
        'select r.cause, r.settled_as as settled from sheet_reviews r join sheets s on s.id = r.sheet_id where s.public_id = ? order by r.id',
      )
      .all(sheet) as { cause: string; settled: string | null }[];

  it('needs review when this one is changed, cleared anew or pulled, never at its first filing and clearing', () => {
    const other = sibling();
    on.file(reporter, id);
    on.clear(editor, id);
    expect(reviewsOf(other)).toEqual([]);
    pullSheet(editor, { id, reason: 'The pollster checks a batch.' }, desk.ctx());
    expect(reviewsOf(other)).toEqual([{ cause: 'pulled', settled: null }]);
    markReviewed(reporter, { id: other }, desk.ctx());
    expect(reviewsOf(other)).toEqual([{ cause: 'pulled', settled: 'reviewed' }]);
    expect(refusal(() => markReviewed(reporter, { id: other }, desk.ctx()))[0]).toBe('conflict');
    expect(refusal(() => markReviewed(copyDesk, { id: other }, desk.ctx()))[0]).toBe('forbidden');
  });

  it('is settled by being filed anew', () => {
    const other = sibling();
    on.file(reporter, id);
    on.sendBack(editor, id, 'Name the pollster.');
    on.file(reporter, id);
    expect(reviewsOf(other)).toEqual([{ cause: 'changed', settled: null }]);
    expect(see().desk.siblings.map(({ language }) => language)).toContain('es');
  });
});

describe('cleared words', () => {
  const reasons = (later = 0) => see(reporter, later).desk.currency?.reasons.map(({ reason }) => reason);

  it('stop being current with a later comparable release, a shorter shelf, or a verb taken off the rung', () => {
    on.file(reporter, id, { body: 'It is too near to say in this poll.' });
    on.clear(editor, id);
    expect(reasons()).toEqual([]);
    setTerms(editor, { id, wanted: null, shelfDays: 5 }, desk.ctx());
    expect(see().desk.currency?.reasons).toEqual([]);
    expect(reasons(24 * 60 * MINUTE)).toEqual(['shelf-life']);
    const race = { kind: 'existing' as const, id: getRelease(reporter, releaseId, desk.ctx()).facts.race.id };
    logRelease(db, reporter, {
      race,
      fieldStartOn: '2026-09-14',
      fieldEndOn: '2026-09-16',
      publishedOn: '2026-09-17',
      shares: sharesOf([
        ['Alder', '48'],
        ['Brook', '40'],
        ['Someone else', '4'],
        ['Don’t know', '8', false],
      ]),
    });
    expect(reasons()).toEqual(['newer-release']);
    const style = JSON.parse(findLatestHouseStyle(db)!.body) as { ladder: Record<string, string[]> };
    const ladder = { ...style.ladder, 'does-not-hold': ['level'] };
    write(db, (tx) => insertHouseStyle(tx, JSON.stringify({ ...style, ladder }), desk.ctx().now));
    expect(see().desk.currency?.reasons).toContainEqual({
      reason: 'ladder',
      words: expect.arrayContaining(['too near']) as string[],
    });
    const data = getSheetData(copyDesk, id, desk.ctx());
    expect(data.cleared?.currency.isCurrent).toBe(false);
    expect(data).not.toHaveProperty('author');
  });

  it('are all that the copy desk gets as data; a draft does not exist for it', () => {
    expect(refusal(() => getSheetData(copyDesk, id, desk.ctx()))[0]).toBe('not-found');
    expect(getSheetData(reporter, id, desk.ctx())).toMatchObject({ cleared: null, state: 'draft' });
    expect(LEAD).toBe(see().claimKey);
  });
});

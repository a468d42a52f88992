import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { answerEmbed } from '@/lib/services/embed/answer';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { listCopyDesk } from '@/lib/services/copy/list-copy-desk';
import { reviseSheet } from '@/lib/services/sheet/change-filed';
import { sendBack } from '@/lib/services/sheet/clear-sheet';
import { saveLines } from '@/lib/services/sheet/edit-lines';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { listOpenSheets } from '@/lib/services/sheet/list-open-sheets';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const { db } = desk;
const on = sheetDesk(db);
const reporter = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const colleague = makePerson(db, { name: 'Jory Quent', roles: ['reporter'] });
const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
const copyDesk = makePerson(db, { name: 'Tamsin Oake', roles: ['copy-desk'] });
const releaseId = logRelease(db, reporter);
const reason = 'The pollster is checking a batch of interviews.';

let id: string;
beforeEach(() => {
  id = on.cleared(reporter, editor, releaseId);
});

const see = (actor = reporter) => getSheet(actor, id, desk.ctx());
const printed = (kind: string) =>
  listCopyDesk(copyDesk, { race: '', pollster: '' }, desk.ctx())
    .find((sheet) => sheet.id === id)
    ?.lines.find((line) => line.kind === kind)?.text;
const statusOf = (path: string) =>
  answerEmbed({ path, query: new URLSearchParams(), headers: {} }, desk.ctx()).status;

describe('a second version', () => {
  it('leaves the first in print until it is cleared, and supersedes it then', () => {
    const embed = createEmbed(copyDesk, { sheetId: id }, desk.ctx()).id;
    const first = printed('body');
    reviseSheet(reporter, { id, version: see().version }, desk.ctx());
    expect(see()).toMatchObject({ state: 'draft', isServed: true });
    on.file(reporter, id, { body: 'Second words about the same poll.', 'chart-title': 'Second title' });
    expect(printed('body')).toBe(first);
    on.clear(editor, id);
    expect(printed('body')).toBe('Second words about the same poll.');

    const page = (path: string) => {
      const { body } = answerEmbed({ path, query: new URLSearchParams(), headers: {} }, desk.ctx());
      return Buffer.from(body ?? '').toString('utf8');
    };
    expect(page(`/embed/${embed}`)).toContain('Second title');
    expect(page(`/embed/${embed}@1`)).not.toContain('Second title');
    expect(page(`/embed/${embed}@2`)).toContain('Second title');
    const linkOf = (path: string) =>
      answerEmbed({ path, query: new URLSearchParams(), headers: {} }, desk.ctx()).headers.Link;
    expect(linkOf(`/embed/${embed}@1`)).toBe(`</embed/${embed}>; rel="latest-version"`);
    expect([linkOf(`/embed/${embed}`), linkOf(`/embed/${embed}@2`)]).toEqual([undefined, undefined]);
    expect(statusOf(`/embed/${embed}@3`)).toBe(404);
  });

  it('may leave out a line that the first had', () => {
    reviseSheet(reporter, { id, version: see().version }, desk.ctx());
    on.file(reporter, id, {}, ['headline']);
    expect(printed('headline')).toBeDefined();
    on.clear(editor, id);
    expect(printed('headline')).toBeUndefined();
  });

  it('is started by the author or an editor, from cleared or pulled words, seen as they are', () => {
    const { version } = see();
    expect(refusal(() => reviseSheet(colleague, { id, version }, desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => reviseSheet(reporter, { id, version: 1 }, desk.ctx()))[0]).toBe('conflict');
    reviseSheet(editor, { id, version }, desk.ctx());
    expect(refusal(() => reviseSheet(editor, { id, version: version + 1 }, desk.ctx()))).toEqual([
      'conflict',
      'A new version starts from cleared or pulled words.',
    ]);
  });
});

describe('pulling', () => {
  it('is one editor’s act, with a reason, and takes words and chart from every reader at once', () => {
    const embed = createEmbed(reporter, { sheetId: id }, desk.ctx()).id;
    expect(statusOf(`/embed/${embed}`)).toBe(200);
    expect(refusal(() => pullSheet(reporter, { id, reason }, desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => pullSheet(copyDesk, { id, reason }, desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => pullSheet(editor, { id, reason: 'Wrong.' }, desk.ctx()))[0]).toBe('invalid');
    pullSheet(editor, { id, reason }, desk.ctx());
    expect(see()).toMatchObject({ state: 'pulled', isServed: false });
    expect(see().acts.at(-1)).toMatchObject({ act: 'pulled', person: 'Marten Reed', comment: reason });
    expect(printed('body')).toBeUndefined();
    expect(statusOf(`/embed/${embed}`)).toBe(410);
    expect(refusal(() => pullSheet(editor, { id, reason }, desk.ctx()))[0]).toBe('conflict');
  });

  it('reaches what is in print while a newer version is being written', () => {
    reviseSheet(reporter, { id, version: see().version }, desk.ctx());
    expect(see(editor).may.pull).toBe(true);
    pullSheet(editor, { id, reason }, desk.ctx());
    expect(printed('body')).toBeUndefined();
    expect(see()).toMatchObject({ state: 'draft', isServed: false });
  });

  it('is no end: the next version is cleared like any other, and its chart comes back', () => {
    const embed = createEmbed(reporter, { sheetId: id }, desk.ctx()).id;
    pullSheet(editor, { id, reason }, desk.ctx());
    reviseSheet(reporter, { id, version: see().version }, desk.ctx());
    on.file(reporter, id);
    expect(statusOf(`/embed/${embed}`)).toBe(410);
    on.clear(editor, id);
    expect(statusOf(`/embed/${embed}`)).toBe(200);
    expect(statusOf(`/embed/${embed}@1`)).toBe(410);
  });
});

describe('the queue', () => {
  const moveOf = (actor: typeof editor) =>
    listOpenSheets(actor, desk.ctx()).find((sheet) => sheet.id === id)?.waitsFor;

  it('says whose move it is at each step', () => {
    expect([moveOf(reporter), moveOf(editor)]).toEqual([undefined, undefined]);
    id = on.draft(reporter, releaseId);
    expect([moveOf(reporter), moveOf(editor)]).toEqual(['nobody', 'nobody']);
    on.file(reporter, id);
    expect([moveOf(reporter), moveOf(colleague), moveOf(editor)]).toEqual(['others', 'others', 'me']);
  });

  it('brings a sheet that was sent back to its author, with the comment and who wrote it', () => {
    id = on.draft(reporter, releaseId);
    on.file(reporter, id);
    const comment = 'Name the pollster in the first sentence.';
    sendBack(editor, { id, hash: on.hashOf(editor, id), comment }, desk.ctx());
    const [mine] = listOpenSheets(reporter, desk.ctx());
    expect(mine).toMatchObject({ waitsFor: 'me', returned: { comment, by: 'Marten Reed' } });
    expect(moveOf(editor)).toBe('others');
    const { version } = see();
    saveLines(reporter, { id, version, lines: [] }, desk.ctx());
    expect(moveOf(reporter)).toBe('nobody');
  });

  it('is for reporters and editors', () => {
    expect(refusal(() => listOpenSheets(copyDesk, desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => getSheet(copyDesk, id, desk.ctx()))[0]).toBe('forbidden');
  });
});

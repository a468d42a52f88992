import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { databaseFile, openDatabase } from '@/db/client';
import type { Role } from '@/lib/domain/roles';
import { readSession } from '@/lib/services/account/read-session';
import { setDisabled, setRoles } from '@/lib/services/people/change-person';
import { changeFiledSheet } from '@/lib/services/sheet/change-filed';
import { clearSheet, sendBack } from '@/lib/services/sheet/clear-sheet';
import { saveLines } from '@/lib/services/sheet/edit-lines';
import { fileSheet } from '@/lib/services/sheet/file-sheet';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';
import { refusal } from '@/tests/support/refusal';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const { db } = desk;
const on = sheetDesk(db);
const reporter = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const colleague = makePerson(db, { name: 'Jory Quent', roles: ['reporter'] });
const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
const otherEditor = makePerson(db, { name: 'Isolde Varn', roles: ['editor', 'reporter'] });
const copyDesk = makePerson(db, { name: 'Tamsin Oake', roles: ['copy-desk'] });
const administrator = makePerson(db, { name: 'Ned Harrow', roles: ['administrator'] });
const releaseId = logRelease(db, reporter);

let id: string;
beforeEach(() => {
  id = on.draft(reporter, releaseId);
});

/** Changes somebody's roles and answers with that person as their next request would find them. */
function withRoles(person: typeof editor, roles: Role[], version = 1) {
  setRoles(administrator, { id: person.publicId, version, roles }, desk.ctx());
  return readSession(person.token, desk.ctx())!;
}

const stateOf = (sheet = id) => getSheet(editor, sheet, desk.ctx()).state;

describe('words filed by a reporter', () => {
  beforeEach(() => void on.file(reporter, id));

  it('are cleared by an editor', () => {
    expect(on.clear(editor, id)).toEqual({ outcome: 'cleared', version: 3 });
    expect(stateOf()).toBe('cleared');
  });

  it('are not cleared by whoever filed them', () => {
    expect(refusal(() => on.clear(reporter, id))).toEqual([
      'forbidden',
      'You filed these words. Somebody else reads them before they are cleared.',
    ]);
    expect(stateOf()).toBe('filed');
  });

  it('are not cleared by a second reporter: one of the two is an editor', () => {
    expect(refusal(() => on.clear(colleague, id))).toEqual([
      'forbidden',
      'One of the two who agree has to be an editor. Leave this one to an editor.',
    ]);
    expect(stateOf()).toBe('filed');
  });

  it.each([
    ['the copy desk', copyDesk],
    ['an administrator', administrator],
  ])('are not cleared by %s', (_, actor) => {
    const hash = on.hashOf(editor, id);
    expect(refusal(() => clearSheet(actor, { id, hash }, desk.ctx()))[0]).toBe('forbidden');
    expect(stateOf()).toBe('filed');
  });

  it('are not cleared by a filer who became an editor meanwhile', () => {
    const filer = makePerson(db, { name: 'Lene Forde', roles: ['reporter'] });
    const own = on.draft(filer, releaseId);
    on.file(filer, own);
    const promoted = withRoles(filer, ['reporter', 'editor']);
    expect(refusal(() => on.clear(promoted, own))[0]).toBe('forbidden');
  });

  it('are not cleared by somebody whose editor’s role was taken away since the page was opened', () => {
    const reader = makePerson(db, { name: 'Pell Sand', roles: ['editor'] });
    const hash = on.hashOf(reader, id);
    const demoted = withRoles(reader, ['reporter']);
    expect(refusal(() => clearSheet(demoted, { id, hash }, desk.ctx()))[0]).toBe('forbidden');
    expect(stateOf()).toBe('filed');
  });

  it('are not cleared or filed by a request that outlasted its person’s role or account', () => {
    const reader = makePerson(db, { name: 'Sela Wick', roles: ['editor'] });
    const hash = on.hashOf(reader, id);
    const draft = on.draft(reader, releaseId);
    const filing = on.filing(reader, draft);
    withRoles(reader, ['reporter']);
    expect(refusal(() => clearSheet(reader, { id, hash }, desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => changeFiledSheet(reader, filing, desk.ctx()))[0]).toBe('forbidden');
    fileSheet(reader, filing, desk.ctx());
    expect(refusal(() => on.clear(colleague, draft))[0], 'filed as a reporter by then').toBe('forbidden');
    setDisabled(administrator, { id: reader.publicId, version: 2, disabled: true }, desk.ctx());
    expect(refusal(() => clearSheet(reader, { id, hash }, desk.ctx()))[0]).toBe('not-signed-in');
    expect(stateOf()).toBe('filed');
  });

  it('are cleared once: the same request again is a conflict', () => {
    const hash = on.hashOf(editor, id);
    clearSheet(editor, { id, hash }, desk.ctx());
    const [code, message] = refusal(() => clearSheet(editor, { id, hash }, desk.ctx()));
    expect([code, message]).toEqual(['conflict', 'This sheet is cleared already.']);
    expect(refusal(() => clearSheet(otherEditor, { id, hash }, desk.ctx()))[0]).toBe('conflict');
    const acts = getSheet(editor, id, desk.ctx()).acts.map(({ act }) => act);
    expect(acts).toEqual(['filed', 'cleared']);
  });

  it.each(['sent back', 'taken back'])('are refused in so many words once %s, also when rewritten', (how) => {
    const hash = on.hashOf(editor, id);
    const back = { id, hash, comment: 'Name the pollster first.' };
    sendBack(how === 'taken back' ? reporter : otherEditor, back, desk.ctx());
    const told = ['conflict', 'It is no longer filed: it was taken back or sent back. Reload the page.'];
    expect(refusal(() => clearSheet(editor, { id, hash }, desk.ctx()))).toEqual(told);
    expect(refusal(() => sendBack(editor, back, desk.ctx()))).toEqual(told);
    const { lines, version } = on.filing(reporter, id);
    saveLines(reporter, { id, version, lines }, desk.ctx());
    expect(refusal(() => clearSheet(editor, { id, hash }, desk.ctx()))).toEqual(told);
  });

  it('are not cleared on the hash of other evidence', () => {
    const other = on.draft(reporter, releaseId);
    on.file(reporter, other);
    const hash = on.hashOf(editor, other);
    expect(refusal(() => clearSheet(editor, { id, hash }, desk.ctx()))[0]).toBe('conflict');
    expect(stateOf()).toBe('filed');
  });

  it('are cleared by one of two editors, whichever connection each is on', () => {
    const second = openDatabase(databaseFile(desk.folder));
    const hash = on.hashOf(editor, id);
    clearSheet(editor, { id, hash }, { ...desk.ctx(), db: second });
    expect(refusal(() => clearSheet(otherEditor, { id, hash }, desk.ctx()))[0]).toBe('conflict');
    second.$client.close();
  });

  it('are taken back by their filer, and sent back by an editor, never by another reporter', () => {
    const hash = on.hashOf(editor, id);
    const comment = 'The second figure reads 41.';
    expect(refusal(() => sendBack(colleague, { id, hash, comment }, desk.ctx()))[0]).toBe('forbidden');
    sendBack(reporter, { id, hash, comment }, desk.ctx());
    expect(stateOf()).toBe('sent-back');
    on.file(reporter, id);
    sendBack(editor, { id, hash: on.hashOf(editor, id), comment }, desk.ctx());
    expect(stateOf()).toBe('sent-back');
  });
});

describe('words filed by an editor', () => {
  it('are not cleared by that editor, and are by any reporter', () => {
    const own = on.draft(otherEditor, releaseId);
    on.file(otherEditor, own);
    expect(refusal(() => on.clear(otherEditor, own))[0]).toBe('forbidden');
    expect(on.clear(colleague, own).outcome).toBe('cleared');
  });

  it('are cleared by a reporter even when the editor’s role has gone since: roles count at the act', () => {
    const filer = makePerson(db, { name: 'Odo Kay', roles: ['editor'] });
    const own = on.draft(filer, releaseId);
    on.file(filer, own);
    withRoles(filer, ['copy-desk']);
    const hash = on.hashOf(reporter, own);
    expect(clearSheet(reporter, { id: own, hash }, desk.ctx()).outcome).toBe('cleared');
  });

  it('are not cleared by an editor who lost the role and filed as a reporter afterwards', () => {
    const filer = makePerson(db, { name: 'Mira Holt', roles: ['editor', 'reporter'] });
    const own = on.draft(filer, releaseId);
    const demoted = withRoles(filer, ['reporter']);
    on.file(demoted, own);
    expect(refusal(() => on.clear(colleague, own))[0]).toBe('forbidden');
    expect(on.clear(editor, own).outcome).toBe('cleared');
  });
});

describe('filed words that an editor changes', () => {
  const changed = 'Alder has 47% and Brook 41% in this Kelmouth poll.';
  beforeEach(() => {
    on.file(reporter, id);
    changeFiledSheet(editor, on.filing(editor, id, { body: changed }), desk.ctx());
  });

  it('wait for somebody else’s agreement, and the editor cannot give it', () => {
    const seen = getSheet(editor, id, desk.ctx());
    expect([seen.state, seen.filer?.name, seen.notYours, seen.may.clear]).toEqual([
      'filed',
      'Marten Reed',
      'filer',
      false,
    ]);
    expect(refusal(() => on.clear(editor, id))[0]).toBe('forbidden');
  });

  it('are cleared by their author with one key, and no editor needs to come again', () => {
    const seen = getSheet(reporter, id, desk.ctx());
    expect([seen.isAuthor, seen.may.clear]).toEqual([true, true]);
    const body = seen.lines.find(({ kind }) => kind === 'body')!;
    expect(body.text).toBe(changed);
    expect(body.earlier).not.toBe(changed);
    expect(on.clear(reporter, id).outcome).toBe('cleared');
  });

  it('keep what both people did in the history of the sheet', () => {
    const acts = getSheet(editor, id, desk.ctx()).acts.map(({ act, person }) => `${act} ${person}`);
    expect(acts).toEqual(['filed Rhea Quill', 'sent-back Marten Reed', 'filed Marten Reed']);
  });

  it('are never changed by a reporter, nor from a page that is out of date', () => {
    const input = on.filing(reporter, id, { body: 'Other words.' });
    expect(refusal(() => changeFiledSheet(reporter, input, desk.ctx()))[0]).toBe('forbidden');
    const stale = { ...on.filing(otherEditor, id), version: 1 };
    expect(refusal(() => changeFiledSheet(otherEditor, stale, desk.ctx()))[0]).toBe('conflict');
  });
});

describe('a draft', () => {
  it('is filed by its author or an editor, and by nobody else', () => {
    const input = on.filing(reporter, id);
    expect(refusal(() => fileSheet(colleague, input, desk.ctx()))).toEqual([
      'forbidden',
      'Only its author or an editor writes on this sheet.',
    ]);
    expect(refusal(() => fileSheet(copyDesk, input, desk.ctx()))[0]).toBe('forbidden');
    expect(fileSheet(editor, input, desk.ctx()).version).toBe(2);
  });

  it('is not cleared, sent back or filed twice', () => {
    const hash = '0'.repeat(64);
    expect(refusal(() => clearSheet(editor, { id, hash }, desk.ctx()))).toEqual([
      'conflict',
      'This sheet is not filed.',
    ]);
    expect(refusal(() => sendBack(editor, { id, hash, comment: 'Again.' }, desk.ctx()))[0]).toBe('conflict');
    const input = on.filing(reporter, id);
    fileSheet(reporter, input, desk.ctx());
    expect(refusal(() => fileSheet(reporter, input, desk.ctx()))[0]).toBe('conflict');
  });
});

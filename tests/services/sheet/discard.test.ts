import { afterAll, describe, expect, it } from 'vitest';
import { listAllRecords } from '@/db/queries/record';
import { discardSheet } from '@/lib/services/sheet/discard-sheet';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { listOpenSheets } from '@/lib/services/sheet/list-open-sheets';
import { freshDatabase, makePerson } from '../../support/database';
import { refusal } from '../../support/refusal';
import { logRelease } from '../../support/release';
import { sheetDesk } from '../../support/sheet';

const desk = freshDatabase();
afterAll(() => desk.closeAndRemove());

const { db } = desk;
const on = sheetDesk(db);
const author = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const other = makePerson(db, { name: 'Jory Quent', roles: ['reporter'] });
const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
const copyDesk = makePerson(db, { name: 'Tamsin Oake', roles: ['copy-desk'] });
const release = logRelease(db, author);
const discard = (actor: typeof author, id: string) => discardSheet(actor, { id }, desk.ctx());

describe('a draft that nobody filed', () => {
  it('is discarded by its author or an editor, and its words stay in the history', () => {
    for (const actor of [author, editor]) {
      const id = on.draft(author, release);
      const body = getSheet(author, id, desk.ctx()).lines.find(({ kind }) => kind === 'body')!.text;
      discard(actor, id);
      expect(refusal(() => getSheet(author, id, desk.ctx()))[0]).toBe('not-found');
      expect(listOpenSheets(author, desk.ctx()).map((sheet) => sheet.id)).not.toContain(id);
      const record = listAllRecords(db).at(-1)!;
      expect(record).toMatchObject({ action: 'discarded draft', entityId: id, personId: actor.personId });
      expect(record.before).toContain(JSON.stringify(body).slice(1, -1));
      expect(refusal(() => discard(actor, id))[0]).toBe('not-found');
    }
  });

  it('is not discarded by another reporter or by the copy desk', () => {
    const id = on.draft(author, release);
    for (const actor of [other, copyDesk]) expect(refusal(() => discard(actor, id))[0]).toBe('forbidden');
    expect(getSheet(author, id, desk.ctx()).state).toBe('draft');
  });
});

describe('a sheet that was filed once', () => {
  it('is kept, also after it was sent back', () => {
    const id = on.draft(author, release);
    on.file(author, id);
    expect(refusal(() => discard(author, id))[0]).toBe('conflict');
    on.sendBack(editor, id, 'Once more, please.');
    expect(refusal(() => discard(author, id))[0]).toBe('conflict');
    expect(getSheet(author, id, desk.ctx()).state).toBe('sent-back');
  });
});

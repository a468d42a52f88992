import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { listAllRecords } from '@/db/queries/record';
import type { LineKind } from '@/lib/domain/sheet';
import { addLine } from '@/lib/services/sheet/add-line';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const { db } = desk;
const on = sheetDesk(db);
const author = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const colleague = makePerson(db, { name: 'Jory Quent', roles: ['reporter'] });
const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
const copyDesk = makePerson(db, { name: 'Tamsin Oake', roles: ['copy-desk'] });
const releaseId = logRelease(db, author);

let id: string;
beforeEach(() => {
  id = on.draft(author, releaseId);
});

const see = (actor = author) => getSheet(actor, id, desk.ctx());
const add = (kind: LineKind, actor = author, version = see().version) =>
  addLine(actor, { id, version, kind }, desk.ctx());
const kinds = () => see().lines.map((line) => line.kind);

describe('a line on request', () => {
  it('is offered where the sheet has none yet and its claim can carry it', () => {
    const offered = ['standfirst', 'caveat-short', 'caveat-one-breath', 'spoken-line', 'newsletter-line'];
    expect(see().addable).toEqual(offered);
    add('caveat-short');
    expect(see().addable).toEqual(offered.filter((kind) => kind !== 'caveat-short'));
  });

  it('stands in the order of the screen, drafted, with an entry in the history', () => {
    const before = see();
    expect(add('standfirst')).toEqual({ version: before.version + 1 });
    expect(kinds().slice(0, 3)).toEqual(['headline', 'standfirst', 'body']);
    const line = see().lines[1];
    expect(line?.text).toBe(line?.draft);
    expect(line?.text).toContain('a gap that chance alone could produce');
    expect(see().basisHash).not.toBe(before.basisHash);
    expect(listAllRecords(db).at(-1)).toMatchObject({ action: 'added line', entityId: id });
  });

  it('is filed, cleared and part of the evidence like every other line', () => {
    add('spoken-line', editor);
    on.file(author, id);
    const hash = on.hashOf(editor, id);
    on.clear(editor, id);
    expect(see().state).toBe('cleared');
    expect(see().hash).toBe(hash);
    expect(see().lines.find(({ kind }) => kind === 'spoken-line')?.text).toContain('percent');
  });

  it('comes onto a sheet that was sent back, and can be knocked out', () => {
    on.file(author, id);
    on.sendBack(editor, id, 'A newsletter line too, please.');
    add('newsletter-line');
    expect(see().state).toBe('draft');
    on.file(author, id, {}, ['newsletter-line']);
    expect(see(editor).lines.find(({ kind }) => kind === 'newsletter-line')?.knockedOut).toBe(true);
  });

  it('is refused to others, on filed words, from an old page, twice, and where the claim cannot carry it', () => {
    expect(refusal(() => add('standfirst', colleague))[0]).toBe('forbidden');
    expect(refusal(() => add('standfirst', copyDesk))[0]).toBe('forbidden');
    expect(refusal(() => add('change-sentence'))[0]).toBe('invalid');
    expect(refusal(() => add('correction-notice'))[0]).toBe('invalid');
    expect(refusal(() => add('headline'))[0]).toBe('conflict');
    add('standfirst');
    expect(refusal(() => add('standfirst'))[0]).toBe('conflict');
    expect(refusal(() => add('spoken-line', author, 1))[0]).toBe('conflict');
    on.file(author, id);
    expect(refusal(() => add('spoken-line'))[0]).toBe('conflict');
  });
});

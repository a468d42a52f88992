import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/security/ids';
import { createSheet } from '@/lib/services/sheet/create-sheet';
import { saveLines } from '@/lib/services/sheet/edit-lines';
import { fileSheet } from '@/lib/services/sheet/file-sheet';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { listOpenSheets } from '@/lib/services/sheet/list-open-sheets';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease } from '@/tests/support/release';
import { LEAD, sheetDesk } from '@/tests/support/sheet';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const { db } = desk;
const on = sheetDesk(db);
const reporter = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const colleague = makePerson(db, { name: 'Jory Quent', roles: ['reporter'] });
const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
const copyDesk = makePerson(db, { name: 'Tamsin Oake', roles: ['copy-desk'] });
const releaseId = logRelease(db, reporter);

let id: string;
beforeEach(() => {
  id = on.draft(reporter, releaseId);
});

const line = (kind: string, actor = reporter) =>
  getSheet(actor, id, desk.ctx()).lines.find((one) => one.kind === kind)!;

describe('a new sheet', () => {
  it('is drafted once, however often the same form is sent', () => {
    const input = { submissionKey: newId(), releaseId, claimKey: LEAD };
    const first = createSheet(reporter, input, desk.ctx());
    expect(createSheet(reporter, input, desk.ctx())).toEqual(first);
    expect(refusal(() => createSheet(colleague, input, desk.ctx()))[0]).toBe('conflict');
  });

  it('claims one of the tested findings of a release that exists, and is drafted by those who may', () => {
    const input = (change: object) => ({ submissionKey: newId(), releaseId, claimKey: LEAD, ...change });
    const draft = (actor: typeof editor, change: object) => () =>
      createSheet(actor, input(change), desk.ctx());
    expect(refusal(draft(reporter, { claimKey: 'share:Alder' }))[0]).toBe('invalid');
    expect(refusal(draft(reporter, { claimKey: 'lead:Alder|Nobody' }))[0]).toBe('invalid');
    expect(refusal(draft(reporter, { releaseId: 'nothing' }))[0]).toBe('not-found');
    expect(refusal(draft(reporter, { extra: true }))[0]).toBe('invalid');
    expect(refusal(draft(copyDesk, {}))[0]).toBe('forbidden');
  });

  it('says nothing above its verdict', () => {
    const { finding, lines } = getSheet(reporter, id, desk.ctx());
    expect(finding.verdict).toBe('does-not-hold');
    expect(lines.map(({ kind }) => kind)).toEqual([
      'headline',
      'body',
      'caveat',
      'method-note',
      'chart-title',
      'alt-text',
    ]);
    expect(lines.flatMap(({ marks }) => marks)).toEqual([]);
  });
});

describe('saving', () => {
  const save = (actor: typeof editor, version: number, text: string) =>
    saveLines(actor, { id, version, lines: [{ kind: 'body', text, knockedOut: false }] }, desk.ctx());

  it('keeps words by author or editor, beside the draft, and marks what goes too far until it is mended', () => {
    expect(save(reporter, 1, 'Alder leads Brook.')).toEqual({ version: 2 });
    expect(line('body')).toMatchObject({
      text: 'Alder leads Brook.',
      marks: [{ phrase: 'leads', rule: 'lead', grade: 'not-supported' }],
      changedBy: 'Rhea Quill',
    });
    expect(line('body').draft).not.toContain('leads');
    save(editor, 2, 'Alder has 47%, Brook 41%.');
    expect(line('body')).toMatchObject({ changedBy: 'Marten Reed', marks: [] });
  });

  it('is refused to others, and from a page that is out of date', () => {
    expect(refusal(() => save(colleague, 1, 'Mine.'))[0]).toBe('forbidden');
    expect(refusal(() => save(copyDesk, 1, 'Mine.'))[0]).toBe('forbidden');
    save(reporter, 1, 'First.');
    expect(refusal(() => save(reporter, 1, 'Second.'))).toEqual([
      'conflict',
      'Somebody changed this sheet meanwhile. Reload the page and look again; nothing was done.',
    ]);
    expect(line('body').text).toBe('First.');
  });

  it('is refused once the words are filed or cleared', () => {
    on.file(reporter, id);
    expect(refusal(() => save(reporter, 2, 'Late.'))[0]).toBe('conflict');
    on.clear(editor, id);
    expect(refusal(() => save(reporter, 3, 'Later.'))[0]).toBe('conflict');
  });

  it('removes what cannot be seen, and refuses what is far too long', () => {
    save(reporter, 1, '  Alder\u200b has\u0000 47%.\r\nBrook 41%. ');
    expect(line('body').text).toBe('Alder has 47%.\nBrook 41%.');
    expect(refusal(() => save(reporter, 2, 'x'.repeat(5001)))[0]).toBe('invalid');
  });
});

describe('a line knocked out', () => {
  it('is neither filed nor cleared, and can be put back before', () => {
    const out = (knockedOut: boolean, version: number) =>
      saveLines(
        reporter,
        { id, version, lines: [{ kind: 'headline', text: line('headline').text, knockedOut }] },
        desk.ctx(),
      );
    out(true, 1);
    expect(line('headline').knockedOut).toBe(true);
    out(false, 2);
    expect(line('headline').knockedOut).toBe(false);
    out(true, 3);
    on.file(reporter, id);
    on.clear(editor, id);
    expect(getSheet(editor, id, desk.ctx()).state).toBe('cleared');
    expect(listOpenSheets(reporter, desk.ctx()).map((one) => one.id)).not.toContain(id);
  });

  it.each(['caveat', 'chart-title', 'alt-text'] as const)('is never the %s', (kind) => {
    const input = on.filing(reporter, id, {}, [kind]);
    expect(fieldsOf(() => fileSheet(reporter, input, desk.ctx()))).toEqual({
      [kind]: 'The chart cannot do without this line.',
    });
  });
});

describe('filing', () => {
  it('needs words on every line that is kept', () => {
    const input = on.filing(reporter, id, { body: '  ', 'alt-text': '' });
    expect(fieldsOf(() => fileSheet(reporter, input, desk.ctx()))).toEqual({
      body: 'A filed line has words. Knock it out, or write it.',
      'alt-text': 'A filed line has words. Knock it out, or write it.',
    });
    expect(getSheet(reporter, id, desk.ctx()).state).toBe('draft');
  });
});

function fieldsOf(act: () => unknown): Record<string, string> {
  try {
    act();
  } catch (error) {
    if (error instanceof AppError) return error.fields;
    throw error;
  }
  throw new Error('the act was not refused');
}

import { beforeEach, describe, expect, it } from 'vitest';
import { findLatestHouseStyle, findLatestPolicy, insertHouseStyle, insertPolicy } from '@/db/queries/desk';
import { listAllRecords } from '@/db/queries/record';
import { write } from '@/db/write';
import { getRelease } from '@/lib/services/release/get-release';
import { saveLines } from '@/lib/services/sheet/edit-lines';
import { fileSheet } from '@/lib/services/sheet/file-sheet';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { listOpenSheets } from '@/lib/services/sheet/list-open-sheets';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease, sharesOf, typed } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

let desk: TestDatabase;
let on: ReturnType<typeof sheetDesk>;
let people: Record<'reporter' | 'editor', ReturnType<typeof makePerson>>;
let releaseId: string;

beforeEach(() => {
  desk = freshDatabase();
  on = sheetDesk(desk.db);
  people = {
    reporter: makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] }),
    editor: makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] }),
  };
  releaseId = logRelease(desk.db, people.reporter);
  return () => desk.closeAndRemove();
});

const changes: [string, string, () => void][] = [
  [
    'the policy',
    'lead:Alder|Brook',
    () => {
      const body = JSON.parse(findLatestPolicy(desk.db)!.body) as { level: number };
      write(desk.db, (tx) => insertPolicy(tx, JSON.stringify({ ...body, level: 0.9 }), desk.ctx().now));
    },
  ],
  [
    'the house style',
    'lead:Alder|Brook',
    () => {
      const body = JSON.parse(findLatestHouseStyle(desk.db)!.body) as object;
      const changed = JSON.stringify({ ...body, percent: 'word' });
      write(desk.db, (tx) => insertHouseStyle(tx, changed, desk.ctx().now));
    },
  ],
  [
    'the release it is compared with',
    'lead:Alder|Brook',
    () => void logRelease(desk.db, people.reporter, earlierPoll()),
  ],
];

describe.each(changes)('when %s changes between filing and clearing', (what, claim, change) => {
  it('clearing returns the sheet to its filer, who agrees anew, to words that follow where nobody edited them', () => {
    const { reporter, editor } = people;
    const id = on.draft(reporter, releaseId, claim);
    on.file(reporter, id);
    change();
    expect(getSheet(editor, id, desk.ctx())).toMatchObject({ state: 'filed', hasMoved: true });
    const before = on.hashOf(editor, id);
    expect(on.clear(editor, id)).toEqual({ outcome: 'returned' });

    const back = getSheet(reporter, id, desk.ctx());
    expect(back).toMatchObject({ state: 'sent-back', agreesAnew: true, isServed: false });
    expect(back.acts.map(({ act }) => act)).toEqual(['filed', 'returned']);
    expect(getSheet(editor, id, desk.ctx()).agreesAnew).toBe(false);
    expect(listOpenSheets(reporter, desk.ctx())[0]).toMatchObject({ waitsFor: 'me' });
    expect(listAllRecords(desk.db).at(-1)).toMatchObject({
      action: 'returned sheet to its filer',
      entityId: id,
      personId: editor.personId,
    });

    const { version, basisHash } = back;
    expect(back.lines.every(({ text, draft }) => text === draft)).toBe(true);
    const filed = fileSheet(reporter, { id, version, basisHash, lines: [] }, desk.ctx());
    expect(filed.hash).not.toBe(before);
    expect(getSheet(editor, id, desk.ctx())).toMatchObject({ state: 'filed', hasMoved: false });
    expect(on.clear(editor, id).outcome).toBe('cleared');
  });
});

describe('a page that is out of date', () => {
  it('does not file on figures that nobody saw', () => {
    const { reporter } = people;
    const id = on.draft(reporter, releaseId);
    const input = on.filing(reporter, id);
    changes[0]![2]();
    expect(refusal(() => fileSheet(reporter, input, desk.ctx()))).toEqual([
      'conflict',
      'The figures or the house style changed since you opened this page. Reload it and read it once more.',
    ]);
    expect(getSheet(reporter, id, desk.ctx()).state).toBe('draft');
  });

  it('follows figures and house style where nobody edited it, and keeps what somebody wrote', () => {
    const { reporter } = people;
    const id = on.draft(reporter, releaseId);
    const { version } = getSheet(reporter, id, desk.ctx());
    const written = { kind: 'headline', text: 'Alder at 47%, Brook at 41%', knockedOut: false };
    saveLines(reporter, { id, version, lines: [written] }, desk.ctx());
    changes[1]![2]();
    const { lines } = getSheet(reporter, id, desk.ctx());
    const lineOf = (kind: string) => lines.find((line) => line.kind === kind)!;
    expect(lineOf('body').text).toContain(' percent');
    expect(lineOf('body').text).toBe(lineOf('body').draft);
    expect(lineOf('headline').text).toBe(written.text);
    expect(lineOf('headline').draft).not.toBe(written.text);
    const opened = getSheet(reporter, id, desk.ctx());
    fileSheet(reporter, { id, version: opened.version, basisHash: opened.basisHash, lines: [] }, desk.ctx());
    const filed = getSheet(reporter, id, desk.ctx()).lines;
    expect(filed.map(({ text }) => text)).toEqual(opened.lines.map(({ text }) => text));
  });
});

describe('cleared words', () => {
  it('stay on the evidence they were cleared on when house style changes afterwards', () => {
    const { reporter, editor } = people;
    const id = on.cleared(reporter, editor, releaseId);
    const before = getSheet(reporter, id, desk.ctx());
    for (const [, , change] of changes) change();
    const after = getSheet(reporter, id, desk.ctx());
    expect(after).toEqual(before);
    expect(after.hasMoved).toBe(false);
  });
});

function earlierPoll() {
  return {
    race: { kind: 'existing' as const, id: getRelease(people.reporter, releaseId, desk.ctx()).facts.race.id },
    fieldStartOn: '2026-08-13',
    fieldEndOn: '2026-08-16',
    publishedOn: '2026-08-19',
    n: typed('1,005'),
    shares: sharesOf([
      ['Alder', '44'],
      ['Brook', '43'],
      ['Someone else', '4'],
      ['Don’t know', '9', false],
    ]),
  };
}

import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { Actor } from '@/lib/domain/roles';
import { getRelease } from '@/lib/services/release/get-release';
import { reviseRelease } from '@/lib/services/release/revise-release';
import { addLine } from '@/lib/services/sheet/add-line';
import { reviseSheet } from '@/lib/services/sheet/change-filed';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease, releaseForm, sharesOf } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const DAY_MS = 86_400_000;
const REASON = 'The pollster sent a corrected table.';
const shares = sharesOf([
  ['Alder', '46'],
  ['Brook', '42'],
  ['Someone else', '4'],
  ['Don’t know', '8', false],
]);

let desk: TestDatabase;
let on: ReturnType<typeof sheetDesk>;
let reporter: Actor;
let editor: Actor;
let releaseId: string;
let id: string;
beforeEach(() => {
  desk = freshDatabase();
  on = sheetDesk(desk.db);
  reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
  editor = makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] });
  releaseId = logRelease(desk.db, reporter);
  id = on.cleared(reporter, editor, releaseId);
});
afterEach(() => desk.closeAndRemove());

const see = (later = 0) => getSheet(reporter, id, desk.ctx(later));
const startAnew = () => reviseSheet(reporter, { id, version: see().version }, desk.ctx());
const pull = () => pullSheet(editor, { id, reason: REASON }, desk.ctx());
function mend() {
  const { version, facts } = getRelease(reporter, releaseId, desk.ctx());
  const race = { kind: 'existing' as const, id: facts.race.id };
  reviseRelease(reporter, { id: releaseId, version, release: releaseForm({ race, shares }) }, desk.ctx());
}
const ask = () => addLine(reporter, { id, version: see().version, kind: 'correction-notice' }, desk.ctx());
/** Every line as the right figures draft it: the old words contradict them and are not filed. */
const inNewWords = () => Object.fromEntries(see().lines.map(({ kind, draft }) => [kind, draft]));
const notice = (later = 0) => see(later).lines.find(({ kind }) => kind === 'correction-notice');

describe('a correction notice', { timeout: 20_000 }, () => {
  it('is not offered while what was printed stands', () => {
    startAnew();
    expect(see().addable).not.toContain('correction-notice');
    expect(refusal(ask)[0]).toBe('invalid');
    const fresh = on.draft(reporter, releaseId);
    expect(getSheet(reporter, fresh, desk.ctx()).addable).not.toContain('correction-notice');
  });

  it('is offered once words were pulled and the release has a newer version, and says what was wrong', () => {
    pull();
    mend();
    startAnew();
    expect(see().addable).toContain('correction-notice');
    ask();
    expect(notice()?.text).toMatch(
      /^Correction, .*: an earlier version of this report gave wrong particulars of the poll by Kelmouth Research\. It put Alder at 47%; the right figure is 46%\. It put Brook at 41%; the right figure is 42%\. What the right figures support: /,
    );
    expect(notice()?.marks).toEqual([]);
  });

  it('says of pulled words whose figures stand that they were withdrawn', () => {
    pull();
    startAnew();
    ask();
    expect(notice()?.text).toMatch(
      /^Correction, .*: words of an earlier version of this report about the poll by Kelmouth Research were withdrawn\. What the figures support: /,
    );
  });

  it('keeps its day, so that a filed sheet does not move overnight', () => {
    pull();
    mend();
    startAnew();
    ask();
    on.file(reporter, id, inNewWords());
    const today = notice()?.text;
    expect(notice(3 * DAY_MS)?.text).toBe(today);
    expect(see(3 * DAY_MS).hasMoved).toBe(false);
  });

  it('may quote the figure that was wrong in an editor’s own words', () => {
    pull();
    mend();
    startAnew();
    ask();
    const text = 'Correction: we put Alder at 47% in the poll by Kelmouth Research. The right figure is 46%.';
    on.file(reporter, id, { ...inNewWords(), 'correction-notice': text });
    expect(see().state).toBe('filed');
  });
});

import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { ReleaseFormValues } from '@/lib/domain/release-input';
import type { Actor } from '@/lib/domain/roles';
import { copyLines } from '@/lib/services/copy/copy-lines';
import { getRelease } from '@/lib/services/release/get-release';
import { overrideComparison } from '@/lib/services/release/override-comparison';
import { reviseRelease } from '@/lib/services/release/revise-release';
import { reviseSheet } from '@/lib/services/sheet/change-filed';
import { sendBack } from '@/lib/services/sheet/clear-sheet';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease, releaseForm, sharesOf, typed } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const AUGUST: Partial<ReleaseFormValues> = {
  fieldStartOn: '2026-08-13',
  fieldEndOn: '2026-08-16',
  publishedOn: '2026-08-19',
  mode: typed('online'),
};
const shares = (alder: string, brook: string, other: string) =>
  sharesOf([
    ['Alder', alder],
    ['Brook', brook],
    ['Someone else', other],
    ['Don’t know', '8', false],
  ]);

let desk: TestDatabase;
let on: ReturnType<typeof sheetDesk>;
let reporter: Actor;
let colleague: Actor;
let editor: Actor;
let id: string;
let race: ReleaseFormValues['race'];
beforeEach(() => {
  desk = freshDatabase();
  on = sheetDesk(desk.db);
  reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
  colleague = makePerson(desk.db, { name: 'Jory Quent', roles: ['reporter'] });
  editor = makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] });
  id = logRelease(desk.db, reporter);
  race = { kind: 'existing', id: getRelease(reporter, id, desk.ctx()).facts.race.id };
});
afterEach(() => desk.closeAndRemove());

function revise(release: string, change: Partial<ReleaseFormValues>, actor = reporter) {
  const { version } = getRelease(actor, release, desk.ctx());
  reviseRelease(actor, { id: release, version, release: releaseForm({ race, ...change }) }, desk.ctx());
}

describe('an overridden comparison whose other release is mended', () => {
  let august: string;
  let sheet: string;
  beforeEach(() => {
    august = logRelease(desk.db, reporter, { ...AUGUST, race, shares: shares('44', '43', '5') });
    const reason = 'The pollster ran both modes side by side.';
    overrideComparison(editor, { id, comparedWith: august, reason }, desk.ctx());
    sheet = on.draft(reporter, id, 'change:Alder');
    on.file(reporter, sheet);
  });

  it('never clears words on the figures that were mended', () => {
    revise(august, { ...AUGUST, shares: shares('47', '40', '5') });
    expect(getSheet(editor, sheet, desk.ctx())).toMatchObject({ hasMoved: true });
    expect(on.clear(editor, sheet)).toEqual({ outcome: 'returned' });
    const { previous, finding } = getSheet(reporter, sheet, desk.ctx());
    expect([previous?.version, finding.estimatePp]).toEqual([2, 0]);
  });

  it('is left when the two now share days of interviewing', () => {
    revise(august, { ...AUGUST, fieldEndOn: '2026-09-10', publishedOn: '2026-09-11' });
    expect(getRelease(reporter, id, desk.ctx()).comparison.reason).not.toBe('override');
  });
});

describe('a filed sheet whose claim the mended release no longer supports', () => {
  it('is shown as it was filed, is not cleared, and can be sent back', () => {
    const sheet = on.draft(reporter, id);
    on.file(reporter, sheet);
    revise(id, { shares: shares('47', '10', '35') });
    const seen = getSheet(editor, sheet, desk.ctx());
    expect(seen).toMatchObject({ state: 'filed', hasMoved: true });
    expect(seen.evidence.release.version).toBe(1);
    const message = 'This release supports no such claim any more. Draft a new sheet from it.';
    expect(refusal(() => on.clear(editor, sheet))).toEqual(['conflict', message]);
    sendBack(editor, { id: sheet, hash: seen.hash, comment: 'The figures were mended.' }, desk.ctx());
    expect(refusal(() => getSheet(reporter, sheet, desk.ctx()))).toEqual(['conflict', message]);
    revise(id, { shares: shares('47', '35', '10') });
    expect(getSheet(reporter, sheet, desk.ctx())).toMatchObject({ state: 'sent-back', may: { write: true } });
  });
});

describe('pulled words whose release was mended', () => {
  it('stay on their own evidence with who typed it, and are copied by nobody', () => {
    const sheet = on.cleared(reporter, editor, id);
    pullSheet(editor, { id: sheet, reason: 'A share was typed wrongly.' }, desk.ctx());
    revise(id, { shares: shares('46', '42', '4') }, colleague);
    const seen = getSheet(editor, sheet, desk.ctx());
    expect(seen.evidence.release.shares[0]).toMatchObject({ option: 'Alder', units: 47 });
    expect(seen.enteredBy).toMatchObject({ Alder: 'Rhea Quill' });
    const copy = () => copyLines(editor, { id: sheet, kinds: ['body'], form: 'plain' }, desk.ctx());
    expect(refusal(copy)[0]).toBe('conflict');

    reviseSheet(reporter, { id: sheet, version: seen.version }, desk.ctx());
    expect(getSheet(editor, sheet, desk.ctx()).enteredBy).toMatchObject({ Alder: 'Jory Quent' });
    on.file(reporter, sheet);
    expect(on.clear(editor, sheet).outcome).toBe('cleared');
    expect(getSheet(editor, sheet, desk.ctx()).evidence.release.shares[0]).toMatchObject({ units: 46 });
  });
});

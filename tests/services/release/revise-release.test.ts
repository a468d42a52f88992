import { beforeEach, describe, expect, it } from 'vitest';
import { listVerdicts } from '@/db/queries/finding-index';
import { listAllRecords } from '@/db/queries/record';
import { findRelease, findWholeVersion } from '@/db/queries/release';
import type { ReleaseFormValues } from '@/lib/domain/release-input';
import type { Actor } from '@/lib/domain/roles';
import { verifyHistory } from '@/lib/services/history/verify';
import { computeFindings } from '@/lib/services/release/compute-findings';
import { factsOfWhole } from '@/lib/services/release/facts';
import { getRelease } from '@/lib/services/release/get-release';
import { getReleaseForm } from '@/lib/services/release/get-release-form';
import { reviseRelease } from '@/lib/services/release/revise-release';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { listOpenSheets } from '@/lib/services/sheet/list-open-sheets';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { freshDatabase, HOUR, makePerson, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { GOVERNOR, logRelease, releaseForm, sharesOf, typed, withheld } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const RESTING = 'Cleared words rest on these figures: correct the release, and see what that does to them.';
const AUGUST = { fieldStartOn: '2026-08-13', fieldEndOn: '2026-08-16', publishedOn: '2026-08-19' };
const OTHER_SHARES = sharesOf([
  ['Alder', '52'],
  ['Brook', '36'],
  ['Someone else', '4'],
  ['Don’t know', '8', false],
]);

let desk: TestDatabase;
let on: ReturnType<typeof sheetDesk>;
let reporter: Actor;
let editor: Actor;
let copyDesk: Actor;
let id: string;
beforeEach(() => {
  desk = freshDatabase();
  on = sheetDesk(desk.db);
  reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
  editor = makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] });
  copyDesk = makePerson(desk.db, { name: 'Tamsin Oake', roles: ['copy-desk'] });
  id = logRelease(desk.db, reporter);
  return () => desk.closeAndRemove();
});

const formOf = (release = id, actor = reporter) => getReleaseForm(actor, release, desk.ctx());
const raceOfFirst = (): ReleaseFormValues['race'] => formOf().values.race;

/** Sends the stored form back with something changed, as the page does. */
function revise(
  change: Partial<ReleaseFormValues> = {},
  { actor = reporter, release = id, version = 0 } = {},
) {
  const stored = formOf(release);
  const input = {
    id: release,
    version: version || stored.version,
    release: { ...stored.values, ...change },
  };
  return reviseRelease(actor, input, desk.ctx(HOUR));
}

describe('the stored form', () => {
  it('is what would have been typed, with its decimals, units, levels and what was withheld', () => {
    const change: Partial<ReleaseFormValues> = {
      race: raceOfFirst(),
      sponsor: withheld,
      population: typed(''),
      n: typed('1012'),
      deff: { source: 'design', value: '1.45', df: '40' },
      statedMargin: { notDisclosed: false, pp: '4.0', unit: '0.5', level: '99.9' },
      sameQuestion: true,
      methodNote: 'By **telephone**.',
      shares: [
        ...sharesOf([
          ['Alder', '47.0'],
          ['Brook', '41.5'],
        ]),
        { option: 'Don’t know', printed: '', notDisclosed: true, isAnswer: false },
      ],
    };
    const stored = formOf(logRelease(desk.db, reporter, change));
    expect(stored).toMatchObject({ version: 1, number: 1, race: 'Averil Coast governor', whyNot: null });
    expect(stored.values).toEqual(releaseForm(change));
  });

  it('takes the unit and level of a modelled interval along, and leaves the embargo where it is', () => {
    const change: Partial<ReleaseFormValues> = {
      race: raceOfFirst(),
      sampleSource: 'opt-in',
      statedMargin: { notDisclosed: true, pp: '', unit: '0.1', level: '95' },
      modelledInterval: { pp: '3', unit: '1', level: '90' },
      embargo: { local: '2026-09-20T06:00', zone: 'UTC' },
      n: typed('1012'),
    };
    const held = logRelease(desk.db, reporter, change);
    expect(formOf(held).values).toEqual(releaseForm({ ...change, embargo: null }));
    revise({ n: typed('1013') }, { release: held });
    expect(getRelease(reporter, held, desk.ctx()).embargo).toMatchObject({
      local: '2026-09-20T06:00',
      isRunning: true,
    });
  });

  it('is for reporters and editors, of a release that is there', () => {
    expect(formOf(id, editor).id).toBe(id);
    expect(refusal(() => formOf(id, copyDesk))[0]).toBe('forbidden');
    expect(refusal(() => formOf('no-such-release'))[0]).toBe('not-found');
  });
});

describe('changing a release', () => {
  it('keeps both versions and tells the history before and after', () => {
    const first = findRelease(desk.db, id, reporter, desk.ctx().now)!.currentVersionId!;
    expect(revise({ n: typed('1,021') }, { actor: editor })).toEqual({ version: 2 });
    const view = getRelease(reporter, id, desk.ctx());
    expect(view.facts).toMatchObject({ version: 2, n: { status: 'given', value: 1021 } });
    const kept = factsOfWhole(desk.db, findWholeVersion(desk.db, first)!);
    expect(kept).toMatchObject({ version: 1, n: { status: 'given', value: 1012 } });
    const last = listAllRecords(desk.db).at(-1)!;
    expect(last).toMatchObject({ action: 'revised release', entityId: id, personId: editor.personId });
    expect(JSON.parse(last.before!)).toMatchObject({ version: 1, n: { value: 1012 } });
    expect(JSON.parse(last.after!)).toMatchObject({ version: 2, n: { value: 1021 } });
    expect(verifyHistory(desk.db, []).ok).toBe(true);
  });

  it('renews what lists know of it and of the releases compared with it', () => {
    const earlier = logRelease(desk.db, reporter, { race: raceOfFirst(), ...AUGUST });
    const verdictsOf = (release: string) => {
      const version = findRelease(desk.db, release, reporter, desk.ctx().now)!.currentVersionId!;
      const { answer, settings } = computeFindings(desk.db, version, desk.ctx().now);
      const listed = listVerdicts(desk.db, [version], settings.policy.version, answer.engine);
      const computed = answer.findings.flatMap((one) => (one.kind === 'share' ? [] : [one.verdict]));
      expect(listed.map(({ verdict }) => verdict)).toEqual(computed);
      return computed;
    };
    const before = [verdictsOf(id), verdictsOf(earlier)];
    const shares = sharesOf([
      ['Alder', '30'],
      ['Brook', '58'],
    ]);
    revise({ shares }, { release: earlier });
    expect(verdictsOf(earlier)).not.toEqual(before[1]);
    expect(verdictsOf(id)).not.toEqual(before[0]);
  });

  it('is for reporters and editors, of a release that is there', () => {
    expect(refusal(() => revise({}, { actor: copyDesk }))[0]).toBe('forbidden');
    const input = { id: 'no-such-release', version: 1, release: releaseForm({ race: raceOfFirst() }) };
    expect(refusal(() => reviseRelease(reporter, input, desk.ctx()))[0]).toBe('not-found');
  });

  it('refuses a page that is out of date, and changes nothing then', () => {
    revise({ n: typed('1,021') });
    expect(refusal(() => revise({ n: typed('1,030') }, { version: 1 }))).toEqual([
      'conflict',
      'Somebody changed this release meanwhile. Reload it and look again.',
    ]);
    expect(formOf()).toMatchObject({ version: 2, number: 2, values: { n: typed('1021') } });
  });

  it('refuses another race, and figures that cannot be', () => {
    expect(refusal(() => revise({ race: { kind: 'existing', id: 'another-race' } }))[0]).toBe('invalid');
    expect(refusal(() => revise({ race: GOVERNOR }))[0]).toBe('invalid');
    const tooMuch = sharesOf([
      ['Alder', '80'],
      ['Brook', '41'],
    ]);
    expect(refusal(() => revise({ shares: tooMuch }))[0]).toBe('invalid');
    expect(formOf().number).toBe(1);
  });
});

describe('under cleared words', () => {
  it('nothing changes until they are pulled', () => {
    const sheet = on.cleared(reporter, editor, id);
    expect(refusal(() => revise())).toEqual(['conflict', RESTING]);
    expect(formOf().whyNot).toBe(RESTING);
    expect(getRelease(reporter, id, desk.ctx()).whyNotRevised).toBe(RESTING);
    pullSheet(editor, { id: sheet, reason: 'A figure was typed wrongly.' }, desk.ctx());
    expect(getRelease(reporter, id, desk.ctx()).whyNotRevised).toBeNull();
    expect(revise({ n: typed('1,021') })).toEqual({ version: 2 });
  });

  it('nor does a release that they compare with', () => {
    const earlier = logRelease(desk.db, reporter, { race: raceOfFirst(), ...AUGUST });
    on.cleared(reporter, editor, id);
    expect(refusal(() => revise({}, { release: earlier }))).toEqual(['conflict', RESTING]);
    expect(formOf(earlier).whyNot).toBe(RESTING);
  });
});

describe('sheets that are open', () => {
  it('go over to the new figures, and words that nobody edited with them', () => {
    const sheet = on.draft(reporter, id);
    const before = getSheet(reporter, sheet, desk.ctx());
    revise({ shares: OTHER_SHARES });
    const after = getSheet(reporter, sheet, desk.ctx());
    expect(before.finding).toMatchObject({ estimatePp: 6 });
    expect(after.finding).toMatchObject({ estimatePp: 16 });
    expect(after.evidence.release.version).toBe(2);
    const bodyOf = ({ lines }: typeof before) => lines.find(({ kind }) => kind === 'body')!;
    expect(bodyOf(before).draft).toContain('47');
    expect(bodyOf(after).draft).toContain('52');
    expect(bodyOf(after).text).toBe(bodyOf(after).draft);
  });

  it('that are filed return to their filer at clearing, who agrees to the new figures', () => {
    const sheet = on.draft(reporter, id);
    on.file(reporter, sheet);
    revise({ n: typed('1,021') });
    expect(getSheet(editor, sheet, desk.ctx())).toMatchObject({ state: 'filed', hasMoved: true });
    expect(on.clear(editor, sheet)).toEqual({ outcome: 'returned' });
    expect(getSheet(reporter, sheet, desk.ctx())).toMatchObject({ state: 'sent-back', agreesAnew: true });
    on.file(reporter, sheet);
    expect(on.clear(editor, sheet).outcome).toBe('cleared');
  });

  it('whose claim is gone say so, filed or not, and the queue still lists them', () => {
    const [drafted, filed] = [on.draft(reporter, id), on.draft(reporter, id)];
    on.file(reporter, filed);
    const [first, ...others] = formOf().values.shares;
    revise({ shares: [{ ...first!, option: 'Elder' }, ...others] });
    const gone = ['conflict', 'This release supports no such claim any more. Draft a new sheet from it.'];
    expect(refusal(() => getSheet(reporter, drafted, desk.ctx()))).toEqual(gone);
    expect(getSheet(editor, filed, desk.ctx())).toMatchObject({ state: 'filed', hasMoved: true });
    expect(refusal(() => on.clear(editor, filed))).toEqual(gone);
    on.sendBack(editor, filed, 'The option has another name now.');
    expect(refusal(() => getSheet(reporter, filed, desk.ctx()))).toEqual(gone);
    const listed = listOpenSheets(reporter, desk.ctx()).map((sheet) => sheet.id);
    expect(listed).toEqual(expect.arrayContaining([drafted, filed]));
  });
});

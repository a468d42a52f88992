import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { ReleaseFormValues } from '@/lib/domain/release-input';
import type { Actor } from '@/lib/domain/roles';
import { liftEmbargo } from '@/lib/services/release/embargo';
import { getRelease } from '@/lib/services/release/get-release';
import { listReleases } from '@/lib/services/release/list-releases';
import { overrideComparison } from '@/lib/services/release/override-comparison';
import { previewComparison } from '@/lib/services/release/preview-comparison';
import { freshDatabase, HOUR, makePerson, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease, sharesOf } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

/** NOW is 08:00 UTC of that day. */
const UNTIL_NOON = { local: '2026-09-17T12:00', zone: 'Etc/UTC' };
const AUGUST: Partial<ReleaseFormValues> = {
  fieldStartOn: '2026-08-13',
  fieldEndOn: '2026-08-16',
  publishedOn: '2026-08-19',
  shares: sharesOf([
    ['Alder', '44'],
    ['Brook', '43'],
    ['Someone else', '4'],
    ['Don’t know', '9', false],
  ]),
};

let desk: TestDatabase;
let reporter: Actor;
let editor: Actor;
let open: string;
let race: ReleaseFormValues['race'] & { kind: 'existing' };
let held: string;
beforeEach(() => {
  desk = freshDatabase();
  reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
  editor = makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] });
  open = logRelease(desk.db, reporter);
  race = { kind: 'existing', id: getRelease(reporter, open, desk.ctx()).facts.race.id };
  held = logRelease(desk.db, reporter, { ...AUGUST, race, embargo: UNTIL_NOON });
});
afterEach(() => desk.closeAndRemove());

const read = (later = 0) => getRelease(reporter, open, desk.ctx(later));
const listedVerdicts = (later = 0) =>
  listReleases(reporter, desk.ctx(later)).find(({ id }) => id === open)!.verdicts.length;

describe('an earlier release that is under embargo', () => {
  it('is not compared with by one that is out, whose words would tell its figures', () => {
    expect(read().previous).toBeNull();
    expect(read().comparison).toMatchObject({ reason: 'none-earlier', passedOver: [] });
    expect(JSON.stringify(read().document)).not.toContain('"pct":44');
    const refused = refusal(() => sheetDesk(desk.db).draft(reporter, open, 'change:Alder'));
    expect(refused[0]).toBe('invalid');
  });

  it('is not offered to the form either', () => {
    const query = {
      raceId: race.id,
      pollster: 'Kelmouth Research',
      wording: null,
      sameQuestion: true,
      answerOptions: ['Alder', 'Brook', 'Someone else'],
      hasNonAnswers: true,
      population: 'likely-voters',
      mode: 'live-telephone',
      sampleSource: 'probability',
      design: 'weighted',
      fieldStartOn: '2026-09-01',
      fieldEndOn: '2026-09-02',
    };
    expect(previewComparison(reporter, query, desk.ctx()).previous).toBeNull();
    expect(previewComparison(reporter, query, desk.ctx(4 * HOUR)).previous?.releaseId).toBe(held);
  });

  it('is not compared with by an editor’s override before the hour', () => {
    const override = (later: number) =>
      overrideComparison(
        editor,
        { id: open, comparedWith: held, reason: 'The two are of one series.' },
        desk.ctx(later),
      );
    expect(refusal(() => override(4 * HOUR - 1))).toEqual([
      'invalid',
      'That release is under embargo, and its figures would show. Compare with it once the embargo is over.',
    ]);
    override(4 * HOUR);
    expect(read(4 * HOUR).previous?.releaseId).toBe(held);
  });

  it('is compared with from the hour on', () => {
    expect(read(4 * HOUR - 1).previous).toBeNull();
    expect(read(4 * HOUR).previous?.releaseId).toBe(held);
  });

  it('is compared with once an editor has lifted the embargo, in lists too', () => {
    expect(listedVerdicts()).toBe(1);
    liftEmbargo(editor, { id: held, version: 1, reason: 'The pollster published it early.' }, desk.ctx());
    expect(read().previous?.releaseId).toBe(held);
    expect(listedVerdicts()).toBe(4);
  });
});

describe('an earlier release that is logged later', () => {
  it('changes what lists say the later one supports', () => {
    expect(listedVerdicts()).toBe(1);
    logRelease(desk.db, reporter, {
      ...AUGUST,
      race,
      fieldStartOn: '2026-08-20',
      fieldEndOn: '2026-08-22',
      publishedOn: '2026-08-23',
    });
    expect(listedVerdicts()).toBe(4);
  });
});

import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { ReleaseFormValues } from '@/lib/domain/release-input';
import type { Actor } from '@/lib/domain/roles';
import { getRelease } from '@/lib/services/release/get-release';
import { overrideComparison } from '@/lib/services/release/override-comparison';
import { previewComparison } from '@/lib/services/release/preview-comparison';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease, typed } from '@/tests/support/release';

const REASON = 'The pollster ran both modes side by side and found no difference.';

let desk: TestDatabase;
let reporter: Actor;
let editor: Actor;
let race: ReleaseFormValues['race'];
let first: string;
beforeEach(() => {
  desk = freshDatabase();
  reporter = makePerson(desk.db, { name: 'Rita Quill', roles: ['reporter'] });
  editor = makePerson(desk.db, { name: 'Edda Stone', roles: ['editor'] });
  const august = { fieldStartOn: '2026-08-10', fieldEndOn: '2026-08-13', publishedOn: '2026-08-16' };
  first = logRelease(desk.db, reporter, august);
  race = { kind: 'existing', id: getRelease(reporter, first, desk.ctx()).facts.race.id };
});
afterEach(() => desk.closeAndRemove());

const query = (change: object = {}) => ({
  raceId: race.kind === 'existing' ? race.id : '',
  pollster: 'kelmouth research',
  wording: 'if the election for governor were held today whom would you vote for',
  sameQuestion: false,
  answerOptions: ['Alder', 'Brook', 'Someone else'],
  hasNonAnswers: true,
  population: 'likely-voters',
  mode: 'live-telephone',
  sampleSource: 'probability',
  design: 'weighted',
  fieldStartOn: '2026-09-10',
  fieldEndOn: '2026-09-13',
  ...change,
});
const preview = (actor: Actor, change: object = {}) => previewComparison(actor, query(change), desk.ctx());

describe('the comparison of a release being typed', () => {
  it('is the latest earlier one that agrees, whatever case and punctuation', () => {
    const { previous, comparison } = preview(reporter);
    expect(previous?.releaseId).toBe(first);
    expect(comparison).toMatchObject({ reason: 'latest', passedOver: [] });
  });

  it.each([
    ['another mode', { mode: 'online' }, 'none-comparable'],
    ['another population', { population: 'adults' }, 'none-comparable'],
    ['field dates that overlap', { fieldStartOn: '2026-08-13' }, 'none-comparable'],
    ['earlier field dates', { fieldStartOn: '2026-07-01', fieldEndOn: '2026-07-02' }, 'none-earlier'],
    ['no field dates yet', { fieldStartOn: null, fieldEndOn: null }, 'dates-unknown'],
  ])('is none with %s, and says so', (_, change, reason) => {
    const { previous, comparison } = preview(reporter, change);
    expect(previous).toBeNull();
    expect(comparison?.reason).toBe(reason);
  });

  it('takes what is not known as no difference, and lists it', () => {
    const { previous, comparison } = preview(reporter, { mode: null });
    expect(previous?.releaseId).toBe(first);
    expect(comparison?.unknowns).toContain('mode');
  });

  it('has nothing for a pollster or race that is not on file', () => {
    expect(preview(reporter, { pollster: 'Norwater Polls' })).toMatchObject({
      previous: null,
      comparison: null,
    });
    expect(preview(reporter, { raceId: 'nothing' })).toMatchObject({ previous: null, comparison: null });
  });

  it('is refused to other roles and to bodies that are no question', () => {
    const other = makePerson(desk.db, { name: 'Cora Lane', roles: ['copy-desk', 'administrator'] });
    expect(refusal(() => preview(other))[0]).toBe('forbidden');
    expect(refusal(() => preview(reporter, { extra: 1 }))[0]).toBe('invalid');
    expect(refusal(() => preview(reporter, { wording: 'x'.repeat(2001) }))[0]).toBe('invalid');
  });
});

describe('an editor’s override', () => {
  let online: string;
  beforeEach(() => {
    online = logRelease(desk.db, reporter, { race, mode: typed('online') }, 1000);
  });
  const override = (actor: Actor, change: object = {}) =>
    overrideComparison(actor, { id: online, comparedWith: first, reason: REASON, ...change }, desk.ctx(2000));

  it('compares two releases that differ, names the differences and keeps the reason', () => {
    expect(getRelease(reporter, online, desk.ctx()).previous).toBeNull();
    override(editor);
    const { previous, comparison } = getRelease(reporter, online, desk.ctx());
    expect(previous?.releaseId).toBe(first);
    expect(comparison).toMatchObject({
      reason: 'override',
      override: { reason: REASON, by: 'Edda Stone' },
      differences: [{ item: 'mode' }],
    });
  });

  it('is refused to a reporter, without a reason, with itself, with a later one and with nothing', () => {
    expect(refusal(() => override(reporter))[0]).toBe('forbidden');
    expect(refusal(() => override(editor, { reason: 'same' }))[0]).toBe('invalid');
    expect(refusal(() => override(editor, { comparedWith: online }))[0]).toBe('invalid');
    expect(refusal(() => override(editor, { id: first, comparedWith: online }))[0]).toBe('invalid');
    expect(refusal(() => override(editor, { comparedWith: 'nothing' }))[0]).toBe('not-found');
    expect(getRelease(reporter, online, desk.ctx()).previous).toBeNull();
  });
});

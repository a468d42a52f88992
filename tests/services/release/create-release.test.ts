import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { ReleaseFormValues } from '@/lib/domain/release-input';
import type { Actor } from '@/lib/domain/roles';
import { AppError, type FieldErrors } from '@/lib/errors';
import { createRelease } from '@/lib/services/release/create-release';
import { getReleaseDraft, saveReleaseDraft } from '@/lib/services/release/draft';
import { getRelease } from '@/lib/services/release/get-release';
import { listReleases } from '@/lib/services/release/list-releases';
import { verifyHistory } from '@/lib/services/history/verify';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease, releaseForm, sharesOf, typed, withheld } from '@/tests/support/release';

const KEY = 'form-key-of-a-test-0001';

let desk: TestDatabase;
let reporter: Actor;
let editor: Actor;
beforeEach(() => {
  desk = freshDatabase();
  reporter = makePerson(desk.db, { name: 'Rita Quill', roles: ['reporter'] });
  editor = makePerson(desk.db, { name: 'Edda Stone', roles: ['editor'] });
});
afterEach(() => desk.closeAndRemove());

const send = (actor: Actor, release: unknown, submissionKey: unknown = KEY) =>
  createRelease(actor, { submissionKey, release }, desk.ctx());

function faults(act: () => unknown): FieldErrors {
  try {
    act();
  } catch (error) {
    if (error instanceof AppError) return error.fields;
    throw error;
  }
  throw new Error('the act was not refused');
}

describe('logging a release', () => {
  it('keeps what was typed and computes what it supports', () => {
    const { id } = send(reporter, releaseForm());
    const view = getRelease(editor, id, desk.ctx());
    expect(view.facts).toMatchObject({ n: { status: 'given', value: 1012 }, decimals: 0, version: 1 });
    expect(view.loggedBy).toBe('Rita Quill');
    expect(view.enteredBy).toEqual({
      Alder: 'Rita Quill',
      Brook: 'Rita Quill',
      'Someone else': 'Rita Quill',
      'Don’t know': 'Rita Quill',
    });
    expect(view.answer.base.deff).toBeCloseTo(1.4426, 4);
    expect(view.answer.findings.find((finding) => finding.kind === 'lead')).toMatchObject({
      estimatePp: 6,
      verdict: 'does-not-hold',
    });
    expect(verifyHistory(desk.db, []).ok).toBe(true);
  });

  it('tells withheld from empty and keeps a closing zero', () => {
    const { id } = send(
      reporter,
      releaseForm({
        n: withheld,
        sponsor: typed(''),
        shares: sharesOf([
          ['Alder', '47.0'],
          ['Brook', '41.5'],
        ]),
      }),
    );
    const { facts, missing } = getRelease(reporter, id, desk.ctx());
    expect(facts.n).toEqual({ status: 'not-disclosed' });
    expect(facts.sponsor).toEqual({ status: 'not-entered' });
    expect(facts.shares.map(({ units }) => units)).toEqual([470, 415]);
    expect(missing.map(({ item, status }) => [item, status])).toEqual([
      ['sponsor', 'not-entered'],
      ['sample-size', 'not-disclosed'],
    ]);
  });

  it('takes away the draft that it was typed as', () => {
    saveReleaseDraft(reporter, { body: '{"pollster":"Kelmouth"}', basedOn: null }, desk.ctx());
    send(reporter, releaseForm());
    expect(getReleaseDraft(reporter, desk.ctx())).toBeNull();
  });

  it('makes one release of the same form sent twice', () => {
    const first = send(reporter, releaseForm());
    expect(send(reporter, releaseForm())).toEqual(first);
    expect(listReleases(reporter, desk.ctx())).toHaveLength(1);
  });

  it('refuses somebody else who replays the form', () => {
    send(reporter, releaseForm());
    expect(refusal(() => send(editor, releaseForm()))[0]).toBe('conflict');
    expect(listReleases(reporter, desk.ctx())).toHaveLength(1);
  });

  it.each(['copy-desk', 'administrator'] as const)('refuses a %s', (role) => {
    const other = makePerson(desk.db, { name: `Only ${role}`, roles: [role] });
    expect(refusal(() => send(other, releaseForm()))[0]).toBe('forbidden');
    expect(listReleases(reporter, desk.ctx())).toEqual([]);
  });

  it('refuses a body that is no form, with nothing written', () => {
    const bodies: unknown[] = [null, 7, 'text', [], {}, { ...releaseForm(), extra: 1 }];
    for (const body of bodies) expect(refusal(() => send(reporter, body))[0]).toBe('invalid');
    expect(refusal(() => send(reporter, releaseForm(), 'short'))[0]).toBe('invalid');
    expect(refusal(() => send(reporter, releaseForm(), { length: 20 }))[0]).toBe('invalid');
    expect(listReleases(reporter, desk.ctx())).toEqual([]);
  });

  it('refuses more than a form can hold', () => {
    const long = 'x'.repeat(20_001);
    expect(faults(() => send(reporter, releaseForm({ methodNote: long })))).toHaveProperty([
      'release.methodNote',
    ]);
    const rows = Array.from({ length: 31 }, (_, at): [string, string] => [`Option ${at}`, '1']);
    expect(faults(() => send(reporter, releaseForm({ shares: sharesOf(rows) })))).toHaveProperty([
      'release.shares',
    ]);
  });

  it.each<[string, Partial<ReleaseFormValues>, string]>([
    [
      'shares above 100 beyond rounding',
      {
        shares: sharesOf([
          ['Alder', '70'],
          ['Brook', '41'],
        ]),
      },
      'shares',
    ],
    [
      'a margin that is no multiple of its unit',
      { statedMargin: { notDisclosed: false, pp: '3.7', unit: '0.5', level: '95' } },
      'statedMargin.pp',
    ],
    ['a race that is gone', { race: { kind: 'existing', id: 'nothing' } }, 'race.id'],
  ])('refuses %s at its field', (_, change, field) => {
    expect(Object.keys(faults(() => send(reporter, releaseForm(change))))).toEqual([field]);
    expect(listReleases(reporter, desk.ctx())).toEqual([]);
  });

  it('refuses a second race of a name that is on file', () => {
    send(reporter, releaseForm());
    const again = () => send(reporter, releaseForm(), 'form-key-of-a-test-0002');
    expect(faults(again)).toHaveProperty(['race.race.name']);
  });
});

describe('reading releases', () => {
  it.each(['copy-desk', 'administrator'] as const)('is not for a %s', (role) => {
    const id = logRelease(desk.db, reporter);
    const other = makePerson(desk.db, { name: `Only ${role}`, roles: [role] });
    expect(refusal(() => listReleases(other, desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => getRelease(other, id, desk.ctx()))[0]).toBe('forbidden');
  });

  it('does not tell an unknown id from any other', () => {
    expect(refusal(() => getRelease(reporter, 'nothing', desk.ctx()))[0]).toBe('not-found');
  });

  it('lists the newest first with its largest shares and verdicts', () => {
    const first = logRelease(desk.db, reporter);
    const race = { kind: 'existing' as const, id: getRelease(reporter, first, desk.ctx()).facts.race.id };
    const dates = { fieldStartOn: '2026-09-14', fieldEndOn: '2026-09-15' };
    const second = logRelease(desk.db, reporter, { race, ...dates, pollster: 'Norwater Polls' }, 1000);
    const [newest, older] = listReleases(reporter, desk.ctx(2000));
    expect([newest?.id, older?.id]).toEqual([second, first]);
    expect(newest).toMatchObject({
      pollster: 'Norwater Polls',
      topShares: [
        { option: 'Alder', printed: '47' },
        { option: 'Brook', printed: '41' },
        { option: 'Someone else', printed: '4' },
      ],
      verdicts: ['does-not-hold'],
      isUnderEmbargo: false,
    });
  });
});

import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { liveDocument } from '@/components/forms/release/live-document';
import type { ReleaseFormValues } from '@/lib/domain/release-input';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import { listCopyDesk } from '@/lib/services/copy/list-copy-desk';
import { addPerson } from '@/lib/services/people/add-person';
import { listPeople } from '@/lib/services/people/list-people';
import { getRelease } from '@/lib/services/release/get-release';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease, releaseForm, sharesOf, typed } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const { db } = desk;
const reporter = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const administrator = makePerson(db, { name: 'Ned Harrow', roles: ['administrator'] });

let race: ReleaseFormValues['race'] & { kind: 'existing' };
let first: string;
beforeAll(() => {
  first = logRelease(db, reporter);
  race = { kind: 'existing', id: getRelease(reporter, first, desk.ctx()).facts.race.id };
});

const HOSTILE = sharesOf([
  ['Al\u202eder', '47'],
  ['Br\u0007ook\n of the\u2067 Quay', '41'],
  ['Don’t know', '12', false],
]);

describe('names with characters that nobody sees', () => {
  it('are stored without them, on one line, so that no printed sentence is turned around', () => {
    const change = {
      race,
      pollster: 'Quillon\u202e  Panel',
      sponsor: typed('The\u200b Courier\u2028'),
      shares: HOSTILE,
    };
    const id = logRelease(db, reporter, change);
    const { facts } = getRelease(reporter, id, desk.ctx());
    expect([facts.pollster.name, facts.sponsor]).toMatchObject([
      'Quillon Panel',
      { value: { name: 'The Courier' } },
    ]);
    expect(facts.shares.map(({ option }) => option)).toEqual(['Alder', 'Brook of the Quay', 'Don’t know']);
    const on = sheetDesk(db);
    const sheet = getSheet(reporter, on.draft(reporter, id, 'lead:Alder|Brook of the Quay'), desk.ctx());
    expect(JSON.stringify(sheet.lines)).not.toMatch(/[\u0007\u200b\u202a-\u202e\u2066-\u2069]/);
  });

  it('cannot pass for another option of the same name', () => {
    const shares = sharesOf([
      ['Alder', '47'],
      ['Alder\u200b', '41'],
    ]);
    expect(refusal(() => logRelease(db, reporter, { race, shares }))[0]).toBe('invalid');
    expect(refusal(() => logRelease(db, reporter, { race, pollster: '\u200b\u202e' }))[0]).toBe('invalid');
  });

  it('are those of people too', () => {
    const input = { name: 'Edda\u202e Stone\n', email: 'edda@courier.example', roles: ['reporter'] };
    addPerson(administrator, input, desk.ctx());
    expect(listPeople(administrator, desk.ctx()).map(({ name }) => name)).toContain('Edda Stone');
  });

  it('are read by the form as the service stores them', () => {
    const around = { policy: DEFAULT_POLICY, previous: null, thresholds: [] };
    const live = liveDocument(releaseForm({ shares: HOSTILE }), around)!;
    expect(live.document.release.shares.map(({ option }) => option)).toEqual([
      'Alder',
      'Brook of the Quay',
      'Don’t know',
    ]);
  });
});

describe('names beyond ASCII', () => {
  it('are one name in any case, and are found in any', () => {
    const change = (pollster: string) => ({ race, pollster, sponsor: typed('ÉCHO D’ÂVERIL') });
    const ids = ['Éclat Ökonometrie', 'ÉCLAT ÖKONOMETRIE', 'e\u0301clat o\u0308konometrie'].map((name) =>
      logRelease(db, reporter, change(name)),
    );
    const facts = ids.map((id) => getRelease(reporter, id, desk.ctx()).facts);
    expect(new Set(facts.map(({ pollster }) => pollster.name))).toEqual(new Set(['Éclat Ökonometrie']));
    const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
    const sheet = sheetDesk(db).cleared(reporter, editor, ids[0]!);
    for (const pollster of ['éclat', 'ÖKONO', 'E\u0301CLAT'])
      expect(listCopyDesk(editor, { race: '', pollster }, desk.ctx()).map(({ id }) => id)).toEqual([sheet]);
  });
});

describe('an earlier release that spells its options otherwise', () => {
  it('is compared option by option, on the page and in the form', () => {
    const earlier = {
      race,
      fieldStartOn: '2026-08-13',
      fieldEndOn: '2026-08-16',
      publishedOn: '2026-08-19',
      shares: sharesOf([
        ['BROOK', '43'],
        ['ALDER', '44'],
        ['Someone else', '4'],
        ["Don't know", '9', false],
      ]),
    };
    logRelease(db, reporter, earlier);
    const { answer, previous, document } = getRelease(reporter, first, desk.ctx());
    const changes = answer.findings.flatMap((finding) =>
      finding.kind === 'change' ? [[finding.option, finding.estimatePp]] : [],
    );
    expect(changes).toEqual([
      ['Alder', 3],
      ['Brook', -2],
    ]);
    expect(answer.findings.map(({ kind }) => kind)).toContain('lead-change');
    expect(previous!.shares.map(({ option }) => option)).toEqual([
      'Brook',
      'Alder',
      'Someone else',
      'Don’t know',
    ]);
    const live = liveDocument(releaseForm(), { policy: DEFAULT_POLICY, previous, thresholds: [] });
    expect(live!.document).toEqual(document);
  });
});

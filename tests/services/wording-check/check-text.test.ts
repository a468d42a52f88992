import { afterAll, describe, expect, it } from 'vitest';
import type { Actor } from '@/lib/domain/roles';
import { setEmbargoReader } from '@/lib/services/release/embargo';
import { getRelease } from '@/lib/services/release/get-release';
import { checkText, type TextChecked } from '@/lib/services/wording-check/check-text';
import { listCheckable } from '@/lib/services/wording-check/list-checkable';
import { freshDatabase, HOUR, makePerson } from '@/tests/support/database';
import { givenRelease } from '@/tests/support/given-release';
import { refusal } from '@/tests/support/refusal';
import { GOVERNOR, logRelease } from '@/tests/support/release';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);
const { db } = desk;
const reporter = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
const copyDesk = makePerson(db, { name: 'Cora Lind', roles: ['copy-desk'] });
const nobody = makePerson(db, { name: 'Ned Void', roles: [] });
const open = logRelease(db, reporter);
const toll = { ...GOVERNOR, race: { ...('race' in GOVERNOR ? GOVERNOR.race : {}), name: 'Bridge toll' } };
const held = logRelease(db, reporter, {
  race: toll as typeof GOVERNOR,
  embargo: { local: '2026-09-17T12:00', zone: 'UTC' },
  publishedOn: '2026-09-17',
});

const ask = (actor: Actor, input: unknown, later = 0) => checkText(actor, input, desk.ctx(later));
function answered(actor: Actor, input: unknown, later = 0): TextChecked {
  const outcome = ask(actor, input, later);
  if (outcome.kind !== 'answer') throw new Error(`not answered: ${JSON.stringify(outcome)}`);
  return outcome.answer;
}
function refused(input: unknown) {
  const outcome = ask(reporter, input);
  if (outcome.kind !== 'refused') throw new Error(`not refused: ${outcome.kind}`);
  return outcome.error;
}

describe('a pasted text', () => {
  it('is marked against a release of the desk, which the answer names', () => {
    const { marks, releases } = answered(reporter, {
      text: 'Alder leads Brook in the Kelmouth Research poll.',
      language: 'en',
      releases: [open],
    });
    expect(marks.find(({ rule }) => rule === 'lead')).toMatchObject({
      phrase: 'leads',
      grade: 'not-supported',
      release: 0,
      claim: 'lead:Alder|Brook',
    });
    expect(releases).toEqual([
      {
        id: open,
        race: 'Averil Coast governor',
        pollster: 'Kelmouth Research',
        fieldStartOn: '2026-09-10',
        fieldEndOn: '2026-09-13',
      },
    ]);
  });

  it('is marked without any release by the rules that need no figures, and is told what was not judged', () => {
    const { marks, cannotJudge, releases } = answered(copyDesk, { text: 'It is a statistical tie.' });
    expect(marks.map(({ rule, grade }) => [rule, grade])).toContainEqual(['level', 'not-supported']);
    expect(cannotJudge[0]).toContain('No release is given');
    expect(releases).toEqual([]);
  });

  it('is marked against a release that comes with it, as against the desk’s own of the same figures', () => {
    const text = 'Alder leads Brook by 6 points in the Kelmouth Research poll.';
    const [own, given] = [open, givenRelease()].map(
      (release) => answered(reporter, { text, releases: [release] }).marks,
    );
    expect(given!.map(({ rule, grade, phrase }) => [rule, grade, phrase])).toEqual(
      own!.map(({ rule, grade, phrase }) => [rule, grade, phrase]),
    );
  });

  it('leaves nothing behind: neither the history nor any table has a word of it', () => {
    const word = 'Zephyranthine';
    const before = db.$client.prepare('select count(*) as n from records').get();
    answered(reporter, { text: `${word}: Alder leads Brook.`, releases: [open] });
    expect(db.$client.prepare('select count(*) as n from records').get()).toEqual(before);
    expect(db.$client.serialize().includes(word)).toBe(false);
  });
});

describe('a release under embargo', () => {
  it('is there for reporters, and is not there at all for the copy desk until its hour', () => {
    const input = { text: 'Alder leads Brook.', releases: [held] };
    expect(answered(reporter, input).releases[0]?.id).toBe(held);
    expect(refusal(() => ask(copyDesk, input))).toEqual(
      refusal(() => ask(copyDesk, { ...input, releases: ['nothing-of-that-id'] })),
    );
    expect(listCheckable(copyDesk, desk.ctx()).map(({ id }) => id)).toEqual([open]);
    expect(listCheckable(reporter, desk.ctx()).map(({ id, isUnderEmbargo }) => [id, isUnderEmbargo])).toEqual(
      [
        [held, true],
        [open, false],
      ],
    );
    expect(answered(copyDesk, input, 4 * HOUR).releases[0]?.id).toBe(held);
    expect(listCheckable(copyDesk, desk.ctx(4 * HOUR))).toHaveLength(2);
  });

  it('is there for a named person, whose look at it is written down', () => {
    setEmbargoReader(editor, { id: held, personId: copyDesk.publicId, listed: true }, desk.ctx());
    answered(copyDesk, { text: 'Alder leads Brook.', releases: [held] });
    expect(getRelease(editor, held, desk.ctx()).embargoViews).toMatchObject([
      { name: 'Cora Lind', count: 1 },
    ]);
  });
});

describe('what cannot be checked', () => {
  it.each([
    ['no object', [], '', /one object/],
    ['no text', {}, 'text', /Give the text/],
    ['a text that is too long', { text: 'a'.repeat(20_001) }, 'text', /20,000/],
    ['another language', { text: '', language: 'la' }, 'language', /en, es, fr or de/],
    ['a key that is not known', { text: '', title: '' }, 'title', /not known/],
    ['too many releases', { text: '', releases: Array(6).fill('x') }, 'releases', /At most 5/],
    ['a number for a release', { text: '', releases: [7] }, 'releases[0]', /id or a release/],
    ['a sample of none', { text: '', releases: [givenRelease(0)] }, 'releases[0].release.n', /at least 1/],
    ['no names', { text: '', releases: [{ release: {} }] }, 'releases[0].names', /names/],
    [
      'a day that is none',
      {
        text: '',
        releases: [givenRelease(9, { dates: { fieldStartOn: '2026-02-30', fieldEndOn: '2026-03-01' } })],
      },
      'releases[0].dates.fieldStartOn',
      /YYYY-MM-DD/,
    ],
    [
      'a policy of its own',
      { text: '', releases: [givenRelease(900, { policy: { level: 0.5 } })] },
      'releases[0].policy',
      /desk’s own/,
    ],
    [
      'an earlier release without dates',
      { text: '', releases: [givenRelease(900, { previous: givenRelease().release })] },
      'releases[0].previousDates',
      /field dates/,
    ],
  ])('is refused at its place: %s', (_, input, path, message) => {
    const error = refused(input);
    expect(error.path).toBe(path);
    expect(error.message).toMatch(message);
  });

  it('is nobody’s who holds no role', () => {
    expect(refusal(() => ask(nobody, { text: '' }))[0]).toBe('forbidden');
    expect(refusal(() => listCheckable(nobody, desk.ctx()))[0]).toBe('forbidden');
  });

  it('is put off where somebody asks too much at once, sooner with long texts', () => {
    const hasty = makePerson(db, { name: 'Hal Rush', roles: ['reporter'] });
    const kinds = Array.from({ length: 20 }, () => ask(hasty, { text: 'word '.repeat(3999) }).kind);
    expect(kinds.filter((kind) => kind === 'too-many').length).toBeGreaterThan(0);
    expect(kinds[0]).toBe('answer');
    expect(ask(hasty, { text: '' }, HOUR).kind).toBe('answer');
  });
});

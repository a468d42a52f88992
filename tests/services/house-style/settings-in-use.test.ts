import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { insertHouseStyle } from '@/db/queries/desk';
import { write } from '@/db/write';
import { getRelease } from '@/lib/services/release/get-release';
import { fileSheet } from '@/lib/services/sheet/file-sheet';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { checkText } from '@/lib/services/wording-check/check-text';
import { DEFAULT_HOUSE_STYLE, type HouseStyle } from '@/lib/wording/house-style';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease, sharesOf } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

let desk = freshDatabase();
beforeEach(() => {
  desk.closeAndRemove();
  desk = freshDatabase();
  reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
});
afterAll(() => desk.closeAndRemove());
let reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });

/** As two editors would have agreed to it. */
function decide(change: Partial<HouseStyle>): void {
  const body = { ...DEFAULT_HOUSE_STYLE, ...change };
  write(desk.db, (tx) => insertHouseStyle(tx, JSON.stringify(body), desk.ctx().now));
}

const CLEAR_LEAD = sharesOf([
  ['Alder', '55'],
  ['Brook', '38'],
  ['Don’t know', '7', false],
]);
const linesOf = (id: string) => getSheet(reporter, id, desk.ctx()).lines;
const textOf = (id: string, kind: string) => linesOf(id).find((line) => line.kind === kind)?.text ?? '';
const drafted = () =>
  sheetDesk(desk.db).draft(reporter, logRelease(desk.db, reporter, { shares: CLEAR_LEAD }));

describe('a setting of house style', () => {
  it.each([
    ['sign', '55% to 38%'],
    ['word', '55 percent to 38 percent'],
    ['per-cent', '55 per cent to 38 per cent'],
  ] as const)('prints percent as a %s in the next draft', (percent, printed) => {
    decide({ percent });
    expect(textOf(drafted(), 'headline')).toContain(printed);
  });

  it.each([
    ['whole', '±6 points'],
    ['half', '±6.5 points'],
    ['tenth', '±6.3 points'],
  ] as const)('rounds margins to %s points in the next draft', (margins, printed) => {
    decide({ margins });
    const statedMargin = { notDisclosed: false, pp: '3.3', unit: '0.1', level: '95' };
    const releaseId = logRelease(desk.db, reporter, { shares: CLEAR_LEAD, statedMargin });
    expect(textOf(sheetDesk(desk.db).draft(reporter, releaseId), 'caveat')).toContain(printed);
  });

  it.each([
    ['figures', 'a gap of 6 percentage points'],
    ['words-to-nine', 'a gap of six percentage points'],
  ] as const)('writes whole points in %s in the next draft', (numbers, printed) => {
    decide({ numbers });
    const id = sheetDesk(desk.db).draft(reporter, logRelease(desk.db, reporter));
    expect(textOf(id, 'body')).toContain(printed);
  });
});

describe('banned and preferred phrases', () => {
  const marksOf = (text: string) => {
    const outcome = checkText(reporter, { text, language: 'en', releases: [] }, desk.ctx());
    if (outcome.kind !== 'answer') throw new Error('the text was not checked');
    return outcome.answer.marks.map(({ rule, grade, phrase, replacement }) => [
      rule,
      grade,
      phrase,
      replacement,
    ]);
  };

  it('are marked in any text from the moment they are in force', () => {
    expect(marksOf('A horse race, says the survey.')).toEqual([]);
    decide({
      banned: { ...DEFAULT_HOUSE_STYLE.banned, en: ['horse race'] },
      preferred: { ...DEFAULT_HOUSE_STYLE.preferred, en: [{ say: 'poll', insteadOf: 'survey' }] },
    });
    expect(marksOf('A horse race, says the survey.')).toEqual([
      ['house-phrase', 'house-style', 'horse race', null],
      ['house-phrase', 'house-style', 'survey', 'poll'],
    ]);
  });

  it('are marked in a sheet, and do not keep it from being filed', () => {
    decide({ preferred: { ...DEFAULT_HOUSE_STYLE.preferred, en: [{ say: 'poll', insteadOf: 'survey' }] } });
    const on = sheetDesk(desk.db);
    const id = drafted();
    on.file(reporter, id, { body: 'Alder has 55% in this survey by Kelmouth Research.' });
    const body = linesOf(id).find(({ kind }) => kind === 'body');
    expect(body?.marks).toMatchObject([{ rule: 'house-phrase', phrase: 'survey', replacement: 'poll' }]);
  });

  it('of an older house style, one list for all, are held against every language', () => {
    const body = { ...DEFAULT_HOUSE_STYLE, banned: ['horse race'], preferred: [] };
    write(desk.db, (tx) => insertHouseStyle(tx, JSON.stringify(body), desk.ctx().now));
    expect(marksOf('A horse race.')).toHaveLength(1);
  });
});

describe('headlines that rest on one poll', () => {
  const headlineOf = (id: string) => linesOf(id).find(({ kind }) => kind === 'headline')!;

  it('are drafted and filed without a word where the desk allows them', () => {
    const id = drafted();
    expect(headlineOf(id)).toMatchObject({ knockedOut: false, marks: [] });
    sheetDesk(desk.db).file(reporter, id);
    expect(getSheet(reporter, id, desk.ctx()).state).toBe('filed');
  });

  it('are drafted, marked and filed where the desk warns', () => {
    decide({ onePollHeadlines: 'warn' });
    const id = drafted();
    expect(headlineOf(id)).toMatchObject({ knockedOut: false, marks: [{ rule: 'one-poll', phrase: '' }] });
    sheetDesk(desk.db).file(reporter, id);
    expect(getSheet(reporter, id, desk.ctx()).state).toBe('filed');
  });

  it('are knocked out of the draft and refused at filing where the desk refuses them', () => {
    decide({ onePollHeadlines: 'refuse' });
    const on = sheetDesk(desk.db);
    const id = drafted();
    expect(headlineOf(id).knockedOut).toBe(true);
    const filing = on.filing(reporter, id);
    const lines = filing.lines.map((line) => ({ ...line, knockedOut: false }));
    expect(refusal(() => fileSheet(reporter, { ...filing, lines }, desk.ctx()))).toEqual([
      'invalid',
      'House style files no headline that rests on one poll.',
    ]);
    on.file(reporter, id);
    expect(getSheet(reporter, id, desk.ctx()).state).toBe('filed');
  });

  it('are not those of a change, which rests on two', () => {
    decide({ onePollHeadlines: 'refuse' });
    const earlier = { fieldStartOn: '2026-08-10', fieldEndOn: '2026-08-13', publishedOn: '2026-08-16' };
    const first = logRelease(desk.db, reporter, earlier);
    const race = { kind: 'existing' as const, id: getRelease(reporter, first, desk.ctx()).facts.race.id };
    const releaseId = logRelease(desk.db, reporter, { race });
    const id = sheetDesk(desk.db).draft(reporter, releaseId, 'change:Alder');
    expect(headlineOf(id)).toMatchObject({ knockedOut: false, marks: [] });
  });

  it('are told of a pasted headline too', () => {
    decide({ onePollHeadlines: 'warn' });
    const releaseId = logRelease(desk.db, reporter, { shares: CLEAR_LEAD });
    const ask = (part: string) => {
      const input = { text: 'Alder 55%, Brook 38%', part, releases: [releaseId] };
      const outcome = checkText(reporter, input, desk.ctx());
      return outcome.kind === 'answer' ? outcome.answer.marks.map(({ rule }) => rule) : [];
    };
    expect(ask('headline')).toContain('one-poll');
    expect(ask('whole')).not.toContain('one-poll');
  });
});

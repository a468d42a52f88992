import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import { checkWording, MAX_TEXT } from '@/lib/wording/check/check-wording';
import { checkedReleaseOf } from '@/lib/wording/check/checked-release';
import type { CheckedRelease, WordingCheckInput } from '@/lib/wording/check/types';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { earlierOf, releaseOf } from '../examples';

const held = checkedReleaseOf(releaseOf({ Alder: 52, Brook: 38, 'Don’t know': 6 }), null, DEFAULT_POLICY);
const open = checkedReleaseOf(releaseOf({ Alder: 45, Brook: 42, 'Don’t know': 9 }), null, DEFAULT_POLICY);

const inputOf = (text: string, releases: readonly CheckedRelease[]): WordingCheckInput => ({
  text,
  language: 'en',
  releases,
  houseStyle: DEFAULT_HOUSE_STYLE,
  policy: DEFAULT_POLICY,
});
const marksOf = (text: string, releases: readonly CheckedRelease[] = [open]) =>
  checkWording(inputOf(text, releases)).marks;
const told = (text: string, releases?: readonly CheckedRelease[]) =>
  marksOf(text, releases).map(({ rule, grade, phrase }) => `${rule} ${grade}: ${phrase}`);

describe('checkWording', () => {
  it('says where a phrase stands, what it rests on and what may be said instead', () => {
    const text = 'Poll: Alder leads Brook';
    expect(marksOf(text)).toEqual([
      {
        start: 12,
        end: 17,
        phrase: 'leads',
        rule: 'lead',
        grade: 'not-supported',
        quoted: false,
        release: 0,
        claim: 'lead:Alder|Brook',
        message: 'Chance alone could produce this gap: no word of leading is supported.',
        replacement: 'has the higher figure, but chance alone could produce that gap',
      },
    ]);
  });

  it.each([
    ['Alder leads Brook', [], []],
    ['Brook leads Alder', ['lead wrong: leads'], ['lead wrong: leads']],
    ['The poll cannot say who leads', [], []],
    ['There is no sign that Alder is ahead', [], []],
    ['Alder’s campaign goes ahead with its rally', [], []],
    ['Alder, Brook in dead heat', ['level not-supported: dead heat'], ['level not-supported: dead heat']],
    ['Alder at 50%', ['figure wrong: 50%'], ['figure wrong: 50%']],
  ])('reads “%s”', (text, onHeld, onOpen) => {
    expect(told(text, [held])).toEqual(onHeld);
    const extra = text === 'Alder leads Brook' ? ['lead not-supported: leads'] : onOpen;
    expect(told(text, [open])).toEqual(extra);
  });

  it.each([
    '“We lead,” Alder said',
    '"We lead," Alder said',
    '«We lead», Alder said',
    '„We lead“, Alder said',
  ])('grades no words of others: %s', (text) => {
    const reversed = text.replace('We lead', 'Brook leads Alder');
    expect(marksOf(reversed).map(({ grade, quoted }) => [grade, quoted])).toEqual([['cannot-judge', true]]);
  });

  it('takes an apostrophe for no quotation mark', () => {
    expect(marksOf("Brook's rivals say Brook leads Alder's ticket").map(({ quoted }) => quoted)).toEqual([
      false,
    ]);
  });

  it('finds names whatever their case, accents or invisible characters', () => {
    const accented = checkedReleaseOf(releaseOf({ Éldér: 52, Brook: 38 }), null, DEFAULT_POLICY);
    expect(told('BROOK LEADS ELDER', [accented])).toEqual(['lead wrong: LEADS']);
    expect(told('Bro\u200bok leads E\u0301lder', [accented])).toEqual(['lead wrong: leads']);
  });

  it('keeps names that contain words of leading', () => {
    const names = checkedReleaseOf(
      releaseOf({ 'Forward Lead': 45, 'Rising Tide': 42 }),
      null,
      DEFAULT_POLICY,
    );
    expect(told('Forward Lead at 45%, Rising Tide at 42%', [names])).toEqual([]);
    expect(told('Forward Lead leads Rising Tide', [names])).toEqual(['lead not-supported: leads']);
  });

  it('says that a change cannot be judged without an earlier release', () => {
    expect(told('Alder is up 5 points')).toEqual(['change cannot-judge: up']);
  });

  it('refuses a comparison of releases that differ in who was asked', () => {
    const adults = earlierOf({ Alder: 40, Brook: 47 }, { population: { status: 'given', value: 'adults' } });
    const changed = checkedReleaseOf(releaseOf({ Alder: 52, Brook: 38 }), adults, DEFAULT_POLICY);
    expect(told('Alder is up since August', [changed])).toEqual(['not-comparable not-supported: up']);
  });

  it('knows what needs no figures where no release is given', () => {
    const { marks, cannotJudge } = checkWording(
      inputOf('A dead heat, the poll proves; Brook will win by 6 points', []),
    );
    expect(marks.map(({ rule }) => rule)).toEqual(['level', 'proof', 'forecast']);
    expect(cannotJudge).toHaveLength(1);
  });

  it('judges a subgroup by its own standard', () => {
    const groups = { subgroups: [{ name: 'young voters', isBelowStandard: true }] };
    const release = checkedReleaseOf(releaseOf({ Alder: 52, Brook: 38 }), null, DEFAULT_POLICY, groups);
    expect(told('Among young voters Alder is ahead', [release])).toEqual([
      'subgroup not-supported: Among young voters',
    ]);
    expect(told('Among rural voters Alder is ahead', [release])).toEqual([
      'subgroup cannot-judge: Among rural voters',
    ]);
  });

  it('asks a text that stands alone for its particulars, and a line of a sheet for none', () => {
    const text = 'Alder has 52%. Brook has 38%. The poll asked likely voters.';
    expect(marksOf(text, [held])[0]?.message).toMatch(/^Missing: the pollster, the sponsor, the field dates/);
    expect(checkWording({ ...inputOf(text, [held]), part: 'line' }).marks).toEqual([]);
  });
});

describe('checkWording on hostile text', () => {
  it('refuses a text that is too long', () => {
    expect(() => marksOf('x'.repeat(MAX_TEXT + 1))).toThrow(
      new RangeError('checkWording requires a text of at most 20000 characters'),
    );
  });

  it.each([
    ['words of leading', 'Alder leads Brook '],
    ['open quotations', '“Alder ‘leads "Brook '],
    ['numbers', '52% to 38-41–40 ±3 '],
    ['one word', 'a'],
    ['apostrophes', "'"],
    ['spaces', '" '],
    ['half surrogates', '\ud800'],
    ['marks of direction', '\u202e\u200f\u2066'],
    ['full stops', '. '],
    ['months', 'September 14 – 17 '],
  ])('reads the longest text of %s in less than two seconds of its own', (_, piece) => {
    const text = piece.repeat(Math.floor(MAX_TEXT / piece.length));
    const before = process.cpuUsage().user;
    expect(() => marksOf(text)).not.toThrow();
    expect((process.cpuUsage().user - before) / 1000).toBeLessThan(2000);
  });

  it('never throws, and marks what stands in the text', () => {
    const words = [
      'Alder',
      'Brook',
      'leads',
      '“',
      '”',
      "'",
      '47%',
      'by 6',
      '\ud83d',
      '\u200b',
      '±',
      'one in three',
      '\n',
      '?',
      'since',
      'September',
      '14–17',
      'most',
      'half',
    ];
    const text = fc.array(fc.oneof(fc.constantFrom(...words), fc.string({ unit: 'binary', maxLength: 5 })), {
      maxLength: 60,
    });
    fc.assert(
      fc.property(text, fc.constantFrom(' ', ''), (pieces, glue) => {
        const whole = pieces.join(glue);
        for (const { start, end, phrase, quoted, grade } of marksOf(whole)) {
          expect(whole.slice(start, end)).toBe(phrase);
          expect(quoted && grade === 'wrong').toBe(false);
        }
      }),
      { numRuns: 300 },
    );
  });

  it('changes nothing it is given and says the same again', () => {
    const input = inputOf('Brook leads Alder by 3 percent', [open]);
    const copy = structuredClone(input);
    const first = checkWording(input);
    expect(input).toEqual(copy);
    expect(checkWording(structuredClone(input))).toEqual(first);
  });

  it('reads 300 words against twelve options in less than 20 ms', () => {
    const names = Array.from({ length: 12 }, (_, index) => `Party ${'ABCDEFGHIJKL'.charAt(index)}lder`);
    const shares = Object.fromEntries(names.map((name, index) => [name, 14 - index]));
    const releases = [checkedReleaseOf(releaseOf(shares), earlierOf(shares), DEFAULT_POLICY)];
    const sentence = `${names[0]} leads ${names[1]} by one point, 14% to 13%, and is up since August, the poll of likely voters shows. `;
    const text = sentence.repeat(Math.ceil(300 / sentence.split(' ').length));
    // Of the processor's own time, so that a busy machine does not count.
    const times = Array.from({ length: 20 }, () => {
      const before = process.cpuUsage().user;
      checkWording(inputOf(text, releases));
      return (process.cpuUsage().user - before) / 1000;
    });
    expect(Math.min(...times)).toBeLessThan(20);
  });
});

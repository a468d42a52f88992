import { describe, expect, it } from 'vitest';
import { given } from '@/lib/domain/disclosed';
import { LINE_KINDS, REQUESTED_LINE_KINDS } from '@/lib/domain/sheet';
import { carries, requestable } from '@/lib/wording/carries';
import type { DraftInput } from '@/lib/wording/draft-input';
import { draftLine } from '@/lib/wording/draft-sheet';
import { DEFAULT_HOUSE_STYLE, type HouseStyle } from '@/lib/wording/house-style';
import { claimsAbove } from '@/lib/wording/never-says-more';
import { CAVEAT_PARTICULARS, type Particular } from '@/lib/wording/particulars';
import { speakNumber } from '@/lib/wording/speak';
import { voiceOf } from '@/lib/wording/voice';
import { earlierOf, inputOf, releaseOf } from './examples';
import { GOLDEN_CASES } from './golden-cases';
import { JUDGED_CASES, RIGHT_TO_LEFT } from './judged-cases';

const CASES = Object.entries<DraftInput>({ ...GOLDEN_CASES, ...JUDGED_CASES });
const PRINTED = LINE_KINDS.filter((kind) => kind !== 'correction-notice');
const styled = (input: DraftInput, change: Partial<HouseStyle>) => ({
  ...input,
  houseStyle: { ...DEFAULT_HOUSE_STYLE, ...change },
});

describe('every line of every case', () => {
  it.each(CASES)('has no hole, ends, and says no more than its verdict: %s', (_, input) => {
    for (const kind of PRINTED.filter((one) => carries(one, input.claim.kind))) {
      const text = draftLine(input, kind);
      expect(text).not.toMatch(/undefined|NaN|null|Infinity|[{}]| {2}| [.,;:]|\.\.|\(\)/);
      expect(claimsAbove(input.finding.verdict, text), text).toEqual([]);
      if (kind === 'headline' || kind === 'chart-title') expect(text).not.toMatch(/\.$/);
      else if (kind !== 'method-note') expect(text).toMatch(/\.$/);
    }
  });

  it.each(CASES)('keeps to its length: %s', (_, input) => {
    const isDated = /\d{4}/.test(draftLine(input, 'caveat-one-breath').replace(/\d,\d{3}/g, ''));
    expect(draftLine(input, 'headline').length).toBeLessThanOrEqual(isDated ? 125 : 110);
    expect(draftLine(input, 'caveat-one-breath').split(' ').length).toBeLessThanOrEqual(isDated ? 32 : 30);
  });

  it.each(CASES)('is spoken without a digit or a symbol: %s', (_, input) => {
    expect(draftLine(input, 'spoken-line')).not.toMatch(/[0-9%±+−–()[\]/]/);
  });
});

describe('the lengths of a caveat', () => {
  const release = releaseOf({ Alder: 47, Brook: 41 }, { n: given(1013) });
  const input = inputOf({ claim: { kind: 'lead', pair: ['Alder', 'Brook'] }, release });
  const SHOWN: Record<Particular, string> = {
    pollster: 'Kelmouth Research',
    sponsor: 'the Averil Courier',
    population: 'likely voters',
    'sample-size': '1,013',
    mode: 'live telephone',
    'field-dates': '14–17 September',
    'sample-type': 'drawn at random',
    margin: '±7 points',
    'stated-margin': '±3.7 points for a share',
    'confidence-level': '95% confidence',
    'not-disclosed': '',
    'other-error': 'about twice the stated margins',
  };

  it.each(Object.entries(CAVEAT_PARTICULARS))('%s carries what it owes', (kind, owed) => {
    const text = draftLine(input, kind as keyof typeof CAVEAT_PARTICULARS);
    for (const particular of owed) expect(text).toContain(SHOWN[particular]);
  });

  it.each(['caveat', 'caveat-short'] as const)('%s names what is not disclosed', (kind) => {
    expect(draftLine(GOLDEN_CASES['lead-untested-opt-in'], kind)).toContain('Not disclosed: the sponsor.');
  });

  it.each(['caveat', 'caveat-short', 'caveat-one-breath', 'spoken-line'] as const)(
    '%s claims no margin for a sample that is not random',
    (kind) => {
      const text = draftLine(GOLDEN_CASES['lead-untested-opt-in'], kind);
      expect(text).not.toMatch(/±|plus or minus/);
      expect(text).toMatch(/not drawn at random/);
    },
  );
});

describe('what a claim can carry', () => {
  it('is everything, but a change sentence only for a change', () => {
    const without = LINE_KINDS.filter((kind) => !carries(kind, 'lead'));
    expect(without).toEqual(['change-sentence']);
    expect(LINE_KINDS.filter((kind) => !carries(kind, 'net-score-change'))).toEqual([]);
    expect(() => draftLine(GOLDEN_CASES['lead-holds'], 'change-sentence')).toThrow(
      new RangeError('draftLine requires a kind of line that its claim carries'),
    );
  });

  it('offers a correction only beside what stood before, and nothing in a style without the words', () => {
    const input = GOLDEN_CASES['change-holds-twice'];
    const all = REQUESTED_LINE_KINDS.filter((kind) => kind !== 'correction-notice');
    expect(requestable(input)).toEqual(all);
    expect(requestable({ ...input, corrected: { was: input, on: '2026-09-20' } })).toEqual(
      REQUESTED_LINE_KINDS,
    );
    const { told: _, ...old } = DEFAULT_HOUSE_STYLE.messages.en;
    const messages = { en: old } as unknown as HouseStyle['messages'];
    expect(requestable(styled(input, { messages }))).toEqual([]);
  });
});

describe('a correction notice', () => {
  const claim = { kind: 'change' as const, option: 'Alder' };
  const previous = earlierOf({ Alder: 44, Brook: 43 });
  const was = inputOf({ claim, release: releaseOf({ Alder: 57, Brook: 31 }), previous });
  const is = inputOf({ claim, release: releaseOf({ Alder: 47, Brook: 41 }, { n: given(1021) }), previous });

  it('says what was wrong, what is right and what the right figures support', () => {
    expect(draftLine({ ...is, corrected: { was, on: '2026-09-20' } }, 'correction-notice')).toBe(
      'Correction, 20 September 2026: an earlier version of this report gave wrong particulars of the poll by Kelmouth Research. It put Alder at 57%; the right figure is 47%. It said that 1,012 people were asked; the right number is 1,021. They do not support the claim that was made. What the right figures support: Alder is at 47%, against 44% in the poll of 17–20 August, a difference that chance alone could produce.',
    );
  });

  it('needs what stood before', () => {
    expect(() => draftLine(is, 'correction-notice')).toThrow(
      new RangeError('draftLine requires what stood in print before'),
    );
  });
});

describe('habits of English', () => {
  const input = GOLDEN_CASES['change-fragile'];
  it('write dates, direction and percent as the desk does', () => {
    const american = styled(input, { locales: { ...DEFAULT_HOUSE_STYLE.locales, en: 'en-US' } });
    expect(draftLine(american, 'caveat-short')).toContain('on September 14–17');
    expect(draftLine(american, 'spoken-line')).toContain(
      'asked one thousand twelve likely voters between September fourteenth and seventeenth.',
    );
    expect(draftLine(styled(input, { percent: 'per-cent' }), 'standfirst')).toContain(
      '50 per cent against 43 per cent',
    );
  });

  it.each([
    [0, 'zero'],
    [47.5, 'forty-seven point five'],
    [-11, 'minus eleven'],
    [100, 'one hundred'],
    [2024, 'two thousand and twenty-four'],
    [12345, 'twelve thousand three hundred and forty-five'],
    [2_000_001, 'two million and one'],
  ])('say %d aloud', (value, words) => {
    expect(speakNumber(value, voiceOf(DEFAULT_HOUSE_STYLE, 'en', true))).toBe(words);
  });
});

describe('a name that runs from right to left', () => {
  it('is held apart by invisible marks, and no other name is', () => {
    expect(draftLine(RIGHT_TO_LEFT, 'headline')).toBe(
      '\u2068תקווה\u2069 leads Brook in poll by Kelmouth Research, 52% to 40%',
    );
    for (const [, one] of CASES) expect(draftLine(one, 'body')).not.toMatch(/[\u2066-\u2069]/);
  });
});

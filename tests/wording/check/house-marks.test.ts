import { describe, expect, it } from 'vitest';
import { LANGUAGES } from '@/lib/domain/vocabulary';
import { checkWording } from '@/lib/wording/check/check-wording';
import { checkedReleaseOf } from '@/lib/wording/check/checked-release';
import { houseMarks } from '@/lib/wording/check/house-marks';
import type { WordingCheckInput } from '@/lib/wording/check/types';
import { carries } from '@/lib/wording/carries';
import { draftLine, draftSheet } from '@/lib/wording/draft-sheet';
import { DEFAULT_HOUSE_STYLE, type HouseStyle } from '@/lib/wording/house-style';
import { GOLDEN_CASES } from '../golden-cases';

const LEAD = GOLDEN_CASES['lead-not-shown'];
const RELEASE = checkedReleaseOf(LEAD.release, null, LEAD.policy);

function marks(text: string, style: Partial<HouseStyle>, more: Partial<WordingCheckInput> = {}) {
  const houseStyle = { ...DEFAULT_HOUSE_STYLE, ...style };
  const base = { text, language: 'en' as const, releases: [], houseStyle, policy: LEAD.policy };
  return houseMarks({ ...base, ...more }).map(({ rule, grade, phrase, replacement }) => ({
    rule,
    grade,
    phrase,
    replacement,
  }));
}

const only = (list: readonly string[], language = 'en') => ({
  banned: { ...DEFAULT_HOUSE_STYLE.banned, [language]: list },
});
const preferring = (say: string, insteadOf: string, language = 'en') => ({
  preferred: { ...DEFAULT_HOUSE_STYLE.preferred, [language]: [{ say, insteadOf }] },
});

describe('phrases of a house style', () => {
  it('that are banned are marked as whole words, in any case and with any accents', () => {
    expect(marks('A Horse  race, horse races and a horserace.', only(['horse race']))).toEqual([
      { rule: 'house-phrase', grade: 'house-style', phrase: 'Horse  race', replacement: null },
    ]);
    expect(marks('Un sondeo ELECTORAL más.', only(['electoral mas'], 'es'), { language: 'es' })).toHaveLength(
      1,
    );
  });

  it('that are preferred stand as the replacement, with the capital of what they replace', () => {
    expect(marks('Survey of voters. The survey says.', preferring('poll', 'survey'))).toMatchObject([
      { phrase: 'Survey', replacement: 'Poll' },
      { phrase: 'survey', replacement: 'poll' },
    ]);
  });

  it('belong to one language', () => {
    expect(marks('Le gain est net.', only(['gain']), { language: 'fr' })).toEqual([]);
    expect(marks('Le gain est net.', only(['gain'], 'fr'), { language: 'fr' })).toHaveLength(1);
  });

  it('are left alone in names and said, not graded, in quotation marks', () => {
    expect(marks('Alder is at 47%.', only(['alder']), { releases: [RELEASE] })).toEqual([]);
    expect(marks('She said “a horse race it is”.', only(['horse race']))).toMatchObject([
      { grade: 'cannot-judge', phrase: 'horse race', replacement: null },
    ]);
  });
});

describe('how a desk prints', () => {
  it.each([
    ['sign', 'Alder has 47 percent, Brook 41 per cent.', ['47%', '41%']],
    ['word', 'Alder has 47%, Brook 41 per cent.', ['47 percent', '41 percent']],
    ['per-cent', 'Alder has 47%, Brook 41 percent.', ['47 per cent', '41 per cent']],
  ] as const)('percent as a %s', (percent, text, replacements) => {
    expect(marks(text, { percent }).map(({ replacement }) => replacement)).toEqual(replacements);
  });

  it('percent in another language, with that language’s space', () => {
    expect(marks('Alder: 47,5 pour cent', {}, { language: 'fr' })[0]?.replacement).toBe('47,5\u202f%');
    expect(marks('Alder: 47 %', { percent: 'word' }, { language: 'de' })[0]?.replacement).toBe('47 Prozent');
    expect(marks('Alder: 47 por ciento', { percent: 'per-cent' }, { language: 'es' })).toEqual([]);
  });

  it('whole points in figures or in words, and margins in figures either way', () => {
    const text = 'Alder is ahead by six points; the margin is 4 points, and Brook is up 3 points.';
    expect(marks(text, {})).toMatchObject([{ phrase: 'six', replacement: '6' }]);
    expect(marks(text, { numbers: 'words-to-nine' })).toMatchObject([{ phrase: '3', replacement: 'three' }]);
  });

  it('says nothing of words that are said aloud', () => {
    expect(marks('by six points, forty percent, 40 percent', {}, { part: 'spoken' })).toEqual([]);
  });

  it('is not marked where percent should be points: that is a fault of its own', () => {
    const input = { language: 'en' as const, releases: [RELEASE], policy: LEAD.policy };
    const text = 'In the Kelmouth Research poll Alder is ahead of Brook by 6 percent.';
    const found = checkWording({ ...input, text, houseStyle: DEFAULT_HOUSE_STYLE }).marks;
    expect(found.map(({ rule }) => rule)).toContain('percent-points');
    expect(found.map(({ rule }) => rule)).not.toContain('house-print');
  });
});

describe('a headline that rests on one poll', () => {
  const rules = (style: Partial<HouseStyle>, more: Partial<WordingCheckInput>) =>
    marks('Alder 47%, Brook 41%', style, { releases: [RELEASE], part: 'headline', ...more }).map(
      ({ rule, phrase }) => [rule, phrase],
    );

  it('is marked where the desk warns or refuses, as a whole', () => {
    expect(rules({ onePollHeadlines: 'allow' }, {})).toEqual([]);
    expect(rules({ onePollHeadlines: 'warn' }, {})).toEqual([['one-poll', '']]);
    expect(rules({ onePollHeadlines: 'refuse' }, {})).toEqual([['one-poll', '']]);
  });

  it('is not one that compares two polls, nor a line below it', () => {
    expect(rules({ onePollHeadlines: 'refuse' }, { polls: 2 })).toEqual([]);
    expect(rules({ onePollHeadlines: 'refuse' }, { releases: [RELEASE, RELEASE] })).toEqual([]);
    expect(rules({ onePollHeadlines: 'refuse' }, { part: 'line' })).toEqual([]);
  });
});

describe('house style and our own drafting', () => {
  const styles = (['sign', 'word', 'per-cent'] as const).flatMap((percent) =>
    (['figures', 'words-to-nine'] as const).map((numbers) => ({ percent, numbers })),
  );

  it.each(styles)('never marks what it drafts itself: $percent, $numbers', (style) => {
    const objections = LANGUAGES.flatMap((language) =>
      Object.values(GOLDEN_CASES).flatMap((golden) => {
        const input = { ...golden, language, houseStyle: { ...DEFAULT_HOUSE_STYLE, ...style } };
        const asked = ['standfirst', 'caveat-short', 'spoken-line', 'newsletter-line'] as const;
        const lines = [
          ...draftSheet(input),
          ...asked
            .filter((kind) => carries(kind, input.claim.kind))
            .map((kind) => ({ kind, text: draftLine(input, kind) })),
        ];
        return lines.flatMap(({ kind, text }) =>
          marks(text, style, { language, part: kind === 'spoken-line' ? 'spoken' : 'line' }).map(
            ({ phrase }) => `${language} ${kind}: ${phrase} in ${text}`,
          ),
        );
      }),
    );
    expect(objections).toEqual([]);
  });
});

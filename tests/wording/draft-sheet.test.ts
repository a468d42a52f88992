import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { given } from '@/lib/domain/disclosed';
import { STANDING_LINE_KINDS } from '@/lib/domain/sheet';
import type { Claim } from '@/lib/domain/sheet';
import type { DraftInput } from '@/lib/wording/draft-input';
import { draftSheet } from '@/lib/wording/draft-sheet';
import { DEFAULT_HOUSE_STYLE, type HouseStyle } from '@/lib/wording/house-style';
import { claimsAbove } from '@/lib/wording/never-says-more';
import { anyRaceOf, draftInputsOf, PLAIN_NAMES, PLAIN_QUESTION } from '@/tests/support/any-race';
import { earlierOf, inputOf, releaseOf } from './examples';

describe('draftSheet, of any release', () => {
  it('never says more than the verdict, leaves no hole, and says the same again', { timeout: 60_000 }, () => {
    fc.assert(
      fc.property(anyRaceOf([PLAIN_NAMES], [PLAIN_QUESTION]), (race) => {
        for (const input of draftInputsOf(race)) {
          const lines = draftSheet(input);
          expect(lines.map(({ kind }) => kind)).toEqual(STANDING_LINE_KINDS);
          for (const { text } of lines) {
            expect(claimsAbove(input.finding.verdict, text), text).toEqual([]);
            expect(text, text).toMatch(/^\S(?:.*\S)?$/u);
            expect(text, text).not.toMatch(/undefined|NaN|null|Infinity|[{}]| {2}| [.,;:]|\.\.|\(\)|-\d/);
          }
          expect(draftSheet(structuredClone(input))).toEqual(lines);
        }
      }),
      { numRuns: 60 },
    );
  });
});

describe('draftSheet', () => {
  const lead: Claim = { kind: 'lead', pair: ['Alder', 'Brook'] };
  const textOf = (input: DraftInput, kind: (typeof STANDING_LINE_KINDS)[number]) =>
    draftSheet(input).find((line) => line.kind === kind)?.text ?? '';

  it('speaks of the error of pre-election polls only where there is a vote', () => {
    const shares = { Alder: 47, Brook: 41, 'Don’t know': 8 };
    const issue = { id: 'toll', name: 'Bridge toll', kind: 'issue' as const, thresholds: [] };
    const vote = inputOf({ claim: lead, release: releaseOf(shares) });
    const opinion = inputOf({ claim: lead, release: releaseOf(shares, { race: issue }) });
    expect(textOf(vote, 'caveat')).toContain('studies of pre-election polls');
    expect(textOf(vote, 'method-note')).toContain('election authority');
    expect(textOf(opinion, 'caveat')).not.toContain('pre-election');
    expect(textOf(opinion, 'method-note')).not.toContain('election authority');
  });

  it('says whose margin is whose, with the level where the two differ', () => {
    const release = releaseOf(
      { Alder: 47, Brook: 41 },
      { statedMargin: given({ pp: 3.1, unit: 0.1, level: 0.9 }) },
    );
    expect(textOf(inputOf({ claim: lead, release }), 'caveat')).toContain(
      'Kelmouth Research states ±3.1 points for a share at 90% confidence; our desk puts the gap between Alder and Brook at ±',
    );
  });

  it('claims no margin for a sample that is not random', () => {
    const release = releaseOf({ Alder: 49, Brook: 41 }, { sampleSource: 'quota' });
    const lines = draftSheet(inputOf({ claim: lead, release }));
    expect(lines.filter(({ text }) => text.includes('±'))).toEqual([]);
    expect(lines.find(({ kind }) => kind === 'caveat')?.text).toContain(
      'no margin of sampling error is claimed',
    );
  });

  it('follows the desk in percent, numbers, rounding and name', () => {
    const input = inputOf({ claim: lead, release: releaseOf({ Alder: 47, Brook: 41 }) });
    const houseStyle: HouseStyle = {
      ...DEFAULT_HOUSE_STYLE,
      percent: 'word',
      numbers: 'words-to-nine',
      margins: 'tenth',
      newsroom: 'the Courier’s desk',
    };
    const styled = { ...input, houseStyle };
    expect(textOf(styled, 'body')).toContain('47 percent and Brook 41 percent');
    expect(textOf(styled, 'body')).toContain('a gap of six percentage points');
    expect(textOf(styled, 'caveat')).toContain(
      'the Courier’s desk puts the gap between Alder and Brook at ±6.9 points',
    );
  });

  it('puts the notes of the comparison into the method note as sentences', () => {
    const input = inputOf({
      claim: { kind: 'change', option: 'Alder' },
      release: releaseOf({ Alder: 47, Brook: 41 }),
      previous: earlierOf({ Alder: 44, Brook: 43 }),
      note: ['The order of the  questions is not known'],
    });
    expect(textOf(input, 'method-note')).toContain(' The order of the questions is not known. ');
  });

  it('refuses a finding that is not of the claim, and a change without its earlier release', () => {
    const input = inputOf({
      claim: { kind: 'change', option: 'Alder' },
      release: releaseOf({ Alder: 47, Brook: 41 }),
      previous: earlierOf({ Alder: 44, Brook: 43 }),
    });
    expect(() => draftSheet({ ...input, claim: { kind: 'change', option: 'Brook' } })).toThrow(
      new RangeError('draftSheet requires the finding of its claim'),
    );
    expect(() => draftSheet({ ...input, previous: null })).toThrow(
      new RangeError('draftSheet requires the earlier release of a change'),
    );
  });
});

describe('the names of answers', () => {
  const toll = { id: 'toll', name: 'Bridge-toll referendum', kind: 'referendum' as const, thresholds: [] };
  const shares = { 'Keep the toll': 40, 'End the toll': 55, Undecided: 5 };

  it('stand in quotation marks where an answer of a referendum is a phrase', () => {
    const release = releaseOf(shares, { race: toll });
    const claim: Claim = { kind: 'lead', pair: ['End the toll', 'Keep the toll'] };
    const [headline] = draftSheet(inputOf({ claim, release }));
    expect(headline?.text).toMatch(/^“End the toll” leads “Keep the toll”/);
  });
});

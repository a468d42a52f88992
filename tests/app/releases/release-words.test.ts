import { describe, expect, it } from 'vitest';
import {
  columnHeads,
  missingSentence,
  particularsOf,
  tabOf,
  titleOf,
} from '@/app/(desk)/releases/[id]/_components/release-words';
import { NOT_DISCLOSED, NOT_ENTERED } from '@/lib/domain/disclosed';
import { FACTS } from './example-facts';

describe('the browser tab of a release', () => {
  it('names race, pollster and dates, and no figure', () => {
    expect(tabOf(FACTS)).toBe('Averil Coast governor: Kelmouth Research, 14–17 September');
  });
});

describe('the title of a release', () => {
  it('keeps a figure after its name, whichever way the name is written', () => {
    const shares = [
      { option: 'אלון', units: 470, isAnswer: true },
      { option: 'Brook', units: 410, isAnswer: true },
    ];
    expect(titleOf({ ...FACTS, shares })).toBe('Kelmouth Research: אלון\u200e 47.0, Brook 41.0');
  });

  it('is the pollster and the two largest answers as printed, without a word of who leads', () => {
    expect(titleOf(FACTS)).toBe('Kelmouth Research: Alder 49.0, Brook 41.0');
  });

  it('says so where no share is disclosed', () => {
    const shares = [{ option: 'Alder', units: null, isAnswer: true }];
    expect(titleOf({ ...FACTS, shares })).toBe('Kelmouth Research: no share disclosed');
  });
});

describe('the line beneath it', () => {
  it('tells who was asked, when, how and for whom', () => {
    expect(particularsOf(FACTS)).toBe(
      '1,012 likely voters, 14–17 September 2026, live telephone, for The Averil Courier.',
    );
  });

  it('leaves out what is not known and says when the size is withheld', () => {
    const facts = {
      ...FACTS,
      n: NOT_DISCLOSED,
      mode: NOT_ENTERED,
      sponsor: NOT_DISCLOSED,
      population: NOT_ENTERED,
    };
    expect(particularsOf(facts)).toBe('An undisclosed number of people, 14–17 September 2026.');
  });

  it('counts what the disclosure list misses', () => {
    const item = { item: 'sponsor' as const, label: 'Sponsor', status: 'not-entered' as const };
    expect(missingSentence([])).toBe('Nothing of the disclosure list is missing.');
    expect(missingSentence([item])).toBe('One item of the disclosure list is missing.');
    expect(missingSentence([item, item, item])).toBe('Three items of the disclosure list are missing.');
  });
});

describe('the heads of the columns of shares', () => {
  const earlier = (fieldEndOn: string) => columnHeads(FACTS, { ...FACTS, fieldEndOn });

  it('are months, days within one month, years across years', () => {
    expect(columnHeads(FACTS, null)).toEqual(['Share', '']);
    expect(earlier('2026-08-13')).toEqual(['Sept', 'Aug']);
    expect(earlier('2026-09-03')).toEqual(['17 Sept', '3 Sept']);
    expect(earlier('2025-09-13')).toEqual(['Sept 26', 'Sept 25']);
  });
});

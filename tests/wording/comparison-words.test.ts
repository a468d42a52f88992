import { describe, expect, it } from 'vitest';
import type { Difference } from '@/lib/findings/comparability';
import { comparisonNote, comparisonReason, type ComparisonTold } from '@/lib/wording/comparison-words';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';

const differs = (item: Difference['item']): Difference => ({
  item,
  current: 'a',
  earlier: 'b',
  isOverridable: true,
});
const told = (change: Partial<ComparisonTold>): ComparisonTold => ({
  reason: 'latest',
  unknowns: [],
  differences: [],
  passedOver: [],
  override: null,
  ...change,
});
const noteOf = (change: Partial<ComparisonTold>) => comparisonNote(told(change), DEFAULT_HOUSE_STYLE, 'en');

const passedOver = [
  {
    fieldStartOn: '2026-09-01',
    fieldEndOn: '2026-09-03',
    differences: [differs('mode'), differs('population')],
  },
  { fieldStartOn: '2026-09-13', fieldEndOn: '2026-09-14', differences: [differs('field-dates')] },
];

describe('comparisonReason', () => {
  it('names what is unknown and not taken as different', () => {
    expect(comparisonReason(told({ unknowns: ['sample-supplier', 'question-order'] }))).toEqual([
      'The latest release with earlier field dates; nothing known of the two differs.',
      'Not known, and not taken as different: who supplied the sample and the order of the questions.',
    ]);
  });

  it('says why later releases were passed over', () => {
    expect(comparisonReason(told({ reason: 'latest-comparable', passedOver }))).toEqual([
      'The latest release with earlier field dates that compares.',
      'The release of 1–3 September 2026 differs in how people were asked and who was asked.',
      'The release of 13–14 September 2026 has days of interviewing in common with this one.',
    ]);
  });

  it.each([
    ['none-comparable', 'No earlier release of this series compares with this one.'],
    ['none-earlier', 'This series has no release with earlier field dates that is out of embargo.'],
    ['dates-unknown', 'The field dates are not entered yet, so there is nothing to compare with.'],
  ] as const)('says why there is none: %s', (reason, sentence) => {
    expect(comparisonReason(told({ reason }))).toEqual([sentence]);
    expect(noteOf({ reason })).toEqual([]);
  });

  it('says who overrode a difference and why', () => {
    const override = { reason: 'The change of mode was run in parallel for a month.', by: 'M. Reed' };
    expect(comparisonReason(told({ reason: 'override', differences: [differs('mode')], override }))).toEqual([
      'M. Reed chose this release although the two differ in how people were asked: The change of mode was run in parallel for a month.',
    ]);
  });
});

describe('an override of releases that differ in nothing known', () => {
  it('is told by its reason alone', () => {
    const override = { reason: 'It is the last poll before the debate.', by: 'M. Reed' };
    expect(comparisonReason(told({ reason: 'override', override }))).toEqual([
      'M. Reed chose this release: It is the last poll before the debate.',
    ]);
    expect(noteOf({ reason: 'override', override })).toEqual([
      'The desk chose the poll to compare with: It is the last poll before the debate.',
    ]);
  });
});

describe('comparisonNote', () => {
  it('prints why that poll is compared with', () => {
    expect(noteOf({})).toEqual(['It is the latest poll of this series with earlier field dates.']);
    expect(noteOf({ reason: 'latest-comparable', passedOver })).toEqual([
      'It is the latest earlier poll that can be compared; 2 later ones differ in how people were asked, who was asked and the field dates.',
    ]);
    expect(noteOf({ unknowns: ['weighting-scheme'] })[1]).toBe(
      'Not known, and not taken as different: the weighting.',
    );
  });

  it('prints an override without the name of who made it', () => {
    const override = { reason: 'The question is the same but for a comma.', by: 'M. Reed' };
    expect(noteOf({ reason: 'override', differences: [differs('question-wording')], override })).toEqual([
      'The two polls differ in the wording of the question; the desk compares them all the same: The question is the same but for a comma.',
    ]);
  });
});

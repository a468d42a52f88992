import { describe, expect, test } from 'vitest';
import { given, NOT_DISCLOSED } from '@/lib/domain/disclosed';
import type { FactThreshold, ReleaseFacts } from '@/lib/domain/release-facts';
import { baseOf, checkDocumentOf } from '@/lib/findings/check-document-of';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import { withNamesOf } from '@/lib/findings/same-names';
import { countsTheBase, shareBaseOf, uncountedThresholds } from '@/lib/findings/threshold-base';

const facts: ReleaseFacts = {
  releaseId: 'september',
  versionId: 'september-1',
  version: 1,
  race: { id: 'governor', name: 'Governor of Averil Coast', kind: 'candidate', thresholds: [] },
  pollster: { id: 'kelmouth', name: 'Kelmouth Research' },
  sponsor: NOT_DISCLOSED,
  population: given('likely-voters'),
  sampleSource: 'probability',
  mode: given('live-telephone'),
  design: 'weighted',
  fieldStartOn: '2026-09-14',
  fieldEndOn: '2026-09-17',
  publishedOn: '2026-09-18',
  n: given(1012),
  deff: null,
  statedMargin: given({ pp: 3.7, unit: 0.1, level: 0.95 }),
  modelledInterval: null,
  questionWording: NOT_DISCLOSED,
  decimals: 1,
  shares: [
    { option: 'Alder', units: 470, isAnswer: true },
    { option: 'Brook', units: null, isAnswer: true },
  ],
  sourceUrl: NOT_DISCLOSED,
};
const withUndecided = [...facts.shares, { option: 'Don’t know', units: 80, isAnswer: false }];
const thresholds: FactThreshold[] = [
  { option: 'Alder', pct: 50, base: 'valid-votes' },
  { option: 'Brook', pct: 5, base: 'answers' },
  { option: 'Nobody', pct: 5, base: 'answers' },
];
const ofVotes = { ...facts, race: { ...facts.race, thresholds } };

describe('the check document of a release', () => {
  test('has its figures as printed, with what is not disclosed left open', () => {
    expect(baseOf(facts)).toEqual({
      sampleSource: 'probability',
      n: 1012,
      design: 'weighted',
      deff: null,
      statedMargin: { pp: 3.7, unit: 0.1, level: 0.95 },
      modelledInterval: null,
      decimals: 1,
      shares: [
        { option: 'Alder', pct: 47, answer: true },
        { option: 'Brook', pct: null, answer: true },
      ],
    });
    expect(baseOf({ ...facts, n: NOT_DISCLOSED, statedMargin: NOT_DISCLOSED })).toMatchObject({
      n: null,
      statedMargin: null,
    });
  });

  test('says which shares are no answers', () => {
    expect(baseOf({ ...facts, shares: withUndecided }).shares[2]).toEqual({
      option: 'Don’t know',
      pct: 8,
      answer: false,
    });
  });

  test('carries a design effect with its degrees of freedom where they are known', () => {
    const deff = { source: 'design' as const, value: 1.3 };
    expect(baseOf({ ...facts, deff: { ...deff, df: null } }).deff).toEqual(deff);
    expect(baseOf({ ...facts, deff: { ...deff, df: 40 } }).deff).toEqual({ ...deff, df: 40 });
  });

  test('takes an unknown design for weighted and a sample at the door for clustered', () => {
    expect(baseOf({ ...facts, design: 'unknown' }).design).toBe('weighted');
    expect(baseOf({ ...facts, design: 'unweighted' }).design).toBe('unweighted');
    expect(baseOf({ ...facts, design: 'unweighted', mode: given('face-to-face') }).design).toBe('clustered');
  });

  test('has the comparison, the policy and what the desk asks, and is accepted', () => {
    const document = checkDocumentOf(facts, { ...facts, n: given(998) }, DEFAULT_POLICY, {
      pairs: [['Alder', 'Brook']],
      changes: ['Alder'],
    });
    expect(document).toMatchObject({
      policy: DEFAULT_POLICY,
      release: baseOf(facts),
      previous: { n: 998 },
      pairs: [['Alder', 'Brook']],
      changes: ['Alder'],
      thresholds: [],
    });
    expect(parseCheckDocument(document)).toMatchObject({ release: { n: 1012 } });
    expect(checkDocumentOf(facts, null, DEFAULT_POLICY).previous).toBeNull();
  });

  test('asks only the thresholds of options that it has, on the base that the rule counts', () => {
    const ask = (shares: ReleaseFacts['shares']) =>
      checkDocumentOf({ ...ofVotes, shares }, null, DEFAULT_POLICY).thresholds;
    expect(ask(facts.shares)).toEqual([
      { option: 'Alder', pct: 50 },
      { option: 'Brook', pct: 5 },
    ]);
    expect(ask(withUndecided)).toEqual([{ option: 'Brook', pct: 5 }]);
  });
});

describe('the base that a threshold counts', () => {
  test.each([
    ['answers', true, 'adults', true],
    ['answers', false, null, true],
    ['registered-voters', false, 'registered-voters', true],
    ['registered-voters', false, 'likely-voters', false],
    ['registered-voters', false, null, false],
    ['votes-cast', false, 'adults', true],
    ['votes-cast', true, 'likely-voters', false],
    ['valid-votes', false, 'adults', true],
    ['valid-votes', true, 'likely-voters', false],
  ] as const)('%s, non-answers %s, %s: %s', (base, hasNonAnswers, population, counts) => {
    expect(countsTheBase(base, { hasNonAnswers, population })).toBe(counts);
  });

  test('of a release comes from its shares and its population', () => {
    expect(shareBaseOf(facts)).toEqual({ hasNonAnswers: false, population: 'likely-voters' });
    expect(shareBaseOf({ ...facts, shares: withUndecided, population: NOT_DISCLOSED })).toEqual({
      hasNonAnswers: true,
      population: null,
    });
  });

  test('leaves over the thresholds of its options that it cannot test', () => {
    expect(uncountedThresholds(ofVotes)).toEqual([]);
    expect(uncountedThresholds({ ...ofVotes, shares: withUndecided })).toEqual([thresholds[0]]);
  });
});

describe('an earlier release under the names of the later one', () => {
  const named = (...options: string[]) => ({
    ...facts,
    shares: options.map((option, units) => ({ option, units, isAnswer: true })),
  });
  const names = (release: ReleaseFacts) => release.shares.map(({ option }) => option);

  test('takes the later writing where only case, spaces or punctuation differ', () => {
    const renamed = withNamesOf(named('ALDER', 'J. Brook', 'Other'), named('Alder', 'J Brook', 'Cairn'));
    expect(names(renamed)).toEqual(['Alder', 'J Brook', 'Other']);
    expect(renamed.shares.map(({ units }) => units)).toEqual([0, 1, 2]);
    expect(renamed.releaseId).toBe('september');
  });

  test('keeps a name that both have, and gives no name twice', () => {
    expect(names(withNamesOf(named('Alder', 'ALDER'), named('Alder')))).toEqual(['Alder', 'ALDER']);
    expect(names(withNamesOf(named('ALDER', 'alder'), named('Alder')))).toEqual(['Alder', 'alder']);
    expect(names(withNamesOf(named('brook', 'alder'), named('Alder', 'Brook')))).toEqual(['Brook', 'Alder']);
  });
});

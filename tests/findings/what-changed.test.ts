import { describe, expect, test } from 'vitest';
import { given, NOT_DISCLOSED } from '@/lib/domain/disclosed';
import {
  CORRECTED_ITEM_NAMES,
  CORRECTED_ITEMS,
  type CorrectedFacts,
  type CorrectedItem,
  whatChanged,
} from '@/lib/findings/what-changed';

const facts: CorrectedFacts = {
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
  statedMargin: NOT_DISCLOSED,
  modelledInterval: null,
  questionWording: NOT_DISCLOSED,
  decimals: 0,
  shares: [
    { option: 'Alder', units: 47, isAnswer: true },
    { option: 'Brook', units: 41, isAnswer: true },
  ],
  sourceUrl: NOT_DISCLOSED,
  sameQuestion: false,
  methodNote: null,
};
const [alder, brook] = [facts.shares[0]!, facts.shares[1]!];
const margin = { pp: 3.7, unit: 0.1, level: 0.95 };

const CHANGES: [CorrectedItem, Partial<CorrectedFacts>][] = [
  ['pollster', { pollster: { id: 'quillon', name: 'The Quillon Panel' } }],
  ['sponsor', { sponsor: given({ id: 'courier', name: 'The Averil Courier' }) }],
  ['population', { population: given('adults') }],
  ['sample-source', { sampleSource: 'opt-in' }],
  ['mode', { mode: given('online') }],
  ['field-dates', { fieldStartOn: '2026-09-13' }],
  ['field-dates', { fieldEndOn: '2026-09-16' }],
  ['publication-date', { publishedOn: '2026-09-19' }],
  ['sample-size', { n: given(1021) }],
  ['sample-size', { n: NOT_DISCLOSED }],
  ['design', { design: 'unweighted' }],
  ['design', { deff: { source: 'stated', value: 1.3, df: null } }],
  ['margin', { statedMargin: given(margin) }],
  ['margin', { modelledInterval: margin }],
  ['question-wording', { questionWording: given('For whom would you vote?') }],
  ['options', { shares: [{ ...alder, option: 'Elder' }, brook] }],
  ['options', { shares: [{ ...alder, isAnswer: false }, brook] }],
  ['shares', { shares: [{ ...alder, units: 46 }, brook] }],
  ['shares', { decimals: 1 }],
  ['same-question', { sameQuestion: true }],
  ['method-note', { methodNote: 'Weighted by age.' }],
  ['source-link', { sourceUrl: given('https://polls.example/september') }],
];

describe('what a correction changed', () => {
  test.each(CHANGES)('is the %s alone', (item, change) => {
    expect(whatChanged(facts, { ...facts, ...change })).toEqual([item]);
    expect(whatChanged({ ...facts, ...change }, facts)).toEqual([item]);
  });

  test('is told in the order of the list, several at once', () => {
    const after = { ...facts, n: given(1021), pollster: { id: 'quillon', name: 'The Quillon Panel' } };
    expect(whatChanged(facts, after)).toEqual(['pollster', 'sample-size']);
  });

  test('is nothing where only the number of the version differs', () => {
    expect(whatChanged(facts, { ...facts, version: 2, versionId: 'september-2' })).toEqual([]);
  });

  test('has a name for each part, and no two share one', () => {
    const names = CORRECTED_ITEMS.map((item) => CORRECTED_ITEM_NAMES[item]);
    expect(new Set(names).size).toBe(CORRECTED_ITEMS.length);
    expect(names.every((name) => /^[A-Z][a-z]/.test(name))).toBe(true);
  });
});

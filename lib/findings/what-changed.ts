import type { ReleaseFacts } from '@/lib/domain/release-facts';

/** The parts of a release that a correction can touch. */
export const CORRECTED_ITEMS = [
  'pollster',
  'sponsor',
  'population',
  'sample-source',
  'mode',
  'field-dates',
  'publication-date',
  'sample-size',
  'design',
  'margin',
  'question-wording',
  'options',
  'shares',
  'same-question',
  'method-note',
  'source-link',
] as const;
export type CorrectedItem = (typeof CORRECTED_ITEMS)[number];

export const CORRECTED_ITEM_NAMES: Record<CorrectedItem, string> = {
  pollster: 'Pollster',
  sponsor: 'Sponsor',
  population: 'Population',
  'sample-source': 'How people were found',
  mode: 'Mode',
  'field-dates': 'Field dates',
  'publication-date': 'Publication date',
  'sample-size': 'Sample size',
  design: 'Weighting or design effect',
  margin: 'Stated margin or interval',
  'question-wording': 'Question wording',
  options: 'Options',
  shares: 'Shares',
  'same-question': 'Same question as before',
  'method-note': 'Note on method',
  'source-link': 'Link to the source',
};

/** A version with what of it is not part of its facts. */
export type CorrectedFacts = ReleaseFacts & { sameQuestion: boolean; methodNote: string | null };

const PARTS: Record<CorrectedItem, (facts: CorrectedFacts) => unknown> = {
  pollster: ({ pollster }) => pollster,
  sponsor: ({ sponsor }) => sponsor,
  population: ({ population }) => population,
  'sample-source': ({ sampleSource }) => sampleSource,
  mode: ({ mode }) => mode,
  'field-dates': ({ fieldStartOn, fieldEndOn }) => [fieldStartOn, fieldEndOn],
  'publication-date': ({ publishedOn }) => publishedOn,
  'sample-size': ({ n }) => n,
  design: ({ design, deff }) => [design, deff],
  margin: ({ statedMargin, modelledInterval }) => [statedMargin, modelledInterval],
  'question-wording': ({ questionWording }) => questionWording,
  options: ({ shares }) => shares.map(({ option, isAnswer }) => [option, isAnswer]),
  shares: ({ shares, decimals }) => [decimals, shares.map(({ units }) => units)],
  'same-question': ({ sameQuestion }) => sameQuestion,
  'method-note': ({ methodNote }) => methodNote,
  'source-link': ({ sourceUrl }) => sourceUrl,
};

/**
 * The parts in which two versions of one release differ, in the order of the list.
 *
 * @param before the version that is corrected
 * @param after the version that corrects it
 * @returns no part where only the number of the version differs
 */
export function whatChanged(before: CorrectedFacts, after: CorrectedFacts): CorrectedItem[] {
  return CORRECTED_ITEMS.filter(
    (item) => JSON.stringify(PARTS[item](before)) !== JSON.stringify(PARTS[item](after)),
  );
}

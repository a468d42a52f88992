import type { DisclosureStatus } from '@/lib/domain/disclosed';

/** What a reader must be able to learn of a poll, in the order that it is listed; common practice, no source. */
export const DISCLOSURE_LABELS = {
  pollster: 'Pollster',
  sponsor: 'Sponsor',
  population: 'Population',
  'sample-source': 'How people came into the sample',
  mode: 'How they were interviewed',
  'field-dates': 'Field dates',
  'sample-size': 'Sample size',
  'question-wording': 'Question wording',
  shares: 'A share for every answer option',
  margin: 'Margin of error, or why there is none',
  weighting: 'Weighting',
  'source-link': 'Link to the source',
} as const;

export type DisclosureItem = keyof typeof DISCLOSURE_LABELS;

export type MissingDisclosure = {
  item: DisclosureItem;
  label: string;
  /** The release withholds it, or nobody has entered it yet. */
  status: 'not-disclosed' | 'not-entered';
};

const ORDER = Object.keys(DISCLOSURE_LABELS) as DisclosureItem[];

/**
 * What is missing of a release: withheld by it, or not entered yet.
 *
 * @param facts the status of each item; an item left out counts as not entered
 * @returns the missing items in the order of the labels; empty where all is given or does not apply
 * @example
 * missingDisclosure({
 *   ...Object.fromEntries(Object.keys(DISCLOSURE_LABELS).map((item) => [item, 'given'])),
 *   sponsor: 'not-disclosed',
 * }); // => [{ item: 'sponsor', label: 'Sponsor', status: 'not-disclosed' }]
 */
export function missingDisclosure(
  facts: Partial<Record<DisclosureItem, DisclosureStatus>>,
): MissingDisclosure[] {
  return ORDER.flatMap((item) => {
    const status = facts[item] ?? 'not-entered';
    if (status === 'given' || status === 'not-applicable') return [];
    return [{ item, label: DISCLOSURE_LABELS[item], status }];
  });
}

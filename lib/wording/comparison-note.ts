import type { ComparableItem } from '@/lib/findings/comparability';

/** What decides whether two releases compare, as it is named in a sentence. */
export const COMPARABLE_ITEM_NAMES: Record<ComparableItem, string> = {
  pollster: 'the pollster',
  race: 'the race',
  'question-wording': 'the wording of the question',
  'answer-options': 'the answer options',
  population: 'the population',
  'likely-voter-method': 'the likely-voter method',
  mode: 'the mode of interviewing',
  'sample-source': 'how people came into the sample',
  'sample-supplier': 'who supplied the sample',
  'weighting-scheme': 'the weighting',
  'sponsor-kind': 'the kind of sponsor',
  're-basing': 'whether don’t-knows were left out',
  'question-order': 'the order of the questions',
  'field-dates': 'the field dates',
};

/**
 * Whole sentences for the method note: what of the comparison is not known, and the written reason where an editor
 * compared releases that differ. Empty where nothing needs saying.
 */
export function comparisonNote(comparison: {
  unknowns: readonly ComparableItem[];
  differences: readonly { item: ComparableItem }[];
  override: { reason: string } | null;
}): string[] {
  const notes: string[] = [];
  if (comparison.override) {
    const differing = listed(comparison.differences.map(({ item }) => COMPARABLE_ITEM_NAMES[item]));
    const reason = comparison.override.reason.trim().replace(/[.!?…]+$/u, '');
    notes.push(
      differing === ''
        ? `An editor chose the poll it is compared with: ${reason}.`
        : `The two polls differ in ${differing}; an editor compared them all the same: ${reason}.`,
    );
  }
  if (comparison.unknowns.length > 0) {
    const unknown = listed(comparison.unknowns.map((item) => COMPARABLE_ITEM_NAMES[item]));
    notes.push(`Not known of both polls, and taken as the same: ${unknown}.`);
  }
  return notes;
}

function listed(names: readonly string[]): string {
  if (names.length < 2) return names[0] ?? '';
  return `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`;
}

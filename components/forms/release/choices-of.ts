import type { Choice } from '../../ui/select';

/** A closed list of the trade as choices, with the words that screens show. */
export function choicesOf<T extends string>(list: readonly T[], names: Record<T, string>): Choice[] {
  return list.map((value) => ({ value, label: names[value] }));
}

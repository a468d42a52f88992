import { compareReleases, type Comparability, type ComparableFacts } from './comparability';

/** Why this release is compared with that one, or with none. */
export type ChoiceReason =
  /** The latest release with earlier field dates is comparable. */
  | 'latest'
  /** Later ones were passed over, for the differences listed. */
  | 'latest-comparable'
  /** There are earlier ones, each with differences. */
  | 'none-comparable'
  /** No release has earlier field dates. */
  | 'none-earlier'
  /** The field dates of the release in hand are not known. */
  | 'dates-unknown';

export type ComparisonChoice<Facts extends ComparableFacts = ComparableFacts> = {
  chosen: Facts | null;
  reason: ChoiceReason;
  /** Of the chosen one: what is not known of it. */
  comparability: Comparability | null;
  /** Later than the chosen one yet not comparable, latest first. */
  passedOver: { release: Facts; comparability: Comparability }[];
};

/**
 * The release to compare with: the latest comparable one with earlier field dates.
 *
 * Of two that ended on one day the one that began later counts as later, then the order given.
 *
 * @param current the release in hand
 * @param earlier releases it may be compared with, in any order; itself and later ones are left out
 */
export function chooseComparison<Facts extends ComparableFacts>(
  current: ComparableFacts,
  earlier: readonly Facts[],
): ComparisonChoice<Facts> {
  const none = { chosen: null, comparability: null, passedOver: [] };
  if (!current.fieldStartOn || !current.fieldEndOn) return { ...none, reason: 'dates-unknown' };
  const candidates = earlier
    .filter((release) => release.id !== current.id && daysOf(release) < daysOf(current) && release.fieldEndOn)
    .sort((a, b) => (daysOf(a) < daysOf(b) ? 1 : daysOf(a) > daysOf(b) ? -1 : 0))
    .map((release) => ({ release, comparability: compareReleases(current, release) }));
  if (candidates.length === 0) return { ...none, reason: 'none-earlier' };

  const place = candidates.findIndex(({ comparability }) => comparability.comparable);
  const found = candidates[place];
  if (!found) return { ...none, reason: 'none-comparable', passedOver: candidates };
  return {
    chosen: found.release,
    reason: place === 0 ? 'latest' : 'latest-comparable',
    comparability: found.comparability,
    passedOver: candidates.slice(0, place),
  };
}

/** Sorts as text by the last day, then by the first. */
function daysOf({ fieldStartOn, fieldEndOn }: ComparableFacts): string {
  return `${fieldEndOn ?? ''} ${fieldStartOn ?? ''}`;
}

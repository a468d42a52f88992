import type { Language } from '@/lib/domain/vocabulary';
import type { ChoiceReason } from '@/lib/findings/choose-comparison';
import type { ComparableItem, Difference } from '@/lib/findings/comparability';
import { formatDayRange } from '@/lib/format/date';
import type { HouseStyle } from './house-style';
import { EN } from './messages/en';
import { plain } from './names';
import { say } from './say';

/** How a release came by the one it is compared with, or by none. */
export type ComparisonTold = {
  reason: ChoiceReason | 'override';
  /** Of the release compared with. */
  unknowns: readonly ComparableItem[];
  differences: readonly Difference[];
  passedOver: readonly { fieldStartOn: string; fieldEndOn: string; differences: readonly Difference[] }[];
  override: { reason: string; by: string } | null;
};

const INTERFACE = { locale: 'en-GB', terms: EN.terms };

/**
 * Staff-facing sentences: why this release is the one compared with, or why there is none.
 *
 * @returns at least one sentence
 */
export function comparisonReason(told: ComparisonTold): string[] {
  const chosen =
    told.reason === 'latest' || told.reason === 'latest-comparable' || told.reason === 'override';
  return [
    firstSentence(told),
    ...(told.reason === 'override' ? [] : told.passedOver.map(passedOverSentence)),
    ...(chosen && told.unknowns.length > 0
      ? [`Not known, and not taken as different: ${itemList(told.unknowns, INTERFACE)}.`]
      : []),
  ];
}

/**
 * What a printed method note says of the comparison, beside its dates and size.
 *
 * @returns whole sentences; none where nothing is compared
 */
export function comparisonNote(told: ComparisonTold, style: HouseStyle, language: Language): string[] {
  const { comparison, terms } = style.messages[language];
  const locale = style.locales[language];
  const list = (items: readonly ComparableItem[]) => itemList(items, { locale, terms });
  const unknown =
    told.unknowns.length > 0 ? [say(comparison.unknown, { items: list(told.unknowns) }, locale)] : [];
  switch (told.reason) {
    case 'latest':
      return [say(comparison.latest, {}, locale), ...unknown];
    case 'latest-comparable': {
      const items = told.passedOver.flatMap(({ differences }) => itemsOf(differences));
      const slots = { count: told.passedOver.length, items: list(items) };
      return [say(comparison['latest-comparable'], slots, locale), ...unknown];
    }
    case 'override': {
      const items = itemsOf(told.differences);
      const slots = {
        differing: items.length > 0 ? 'yes' : 'no',
        items: list(items),
        reason: plain(told.override?.reason ?? ''),
      };
      return [say(comparison.override, slots, locale), ...unknown];
    }
    default:
      return [];
  }
}

function firstSentence(told: ComparisonTold): string {
  switch (told.reason) {
    case 'latest':
      return 'The latest release with earlier field dates; nothing known of the two differs.';
    case 'latest-comparable':
      return 'The latest release with earlier field dates that compares.';
    case 'none-comparable':
      return 'No earlier release of this series compares with this one.';
    case 'none-earlier':
      return 'This series has no release with earlier field dates that is out of embargo.';
    case 'dates-unknown':
      return 'The field dates are not entered yet, so there is nothing to compare with.';
    case 'override': {
      const by = told.override ? plain(told.override.by) : 'An editor';
      const reason = plain(told.override?.reason ?? '');
      const items = itemList(itemsOf(told.differences), INTERFACE);
      return items === ''
        ? `${by} chose this release: ${reason}`
        : `${by} chose this release although the two differ in ${items}: ${reason}`;
    }
  }
}

function passedOverSentence({
  fieldStartOn,
  fieldEndOn,
  differences,
}: ComparisonTold['passedOver'][number]): string {
  const items = itemsOf(differences);
  const dates =
    fieldStartOn && fieldEndOn
      ? formatDayRange(fieldStartOn, fieldEndOn, INTERFACE.locale, { withYear: true })
      : '';
  const release = dates ? `The release of ${dates}` : 'A release without field dates';
  return items.includes('field-dates')
    ? `${release} has days of interviewing in common with this one.`
    : `${release} differs in ${itemList(items, INTERFACE)}.`;
}

const itemsOf = (differences: readonly Difference[]) => differences.map(({ item }) => item);

function itemList(
  items: readonly ComparableItem[],
  { locale, terms }: { locale: string; terms: typeof EN.terms },
): string {
  const names = [...new Set(items)].map((item) => terms.comparable[item]);
  return new Intl.ListFormat(locale, { type: 'conjunction' }).format(names);
}

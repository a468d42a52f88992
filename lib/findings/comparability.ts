/**
 * What decides whether two releases may be compared. null is "not known", which is not a difference. Texts other
 * than wording and options are compared as they are, so ids or closed codes belong there.
 */
export type ComparableFacts = {
  id: string;
  pollster: string | null;
  race: string | null;
  questionWording: string | null;
  /** A reporter's mark: the same question as in the earlier releases, whatever the words entered. */
  sameQuestion: boolean;
  /** The options that count as answers, in any order. */
  answerOptions: readonly string[] | null;
  population: string | null;
  /** Looked at where either population is, or may be, likely voters. */
  likelyVoterMethod: string | null;
  /** live or recorded telephone, face to face, online, post, mixed */
  modeFamily: string | null;
  sampleSource: string | null;
  sampleSupplier: string | null;
  weightingScheme: string | null;
  sponsorKind: string | null;
  /** Whether don't-knows were taken out and the shares computed anew. */
  isRebased: boolean | null;
  questionOrder: string | null;
  /** YYYY-MM-DD */
  fieldStartOn: string | null;
  fieldEndOn: string | null;
};

export type ComparableItem =
  | 'pollster'
  | 'race'
  | 'question-wording'
  | 'answer-options'
  | 'population'
  | 'likely-voter-method'
  | 'mode'
  | 'sample-source'
  | 'sample-supplier'
  | 'weighting-scheme'
  | 'sponsor-kind'
  | 're-basing'
  | 'question-order'
  | 'field-dates';

export type Difference = {
  item: ComparableItem;
  current: string;
  earlier: string;
  /** false where no written reason of an editor can lift it: another race, or interviews that overlap. */
  isOverridable: boolean;
};

export type Comparability = {
  comparable: boolean;
  differences: Difference[];
  /** Not known of one release or both; computed all the same, and told beside the comparison. */
  unknowns: ComparableItem[];
};

/**
 * Whether two releases may be compared: every item that is known of both agrees, and field dates do not overlap.
 *
 * @param current the release in hand
 * @param earlier the one it would be compared with
 * @returns the differences and the unknowns in a fixed order; comparable where there is no difference
 */
export function compareReleases(current: ComparableFacts, earlier: ComparableFacts): Comparability {
  const differences: Difference[] = [];
  const unknowns: ComparableItem[] = [];
  for (const [item, read, compared = read] of ITEMS) {
    if (!isConcerned(item, current, earlier)) continue;
    const [now, before] = [read(current), read(earlier)];
    if (now === null || before === null) unknowns.push(item);
    else if (compared(current) !== compared(earlier)) {
      differences.push({ item, current: now, earlier: before, isOverridable: item !== 'race' });
    }
  }
  const [now, before] = [fieldDates(current), fieldDates(earlier)];
  if (now === null || before === null) unknowns.push('field-dates');
  else if (fieldDatesOverlap(current, earlier)) {
    differences.push({ item: 'field-dates', current: now, earlier: before, isOverridable: false });
  }
  return { comparable: differences.length === 0, differences, unknowns };
}

type Read = (facts: ComparableFacts) => string | null;

const ITEMS: readonly [item: ComparableItem, read: Read, compared?: Read][] = [
  ['pollster', (facts) => facts.pollster],
  ['race', (facts) => facts.race],
  ['question-wording', (facts) => facts.questionWording, (facts) => plainText(facts.questionWording ?? '')],
  ['answer-options', (facts) => facts.answerOptions?.join(', ') ?? null, plainOptions],
  ['population', (facts) => facts.population],
  ['likely-voter-method', (facts) => facts.likelyVoterMethod],
  ['mode', (facts) => facts.modeFamily],
  ['sample-source', (facts) => facts.sampleSource],
  ['sample-supplier', (facts) => facts.sampleSupplier],
  ['weighting-scheme', (facts) => facts.weightingScheme],
  ['sponsor-kind', (facts) => facts.sponsorKind],
  ['re-basing', (facts) => (facts.isRebased === null ? null : facts.isRebased ? 'yes' : 'no')],
  ['question-order', (facts) => facts.questionOrder],
];

function isConcerned(item: ComparableItem, current: ComparableFacts, earlier: ComparableFacts): boolean {
  if (item === 'question-wording') return !current.sameQuestion;
  if (item !== 'likely-voter-method') return true;
  return [current, earlier].some(({ population }) => population === null || population === 'likely-voters');
}

/** Whether two releases have a day of interviewing in common; false where dates are not known. */
function fieldDatesOverlap(a: ComparableFacts, b: ComparableFacts): boolean {
  if (!a.fieldStartOn || !a.fieldEndOn || !b.fieldStartOn || !b.fieldEndOn) return false;
  return a.fieldStartOn <= b.fieldEndOn && b.fieldStartOn <= a.fieldEndOn;
}

function fieldDates({ fieldStartOn, fieldEndOn }: ComparableFacts): string | null {
  return fieldStartOn && fieldEndOn ? `${fieldStartOn}/${fieldEndOn}` : null;
}

/**
 * A text without what does not count in comparing questions: case, spaces, punctuation.
 *
 * @param text any text
 * @example
 * plainText('If the vote were held today, …?') === plainText('if the vote were held today'); // => true
 */
export function plainText(text: string): string {
  return text
    .normalize('NFKC')
    .toLowerCase()
    .replace(/[\p{P}\p{Z}\p{C}\s]+/gu, '');
}

function plainOptions({ answerOptions }: ComparableFacts): string | null {
  return answerOptions && JSON.stringify(answerOptions.map(plainText).sort());
}

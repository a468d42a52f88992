import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { valueOf } from '@/lib/domain/disclosed';
import type { ThresholdBase } from '@/lib/domain/vocabulary';

/** Who the shares of a question are shares of. */
export type ShareBase = {
  /** Whether don't know and the like are among them. */
  hasNonAnswers: boolean;
  /** null where not known. */
  population: 'adults' | 'registered-voters' | 'likely-voters' | null;
};

/**
 * Whether a rule's threshold may be tested on these shares: only on the base that the rule counts.
 *
 * Votes are cast by people who made a choice, so shares that count the undecided are not shares of votes; they
 * are shares of everyone asked.
 *
 * @param base what the rule counts
 * @param shares what the shares count
 * @example
 * countsTheBase('valid-votes', { hasNonAnswers: true, population: 'likely-voters' }); // => false
 * countsTheBase('answers', { hasNonAnswers: true, population: 'adults' }); // => true
 */
export function countsTheBase(base: ThresholdBase, shares: ShareBase): boolean {
  switch (base) {
    case 'answers':
      return true;
    case 'registered-voters':
      return shares.population === 'registered-voters';
    case 'votes-cast':
    case 'valid-votes':
      return !shares.hasNonAnswers;
  }
}

/** What the shares of a release count. */
export function shareBaseOf(facts: ReleaseFacts): ShareBase {
  return {
    hasNonAnswers: facts.shares.some((share) => !share.isAnswer),
    population: valueOf(facts.population),
  };
}

/** The race's thresholds that this release cannot be tested against, since it counts another base. */
export function uncountedThresholds(facts: ReleaseFacts): ReleaseFacts['race']['thresholds'] {
  const options = new Set(facts.shares.map((share) => share.option));
  const base = shareBaseOf(facts);
  return facts.race.thresholds.filter(
    (threshold) => options.has(threshold.option) && !countsTheBase(threshold.base, base),
  );
}

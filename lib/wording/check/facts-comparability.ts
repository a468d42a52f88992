import { valueOf } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { compareReleases, type ComparableFacts } from '@/lib/findings/comparability';
import type { CheckedRelease } from './types';

/** Whether two releases compare, as far as their facts tell; what facts do not hold is unknown, never different. */
export function comparabilityOf(
  facts: ReleaseFacts,
  previous: ReleaseFacts,
): NonNullable<CheckedRelease['comparability']> {
  return { ...compareReleases(comparableOf(facts), comparableOf(previous)), isOverridden: false };
}

function comparableOf(facts: ReleaseFacts): ComparableFacts {
  return {
    id: facts.releaseId,
    pollster: facts.pollster.id,
    race: facts.race.id,
    questionWording: valueOf(facts.questionWording),
    sameQuestion: false,
    answerOptions: facts.shares.filter(({ isAnswer }) => isAnswer).map(({ option }) => option),
    population: valueOf(facts.population),
    likelyVoterMethod: null,
    modeFamily: valueOf(facts.mode),
    sampleSource: facts.sampleSource === 'unknown' ? null : facts.sampleSource,
    sampleSupplier: null,
    weightingScheme: null,
    sponsorKind: null,
    isRebased: null,
    questionOrder: null,
    fieldStartOn: facts.fieldStartOn,
    fieldEndOn: facts.fieldEndOn,
  };
}

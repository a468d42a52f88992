import type { ComparisonInput, ComparisonStatus, OverlapAnswer, ReleaseUntestedReason } from './judge-types';

/** How two releases are compared, and what stands against it. */
export type ComparisonCourse = {
  status: ComparisonStatus;
  /** Against every change; empty where it may be tested. */
  reasons: ReleaseUntestedReason[];
  overrideReason: string | null;
  overlap: OverlapAnswer | null;
};

/**
 * What becomes of a comparison: differences, an editor's reason, shared waves and people asked twice weighed together.
 *
 * A written reason lifts every difference but another race and interviews that overlap in time; those are lifted by
 * knowing which waves are shared, of which none may be.
 *
 * @param comparison of a parsed document
 * @example
 * comparisonCourse({ samePeople: true }).status; // => 'same-people'
 */
export function comparisonCourse({
  comparability,
  override,
  overlap,
  samePeople = false,
}: Pick<ComparisonInput, 'comparability' | 'override' | 'overlap' | 'samePeople'>): ComparisonCourse {
  const differences = comparability?.differences ?? [];
  const others = differences.filter(({ item }) => item !== 'field-dates');
  const isLifted = others.every(({ isOverridable }) => isOverridable) && override !== undefined;
  const stands = others.length > 0 && !isLifted;
  const sharesUnknown = differences.length > others.length && !overlap && !samePeople;
  const sharesAll = overlap !== undefined && overlap.shared === overlap.window;
  const reasons: ReleaseUntestedReason[] = [];
  if (stands) reasons.push('not-comparable');
  if (sharesUnknown || sharesAll) reasons.push('shared-waves');
  if (samePeople) reasons.push('same-people');
  const sharesSome = overlap !== undefined && overlap.shared > 0;
  return {
    status: statusOf({
      stands: stands || sharesUnknown,
      samePeople,
      sharesSome,
      isLifted: others.length > 0,
    }),
    reasons,
    overrideReason: others.length > 0 && isLifted ? override.reason : null,
    overlap: sharesSome
      ? {
          window: overlap.window,
          shared: overlap.shared,
          assumesEqualWaves: overlap.interviews === undefined,
          usesPooledShare: overlap.shares === undefined,
        }
      : null,
  };
}

function statusOf(facts: {
  stands: boolean;
  samePeople: boolean;
  sharesSome: boolean;
  isLifted: boolean;
}): ComparisonStatus {
  if (facts.stands) return 'not-comparable';
  if (facts.samePeople) return 'same-people';
  if (facts.sharesSome) return 'overlapping';
  return facts.isLifted ? 'overridden' : 'comparable';
}

import 'server-only';
import { LRUCache } from 'lru-cache';
import { canonicalJson } from '@/lib/security/canonical';
import { sha256 } from '@/lib/security/ids';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { Policy } from '@/lib/findings/check-types';
import { checkedReleaseOf } from '@/lib/wording/check/checked-release';
import type { CheckedRelease } from '@/lib/wording/check/types';
import type { Computed } from '../release/compute-findings';

/** Some tens of kilobytes each. */
const kept = new LRUCache<string, CheckedRelease>({ max: 60 });

/** A stored release as the wording check reads it: the comparison and the findings are those of its own page. */
export function checkedStored({ facts, previous, comparison, settings, answer }: Computed): CheckedRelease {
  const { differences, unknowns, override } = comparison;
  const comparability = previous && {
    comparable: differences.length === 0,
    differences,
    unknowns,
    isOverridden: override !== null,
  };
  return checkedOnce(facts, previous, settings.policy.body, { answer, comparability });
}

/** Every pair and change of a release is tested once, however often somebody types about it. */
export function checkedOnce(
  facts: ReleaseFacts,
  previous: ReleaseFacts | null,
  policy: Policy,
  known: Pick<Partial<CheckedRelease>, 'answer' | 'comparability'> = {},
): CheckedRelease {
  const key = sha256(canonicalJson({ facts, previous, policy, known }));
  const before = kept.get(key);
  if (before) return before;
  const checked = checkedReleaseOf(facts, previous, policy, known);
  kept.set(key, checked);
  return checked;
}

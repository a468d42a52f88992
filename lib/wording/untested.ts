import { valueOf } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { Policy } from '@/lib/findings/check-types';
import type { ReleaseUntestedReason } from '@/lib/findings/judge-types';
import { namesOf } from './draft-finding';
import { figureOf, isOfTwoReleases, type DraftInput } from './draft-input';
import type { Slots } from './say';

/** Headlines name one reason: the first of these that applies. */
const WEIGHT: readonly [ReleaseUntestedReason, string][] = [
  ['not-disclosed', 'notDisclosed'],
  ['below-presentation-standard', 'belowPresentationStandard'],
  ['not-comparable', 'notComparable'],
  ['shared-waves', 'sharedWaves'],
  ['same-people', 'samePeople'],
  ['no-sampling-basis', 'noSamplingBasis'],
  ['no-sample-size', 'noSampleSize'],
  ['few-clusters', 'fewClusters'],
  ['too-small', 'tooSmall'],
];

/** What the sentences about a finding that cannot be tested ask for; harmless for the others. */
export function untestedSlots(input: DraftInput): Slots {
  const { finding } = input;
  const applies = (reason: ReleaseUntestedReason) =>
    finding.verdict === 'cannot-be-tested' && finding.reasons.includes(reason);
  const hasOptions = namesOf(input.finding).every((name) => figureOf(name, input, 'then') !== null);
  return {
    reason: WEIGHT.find(([reason]) => applies(reason))?.[1] ?? 'none',
    offered: hasOptions ? 'yes' : 'no',
  };
}

/** Which of the polls a reason is true of. */
export function whichPoll(reason: ReleaseUntestedReason, input: DraftInput): 'this' | 'previous' | 'both' {
  const { finding, release, previous, policy } = input;
  if (reason === 'not-disclosed' && previous) return whichHides(input);
  const isTrueOf = (facts: ReleaseFacts) => appliesTo(reason, facts, policy);
  if (!isOfTwoReleases(finding.kind) || !previous || !isTrueOf(previous)) return 'this';
  return isTrueOf(release) ? 'both' : 'previous';
}

function whichHides(input: DraftInput): 'this' | 'previous' | 'both' {
  const hides = (which: 'now' | 'then') =>
    namesOf(input.finding).some((name) => figureOf(name, input, which)?.units === null);
  if (!isOfTwoReleases(input.finding.kind) || !hides('then')) return 'this';
  return hides('now') ? 'both' : 'previous';
}

function appliesTo(reason: ReleaseUntestedReason, facts: ReleaseFacts, policy: Policy): boolean {
  switch (reason) {
    case 'no-sample-size':
      return valueOf(facts.n) === null;
    case 'no-sampling-basis':
      return facts.sampleSource !== 'probability' && !facts.modelledInterval && !policy.comparisonBasis;
    default:
      return false;
  }
}

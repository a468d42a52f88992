import { valueOf } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { Policy, TestableFinding, UntestedReason } from '@/lib/findings/check-types';
import { isOfTwoReleases, type DraftInput } from './draft-input';
import type { Slots } from './say';

/** Headlines name one reason: the first of these that applies. */
const WEIGHT: readonly [UntestedReason, string][] = [
  ['not-disclosed', 'notDisclosed'],
  ['not-comparable', 'notComparable'],
  ['no-sampling-basis', 'noSamplingBasis'],
  ['no-sample-size', 'noSampleSize'],
  ['few-clusters', 'fewClusters'],
  ['too-small', 'tooSmall'],
];

/** What the sentences about a finding that cannot be tested ask for; harmless for the others. */
export function untestedSlots({ finding, previous }: DraftInput): Slots {
  const applies = (reason: UntestedReason) =>
    finding.verdict === 'cannot-be-tested' && finding.reasons.includes(reason);
  const hasOptions = optionsOf(finding).every((option) =>
    previous?.shares.some((share) => share.option === option),
  );
  return {
    reason: WEIGHT.find(([reason]) => applies(reason))?.[1] ?? 'none',
    offered: hasOptions ? 'yes' : 'no',
  };
}

/** Which of the polls a reason is true of. */
export function whichPoll(reason: UntestedReason, input: DraftInput): 'this' | 'previous' | 'both' {
  const { finding, release, previous, policy } = input;
  const isTrueOf = (facts: ReleaseFacts) => appliesTo(reason, facts, finding, policy);
  if (!isOfTwoReleases(finding.kind) || !previous || !isTrueOf(previous)) return 'this';
  return isTrueOf(release) ? 'both' : 'previous';
}

function appliesTo(
  reason: UntestedReason,
  facts: ReleaseFacts,
  finding: TestableFinding,
  policy: Policy,
): boolean {
  switch (reason) {
    case 'no-sample-size':
      return valueOf(facts.n) === null;
    case 'no-sampling-basis':
      return facts.sampleSource !== 'probability' && !facts.modelledInterval && !policy.comparisonBasis;
    case 'not-disclosed':
      return optionsOf(finding).some(
        (option) => facts.shares.find((share) => share.option === option)?.units === null,
      );
    default:
      return false;
  }
}

function optionsOf(finding: TestableFinding): readonly string[] {
  return 'pair' in finding ? finding.pair : [finding.option];
}

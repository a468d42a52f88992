import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { check } from '@/lib/findings/check';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import type { CheckAnswer, Finding, Pair, Policy, Threshold } from '@/lib/findings/check-types';
import { claimKey } from '@/lib/findings/claim-key';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { comparabilityOf } from './facts-comparability';
import type { CheckedRelease, CheckedSubgroup } from './types';

/** Beyond so many options, leads are tested between the largest only. */
const MAX_PAIRED = 12;

type Known = {
  /** The evidence a text belongs to; its findings go before those made here. */
  answer?: CheckAnswer;
  /** What is known of the comparison; absent: told from the facts of both releases. */
  comparability?: CheckedRelease['comparability'];
  subgroups?: readonly CheckedSubgroup[];
};

/**
 * A release as the wording check reads it: every lead, change, change of lead and threshold that words could claim.
 *
 * The findings that the desk asks as a matter of course are made together, as on its screens; every other claim is
 * tested by itself, as if it were the only one asked. Make it once per release and keep it: it costs some
 * milliseconds a pair.
 *
 * @param facts the release
 * @param previous the one that changes are told from, or null
 * @param policy the desk's policy, complete
 * @param known what is already known of it
 * @returns leads between all answers, between the twelve largest where there are more; every share against half
 * @throws CheckRefused where the figures are not those of a release
 */
export function checkedReleaseOf(
  facts: ReleaseFacts,
  previous: ReleaseFacts | null,
  policy: Policy,
  known: Known = {},
): CheckedRelease {
  const document = parseCheckDocument(checkDocumentOf(facts, previous, policy));
  const asked = check(document);
  const changes = optionsInBoth(facts, previous);
  const alone = [
    ...pairsOf(facts).map((pair) => ({ ...document, pairs: [pair], changes: [], thresholds: [] })),
    ...changes.map((option) => ({ ...document, pairs: [], changes: [option], thresholds: [] })),
    ...halvesOf(facts).map((half) => ({ ...document, pairs: [], changes: [], thresholds: [half] })),
  ].flatMap((single) => check(single).findings.filter(({ kind }) => kind !== 'share'));
  const { comparability = previous && comparabilityOf(facts, previous) } = known;
  return {
    facts,
    previous,
    comparability,
    answer: {
      ...asked,
      findings: firstOfEach([...(known.answer?.findings ?? []), ...asked.findings, ...alone]),
    },
    subgroups: known.subgroups ?? [],
  };
}

function firstOfEach(findings: readonly Finding[]): Finding[] {
  const byKey = new Map<string, Finding>();
  for (const finding of findings) {
    const key = claimKey(finding);
    if (!byKey.has(key)) byKey.set(key, finding);
  }
  return [...byKey.values()];
}

function pairsOf({ shares }: ReleaseFacts): Pair[] {
  const largest = [...shares]
    .sort((a, b) => Number(b.isAnswer) - Number(a.isAnswer) || (b.units ?? -1) - (a.units ?? -1))
    .slice(0, MAX_PAIRED)
    .map(({ option }) => option);
  return largest.flatMap((first, index) => largest.slice(index + 1).map((second): Pair => [first, second]));
}

function optionsInBoth(facts: ReleaseFacts, previous: ReleaseFacts | null): string[] {
  const earlier = new Set(previous?.shares.map(({ option }) => option));
  return facts.shares.map(({ option }) => option).filter((option) => earlier.has(option));
}

function halvesOf({ shares }: ReleaseFacts): Threshold[] {
  return shares.map(({ option }) => ({ option, pct: 50 }));
}

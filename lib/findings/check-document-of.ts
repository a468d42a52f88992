import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { pctOf } from '@/lib/domain/release-facts';
import { valueOf } from '@/lib/domain/disclosed';
import { countsTheBase, shareBaseOf } from './threshold-base';
import type { Base, CheckDocument, Design, Pair, Policy } from './check-types';

/** What a desk asks of a release beyond the engine's defaults. */
export type Asked = { pairs?: Pair[]; changes?: string[] };

/**
 * The check document of a release and the release it is compared with.
 * Thresholds are those of the race, on options the release has and on the base that the rule counts.
 */
export function checkDocumentOf(
  release: ReleaseFacts,
  previous: ReleaseFacts | null,
  policy: Policy,
  asked: Asked = {},
): CheckDocument {
  const options = new Set(release.shares.map((share) => share.option));
  const base = shareBaseOf(release);
  return {
    policy,
    release: baseOf(release),
    previous: previous ? baseOf(previous) : null,
    ...asked,
    thresholds: release.race.thresholds
      .filter((threshold) => options.has(threshold.option) && countsTheBase(threshold.base, base))
      .map(({ option, pct }) => ({ option, pct })),
  };
}

/** The base that a release's shares stand on, in the engine's terms. */
export function baseOf(facts: ReleaseFacts): Base {
  return {
    sampleSource: facts.sampleSource,
    n: valueOf(facts.n),
    design: designOf(facts),
    deff: facts.deff && {
      source: facts.deff.source,
      value: facts.deff.value,
      ...(facts.deff.df === null ? {} : { df: facts.deff.df }),
    },
    statedMargin: valueOf(facts.statedMargin),
    modelledInterval: facts.modelledInterval,
    decimals: facts.decimals,
    shares: facts.shares.map((share) => ({
      option: share.option,
      pct: share.units === null ? null : pctOf(share.units, facts.decimals),
      answer: share.isAnswer,
    })),
  };
}

/** Not known whether weighted is taken as weighted; a face-to-face sample is clustered whatever is said. */
function designOf(facts: ReleaseFacts): Design {
  if (valueOf(facts.mode) === 'face-to-face') return 'clustered';
  return facts.design === 'unknown' ? 'weighted' : facts.design;
}

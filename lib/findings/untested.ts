import { isBelow } from '@/lib/stats';
import type { Policy, UntestedReason } from './check-types';
import type { BaseFigures } from './base-figures';

const FEWEST_DF = 8;

/**
 * Why a finding cannot be tested: every reason that applies, in the fixed order; empty where it can be.
 *
 * @param bases the base, or the later and the earlier one
 * @param options the options in the estimate, each present in the later base
 * @param policy the desk's policy, complete
 */
export function untestedReasons(
  bases: readonly BaseFigures[],
  options: readonly string[],
  policy: Policy,
): UntestedReason[] {
  const first = bases[0];
  const isAny = (applies: (base: BaseFigures) => boolean) => bases.some(applies);
  const reasons: UntestedReason[] = [];
  if (isAny((base) => !base.isSizeDisclosed)) reasons.push('no-sample-size');
  if (isAny((base) => lacksBasis(base, policy))) reasons.push('no-sampling-basis');
  if (isAny(({ sampled }) => sampled !== null && isBelow(sampled.nEff, policy.minimumNEff))) {
    reasons.push('too-small');
  }
  if (isAny(({ sampled }) => (sampled?.deff.df ?? FEWEST_DF) < FEWEST_DF)) reasons.push('few-clusters');
  if (isAny((base) => base.isProbability !== first?.isProbability || lacksOption(base, options))) {
    reasons.push('not-comparable');
  }
  if (isAny((base) => options.some((option) => base.units.get(option) === null))) {
    reasons.push('not-disclosed');
  }
  return reasons;
}

function lacksOption(base: BaseFigures, options: readonly string[]): boolean {
  return options.some((option) => !base.units.has(option));
}

function lacksBasis(base: BaseFigures, policy: Policy): boolean {
  return !base.isProbability && !base.hasModelledInterval && !policy.comparisonBasis;
}

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
  const applies: Record<UntestedReason, boolean> = {
    'no-sample-size': bases.some((base) => !base.isSizeDisclosed),
    'no-sampling-basis': bases.some((base) => lacksBasis(base, policy)),
    'too-small': bases.some(({ sampled }) => sampled !== null && isBelow(sampled.nEff, policy.minimumNEff)),
    'few-clusters': bases.some(({ sampled }) => (sampled?.deff.df ?? FEWEST_DF) < FEWEST_DF),
    'not-comparable':
      bases.some((base) => base.isProbability !== first?.isProbability) ||
      bases.some((base) => options.some((option) => !base.units.has(option))),
    'not-disclosed': bases.some((base) => options.some((option) => base.units.get(option) === null)),
  };
  return ORDER.filter((reason) => applies[reason]);
}

const ORDER: readonly UntestedReason[] = [
  'no-sample-size',
  'no-sampling-basis',
  'too-small',
  'few-clusters',
  'not-comparable',
  'not-disclosed',
];

function lacksBasis(base: BaseFigures, policy: Policy): boolean {
  return !base.isProbability && !base.hasModelledInterval && !policy.comparisonBasis;
}

import { impliedDesignEffect, isBelow } from '@/lib/stats';
import type { Base, BaseNote, Basis, DeffSource, Policy, Range, StatedInterval } from './check-types';

/** What a printed 1/√n implies at 95 percent: such a margin may ignore the weighting altogether. */
const LIKE_UNWEIGHTED = (2 / 1.959963984540054) ** 2;
export const LARGEST_IMPLIED_DEFF = 10;

export type ChosenDeff = {
  value: number;
  range: Range;
  source: DeffSource;
  /** Degrees of freedom of a design-based variance; null where none are known. */
  df: number | null;
  notes: BaseNote[];
};

/**
 * Where the basis of a base comes from: a probability sample, a modelled interval, the desk's comparison basis, or
 * nothing that a margin could be computed from.
 *
 * @example
 * basisOf({ sampleSource: 'probability', n: 1000 }, { comparisonBasis: false }); // => 'sampling'
 * basisOf({ sampleSource: 'opt-in', n: 1000 }, { comparisonBasis: false }); // => 'none'
 */
export function basisOf(
  base: Pick<Base, 'sampleSource' | 'n' | 'modelledInterval'>,
  policy: Pick<Policy, 'comparisonBasis'>,
): Basis {
  if (base.n === null) return 'none';
  if (base.sampleSource === 'probability') return 'sampling';
  if (base.modelledInterval) return 'modelled';
  return policy.comparisonBasis ? 'comparison' : 'none';
}

/**
 * The stated margin of a base read as a design effect, with the ends that its rounding allows.
 *
 * @param stated half-width in points, its rounding unit and level
 * @param n sample size
 * @example
 * impliedByMargin({ pp: 3.7, unit: 0.1, level: 0.95 }, 1012).range; // => [1.4038..., 1.4818...]
 */
export function impliedByMargin(stated: StatedInterval, n: number): { value: number; range: Range } {
  const at = (pp: number) => impliedDesignEffect(pp / 100, n, stated.level);
  return { value: at(stated.pp), range: [at(stated.pp - stated.unit / 2), at(stated.pp + stated.unit / 2)] };
}

/** Whether the stated margin is looked at, and not passed over as one that may ignore the weighting. */
export function usesStatedMargin(base: Base, n: number): boolean {
  if (base.deff || !base.statedMargin) return false;
  return !looksUnweighted(base, impliedByMargin(base.statedMargin, n).range);
}

/**
 * The design effect of a base that has a basis, best source first: given, implied by the stated margin, assumed.
 *
 * @param base a validated base
 * @param n its disclosed sample size
 * @param basis any but `none`
 * @param policy the desk's policy
 */
export function chooseDesignEffect(base: Base, n: number, basis: Basis, policy: Policy): ChosenDeff {
  const chosen = basis === 'modelled' ? modelled(base, n) : (given(base, policy) ?? stated(base, n, policy));
  const { unraised = chosen.value, ...deff } = chosen;
  const notes = [...deff.notes];
  if (unraised < 1) notes.push('deff-below-one');
  if (deff.value > 4) notes.push('deff-above-four');
  if (basis === 'modelled') notes.push('modelled-basis');
  if (basis === 'comparison') notes.push('comparison-basis');
  return { ...deff, notes };
}

type Candidate = ChosenDeff & { unraised?: number };

function given(base: Base, policy: Policy): Candidate | null {
  if (!base.deff) return null;
  const { source, value, df = null } = base.deff;
  const [low, high] = source === 'kish' ? policy.kishRange : [1, 1];
  return { value, range: [low * value, high * value], source, df, notes: [] };
}

function stated(base: Base, n: number, policy: Policy): Candidate {
  if (base.statedMargin && usesStatedMargin(base, n)) {
    const implied = impliedByMargin(base.statedMargin, n);
    return base.design === 'unweighted'
      ? raised(implied)
      : { ...implied, source: 'implied', df: null, notes: [] };
  }
  const notes: BaseNote[] = base.statedMargin ? ['stated-margin-like-unweighted'] : [];
  const { value, range } = policy.assumed[base.design];
  return { value, range, source: 'assumed', df: null, notes: [...notes, 'deff-assumed'] };
}

function modelled(base: Base, n: number): Candidate {
  if (!base.modelledInterval) throw new TypeError('chooseDesignEffect requires a modelled interval');
  return raised(impliedByMargin(base.modelledInterval, n));
}

function raised({ value, range: [low, high] }: { value: number; range: Range }): Candidate {
  const range: Range = [Math.max(1, low), Math.max(1, high)];
  return { value: Math.max(1, value), range, source: 'implied', df: null, notes: [], unraised: value };
}

function looksUnweighted(base: Base, [low]: Range): boolean {
  return base.design !== 'unweighted' && !isBelow(LIKE_UNWEIGHTED, low);
}

import { maximumMargin } from '@/lib/stats';
import { criticalAt } from './critical-at';
import type { Base, BaseAnswer, BaseNote, Policy } from './check-types';
import { basisOf, chooseDesignEffect, type ChosenDeff } from './design-effect';

/** What a margin can be computed from. */
export type Sampled = {
  basis: 'sampling' | 'modelled' | 'comparison';
  n: number;
  deff: ChosenDeff;
  nEff: number;
};

/** A base with everything the findings ask of it. */
export type BaseFigures = {
  isProbability: boolean;
  isSizeDisclosed: boolean;
  hasModelledInterval: boolean;
  decimals: number;
  /** Shares in whole units of the last printed decimal; null where not disclosed. */
  units: ReadonlyMap<string, number | null>;
  /** Rounding units in points of the printed figures that make up a share; absent: the last printed decimal. */
  roundings?: ReadonlyMap<string, readonly number[]>;
  /** Options that count as answers, in order. */
  answers: readonly string[];
  /** null on basis `none`. */
  sampled: Sampled | null;
  notes: readonly BaseNote[];
};

/**
 * Reads a validated base: its basis, its design effect, its shares as whole units.
 *
 * @param base as parseCheckDocument returns it
 * @param policy the desk's policy, complete
 */
export function readBase(base: Base, policy: Policy): BaseFigures {
  const units = new Map(
    base.shares.map(({ option, pct }) => [option, pct === null ? null : toUnits(pct, base.decimals)]),
  );
  const sampled = sampledPart(base, policy);
  const disclosed = [...units.values()].reduce<number>((sum, value) => sum + (value ?? 0), 0);
  const notes: BaseNote[] = disclosed > toUnits(100, base.decimals) ? ['shares-exceed-100'] : [];
  return {
    isProbability: base.sampleSource === 'probability',
    isSizeDisclosed: base.n !== null,
    hasModelledInterval: Boolean(base.modelledInterval),
    decimals: base.decimals,
    units,
    answers: base.shares.filter((share) => share.answer !== false).map((share) => share.option),
    sampled,
    notes: [...notes, ...(sampled?.deff.notes ?? [])],
  };
}

/** A printed percentage in whole units of its last decimal. */
export function toUnits(pct: number, decimals: number): number {
  return Math.round(pct * 10 ** decimals) + 0;
}

/** The share as a proportion 0–1; the option must be disclosed. */
export function proportionOf(base: BaseFigures, option: string): number {
  return unitsOf(base, option) / (100 * 10 ** base.decimals);
}

/** The share in whole units; the option must be disclosed. */
export function unitsOf(base: BaseFigures, option: string): number {
  const units = base.units.get(option);
  if (typeof units !== 'number') throw new RangeError('unitsOf requires a disclosed option');
  return units;
}

/** Rounding units, in points, of the printed figures that make up the share of an option. */
export function roundingUnitsPp(base: BaseFigures, option: string): readonly number[] {
  return base.roundings?.get(option) ?? [10 ** -base.decimals];
}

/** The part of the answer that describes the base. */
export function baseAnswer({ sampled, notes }: BaseFigures, policy: Policy): BaseAnswer {
  if (!sampled) {
    return {
      basis: 'none',
      deff: null,
      deffSource: null,
      deffRange: null,
      nEff: null,
      maximumMarginPp: null,
      notes: [...notes],
    };
  }
  const { basis, n, deff, nEff } = sampled;
  const q = criticalAt(1 - policy.level, deff.df);
  return {
    basis,
    deff: deff.value,
    deffSource: deff.source,
    deffRange: deff.range,
    nEff,
    maximumMarginPp: 100 * maximumMargin(n, deff.value, q),
    notes: [...notes],
  };
}

function sampledPart(base: Base, policy: Policy): Sampled | null {
  const basis = basisOf(base, policy);
  if (base.n === null || basis === 'none') return null;
  const deff = chooseDesignEffect(base, base.n, basis, policy);
  return { basis, n: base.n, deff, nEff: base.n / deff.value };
}

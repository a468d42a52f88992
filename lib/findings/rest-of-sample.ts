import { proportionOf, roundingUnitsPp, type BaseFigures } from './base-figures';
import { onPeopleLeft } from './question-base';

/**
 * A subgroup and the rest of its sample for one option, so that the two can be compared: a subgroup is part of the
 * total, never independent of it.
 *
 * The rest's share is (total − w · group) / (1 − w). It has the people left and the total's design effect. The gap
 * is (group − total) / (1 − w), so that each printed figure's rounding counts 1 / (1 − w) times, once.
 *
 * @param total the whole sample, option disclosed
 * @param group the subgroup, option disclosed
 * @param option the answer option
 * @param weightPct the group's weighted share of the sample, percent, inside 0–100
 * @param people people of the rest; null where not known
 * @returns both bases, with that option alone on the rest
 */
export function groupAndRest(
  total: BaseFigures,
  group: BaseFigures,
  option: string,
  weightPct: number,
  people: number | null,
): { group: BaseFigures; rest: BaseFigures } {
  const w = weightPct / 100;
  const isKnown = [total, group].every((base) => typeof base.units.get(option) === 'number');
  const units = isKnown
    ? restShare(proportionOf(total, option), proportionOf(group, option), w) * 100 * 10 ** total.decimals
    : null;
  const stretched = (base: BaseFigures) => roundingUnitsPp(base, option).map((unit) => unit / (1 - w));
  const present = [total, group].every((base) => base.units.has(option));
  return {
    group: { ...group, roundings: new Map([[option, stretched(group)]]) },
    rest: {
      ...onPeopleLeft(total, people),
      isSizeDisclosed: people !== null,
      units: new Map(present ? [[option, units]] : []),
      roundings: new Map([[option, stretched(total)]]),
    },
  };
}

const LAST_BITS = 1e-12;

/**
 * What the rest gave, from the whole and the part.
 *
 * @param total share in the whole sample, 0–1
 * @param group share in the subgroup, 0–1
 * @param w the subgroup's weighted share of the sample, inside 0–1
 * @returns outside 0–1 where the figures do not fit each other; what the last bits leave of 0 or 1 is 0 or 1
 * @example
 * restShare(0.46, 0.5, 0.25); // => 0.4466666666666667
 */
export function restShare(total: number, group: number, w: number): number {
  const share = (total - w * group) / (1 - w);
  if (Math.abs(share) < LAST_BITS) return 0;
  return Math.abs(share - 1) < LAST_BITS ? 1 : share;
}

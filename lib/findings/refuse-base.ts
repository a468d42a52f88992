import { toUnits } from './base-figures';
import { CheckRefused } from './check-refused';
import type { Base, Policy, StatedInterval } from './check-types';
import { decimalPlaces, isMultipleOf } from './decimal';
import { basisOf, impliedByMargin, LARGEST_IMPLIED_DEFF, usesStatedMargin } from './design-effect';

/**
 * Refuses a base whose fields do not fit each other.
 *
 * @param base of the right form
 * @param path of the base, such as `release`
 * @param policy the desk's policy, complete
 * @throws CheckRefused with the path of the field
 */
export function refuseFaultyBase(base: Base, path: string, policy: Policy): void {
  refuseFaultyShares(base, path);
  if (base.deff?.df !== undefined && base.deff.source !== 'design') {
    throw new CheckRefused(
      `${path}.deff.df`,
      'Degrees of freedom belong only to a design effect computed from the design.',
    );
  }
  refuseUneven(base.statedMargin, `${path}.statedMargin`);
  refuseUneven(base.modelledInterval, `${path}.modelledInterval`);
  refuseTooWide(base, path, policy);
}

function refuseFaultyShares({ shares, decimals }: Base, path: string): void {
  const seen = new Set<string>();
  let units = 0;
  let disclosed = 0;
  shares.forEach(({ option, pct }, index) => {
    if (seen.has(option)) {
      throw new CheckRefused(`${path}.shares[${index}].option`, 'This option is already in the list.');
    }
    seen.add(option);
    if (pct === null) return;
    if (decimalPlaces(pct) > decimals) {
      throw new CheckRefused(
        `${path}.shares[${index}].pct`,
        `This share has more than the ${decimals} decimals of its release.`,
      );
    }
    units += toUnits(pct, decimals);
    disclosed += 1;
  });
  if (units > toUnits(100, decimals) + disclosed / 2) {
    throw new CheckRefused(`${path}.shares`, 'The shares sum to more than 100 percent and rounding allow.');
  }
}

function refuseUneven(stated: StatedInterval | null | undefined, path: string): void {
  if (stated && !isMultipleOf(stated.pp, stated.unit)) {
    throw new CheckRefused(
      `${path}.pp`,
      `This margin is not a multiple of ${stated.unit}, the unit it is said to be rounded to.`,
    );
  }
}

function refuseTooWide(base: Base, path: string, policy: Policy): void {
  const basis = basisOf(base, policy);
  if (base.n === null || (basis !== 'sampling' && basis !== 'comparison')) return;
  if (!base.statedMargin || !usesStatedMargin(base, base.n)) return;
  if (impliedByMargin(base.statedMargin, base.n).value > LARGEST_IMPLIED_DEFF) {
    throw new CheckRefused(
      `${path}.statedMargin.pp`,
      'This margin implies a design effect above 10: check it and the sample size.',
    );
  }
}

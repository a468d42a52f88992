import { toUnits } from './base-figures';
import { CheckRefused } from './check-refused';
import type { Base } from './check-types';
import { decimalPlaces } from './decimal';
import type { Bloc, PrintedBloc, ReleaseDocument } from './judge-types';
import { refuseRepeated, UNKNOWN_OPTION } from './refuse-questions';

/**
 * Refuses blocs that name what is not there, share a name, or have a figure that their options cannot add up to.
 *
 * @throws CheckRefused with the path of the field
 */
export function refuseFaultyBlocs({ release, comparison, blocs = [] }: ReleaseDocument): void {
  const options = new Set(release.shares.map(({ option }) => option));
  const names = new Set(options);
  blocs.forEach((bloc, index) => {
    const path = `blocs[${index}]`;
    if (names.has(bloc.name)) {
      throw new CheckRefused(`${path}.name`, 'This name belongs to an option or bloc already.');
    }
    names.add(bloc.name);
    const summed = new Set<string>();
    bloc.options.forEach((option, place) => {
      const at = `${path}.options[${place}]`;
      if (!options.has(option)) throw new CheckRefused(at, UNKNOWN_OPTION);
      refuseRepeated(summed, option, at, 'This bloc counts the option already.');
    });
    refuseFaultySum(release, bloc, bloc.printed, bloc.printed ? `${path}.printed.pct` : path);
  });
  refuseFaultyEarlier(comparison, blocs);
}

function refuseFaultyEarlier(comparison: ReleaseDocument['comparison'], blocs: readonly Bloc[]): void {
  if (!comparison) return;
  const given = new Set<string>();
  (comparison.blocs ?? []).forEach(({ name, ...printed }, index) => {
    const path = `comparison.blocs[${index}]`;
    const bloc = blocs.find((one) => one.name === name);
    if (!bloc) throw new CheckRefused(`${path}.name`, 'No bloc has this name.');
    refuseRepeated(given, name, path, 'This bloc has an earlier figure already.');
    refuseFaultySum(comparison.base, bloc, printed, `${path}.pct`);
  });
  blocs.forEach((bloc, index) => {
    if (!given.has(bloc.name)) refuseFaultySum(comparison.base, bloc, undefined, `blocs[${index}]`);
  });
}

function refuseFaultySum(base: Base, bloc: Bloc, printed: PrintedBloc | undefined, path: string): void {
  if (printed && decimalPlaces(printed.pct) > printed.decimals) {
    throw new CheckRefused(path, `This figure has more than its ${printed.decimals} decimals.`);
  }
  const figures = bloc.options.map((option) => base.shares.find((share) => share.option === option)?.pct);
  const known = figures.flatMap((pct) => (typeof pct === 'number' ? [toUnits(pct, base.decimals)] : []));
  const sumPct = known.reduce((sum, units) => sum + units, 0) / 10 ** base.decimals;
  if (!printed) {
    if (sumPct > 100) throw new CheckRefused(path, 'The options of this bloc sum to more than 100 percent.');
    return;
  }
  const rounding = (known.length * 10 ** -base.decimals + 10 ** -printed.decimals) / 2 + 1e-9;
  const isWhole = known.length === figures.length;
  const apart = printed.pct - sumPct;
  if (apart < -rounding || (isWhole && apart > rounding)) {
    throw new CheckRefused(path, 'This figure is not the sum of its options, rounding allowed for.');
  }
}

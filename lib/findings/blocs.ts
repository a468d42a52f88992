import { roundingUnitsPp, toUnits, type BaseFigures } from './base-figures';
import type { BlocNote, PrintedBloc } from './judge-types';

/** A bloc on one base: what it sums, and its figure where tables give one. */
export type BlocOnBase = { name: string; options: readonly string[]; printed?: PrintedBloc };

/**
 * A base on which every bloc stands as one more share.
 *
 * A figure from tables is taken as it is, with its own rounding; else the printed shares are summed and the bloc
 * carries the rounding of each. A bloc with an option that is not disclosed is not disclosed; one with an option
 * that the base lacks is lacking.
 *
 * @param base the base as read, untouched
 * @param blocs names that no option has
 * @returns the base in the finest decimal that any of its figures is printed with
 */
export function withBlocs(base: BaseFigures, blocs: readonly BlocOnBase[]): BaseFigures {
  if (blocs.length === 0) return base;
  const decimals = Math.max(base.decimals, ...blocs.map(({ printed }) => printed?.decimals ?? 0));
  const finer = 10 ** (decimals - base.decimals);
  const units = new Map([...base.units].map(([option, own]) => [option, own === null ? null : own * finer]));
  const roundings = new Map([...base.units.keys()].map((option) => [option, roundingUnitsPp(base, option)]));
  for (const { name, options, printed } of blocs) {
    if (printed) {
      units.set(name, toUnits(printed.pct, decimals));
      roundings.set(name, [10 ** -printed.decimals]);
    } else if (options.every((option) => base.units.has(option))) {
      const own = options.map((option) => units.get(option) ?? null);
      units.set(name, own.includes(null) ? null : own.reduce<number>((sum, one) => sum + (one ?? 0), 0));
      roundings.set(
        name,
        options.flatMap((option) => roundingUnitsPp(base, option)),
      );
    }
  }
  return { ...base, decimals, units, roundings };
}

/** How the figure of a bloc came about. */
export function blocNote({ options, printed }: BlocOnBase): BlocNote {
  return { options: [...options], source: printed ? 'printed' : 'summed' };
}

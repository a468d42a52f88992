import { required } from '../require';
import { isDay, isValue, isVariance } from './refuse-series';
import type { CertifiedResult, HouseChoice, LevelDays } from './polls';

/** The houses of a series in the order of their effects, and what those are measured from. */
export type HouseList = {
  readonly names: readonly string[];
  readonly indexOf: ReadonlyMap<string, number>;
  /** Whether a house counts in the sum that is 0. */
  readonly isReference: readonly boolean[];
  readonly results: readonly CertifiedResult[];
};

export const noHouses: HouseList = { names: [], indexOf: new Map(), isReference: [], results: [] };

/** Checks the choice of houses against the polls; houses are listed as given, else as they first appear. */
export function listHouses(
  fn: string,
  polls: readonly { readonly house?: string }[],
  choice: HouseChoice,
  days: LevelDays,
): HouseList {
  required(polls.length > 0, fn, 'at least one poll');
  const seen = new Set<string>();
  for (const { house } of polls) {
    required(typeof house === 'string' && house !== '', fn, 'a house for every poll');
    seen.add(house as string);
  }
  const names = choice.houses ? [...choice.houses] : [...seen];
  const indexOf = new Map(names.map((name, index) => [name, index]));
  required(indexOf.size === names.length, fn, 'every house listed once');
  required(
    [...seen].every((name) => indexOf.has(name)),
    fn,
    'every house of a poll among the houses',
  );
  required(
    names.every((name) => seen.has(name)),
    fn,
    'at least one poll of every house',
  );

  const { reference, results = [] } = choice;
  required(reference === undefined || results.length === 0, fn, 'a reference set or results, not both');
  const chosen = new Set(reference ?? names);
  const isKnown = [...chosen].every((name) => indexOf.has(name));
  const isSet = chosen.size > 0 && chosen.size === (reference ?? names).length;
  required(isKnown && isSet, fn, 'a reference set of at least one of the houses, each named once');
  refuseResults(fn, results, days);
  return { names, indexOf, isReference: names.map((name) => chosen.has(name)), results };
}

function refuseResults(fn: string, results: readonly CertifiedResult[], days: LevelDays): void {
  const fits = ({ day, value, variance }: CertifiedResult) =>
    isDay(day, days) && isValue(value) && (variance === 0 || isVariance(variance));
  required(
    results.every(fits),
    fn,
    'results with a day from firstDay to lastDay, a value and a variance of at least 0',
  );
  const exactDays = results.filter((result) => result.variance === 0).map((result) => result.day);
  required(new Set(exactDays).size === exactDays.length, fn, 'at most one exact result a day');
}

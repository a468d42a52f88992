import { smoothLevel, smoothLevelWithHouses, type HousePoll } from '@/lib/stats';
import { entry, numbers, type Entry, type ReadTable } from '../entry';

type Series = {
  readonly data?: string;
  readonly day?: readonly number[];
  readonly house?: readonly number[];
  readonly share?: readonly number[];
  readonly variance?: readonly number[];
  readonly houses?: number;
  readonly first_day: number;
  readonly last_day: number;
  readonly state_variance_per_day: number;
};

/** The polls of a case, from its own lists or from the table that it names. */
function pollsOf(input: Series, readTable: ReadTable): HousePoll[] {
  const table = input.data === undefined ? null : readTable(input.data);
  const column = (name: 'day' | 'house' | 'share' | 'variance') =>
    table ? (table.has(name) ? numbers(table, name) : []) : (input[name] ?? []);
  const [house, value, variance] = [column('house'), column('share'), column('variance')];
  return column('day').map((day, index) => ({
    day,
    house: String(house[index] ?? 1),
    value: value[index] ?? Number.NaN,
    variance: variance[index] ?? Number.NaN,
  }));
}

const options = (input: Series) => ({
  firstDay: input.first_day,
  lastDay: input.last_day,
  stateVariancePerDay: input.state_variance_per_day,
});

export const seriesEntries: Record<string, Entry> = {
  local_level: entry<Series>((input, readTable) => {
    const level = smoothLevel(pollsOf(input, readTable), options(input));
    return {
      day: level.days,
      smoothed_mean: level.smoothedMean,
      smoothed_variance: level.smoothedVariance,
      filtered_mean: level.filteredMean,
      filtered_variance: level.filteredVariance,
      log_likelihood_flat: level.logLikelihoodFlat,
    };
  }),
  house_effects: entry<Series>((input, readTable) => {
    const houses = Array.from({ length: input.houses ?? 0 }, (_, index) => String(index + 1));
    const level = smoothLevelWithHouses(pollsOf(input, readTable), { ...options(input), houses });
    return {
      day: level.days,
      smoothed_mean: level.smoothedMean,
      smoothed_variance: level.smoothedVariance,
      house_effect: level.houseEffects.map((house) => house.effect),
      house_effect_se: level.houseEffects.map((house) => house.standardError),
      log_likelihood_flat: level.logLikelihoodFlat,
    };
  }),
};

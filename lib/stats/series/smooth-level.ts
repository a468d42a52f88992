import { arrangePolls } from './arrange-polls';
import { filteredDays, smoothedDays } from './expand-days';
import { noHouses } from './house-list';
import { changeOver, predictPlace } from './level-at';
import type { LevelChange, LevelDays, LevelPoll, PlacePrediction } from './polls';
import { refuseDays, refusePlaces, refuseStateVariance } from './refuse-series';
import { makeLevel, solveLevel } from './solve-level';

export type KnownLevelOptions = LevelDays & { readonly stateVariancePerDay: number };

export type SmoothedLevel = {
  readonly days: readonly number[];
  readonly smoothedMean: readonly number[];
  readonly smoothedVariance: readonly number[];
  readonly filteredMean: readonly (number | null)[];
  readonly filteredVariance: readonly (number | null)[];
  readonly logLikelihoodFlat: number;
  readonly changes: readonly LevelChange[];
  readonly predictions: readonly PlacePrediction[];
};

/**
 * The level of a question through time, from polls of known variance: a random walk seen with error, by Kalman
 * filter and smoother with a flat prior on the level.
 *
 * Use it when the polls come from one pollster, or when house effects are of no interest; else
 * `smoothLevelWithHouses`. Use `fitLevel` when the variances are not known. To ask who is ahead, give it a series of
 * leads. Errors that all pollsters share are not in its variance.
 *
 * @param polls in any order, several a day allowed; day whole; value in any unit (a proportion, a lead); variance of
 *   its sampling error, above 0 (from 1e-100 to 1e100), in the unit squared
 * @param options firstDay and lastDay, whole, the days to be answered, at most 1000000 of them;
 *   stateVariancePerDay, variance of the daily step of the level, 0 for a level that does not move; changes, pairs of
 *   days to be compared; predictions, days on which a further poll is to be foreseen
 * @returns per day from firstDay to lastDay mean and variance of the level given all polls (smoothed), and given the
 *   polls up to and including that day (filtered, null before the first poll); the flat log likelihood
 *   −((N − 1)·log 2π + log|Ω| + log 1'Ω⁻¹1 + r'Ω⁻¹r)/2; each change with its standard error, in which the
 *   correlation of the two days is counted; each prediction without the sampling error of the poll. Days after the
 *   last poll keep its level and widen. Cost: linear in days plus polls
 * @throws RangeError `smoothLevel requires whole days, firstDay not after lastDay`
 * @throws RangeError `smoothLevel requires at most 1000000 days`
 * @throws RangeError `smoothLevel requires a state variance per day of at least 0`
 * @throws RangeError `smoothLevel requires at least one poll`
 * @throws RangeError `smoothLevel requires every poll on a whole day from firstDay to lastDay`
 * @throws RangeError `smoothLevel requires values that are finite numbers`
 * @throws RangeError `smoothLevel requires variances above 0`
 * @throws RangeError `smoothLevel requires changes between days from firstDay to lastDay`
 * @throws RangeError `smoothLevel requires predictions for days from firstDay to lastDay`
 * @throws RangeError `smoothLevel requires predictions for known houses, for none where there are no houses`
 * @see Durbin and Koopman, Time Series Analysis by State Space Methods, chapter 2 (from memory); checked against dense
 *   generalized least squares in R 4.2.2
 * @example
 * smoothLevel(
 *   [{ day: 1, value: 0.4, variance: 0.0002 }, { day: 3, value: 0.43, variance: 0.0002 }],
 *   { firstDay: 1, lastDay: 4, stateVariancePerDay: 0.00005 },
 * ).smoothedMean; // => [0.412, 0.415, 0.418, 0.418]
 */
export function smoothLevel(polls: readonly LevelPoll[], options: KnownLevelOptions): SmoothedLevel {
  const fn = 'smoothLevel';
  refuseDays(fn, options);
  refuseStateVariance(fn, options.stateVariancePerDay);
  refusePlaces(fn, options.predictions ?? [], []);
  const level = makeLevel(arrangePolls(fn, polls, varianceOf, noHouses, options), noHouses);
  solveLevel(level, options.stateVariancePerDay, 0);
  const smoothed = smoothedDays(level);
  const filtered = filteredDays(level);
  return {
    days: daysOf(options),
    smoothedMean: smoothed.mean,
    smoothedVariance: smoothed.variance,
    filteredMean: filtered.mean,
    filteredVariance: filtered.variance,
    logLikelihoodFlat: level.logLikelihoodFlat,
    changes: (options.changes ?? []).map((span) => changeOver(level, smoothed, span)),
    predictions: (options.predictions ?? []).map((place) => predictPlace(level, smoothed, place)),
  };
}

const varianceOf = (poll: LevelPoll) => poll.variance;

export function daysOf({ firstDay, lastDay }: LevelDays): number[] {
  const days = new Array<number>(lastDay - firstDay + 1);
  for (let index = 0; index < days.length; index += 1) days[index] = firstDay + index;
  return days;
}

import { required } from '../require';
import { arrangePolls } from './arrange-polls';
import { smoothedDays } from './expand-days';
import { listHouses } from './house-list';
import { changeOver, predictPlace } from './level-at';
import type { HouseChoice, HouseEffect, HousePoll, LevelChange, PlacePrediction } from './polls';
import { refuseDays, refusePlaces, refuseStateVariance } from './refuse-series';
import { daysOf, type KnownLevelOptions } from './smooth-level';
import { makeLevel, solveLevel, type Level } from './solve-level';

export type KnownHouseOptions = KnownLevelOptions & HouseChoice;

export type SmoothedLevelWithHouses = {
  readonly days: readonly number[];
  readonly smoothedMean: readonly number[];
  readonly smoothedVariance: readonly number[];
  readonly houseEffects: readonly HouseEffect[];
  readonly logLikelihoodFlat: number;
  readonly changes: readonly LevelChange[];
  readonly predictions: readonly PlacePrediction[];
};

/**
 * The level of a question through time and the lasting difference of every pollster from it, from polls of known
 * variance: a random walk plus fixed house effects, by generalized least squares through the Kalman filter.
 *
 * House effects can only be measured against something. By default they sum to 0 over all houses; give `reference`
 * for a fixed set of houses whose effects sum to 0, so that a newcomer does not move the level; or give `results`,
 * certified results that anchor the level and carry no house effect. An error that all houses share stays hidden
 * unless there are results.
 *
 * @param polls as for `smoothLevel`, each with the name of its house
 * @param options as for `smoothLevel`; houses, the names in the order wanted (default: as they first appear);
 *   reference, some of the houses; results, with day, value and variance, 0 for an exact one
 * @returns per day mean and variance of the level given all polls and results, the uncertainty of the house effects
 *   included; each house's effect with its standard error; the flat log likelihood with one column for the level and
 *   one for each house (one fewer without results: houses summing to 0, whatever the reference); changes and
 *   predictions as `smoothLevel`, a prediction being for a poll of its house. With one house and no results the
 *   effect is 0 and certain. Cost: linear in days plus polls, times houses
 * @throws RangeError `smoothLevelWithHouses requires …` as smoothLevel does
 * @throws RangeError `smoothLevelWithHouses requires a house for every poll`
 * @throws RangeError `smoothLevelWithHouses requires every house listed once`
 * @throws RangeError `smoothLevelWithHouses requires every house of a poll among the houses`
 * @throws RangeError `smoothLevelWithHouses requires at least one poll of every house`
 * @throws RangeError `smoothLevelWithHouses requires a reference set or results, not both`
 * @throws RangeError `smoothLevelWithHouses requires a reference set of at least one of the houses, each named once`
 * @throws RangeError `smoothLevelWithHouses requires results with a day from firstDay to lastDay, a value and a
 *   variance of at least 0`
 * @throws RangeError `smoothLevelWithHouses requires at most one exact result a day`
 * @throws RangeError `smoothLevelWithHouses requires a state variance above 0 where there are several exact results`
 * @throws RangeError `smoothLevelWithHouses requires variances near enough to each other to tell the houses apart`
 * @see dense generalized least squares in R 4.2.2 with `contr.sum` columns; Jackman (2005), Australian Journal of
 *   Political Science 40, 499–517, for the model (from memory)
 * @example
 * smoothLevelWithHouses(
 *   [
 *     { day: 1, value: 0.41, variance: 0.0003, house: 'Kelmouth' },
 *     { day: 1, value: 0.45, variance: 0.0003, house: 'Norwater' },
 *   ],
 *   { firstDay: 1, lastDay: 1, stateVariancePerDay: 0 },
 * ).houseEffects[1].effect; // => 0.02
 */
export function smoothLevelWithHouses(
  polls: readonly HousePoll[],
  options: KnownHouseOptions,
): SmoothedLevelWithHouses {
  const fn = 'smoothLevelWithHouses';
  refuseDays(fn, options);
  refuseStateVariance(fn, options.stateVariancePerDay);
  const houseList = listHouses(fn, polls, options, options);
  const exact = houseList.results.filter((result) => result.variance === 0);
  const canMove = options.stateVariancePerDay > 0 || exact.length < 2;
  required(canMove, fn, 'a state variance above 0 where there are several exact results');
  refusePlaces(fn, options.predictions ?? [], houseList.names);
  const level = makeLevel(
    arrangePolls(fn, polls, (poll) => poll.variance, houseList, options),
    houseList,
  );
  solveLevel(level, options.stateVariancePerDay, 0);
  required(isSolved(level), fn, 'variances near enough to each other to tell the houses apart');
  const smoothed = smoothedDays(level);
  return {
    days: daysOf(options),
    smoothedMean: smoothed.mean,
    smoothedVariance: smoothed.variance,
    houseEffects: houseEffectsOf(level),
    logLikelihoodFlat: level.logLikelihoodFlat,
    changes: (options.changes ?? []).map((span) => changeOver(level, smoothed, span)),
    predictions: (options.predictions ?? []).map((place) => predictPlace(level, smoothed, place)),
  };
}

/** Variances that differ by more than the digits of a number leave nothing to solve for some house. */
function isSolved({ houses, logLikelihoodFlat }: Level): boolean {
  const figures = houses ? [...houses.effects, ...houses.covariance] : [];
  return Number.isFinite(logLikelihoodFlat) && figures.every(Number.isFinite);
}

export function houseEffectsOf({ houseList, houses, arranged }: Level): HouseEffect[] {
  const groups = arranged.houses + 1;
  return houseList.names.map((house, index) => ({
    house,
    effect: houses?.effects[index] ?? 0,
    standardError: Math.sqrt(Math.max(0, houses?.covariance[index * groups + index] ?? 0)),
  }));
}

import { required } from '../require';
import { arrangePolls, type Arranged } from './arrange-polls';
import { averageLevels } from './average-levels';
import { listHouses, noHouses, type HouseList } from './house-list';
import type { HouseChoice, HouseEffect, LevelChange, LevelDays, PlacePrediction } from './polls';
import { refuseDays, refusePlaces } from './refuse-series';
import { restrictedMaximum } from './restricted-maximum';
import { refuseSampling, samplingVariance, type Sampling } from './sampling-variance';
import { daysOf } from './smooth-level';
import { makeLevel, solveLevel, type Level } from './solve-level';
import { bestNode, evaluateGrid, narrowGrid, wideGrid, type GridLikelihood } from './variance-grid';

/** A poll whose sampling error depends on the level, or is given; houses on every poll or on none. */
export type FitPoll = {
  readonly day: number;
  readonly value: number;
  readonly house?: string;
  readonly sampling: Sampling;
};

export type FitOptions = LevelDays & HouseChoice;
export type LevelVariances = { readonly stateVariancePerDay: number; readonly extraVariance: number };

export type FittedLevel = {
  readonly days: readonly number[];
  readonly mean: readonly number[];
  readonly variance: readonly number[];
  readonly houseEffects: readonly HouseEffect[];
  readonly changes: readonly LevelChange[];
  readonly predictions: readonly PlacePrediction[];
  readonly estimated: LevelVariances & { readonly logLikelihoodFlat: number };
  readonly averaged: LevelVariances;
  readonly grid: readonly (LevelVariances & { readonly weight: number })[];
};

const SEARCH = { state: 7, extra: 5 };
const STEPS = { state: 11, extra: 7 };
const FEWEST_DAYS = 4;
const FEWEST_SPARE = 3;
const ENOUGH = 'observations on at least 4 days, at least 3 more of them than house effects and level';

/**
 * The level of a question through time when nobody knows how fast it moves, nor how much polls differ beyond their
 * sampling error: both variances by restricted likelihood, and bands that average over how well they are known.
 *
 * Use it for a series of polls as they come. Either variance often has its largest likelihood at 0, where a band at
 * the estimate alone would be too narrow; therefore mean and variance are averaged over a grid of both standard
 * deviations, weighted by the restricted likelihood (flat in the standard deviations). To ask who is ahead, give it a
 * series of leads. An error that all pollsters share is not estimable from polls: see `levelBands` for a floor.
 *
 * @param polls in any order; day whole; value a proportion or lead; sampling, its sampling error: `given` (variance),
 *   `share` (n and deff: deff·p̂(1 − p̂)/n) or `lead` (also sum, the two shares together: deff·(sum − p̂²)/n), with p̂
 *   the smoothed level, found twice over; house on every poll, for house effects, or on none
 * @param options firstDay, lastDay, changes and predictions as for `smoothLevel`; with houses also houses, reference
 *   and results as for `smoothLevelWithHouses`, but at most one exact result
 * @returns averaged mean and variance of each day, house effects, changes and predictions; the variances with the
 *   largest restricted likelihood (`estimated`, 0 where it lands there) and averaged ones; the grid with its weights.
 *   The same input gives the same output. Cost: some hundred times that of one smoothing
 * @throws RangeError `fitLevel requires …` as smoothLevel, and with houses as smoothLevelWithHouses does
 * @throws RangeError `fitLevel requires a design effect above 0 and n of at least the design effect`
 * @throws RangeError `fitLevel requires a sum of two shares above 0, at most 1`
 * @throws RangeError `fitLevel requires houses for a reference set or results`
 * @throws RangeError `fitLevel requires at most one exact result`
 * @throws RangeError `fitLevel requires observations on at least 4 days, at least 3 more of them than house effects and level`
 * @see Durbin and Koopman, Time Series Analysis by State Space Methods, chapters 2 and 7 (from memory); grid weights:
 *   common practice, no source
 * @example
 * fitLevel(
 *   [0.41, 0.44, 0.42, 0.43, 0.43, 0.42].map((value, index) => ({
 *     day: 1 + 5 * index, value, sampling: { kind: 'share', n: 1000, deff: 1.4 },
 *   })),
 *   { firstDay: 1, lastDay: 26 },
 * ).estimated.stateVariancePerDay; // => 0
 */
export function fitLevel(polls: readonly FitPoll[], options: FitOptions): FittedLevel {
  const level = prepare('fitLevel', polls, options);
  const found = findVariances(level, polls);
  const average = averageLevels(level, found);
  const [, secondState = 0] = found.grid.stateSds;
  const [, secondExtra = 0] = found.grid.extraSds;
  const steps = {
    stateSd: secondState - found.grid.stateSds[0]!,
    extraSd: secondExtra - found.grid.extraSds[0]!,
  };
  const { stateSd, extraSd } = restrictedMaximum(level, bestNode(found), steps);
  solveLevel(level, stateSd ** 2, extraSd ** 2);
  return {
    days: daysOf(options),
    mean: average.mean,
    variance: average.variance,
    houseEffects: average.houseEffects,
    changes: average.changes,
    predictions: average.predictions,
    estimated: {
      stateVariancePerDay: stateSd ** 2,
      extraVariance: extraSd ** 2,
      logLikelihoodFlat: level.logLikelihoodFlat,
    },
    averaged: average.averaged,
    grid: found.grid.extraSds.flatMap((extra, row) =>
      found.grid.stateSds.map((state, column) => ({
        stateVariancePerDay: state ** 2,
        extraVariance: extra ** 2,
        weight: average.weights[row]![column]!,
      })),
    ),
  };
}

function prepare(fn: string, polls: readonly FitPoll[], options: FitOptions): Level {
  refuseDays(fn, options);
  polls.forEach((poll) => refuseSampling(fn, poll.sampling));
  const houseList = housesOf(fn, polls, options);
  refusePlaces(fn, options.predictions ?? [], houseList.names);
  const count = polls.length || 1;
  const pooled = polls.reduce((sum, poll) => sum + poll.value / count, 0);
  const varianceOf = (poll: FitPoll) => samplingVariance(poll.sampling, pooled);
  const arranged = arrangePolls(fn, polls, varianceOf, houseList, options);
  required(hasEnoughToFit(polls, options), fn, ENOUGH);
  return makeLevel(arranged, houseList);
}

/** Whether polls are enough, in number and days, for `fitLevel`. */
export function hasEnoughToFit(polls: readonly FitPoll[], options: FitOptions): boolean {
  const results = options.results ?? [];
  const houses = new Set(polls.flatMap((poll) => poll.house ?? []));
  const parameters = Math.max(1, houses.size + (results.length > 0 ? 1 : 0));
  const days = new Set([...polls, ...results].map(({ day }) => day));
  return days.size >= FEWEST_DAYS && polls.length + results.length >= parameters + FEWEST_SPARE;
}

function housesOf(fn: string, polls: readonly FitPoll[], options: FitOptions): HouseList {
  if (polls.some((poll) => poll.house !== undefined)) {
    const houseList = listHouses(fn, polls, options, options);
    const exact = houseList.results.filter((result) => result.variance === 0);
    required(exact.length <= 1, fn, 'at most one exact result');
    return houseList;
  }
  const isPlain = !options.houses && !options.reference && !options.results?.length;
  required(isPlain, fn, 'houses for a reference set or results');
  return noHouses;
}

/** The likelihood on its grid, with sampling variances at the smoothed level, which is found twice. */
function findVariances(level: Level, polls: readonly FitPoll[]): GridLikelihood {
  const wide = evaluateGrid(level, wideGrid(level));
  resample(level, polls, wide);
  const narrow = evaluateGrid(level, narrowGrid(level, wide, SEARCH));
  resample(level, polls, narrow);
  return evaluateGrid(level, narrowGrid(level, narrow, STEPS));
}

/** Sets each poll's sampling variance at the smoothed level of its day, by the best variances of a grid. */
function resample(level: Level, polls: readonly FitPoll[], found: GridLikelihood): void {
  if (polls.every((poll) => poll.sampling.kind === 'given')) return;
  const { stateSd, extraSd } = bestNode(found);
  solveLevel(level, stateSd ** 2, extraSd ** 2);
  const { sampling, cellOf } = level.arranged;
  const knotOf = knotsOfCells(level.arranged);
  polls.forEach((poll, index) => {
    sampling[index] = samplingVariance(poll.sampling, level.means.smoothed[knotOf[cellOf[index]!]!]!);
  });
}

function knotsOfCells({ knotCells, cellHouse }: Arranged): Int32Array {
  const knotOf = new Int32Array(cellHouse.length);
  for (let knot = 0; knot + 1 < knotCells.length; knot += 1) {
    knotOf.fill(knot, knotCells[knot], knotCells[knot + 1]);
  }
  return knotOf;
}

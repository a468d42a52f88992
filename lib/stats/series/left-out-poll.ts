import { criticalValue } from '../distributions/critical-value';
import { twoSidedP } from '../distributions/two-sided-p';
import type { Interval } from '../interval';
import { isInside, required } from '../require';
import { fitLevel, hasEnoughToFit, type FitOptions, type FitPoll } from './fit-level';
import type { HouseChoice, HousePoll, LevelPoll, PlacePrediction } from './polls';
import { samplingVariance } from './sampling-variance';
import { smoothLevel, type KnownLevelOptions } from './smooth-level';
import { smoothLevelWithHouses } from './smooth-level-with-houses';

/** Where a poll was to be expected from all the others, and how far from that it lies. */
export type LeftOutPoll =
  | {
      readonly kind: 'predicted';
      readonly mean: number;
      readonly standardError: number;
      readonly interval: Interval;
      readonly z: number;
      readonly p: number;
    }
  | {
      readonly kind: 'cannot-be-predicted';
      readonly reason: 'no-other-poll' | 'no-other-poll-of-house' | 'too-few-polls';
    };

type Placed = { readonly day: number; readonly value: number; readonly house?: string };

/**
 * Whether a poll is out of line: where it was to be expected from the others alone, with variances that are known.
 *
 * The poll itself is left out, since it would pull the level towards it. A poll out of line is not wrong.
 *
 * @param polls as for `smoothLevel`, or with a house on every poll as for `smoothLevelWithHouses`
 * @param index which poll, counted from 0
 * @param confidence level of the interval, inside 0–1
 * @param options as for the function that smooths them
 * @returns mean and standard error of what the poll would show (level, house effect, sampling error), the interval,
 *   z = (value − mean)/standardError and its two-sided p; `cannot-be-predicted` if no other poll is there, or none
 *   of its house
 * @throws RangeError `leftOutPoll requires the index of a poll`
 * @throws RangeError `leftOutPoll requires a confidence level inside 0 and 1`
 * @throws RangeError as smoothLevel or smoothLevelWithHouses does
 * @see deletion residuals of dense generalized least squares, written out in the tests
 * @example
 * leftOutPoll(
 *   [
 *     { day: 1, value: 0.4, variance: 0.0002 },
 *     { day: 1, value: 0.42, variance: 0.0002 },
 *     { day: 2, value: 0.46, variance: 0.0003 },
 *   ],
 *   2, 0.95, { firstDay: 1, lastDay: 2, stateVariancePerDay: 0 },
 * ).z; // => 2.5
 */
export function leftOutPoll(
  polls: readonly (LevelPoll & { readonly house?: string })[],
  index: number,
  confidence: number,
  options: KnownLevelOptions & HouseChoice,
): LeftOutPoll {
  const fn = 'leftOutPoll';
  const { poll, others, reason } = takeOut(fn, polls, index, confidence);
  const place = [placeOf(poll)];
  const everyPoll = { ...options, predictions: [], changes: [] };
  if (poll.house === undefined) smoothLevel(polls, everyPoll);
  else smoothLevelWithHouses(polls as readonly HousePoll[], everyPoll);
  if (reason) return { kind: 'cannot-be-predicted', reason };
  const asked = { ...options, predictions: place, changes: [] };
  const { predictions } =
    poll.house === undefined
      ? smoothLevel(others, asked)
      : smoothLevelWithHouses(others as readonly HousePoll[], asked);
  return judge(poll, predictions[0]!, poll.variance, confidence);
}

/**
 * Whether a poll is out of line when the variances have to be estimated: as `leftOutPoll`, with level and variances
 * fitted to the other polls.
 *
 * @param polls as for `fitLevel`
 * @param index which poll, counted from 0
 * @param confidence level of the interval, inside 0–1
 * @param options as for `fitLevel`
 * @returns as `leftOutPoll`; the sampling variance is taken at the level expected, the extra variance at its average;
 *   `too-few-polls` if the others are too few for `fitLevel`
 * @throws RangeError `leftOutFit requires the index of a poll`
 * @throws RangeError `leftOutFit requires a confidence level inside 0 and 1`
 * @throws RangeError as fitLevel does
 * @see common practice, no source
 * @example
 * leftOutFit(
 *   [0.41, 0.44, 0.42, 0.43, 0.43, 0.52].map((value, index) => ({
 *     day: 1 + 5 * index, value, sampling: { kind: 'given', variance: 0.0003 },
 *   })),
 *   5, 0.95, { firstDay: 1, lastDay: 26 },
 * ).kind; // => 'predicted'
 */
export function leftOutFit(
  polls: readonly FitPoll[],
  index: number,
  confidence: number,
  options: FitOptions,
): LeftOutPoll {
  const { poll, others, reason } = takeOut('leftOutFit', polls, index, confidence);
  if (reason) return { kind: 'cannot-be-predicted', reason };
  if (!hasEnoughToFit(others, options)) return { kind: 'cannot-be-predicted', reason: 'too-few-polls' };
  const fit = fitLevel(others, { ...options, predictions: [placeOf(poll)], changes: [] });
  const [prediction] = fit.predictions;
  const sampling = samplingVariance(poll.sampling, prediction!.mean);
  return judge(poll, prediction!, sampling + fit.averaged.extraVariance, confidence);
}

const placeOf = ({ day, house }: Placed) => (house === undefined ? { day } : { day, house });

function takeOut<Poll extends Placed>(fn: string, polls: readonly Poll[], index: number, confidence: number) {
  const poll = polls[index];
  if (!poll) throw new RangeError(`${fn} requires the index of a poll`);
  required(isInside(confidence), fn, 'a confidence level inside 0 and 1');
  const others = polls.filter((_, other) => other !== index);
  const isAlone = poll.house !== undefined && others.every((other) => other.house !== poll.house);
  const none = others.length === 0 ? ('no-other-poll' as const) : null;
  return { poll, others, reason: none ?? (isAlone ? ('no-other-poll-of-house' as const) : null) };
}

function judge(poll: Placed, expected: PlacePrediction, own: number, confidence: number): LeftOutPoll {
  const { mean } = expected;
  const standardError = Math.sqrt(expected.variance + own);
  const half = criticalValue(1 - confidence, null) * standardError;
  const z = (poll.value - mean) / standardError;
  return {
    kind: 'predicted',
    mean,
    standardError,
    interval: [mean - half, mean + half],
    z,
    p: twoSidedP(z, null),
  };
}

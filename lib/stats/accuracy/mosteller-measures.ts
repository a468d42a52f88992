import { extended, type Extended } from './extended';
import { decided, mean, requirePollAndResult } from './shares';

export type MostellerMeasures = {
  /** 1: error of the winner's share, poll less result; of the first winner where two tie. */
  winnerError: number;
  /** 2: the same with the undecided shared out. */
  winnerErrorDecided: number;
  /** 3: mean absolute error over the candidates given. */
  meanAbsoluteError: number;
  /** 3 with the undecided shared out. */
  meanAbsoluteErrorDecided: number;
  /** 4: mean of |poll ÷ result − 1|; `'Infinity'` where a candidate with result 0 was polled above 0, null for 0/0. */
  meanRelativeError: Extended;
  /** 5: absolute error of the lead of the first candidate over the second. */
  leadError: number;
  /** 5 with its sign: above 0 where the poll had the first too far ahead. */
  leadErrorSigned: number;
  /** 6: largest absolute error. */
  largestError: number;
  rootMeanSquareError: number;
};

/**
 * How far a poll was from the result, in the measures of Mosteller and his colleagues.
 *
 * Use it after a certified result, for polls of the same kind and time before the vote. One poll's error says
 * little of its pollster: see tests over many.
 *
 * @param poll shares 0–1, which need not sum to 1; the first two are the pair whose lead is compared
 * @param result shares 0–1 of the same candidates in the same order
 * @returns proportions
 * @throws RangeError `mostellerMeasures requires poll and result of the same two or more candidates`
 * @throws RangeError `mostellerMeasures requires shares from 0 to 1`
 * @throws RangeError `mostellerMeasures requires shares that are not all 0`
 * @see Mosteller et al. (1949), The Pre-Election Polls of 1948, 54–57 (from memory); closed forms in R 4.2.2
 * @example
 * mostellerMeasures([0.48, 0.44, 0.04], [0.5, 0.47, 0.03]).meanAbsoluteError; // => 0.02
 */
export function mostellerMeasures(poll: readonly number[], result: readonly number[]): MostellerMeasures {
  requirePollAndResult(poll, result, 'mostellerMeasures');
  const errors = differences(poll, result);
  const errorsDecided = differences(decided(poll), result);
  const winner = result.indexOf(Math.max(...result));
  const sizes = errors.map(Math.abs);
  const [firstError = 0, secondError = 0] = errors;
  return {
    winnerError: errors[winner] ?? 0,
    winnerErrorDecided: errorsDecided[winner] ?? 0,
    meanAbsoluteError: mean(sizes),
    meanAbsoluteErrorDecided: mean(errorsDecided.map(Math.abs)),
    meanRelativeError: extended(mean(poll.map((share, index) => Math.abs(share / (result[index] ?? 0) - 1)))),
    leadError: Math.abs(firstError - secondError),
    leadErrorSigned: firstError - secondError,
    largestError: Math.max(...sizes),
    rootMeanSquareError: Math.sqrt(mean(errors.map((error) => error ** 2))),
  };
}

function differences(poll: readonly number[], result: readonly number[]): number[] {
  return poll.map((share, index) => share - (result[index] ?? 0));
}

import { extended, type Extended } from './extended';
import { decided, mean, requirePollAndResult } from './shares';

export type MultiPartyAccuracy = {
  /** For each candidate: log odds in the poll, undecided shared out, less log odds in the result. */
  perCandidate: Extended[];
  /** Mean of their sizes: the B measure. */
  b: Extended;
  /** The same, weighted by the result. */
  bWeighted: Extended;
};

/**
 * The bias of a poll over any number of candidates (the B measure).
 *
 * Use it where more than two matter; for two it is the size of the A measure.
 *
 * @param poll shares 0–1, which need not sum to 1
 * @param result shares 0–1 of the same candidates in the same order
 * @returns a share of 0 or 1 makes a candidate's measure unbounded: `'Infinity'`, `'-Infinity'`, or null for 0/0
 * @throws RangeError `multiPartyAccuracy requires poll and result of the same two or more candidates`
 * @throws RangeError `multiPartyAccuracy requires shares from 0 to 1`
 * @throws RangeError `multiPartyAccuracy requires shares that are not all 0`
 * @see Arzheimer and Evans (2014), Political Analysis 22, 31–44 (from memory); closed forms in R 4.2.2
 * @example
 * multiPartyAccuracy([0.45, 0.35, 0.1], [0.5, 0.38, 0.12]).b; // => 0.0415248...
 */
export function multiPartyAccuracy(poll: readonly number[], result: readonly number[]): MultiPartyAccuracy {
  requirePollAndResult(poll, result, 'multiPartyAccuracy');
  const biases = decided(poll).map((share, index) => Math.log(odds(share) / odds(result[index] ?? 0)));
  const sizes = biases.map(Math.abs);
  const votes = result.reduce((sum, share) => sum + share, 0);
  const weighted = sizes.reduce((sum, size, index) => sum + (result[index] ?? 0) * size, 0);
  return {
    perCandidate: biases.map(extended),
    b: extended(mean(sizes)),
    bWeighted: extended(weighted / votes),
  };
}

function odds(share: number): number {
  return share / (1 - share);
}

import { isProportion, required } from '../require';

/** A poll beside the result: shares of the same candidates in the same order; the first two are the pair compared. */
export function requirePollAndResult(poll: readonly number[], result: readonly number[], fn: string): void {
  required(
    poll.length === result.length && poll.length >= 2,
    fn,
    'poll and result of the same two or more candidates',
  );
  required([...poll, ...result].every(isProportion), fn, 'shares from 0 to 1');
  required(poll.some(Boolean) && result.some(Boolean), fn, 'shares that are not all 0');
}

/** The poll with its undecided shared out in proportion: scaled to a sum of 1. */
export function decided(poll: readonly number[]): number[] {
  const sum = poll.reduce((total, share) => total + share, 0);
  return poll.map((share) => share / sum);
}

export function mean(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0) / values.length;
}

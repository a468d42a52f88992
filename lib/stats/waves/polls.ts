import { isPositive, isProportion, required } from '../require';

/** One poll of a row: what it found and how many people that rests on. */
export type PolledShare = {
  /** Share, 0–1. */
  readonly p: number;
  /** Sample size, above 0. */
  readonly n: number;
  /** Design effect, above 0. */
  readonly deff: number;
};

export type Sized = Pick<PolledShare, 'n' | 'deff'>;

export const effectiveSize = ({ n, deff }: Sized): number => n / deff;

export const sumOf = (values: readonly number[]): number => values.reduce((sum, one) => sum + one, 0);

/** The share in all polls together, each with its effective size. */
export function pooledShare(polls: readonly PolledShare[]): number {
  const hits = sumOf(polls.map((poll) => poll.p * effectiveSize(poll)));
  return Math.min(1, hits / sumOf(polls.map(effectiveSize)));
}

export function requirePolls(polls: readonly Sized[], fn: string): void {
  required(polls.length >= 2, fn, 'at least two polls');
  required(
    polls.every(({ n, deff }) => isPositive(n) && isPositive(deff)),
    fn,
    'n and deff above 0',
  );
}

export function requireShares(polls: readonly PolledShare[], fn: string): void {
  requirePolls(polls, fn);
  required(
    polls.every(({ p }) => isProportion(p)),
    fn,
    'shares from 0 to 1',
  );
}

import { isProportion, required } from '../require';
import { chiSquareUpperTail } from './chi-square-upper-tail';
import { effectiveSize, requirePolls, sumOf, type Sized } from './polls';

export type PolledAnswers = Sized & {
  /** The share of every answer, 0–1, the same answers in the same order in each poll. */
  readonly shares: readonly number[];
};

export type AnswerHomogeneity = {
  /** The share of each answer in all polls together; 0 for one that nobody gave. */
  pooled: number[];
  /** Pearson's chi-square on effective counts; null where all gave one and the same answer. */
  chiSquare: number | null;
  /** (polls − 1)·(answers that somebody gave − 1). */
  df: number;
  pValue: number | null;
};

/**
 * Whether several polls of one question differ, over all its answers at once, by more than their sampling errors.
 *
 * Use it where no single share was asked after beforehand; for one share use homogeneityOfShares. Answers that
 * nobody gave in any poll are left out.
 *
 * @param polls two or more, in any order
 * @throws RangeError `homogeneityOfAnswers requires at least two polls`
 * @throws RangeError `homogeneityOfAnswers requires n and deff above 0`
 * @throws RangeError `homogeneityOfAnswers requires the same two or more answers in each poll`
 * @throws RangeError `homogeneityOfAnswers requires shares from 0 to 1, not all 0 in a poll`
 * @see R 4.2.2 `chisq.test(shares * n / deff, correct = FALSE)`
 * @example
 * homogeneityOfAnswers([
 *   { shares: [0.42, 0.4, 0.18], n: 1000, deff: 1.4 },
 *   { shares: [0.47, 0.38, 0.15], n: 800, deff: 1.2 },
 * ]).pValue; // => 0.1243474...
 */
export function homogeneityOfAnswers(polls: readonly PolledAnswers[]): AnswerHomogeneity {
  requireAnswers(polls, 'homogeneityOfAnswers');
  const counts = polls.map((poll) => poll.shares.map((share) => share * effectiveSize(poll)));
  const rows = counts.map(sumOf);
  const columns = (counts[0] ?? []).map((_, answer) => sumOf(counts.map((row) => row[answer] ?? 0)));
  const total = sumOf(rows);
  const df = (polls.length - 1) * (columns.filter((sum) => sum > 0).length - 1);
  const cells = counts.flatMap((row, poll) =>
    row.map((count, answer) => pearson(count, ((rows[poll] ?? 0) * (columns[answer] ?? 0)) / total)),
  );
  const chiSquare = df > 0 ? sumOf(cells) : null;
  const sizes = sumOf(polls.map(effectiveSize));
  return {
    pooled: columns.map((sum) => sum / sizes),
    chiSquare,
    df,
    pValue: chiSquare === null ? null : chiSquareUpperTail(chiSquare, df),
  };
}

function pearson(count: number, expected: number): number {
  return expected > 0 ? (count - expected) ** 2 / expected : 0;
}

function requireAnswers(polls: readonly PolledAnswers[], fn: string): void {
  requirePolls(polls, fn);
  const answers = polls[0]?.shares.length ?? 0;
  required(
    answers >= 2 && polls.every(({ shares }) => shares.length === answers),
    fn,
    'the same two or more answers in each poll',
  );
  required(
    polls.every(({ shares }) => shares.every(isProportion) && sumOf(shares) > 0),
    fn,
    'shares from 0 to 1, not all 0 in a poll',
  );
}

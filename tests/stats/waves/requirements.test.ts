import { describe, expect, test } from 'vitest';
import * as stats from '@/lib/stats';

const poll = { p: 0.4, n: 500, deff: 1, score: 1 };
const later = { ...poll, score: 2 };
const answers = { shares: [0.4, 0.6], n: 500, deff: 1 };
const averages = {
  window: 2,
  shared: 1,
  waves: [0.4, 0.41, 0.42].map((p) => ({ p, n: 200 })),
  deff: 1,
  weighting: 'equal' as const,
};

const homogeneityOfShares = stats.homogeneityOfShares;
const overlap = stats.changeOfOverlappingAverages;
const OVERLAP = 'changeOfOverlappingAverages requires';
const WINDOW = `${OVERLAP} whole window of at least 1 and shared from 0 to window`;

const refusals: [call: () => unknown, message: string][] = [
  [() => homogeneityOfShares([poll]), 'homogeneityOfShares requires at least two polls'],
  [() => homogeneityOfShares([poll, { ...poll, n: 0 }]), 'homogeneityOfShares requires n and deff above 0'],
  [
    () => homogeneityOfShares([poll, { ...poll, deff: Infinity }]),
    'homogeneityOfShares requires n and deff above 0',
  ],
  [
    () => homogeneityOfShares([poll, { ...poll, p: Number.NaN }]),
    'homogeneityOfShares requires shares from 0 to 1',
  ],
  [() => stats.homogeneityOfAnswers([answers]), 'homogeneityOfAnswers requires at least two polls'],
  [
    () => stats.homogeneityOfAnswers([answers, { ...answers, n: -5 }]),
    'homogeneityOfAnswers requires n and deff above 0',
  ],
  [
    () => stats.homogeneityOfAnswers([answers, { ...answers, shares: [0.4, 0.3, 0.3] }]),
    'homogeneityOfAnswers requires the same two or more answers in each poll',
  ],
  [
    () => stats.homogeneityOfAnswers([1, 2].map(() => ({ ...answers, shares: [1] }))),
    'homogeneityOfAnswers requires the same two or more answers in each poll',
  ],
  [
    () => stats.homogeneityOfAnswers([answers, { ...answers, shares: [0, 0] }]),
    'homogeneityOfAnswers requires shares from 0 to 1, not all 0 in a poll',
  ],
  [
    () => stats.homogeneityOfAnswers([answers, { ...answers, shares: [1.2, 0] }]),
    'homogeneityOfAnswers requires shares from 0 to 1, not all 0 in a poll',
  ],
  [() => stats.trendOfShares([]), 'trendOfShares requires at least two polls'],
  [() => stats.trendOfShares([poll, { ...later, deff: 0 }]), 'trendOfShares requires n and deff above 0'],
  [() => stats.trendOfShares([poll, { ...later, p: -0.1 }]), 'trendOfShares requires shares from 0 to 1'],
  [
    () => stats.trendOfShares([poll, poll]),
    'trendOfShares requires scores that are finite and not all equal',
  ],
  [
    () => stats.trendOfShares([poll, { ...poll, score: Infinity }]),
    'trendOfShares requires scores that are finite and not all equal',
  ],
  [() => overlap({ ...averages, window: 0, shared: 0 }), WINDOW],
  [() => overlap({ ...averages, window: 1.5 }), WINDOW],
  [() => overlap({ ...averages, shared: 3 }), WINDOW],
  [() => overlap({ ...averages, shared: 0 }), `${OVERLAP} 2·window − shared waves`],
  [
    () => overlap({ ...averages, waves: [0.4, 2, 0.42].map((p) => ({ p, n: 200 })) }),
    `${OVERLAP} waves with p from 0 to 1 and n above 0`,
  ],
  [
    () => overlap({ ...averages, waves: [0, 1, 2].map((n) => ({ p: 0.4, n })) }),
    `${OVERLAP} waves with p from 0 to 1 and n above 0`,
  ],
  [() => overlap({ ...averages, deff: 0 }), `${OVERLAP} deff above 0`],
  [() => overlap({ ...averages, weighting: 'n' as 'by_n' }), `${OVERLAP} weighting 'equal' or 'by_n'`],
  [() => stats.chiSquareUpperTail(-1, 1), 'chiSquareUpperTail requires x of at least 0'],
  [() => stats.chiSquareUpperTail(Infinity, 1), 'chiSquareUpperTail requires x of at least 0'],
  [() => stats.chiSquareUpperTail(1, 0), 'chiSquareUpperTail requires whole df of at least 1'],
  [() => stats.chiSquareUpperTail(1, 1.5), 'chiSquareUpperTail requires whole df of at least 1'],
];

describe('what a row of polls requires is said by what it throws', () => {
  test.each(refusals.map(([run, message], index) => [index, message, run] as const))(
    '%d: %s',
    (_at, message, run) => {
      expect(run).toThrow(new RangeError(message));
    },
  );
});

import { describe, expect, test } from 'vitest';
import {
  changeStandardError,
  fitLevel,
  leftOutFit,
  leftOutPoll,
  levelBands,
  smoothLevel,
  smoothLevelWithHouses,
  waveToWaveVariance,
  type FitOptions,
  type FitPoll,
  type KnownHouseOptions,
  type KnownLevelOptions,
} from '@/lib/stats';

const poll = { day: 2, value: 0.4, variance: 2e-4, house: 'Kelmouth' };
const other = { ...poll, day: 3, house: 'Norwater' };
const known = { firstDay: 1, lastDay: 5, stateVariancePerDay: 1e-5 };
const fitPolls: FitPoll[] = [1, 2, 3, 4, 5].map((day) => ({
  day,
  value: 0.4 + day / 100,
  sampling: { kind: 'share', n: 1000, deff: 1 },
}));
const fitDays = { firstDay: 1, lastDay: 5 };

describe('a level refuses', () => {
  const plain = (polls: readonly (typeof poll)[], change: Partial<KnownLevelOptions> = {}) =>
    smoothLevel(polls, { ...known, ...change });
  const cases: [reason: string, run: () => unknown, condition: string][] = [
    ['no polls', () => plain([]), 'at least one poll'],
    [
      'days in the wrong order',
      () => plain([poll], { lastDay: 0 }),
      'whole days, firstDay not after lastDay',
    ],
    ['half days', () => plain([poll], { firstDay: 0.5 }), 'whole days, firstDay not after lastDay'],
    [
      'days that are no number',
      () => plain([poll], { lastDay: NaN }),
      'whole days, firstDay not after lastDay',
    ],
    ['too many days', () => plain([poll], { lastDay: 1_000_001 }), 'at most 1000000 days'],
    [
      'a negative state variance',
      () => plain([poll], { stateVariancePerDay: -1e-9 }),
      'a state variance per day of at least 0',
    ],
    [
      'a state variance that is no number',
      () => plain([poll], { stateVariancePerDay: NaN }),
      'a state variance per day of at least 0',
    ],
    [
      'an infinite state variance',
      () => plain([poll], { stateVariancePerDay: Infinity }),
      'a state variance per day of at least 0',
    ],
    [
      'a poll before the first day',
      () => plain([{ ...poll, day: 0 }]),
      'every poll on a whole day from firstDay to lastDay',
    ],
    [
      'a poll after the last day',
      () => plain([poll, { ...poll, day: 6 }]),
      'every poll on a whole day from firstDay to lastDay',
    ],
    [
      'a poll at noon',
      () => plain([{ ...poll, day: 2.5 }]),
      'every poll on a whole day from firstDay to lastDay',
    ],
    ['a value that is no number', () => plain([{ ...poll, value: NaN }]), 'values that are finite numbers'],
    ['an infinite value', () => plain([{ ...poll, value: -Infinity }]), 'values that are finite numbers'],
    ['a variance of 0', () => plain([{ ...poll, variance: 0 }]), 'variances above 0'],
    ['a variance that is no number', () => plain([{ ...poll, variance: NaN }]), 'variances above 0'],
    ['an infinite variance', () => plain([{ ...poll, variance: Infinity }]), 'variances above 0'],
    [
      'a change that begins too early',
      () => plain([poll], { changes: [{ from: 0, to: 2 }] }),
      'changes between days from firstDay to lastDay',
    ],
    [
      'a change that ends too late',
      () => plain([poll], { changes: [{ from: 1, to: 6 }] }),
      'changes between days from firstDay to lastDay',
    ],
    [
      'a prediction beyond its days',
      () => plain([poll], { predictions: [{ day: 6 }] }),
      'predictions for days from firstDay to lastDay',
    ],
    [
      'a prediction for a house',
      () => plain([poll], { predictions: [{ day: 3, house: 'Kelmouth' }] }),
      'predictions for known houses, for none where there are no houses',
    ],
  ];
  test.each(cases)('%s', (_, run, condition) => {
    expect(run).toThrow(new RangeError(`smoothLevel requires ${condition}`));
  });

  test('nothing of the whole range of variances', () => {
    const list = [1e-100, 1e-8, 1, 1e100].map((variance, index) => ({
      day: 1 + index,
      value: 0.4,
      variance,
    }));
    const level = smoothLevel([...list, ...list], known);
    expect(level.smoothedMean.every((mean) => Math.abs(mean - 0.4) < 1e-12)).toBe(true);
    expect(level.smoothedVariance.every((variance) => variance > 0)).toBe(true);
    expect(Number.isFinite(level.logLikelihoodFlat)).toBe(true);
  });
});

describe('a level with houses refuses', () => {
  test('variances between which no number has digits enough', () => {
    const variances: [day: number, variance: number, house: string][] = [
      [2, 1e-80, 'Kelmouth'],
      [5, 1e19, 'Norwater'],
      [5, 1e-85, 'Kelmouth'],
      [3, 1e38, 'Sund'],
      [3, 1e-30, 'Vell'],
    ];
    const far = variances.map(([day, variance, house]) => ({ day, value: 0.4, variance, house }));
    const restless = { ...known, stateVariancePerDay: 1e56 };
    expect(() => smoothLevelWithHouses(far, restless)).toThrow(
      'smoothLevelWithHouses requires variances near enough to each other to tell the houses apart',
    );
  });

  const housed = (change: Partial<KnownHouseOptions>, polls: readonly (typeof poll)[] = [poll, other]) =>
    smoothLevelWithHouses(polls, { ...known, ...change });
  const result = { day: 4, value: 0.42, variance: 0 };
  const cases: [reason: string, run: () => unknown, condition: string][] = [
    ['no polls', () => housed({}, []), 'at least one poll'],
    ['a poll without its house', () => housed({}, [{ ...poll, house: '' }]), 'a house for every poll'],
    [
      'a house listed twice',
      () => housed({ houses: ['Kelmouth', 'Norwater', 'Kelmouth'] }),
      'every house listed once',
    ],
    ['an unknown house', () => housed({ houses: ['Kelmouth'] }), 'every house of a poll among the houses'],
    [
      'a house without polls',
      () => housed({ houses: ['Kelmouth', 'Norwater', 'Quillon'] }),
      'at least one poll of every house',
    ],
    [
      'an unknown reference',
      () => housed({ reference: ['Quillon'] }),
      'a reference set of at least one of the houses, each named once',
    ],
    [
      'an empty reference',
      () => housed({ reference: [] }),
      'a reference set of at least one of the houses, each named once',
    ],
    [
      'a reference named twice',
      () => housed({ reference: ['Kelmouth', 'Kelmouth'] }),
      'a reference set of at least one of the houses, each named once',
    ],
    [
      'a reference beside results',
      () => housed({ reference: ['Kelmouth'], results: [result] }),
      'a reference set or results, not both',
    ],
    [
      'a result of negative variance',
      () => housed({ results: [{ ...result, variance: -1 }] }),
      'results with a day from firstDay to lastDay, a value and a variance of at least 0',
    ],
    [
      'a result outside its days',
      () => housed({ results: [{ ...result, day: 9 }] }),
      'results with a day from firstDay to lastDay, a value and a variance of at least 0',
    ],
    [
      'a result that is no number',
      () => housed({ results: [{ ...result, value: NaN }] }),
      'results with a day from firstDay to lastDay, a value and a variance of at least 0',
    ],
    [
      'two exact results on a day',
      () => housed({ results: [result, result] }),
      'at most one exact result a day',
    ],
    [
      'two exact results of a level that stands',
      () => housed({ stateVariancePerDay: 0, results: [result, { ...result, day: 5 }] }),
      'a state variance above 0 where there are several exact results',
    ],
    [
      'a prediction of no house',
      () => housed({ predictions: [{ day: 3 }] }),
      'predictions for known houses, for none where there are no houses',
    ],
    [
      'a prediction of an unknown house',
      () => housed({ predictions: [{ day: 3, house: 'Quillon' }] }),
      'predictions for known houses, for none where there are no houses',
    ],
    [
      'a poll outside its days',
      () => housed({}, [{ ...poll, day: 9 }]),
      'every poll on a whole day from firstDay to lastDay',
    ],
    [
      'a negative state variance',
      () => housed({ stateVariancePerDay: -1 }),
      'a state variance per day of at least 0',
    ],
    ['days in the wrong order', () => housed({ lastDay: 0 }), 'whole days, firstDay not after lastDay'],
  ];
  test.each(cases)('%s', (_, run, condition) => {
    expect(run).toThrow(new RangeError(`smoothLevelWithHouses requires ${condition}`));
  });
});

describe('a fit refuses', () => {
  const fit = (polls: readonly FitPoll[], change: Partial<FitOptions> = {}) =>
    fitLevel(polls, { ...fitDays, ...change });
  const sampled = (sampling: FitPoll['sampling']) => fitPolls.map((one) => ({ ...one, sampling }));
  const housed = fitPolls.map((one) => ({ ...one, house: 'Kelmouth' }));
  const enough = 'observations on at least 4 days, at least 3 more of them than house effects and level';
  const cases: [reason: string, run: () => unknown, condition: string][] = [
    ['no polls', () => fit([]), 'at least one poll'],
    ['polls on three days', () => fit([...fitPolls.slice(0, 3), ...fitPolls.slice(0, 3)]), enough],
    [
      'as many houses as polls',
      () => fit(fitPolls.map((one, index) => ({ ...one, house: `House ${index}` }))),
      enough,
    ],
    [
      'days in the wrong order',
      () => fit(fitPolls, { lastDay: 0 }),
      'whole days, firstDay not after lastDay',
    ],
    [
      'a value that is no number',
      () => fit(fitPolls.map((one) => ({ ...one, value: NaN }))),
      'values that are finite numbers',
    ],
    ['a given variance of 0', () => fit(sampled({ kind: 'given', variance: 0 })), 'variances above 0'],
    [
      'n below the design effect',
      () => fit(sampled({ kind: 'share', n: 1, deff: 2 })),
      'a design effect above 0 and n of at least the design effect',
    ],
    [
      'n that is no number',
      () => fit(sampled({ kind: 'share', n: NaN, deff: 2 })),
      'a design effect above 0 and n of at least the design effect',
    ],
    [
      'a design effect of 0',
      () => fit(sampled({ kind: 'lead', n: 100, deff: 0, sum: 0.9 })),
      'a design effect above 0 and n of at least the design effect',
    ],
    [
      'two shares above 1',
      () => fit(sampled({ kind: 'lead', n: 100, deff: 1, sum: 1.1 })),
      'a sum of two shares above 0, at most 1',
    ],
    [
      'two shares of 0',
      () => fit(sampled({ kind: 'lead', n: 100, deff: 1, sum: 0 })),
      'a sum of two shares above 0, at most 1',
    ],
    ['houses on some polls only', () => fit([...housed, ...fitPolls]), 'a house for every poll'],
    [
      'a reference without houses',
      () => fit(fitPolls, { reference: ['Kelmouth'] }),
      'houses for a reference set or results',
    ],
    [
      'results without houses',
      () => fit(fitPolls, { results: [poll] }),
      'houses for a reference set or results',
    ],
    [
      'several exact results',
      () =>
        fit(housed, {
          results: [
            { ...poll, variance: 0 },
            { ...other, variance: 0 },
          ],
        }),
      'at most one exact result',
    ],
    [
      'a prediction of an unknown house',
      () => fit(housed, { predictions: [{ day: 2, house: 'Quillon' }] }),
      'predictions for known houses, for none where there are no houses',
    ],
  ];
  test.each(cases)('%s', (_, run, condition) => {
    expect(run).toThrow(new RangeError(`fitLevel requires ${condition}`));
  });
});

describe('the small questions of a series refuse', () => {
  const cases: [reason: string, run: () => unknown, message: string][] = [
    [
      'an index that is no poll',
      () => leftOutPoll([poll], 1, 0.95, known),
      'leftOutPoll requires the index of a poll',
    ],
    [
      'a level of 1',
      () => leftOutPoll([poll], 0, 1, known),
      'leftOutPoll requires a confidence level inside 0 and 1',
    ],
    [
      'a left-out poll beyond its days',
      () => leftOutPoll([{ day: 9, value: 0.4, variance: 1e-4 }], 0, 0.95, known),
      'smoothLevel requires every poll on a whole day from firstDay to lastDay',
    ],
    [
      'a left-out poll of an unknown house',
      () => leftOutPoll([poll, other], 0, 0.95, { ...known, houses: ['Norwater'] }),
      'smoothLevelWithHouses requires every house of a poll among the houses',
    ],
    [
      'an index in a fit that is no poll',
      () => leftOutFit(fitPolls, -1, 0.95, fitDays),
      'leftOutFit requires the index of a poll',
    ],
    [
      'a level of 0 in a fit',
      () => leftOutFit(fitPolls, 0, 0, fitDays),
      'leftOutFit requires a confidence level inside 0 and 1',
    ],
    [
      'a left-out poll that a fit would refuse',
      () => leftOutFit([{ ...fitPolls[0]!, day: 9 }, ...fitPolls], 1, 0.95, fitDays),
      'fitLevel requires every poll on a whole day from firstDay to lastDay',
    ],
    [
      'fewer variances than means',
      () => levelBands([0.4, 0.5], [1e-4], 0.95, 0),
      'levelBands requires as many variances as means, of at least 0',
    ],
    [
      'a negative variance',
      () => levelBands([0.4], [-1e-4], 0.95, 0),
      'levelBands requires as many variances as means, of at least 0',
    ],
    [
      'a mean that is no number',
      () => levelBands([NaN], [1e-4], 0.95, 0),
      'levelBands requires means that are finite numbers',
    ],
    [
      'a confidence level of 95',
      () => levelBands([0.4], [1e-4], 95, 0),
      'levelBands requires a confidence level inside 0 and 1',
    ],
    [
      'a negative floor',
      () => levelBands([0.4], [1e-4], 0.95, -0.01),
      'levelBands requires a floor of at least 0',
    ],
    [
      'a wave that is no number',
      () => waveToWaveVariance([0.4, NaN]),
      'waveToWaveVariance requires values that are finite numbers',
    ],
    [
      'a sampling standard error of 0',
      () => changeStandardError(0, [0.4]),
      'changeStandardError requires a sampling standard error above 0',
    ],
    [
      'an infinite wave beside a change',
      () => changeStandardError(0.01, [Infinity]),
      'waveToWaveVariance requires values that are finite numbers',
    ],
  ];
  test.each(cases)('%s', (_, run, message) => {
    expect(run).toThrow(new RangeError(message));
  });
});

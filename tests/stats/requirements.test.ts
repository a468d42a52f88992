import { describe, expect, test } from 'vitest';
import * as stats from '@/lib/stats';

const refusals: [call: string, run: () => unknown, message: string][] = [
  ['normalQuantile(0)', () => stats.normalQuantile(0), 'normalQuantile requires p inside 0 and 1'],
  ['normalQuantile(NaN)', () => stats.normalQuantile(Number.NaN), 'normalQuantile requires p inside 0 and 1'],
  ['normalUpperTail(NaN)', () => stats.normalUpperTail(Number.NaN), 'normalUpperTail requires a number'],
  ['twoSidedP(Infinity)', () => stats.twoSidedP(Infinity, null), 'twoSidedP requires a finite statistic'],
  ['twoSidedP(1, 0)', () => stats.twoSidedP(1, 0), 'twoSidedP requires df of at least 1, or null'],
  ['criticalValue(1)', () => stats.criticalValue(1, null), 'criticalValue requires alpha inside 0 and 1'],
  [
    'criticalValue(.05, 0)',
    () => stats.criticalValue(0.05, 0),
    'criticalValue requires df of at least 1, or null',
  ],
  ['wilsonInterval(p 2)', () => stats.wilsonInterval(2, 10, 2), 'wilsonInterval requires p from 0 to 1'],
  ['wilsonInterval(n 0)', () => stats.wilsonInterval(0.5, 0, 2), 'wilsonInterval requires n above 0'],
  ['wilsonInterval(q 0)', () => stats.wilsonInterval(0.5, 10, 0), 'wilsonInterval requires q above 0'],
  [
    'newcombeInterval(p 2)',
    () => stats.newcombeInterval(2, 9, 0.5, 9, 2),
    'wilsonInterval requires p from 0 to 1',
  ],
  [
    'clopperPearson(n 0)',
    () => stats.clopperPearsonInterval(0, 0, 0.95),
    'clopperPearsonInterval requires n above 0',
  ],
  [
    'clopperPearson(x > n)',
    () => stats.clopperPearsonInterval(3, 2, 0.95),
    'clopperPearsonInterval requires x from 0 to n',
  ],
  [
    'clopperPearson(level 1)',
    () => stats.clopperPearsonInterval(1, 2, 1),
    'clopperPearsonInterval requires level inside 0 and 1',
  ],
  [
    'shareStandardError(p)',
    () => stats.shareStandardError(-0.1, 9, 1),
    'shareStandardError requires p from 0 to 1',
  ],
  [
    'shareStandardError(n)',
    () => stats.shareStandardError(0.1, 0, 1),
    'shareStandardError requires n and deff above 0',
  ],
  [
    'leadStandardError(a)',
    () => stats.leadStandardError(1.1, 0, 9, 1),
    'leadStandardError requires shares from 0 to 1',
  ],
  [
    'leadStandardError(deff)',
    () => stats.leadStandardError(0.1, 0, 9, 0),
    'leadStandardError requires n and deff above 0',
  ],
  [
    'leadNullStandardError(a)',
    () => stats.leadNullStandardError(1.1, 0, 9, 1),
    'leadNullStandardError requires shares from 0 to 1',
  ],
  [
    'leadNullStandardError(n)',
    () => stats.leadNullStandardError(0.1, 0, 0, 1),
    'leadNullStandardError requires n and deff above 0',
  ],
  [
    'pooledStandardError(p)',
    () => stats.pooledStandardError(2, 9, 0, 9),
    'pooledStandardError requires shares from 0 to 1',
  ],
  [
    'pooledStandardError(n)',
    () => stats.pooledStandardError(0.1, 0, 0, 9),
    'pooledStandardError requires sizes above 0',
  ],
  ['maximumMargin(n 0)', () => stats.maximumMargin(0, 1, 2), 'maximumMargin requires n, deff and q above 0'],
  ['exactSignP(-1)', () => stats.exactSignP(-1, 2), 'exactSignP requires counts of at least 0'],
  ['exactBinomialP(m 0)', () => stats.exactBinomialP(0, 0, 0.5), 'exactBinomialP requires m above 0'],
  ['exactBinomialP(x > m)', () => stats.exactBinomialP(3, 2, 0.5), 'exactBinomialP requires x from 0 to m'],
  ['exactBinomialP(p0 1)', () => stats.exactBinomialP(1, 2, 1), 'exactBinomialP requires p0 inside 0 and 1'],
  [
    'fisherExactP(halves)',
    () => stats.fisherExactP(0.5, 2, 1, 2),
    'fisherExactP requires whole counts of at least 0, none above its sample',
  ],
  [
    'fisherExactP(hits > n)',
    () => stats.fisherExactP(3, 2, 1, 2),
    'fisherExactP requires whole counts of at least 0, none above its sample',
  ],
  ['holm(p 2)', () => stats.holm([2], 0.05), 'holm requires p-values from 0 to 1'],
  ['holm(alpha 0)', () => stats.holm([0.2], 0), 'holm requires alpha inside 0 and 1'],
  [
    'roundingHalfWidth([])',
    () => stats.roundingHalfWidth([], 0.95),
    'roundingHalfWidth requires one to four half units above 0',
  ],
  [
    'roundingHalfWidth(0)',
    () => stats.roundingHalfWidth([0], 0.95),
    'roundingHalfWidth requires one to four half units above 0',
  ],
  [
    'roundingHalfWidth(cov 1)',
    () => stats.roundingHalfWidth([1], 1),
    'roundingHalfWidth requires coverage inside 0 and 1',
  ],
  [
    'kishDesignEffect([])',
    () => stats.kishDesignEffect([]),
    'kishDesignEffect requires weights of at least 0, not all 0',
  ],
  [
    'kishDesignEffect(-1)',
    () => stats.kishDesignEffect([1, -1]),
    'kishDesignEffect requires weights of at least 0, not all 0',
  ],
  [
    'impliedDesignEffect(0)',
    () => stats.impliedDesignEffect(0, 9, 0.95),
    'impliedDesignEffect requires margin and n above 0',
  ],
  [
    'impliedDesignEffect(level)',
    () => stats.impliedDesignEffect(0.1, 9, 1),
    'impliedDesignEffect requires level inside 0 and 1',
  ],
  [
    'detectableDifference(0)',
    () => stats.detectableDifference(2, 0),
    'detectableDifference requires critical and standardError above 0',
  ],
  ['roundHalfUp(-1)', () => stats.roundHalfUp(-1), 'roundHalfUp requires a number of at least 0'],
];

describe('what a function requires is said by what it throws', () => {
  test.each(refusals)('%s', (_call, run, message) => {
    expect(run).toThrow(new RangeError(message));
  });
});

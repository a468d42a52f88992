import { describe, expect, test } from 'vitest';
import * as stats from '@/lib/stats';

const refusals: [call: string, run: () => unknown, message: string][] = [
  ['normalQuantile(0)', () => stats.normalQuantile(0), 'normalQuantile requires p inside 0 and 1'],
  ['normalQuantile(NaN)', () => stats.normalQuantile(Number.NaN), 'normalQuantile requires p inside 0 and 1'],
  ['normalUpperTail(NaN)', () => stats.normalUpperTail(Number.NaN), 'normalUpperTail requires a number'],
  ['twoSidedP(Infinity)', () => stats.twoSidedP(Infinity, null), 'twoSidedP requires a finite statistic'],
  ['twoSidedP(1, 0)', () => stats.twoSidedP(1, 0), 'twoSidedP requires df of at least 1, or null'],
  ['normalP(NaN)', () => stats.normalP(Number.NaN, 'less'), 'normalP requires a number'],
  ['upperTailP(NaN)', () => stats.upperTailP(Number.NaN, 4), 'upperTailP requires a finite statistic'],
  ['upperTailP(1, 0.5)', () => stats.upperTailP(1, 0.5), 'upperTailP requires df of at least 1, or null'],
  ['zTest(NaN)', () => stats.zTest(Number.NaN, 1, 'less'), 'zTest requires a finite difference'],
  [
    'zTest(error -1)',
    () => stats.zTest(1, -1, 'less'),
    'zTest requires a finite standard error of at least 0',
  ],
  ['criticalValue(1)', () => stats.criticalValue(1, null), 'criticalValue requires alpha inside 0 and 1'],
  [
    'criticalValue(.05, 0)',
    () => stats.criticalValue(0.05, 0),
    'criticalValue requires df of at least 1, or null',
  ],
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

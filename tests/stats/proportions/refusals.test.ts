import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import * as stats from '@/lib/stats';

const share = { p: 0.4, n: 500, deff: 1.2 };
const lead = { first: 0.4, second: 0.3, n: 500, deff: 1.2 };
const badShares = [
  [{ ...share, p: 1.1 }, 'p from 0 to 1'],
  [{ ...share, p: Number.NaN }, 'p from 0 to 1'],
  [{ ...share, n: 0 }, 'n and deff above 0'],
  [{ ...share, deff: Infinity }, 'n and deff above 0'],
] as const;
const badLeads = [
  [{ ...lead, first: -0.1 }, 'shares from 0 to 1, together at most 1.05'],
  [{ ...lead, second: 0.7 }, 'shares from 0 to 1, together at most 1.05'],
  [{ ...lead, second: Number.NaN }, 'shares from 0 to 1, together at most 1.05'],
  [{ ...lead, n: -5 }, 'n and deff above 0'],
  [{ ...lead, deff: 0 }, 'n and deff above 0'],
] as const;

const ofShares: Record<string, (bad: typeof share) => unknown> = {
  effectiveCounts: (bad) => stats.effectiveCounts(bad),
  shareScoreTest: (bad) => stats.shareScoreTest(bad, 0.5, 'less'),
  shareEstimate: (bad) => stats.shareEstimate(bad, 0.95),
  pooledTest: (bad) => stats.pooledTest(share, bad, 'less', 'none'),
  unpooledTest: (bad) => stats.unpooledTest(bad, share, 'less'),
  differenceEstimate: (bad) => stats.differenceEstimate(share, bad, 0.95),
  newcombeDifferenceInterval: (bad) => stats.newcombeDifferenceInterval(bad, share, 0.95),
  changeOfShare: (bad) => stats.changeOfShare(bad, share, 0.95),
  finitePopulationMargin: (bad) => stats.finitePopulationMargin(bad, 1000, 0.95, 'fraction'),
  finitePopulationStandardError: (bad) => stats.finitePopulationStandardError(bad, 1000),
};
const ofLeads: Record<string, (bad: typeof lead) => unknown> = {
  leadEstimate: (bad) => stats.leadEstimate(bad, 0.95),
  leadTest: (bad) => stats.leadTest(bad, 'greater'),
  leadScoreTest: (bad) => stats.leadScoreTest(bad, 'greater'),
  probabilityAheadNormal: (bad) => stats.probabilityAheadNormal(bad),
  changeOfLead: (bad) => stats.changeOfLead(lead, bad, 0.95),
};
const ofLevel: Record<string, (level: number) => unknown> = {
  shareEstimate: (level) => stats.shareEstimate(share, level),
  clopperPearsonInterval: (level) => stats.clopperPearsonInterval(1, 2, level),
  jeffreysInterval: (level) => stats.jeffreysInterval(1, 2, level, 'raw'),
  differenceEstimate: (level) => stats.differenceEstimate(share, share, level),
  newcombeDifferenceInterval: (level) => stats.newcombeDifferenceInterval(share, share, level),
  agrestiCaffoInterval: (level) => stats.agrestiCaffoInterval(1, 2, 1, 2, level),
  leadEstimate: (level) => stats.leadEstimate(lead, level),
  changeOfShare: (level) => stats.changeOfShare(share, share, level),
  changeOfLead: (level) => stats.changeOfLead(lead, lead, level),
  finitePopulationMargin: (level) => stats.finitePopulationMargin(share, 1000, level, 'one-less'),
};
const ofCounts: Record<string, (x: number, n: number) => unknown> = {
  oneProportionScoreTest: (x, n) => stats.oneProportionScoreTest(x, n, 0.5, 'less', 'none'),
  wilsonCorrectedInterval: (x, n) => stats.wilsonCorrectedInterval(x, n, 2),
  clopperPearsonInterval: (x, n) => stats.clopperPearsonInterval(x, n, 0.95),
  agrestiCoullInterval: (x, n) => stats.agrestiCoullInterval(x, n, 2),
  jeffreysInterval: (x, n) => stats.jeffreysInterval(x, n, 0.95, 'modified'),
};
const ofCritical: Record<string, (q: number) => unknown> = {
  waldInterval: (q) => stats.waldInterval(0.5, 10, q),
  wilsonInterval: (q) => stats.wilsonInterval(0.5, 10, q),
  wilsonCorrectedInterval: (q) => stats.wilsonCorrectedInterval(1, 2, q),
  agrestiCoullInterval: (q) => stats.agrestiCoullInterval(1, 2, q),
};
const whole = 'binomialTestP requires whole x and n, n at least 1, x from 0 to n';
const tables = 'fisherExactP requires whole counts of at least 0, none above its sample';
const single: [message: string, run: () => unknown][] = [
  [
    'oneProportionScoreTest requires p0 inside 0 and 1',
    () => stats.oneProportionScoreTest(1, 2, 0, 'less', 'none'),
  ],
  ['shareScoreTest requires p0 inside 0 and 1', () => stats.shareScoreTest(share, 1, 'less')],
  [whole, () => stats.binomialTestP(0.5, 2, 0.5, 'less')],
  [whole, () => stats.binomialTestP(3, 2, 0.5, 'less')],
  [whole, () => stats.binomialTestP(0, 0, 0.5, 'less')],
  ['binomialTestP requires p0 inside 0 and 1', () => stats.binomialTestP(1, 2, 1, 'less')],
  ['exactBinomialP requires m above 0', () => stats.exactBinomialP(0, 0, 0.5)],
  ['exactBinomialP requires x from 0 to m', () => stats.exactBinomialP(3, 2, 0.5)],
  ['exactBinomialP requires p0 inside 0 and 1', () => stats.exactBinomialP(1, 2, 1)],
  ['waldInterval requires p from 0 to 1', () => stats.waldInterval(2, 10, 2)],
  ['waldInterval requires n above 0', () => stats.waldInterval(0.5, 0, 2)],
  ['wilsonInterval requires p from 0 to 1', () => stats.wilsonInterval(2, 10, 2)],
  ['wilsonInterval requires p from 0 to 1', () => stats.newcombeInterval(2, 9, 0.5, 9, 2)],
  ['wilsonInterval requires n above 0', () => stats.wilsonInterval(0.5, 0, 2)],
  ['withinUnit requires low at most high', () => stats.withinUnit([0.5, 0.4])],
  [tables, () => stats.fisherExactP(0.5, 2, 1, 2)],
  [tables, () => stats.fisherExactP(3, 2, 1, 2)],
  [tables, () => stats.fisherExactP(1, 2, -1, 2)],
  ['agrestiCaffoInterval requires sizes above 0', () => stats.agrestiCaffoInterval(0, 0, 1, 2, 0.95)],
  [
    'agrestiCaffoInterval requires counts from 0 to their size',
    () => stats.agrestiCaffoInterval(3, 2, 1, 2, 0.95),
  ],
  ['signTest requires counts of at least 0', () => stats.signTest(-1, 2, 'less')],
  ['signTest requires counts of at least 0', () => stats.signTest(1, Infinity, 'less')],
  ['exactSignP requires counts of at least 0', () => stats.exactSignP(Number.NaN, 2)],
  ['mcnemarCorrectedP requires whole counts of at least 0', () => stats.mcnemarCorrectedP(1.5, 2)],
  ['shareStandardError requires p from 0 to 1', () => stats.shareStandardError(-0.1, 9, 1)],
  ['shareStandardError requires n and deff above 0', () => stats.shareStandardError(0.1, 0, 1)],
  ['leadStandardError requires shares from 0 to 1', () => stats.leadStandardError(1.1, 0, 9, 1)],
  ['leadStandardError requires n and deff above 0', () => stats.leadStandardError(0.1, 0, 9, 0)],
  ['leadNullStandardError requires shares from 0 to 1', () => stats.leadNullStandardError(1.1, 0, 9, 1)],
  ['leadNullStandardError requires n and deff above 0', () => stats.leadNullStandardError(0.1, 0, 0, 1)],
  ['pooledStandardError requires shares from 0 to 1', () => stats.pooledStandardError(2, 9, 0, 9)],
  ['pooledStandardError requires sizes above 0', () => stats.pooledStandardError(0.1, 0, 0, 9)],
  ['maximumMargin requires n, deff and q above 0', () => stats.maximumMargin(0, 1, 2)],
  ...([0.5, Number.NaN, Infinity] as const).flatMap((population): [string, () => unknown][] => [
    [
      'finitePopulationFactor requires population of at least 1',
      () => stats.finitePopulationFactor(1, population, 'fraction'),
    ],
    [
      'finitePopulationMargin requires population of at least 1',
      () => stats.finitePopulationMargin(share, population, 0.95, 'fraction'),
    ],
    [
      'finitePopulationStandardError requires population of at least 1',
      () => stats.finitePopulationStandardError(share, population),
    ],
  ]),
  [
    'finitePopulationFactor requires n above 0, at most population',
    () => stats.finitePopulationFactor(11, 10, 'fraction'),
  ],
  [
    'finitePopulationMargin requires n above 0, at most population',
    () => stats.finitePopulationMargin(share, 499, 0.95, 'fraction'),
  ],
  [
    'finitePopulationStandardError requires n above 0, at most population',
    () => stats.finitePopulationStandardError(share, 499),
  ],
];

/** Every refusal under the message it must give. */
const refusals: [message: string, run: () => unknown][] = [
  ...single,
  ...Object.entries(ofShares).flatMap(([fn, run]) =>
    badShares.map(([bad, condition]): [string, () => unknown] => [
      `${fn} requires ${condition}`,
      () => run(bad),
    ]),
  ),
  ...Object.entries(ofLeads).flatMap(([fn, run]) =>
    badLeads.map(([bad, condition]): [string, () => unknown] => [
      `${fn} requires ${condition}`,
      () => run(bad),
    ]),
  ),
  ...Object.entries(ofLevel).flatMap(([fn, run]) =>
    [0, 1, Number.NaN].map((level): [string, () => unknown] => [
      `${fn} requires level inside 0 and 1`,
      () => run(level),
    ]),
  ),
  ...Object.entries(ofCounts).flatMap(([fn, run]): [string, () => unknown][] => [
    [`${fn} requires n above 0`, () => run(0, 0)],
    [`${fn} requires n above 0`, () => run(0, Number.NaN)],
    [`${fn} requires x from 0 to n`, () => run(3, 2)],
    [`${fn} requires x from 0 to n`, () => run(-1, 2)],
  ]),
  ...Object.entries(ofCritical).flatMap(([fn, run]) =>
    [0, Infinity].map((q): [string, () => unknown] => [`${fn} requires q above 0`, () => run(q)]),
  ),
];

describe('what a function of shares requires is said by what it throws', () => {
  test.each(refusals)('%s', (message, run) => {
    expect(run).toThrow(new RangeError(message));
  });

  test('and every promise of a refusal is kept above', () => {
    const folder = 'lib/stats/proportions';
    const promised = readdirSync(folder).flatMap((file) =>
      [...readFileSync(join(folder, file), 'utf8').matchAll(/@throws RangeError `([^`]+)`/g)].map(
        ([, message]) => message,
      ),
    );
    const kept = new Set(refusals.map(([message]) => message));
    expect(promised.length).toBeGreaterThan(50);
    expect(promised.filter((message) => !kept.has(message ?? ''))).toEqual([]);
  });
});

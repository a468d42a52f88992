import { describe, expect, test } from 'vitest';
import * as stats from '@/lib/stats';
import type { ReplicateColumns } from '@/lib/stats';

const weights = Object.freeze([1, 2, 1, 2]);
const level = 0.95;
const design = stats.surveyDesign({ weights });
const replicated = (columns: Partial<ReplicateColumns>) =>
  stats.replicateDesign({
    weights: [1, 1],
    replicateWeights: [
      [0, 2],
      [2, 0],
    ],
    type: 'JK1',
    mse: true,
    ...columns,
  });
/** What a file may hold although the types say numbers. */
const missing = JSON.parse('[1, null, 1, 1]') as number[];
const text = JSON.parse('[1, "1", 1, 1]') as number[];

const refusals: [call: string, run: () => unknown, message: string][] = [
  ['no rows', () => stats.surveyDesign({ weights: [] }), 'surveyDesign requires at least one respondent'],
  [
    'a weight of 0',
    () => stats.surveyDesign({ weights: [1, 0] }),
    'surveyDesign requires weights from 1e-100 to 1e+100; weights[1] is 0',
  ],
  [
    'a negative weight',
    () => stats.surveyDesign({ weights: [-1, 1] }),
    'surveyDesign requires weights from 1e-100 to 1e+100; weights[0] is -1',
  ],
  [
    'a weight that is not a number',
    () => stats.surveyDesign({ weights: [1, Number.NaN] }),
    'surveyDesign requires weights from 1e-100 to 1e+100; weights[1] is NaN',
  ],
  [
    'a missing weight',
    () => stats.surveyDesign({ weights: missing }),
    'surveyDesign requires weights from 1e-100 to 1e+100; weights[1] is null',
  ],
  [
    'an infinite weight',
    () => stats.surveyDesign({ weights: [1, Infinity] }),
    'surveyDesign requires weights from 1e-100 to 1e+100; weights[1] is Infinity',
  ],
  [
    'strata for some',
    () => stats.surveyDesign({ weights, stratum: ['a'] }),
    'surveyDesign requires stratum for each of the 4 respondents; 1 are given',
  ],
  [
    'units for some',
    () => stats.surveyDesign({ weights, psu: Int32Array.of(1, 2) }),
    'surveyDesign requires psu for each of the 4 respondents; 2 are given',
  ],
  [
    'a missing stratum',
    () => stats.surveyDesign({ weights, stratum: ['a', 'a', '', 'b'] }),
    'surveyDesign requires a stratum for every respondent; stratum[2] is missing',
  ],
  [
    'a missing unit',
    () => stats.surveyDesign({ weights, psu: [1, Number.NaN, 2, 3] }),
    'surveyDesign requires a psu for every respondent; psu[1] is missing',
  ],
  [
    'a unit in two strata',
    () => stats.surveyDesign({ weights, stratum: ['n', 'n', 's', 's'], psu: [1, 2, 2, 3] }),
    'surveyDesign requires units inside one stratum, or nest; psu "2" is in strata "n" and "s"',
  ],
  [
    'a lonely unit',
    () => stats.surveyDesign({ weights, stratum: ['n', 'n', 's', 's'], psu: [1, 2, 3, 3] }),
    'surveyDesign requires two units or more in a stratum, or a lonelyPsu convention; stratum "s" has one',
  ],
  [
    'one respondent',
    () => stats.surveyDesign({ weights: [3] }),
    'surveyDesign requires two units or more in a stratum, or a lonelyPsu convention; stratum "the whole sample" has one',
  ],
  [
    'lonely units only',
    () => stats.surveyDesign({ weights, stratum: [1, 2, 3, 4], lonelyPsu: 'adjust' }),
    'surveyDesign requires two units or more in some stratum',
  ],
  [
    'two population sizes in a stratum',
    () => stats.surveyDesign({ weights, populationSize: [9, 9, 8, 9] }),
    'surveyDesign requires one populationSize in a stratum, at least its 4 units; stratum "the whole sample" has 8 in populationSize[2]',
  ],
  [
    'a population smaller than the sample',
    () => stats.surveyDesign({ weights, stratum: ['n', 'n', 's', 's'], populationSize: [2, 2, 1, 1] }),
    'surveyDesign requires one populationSize in a stratum, at least its 2 units; stratum "s" has 1 in populationSize[2]',
  ],
  [
    'population sizes for some',
    () => stats.surveyDesign({ weights, populationSize: [9] }),
    'surveyDesign requires populationSize for each of the 4 respondents; 1 are given',
  ],
  [
    'an outcome of 2',
    () => stats.weightedProportion(design, [1, 0, 2, 0], { level }),
    'weightedProportion requires 0 or 1 as outcome; outcome[2] is 2',
  ],
  [
    'a missing outcome',
    () => stats.weightedProportion(design, missing, { level }),
    'weightedProportion requires 0 or 1 as outcome; outcome[1] is null',
  ],
  [
    'an outcome of text',
    () => stats.weightedProportion(design, text, { level }),
    'weightedProportion requires 0 or 1 as outcome; outcome[1] is 1',
  ],
  [
    'an outcome too short',
    () => stats.weightedProportion(design, [1, 0], { level }),
    'weightedProportion requires outcome for each of the 4 respondents; 2 are given',
  ],
  [
    'an empty domain',
    () => stats.weightedProportion(design, [1, 0, 1, 0], { level, domain: [0, 0, 0, 0] }),
    'weightedProportion requires a respondent in the domain',
  ],
  [
    'a domain of 2',
    () => stats.weightedProportion(design, [1, 0, 1, 0], { level, domain: [0, 2, 0, 0] }),
    'weightedProportion requires a domain of 0 and 1; domain[1] is 2',
  ],
  [
    'a domain too short',
    () => stats.weightedProportion(design, [1, 0, 1, 0], { level, domain: [true] }),
    'weightedProportion requires domain for each of the 4 respondents; 1 are given',
  ],
  [
    'a level of 95',
    () => stats.weightedProportion(design, [1, 0, 1, 0], { level: 95 }),
    'weightedProportion requires level inside 0 and 1',
  ],
  [
    'both outcomes at once',
    () => stats.weightedLead(design, [1, 0, 1, 0], [0, 0, 1, 0], { level }),
    'weightedLead requires outcomes that exclude each other; respondent 2 has both',
  ],
  [
    'a second outcome of −1',
    () => stats.weightedLead(design, [1, 0, 1, 0], [0, -1, 0, 0], { level }),
    'weightedLead requires 0 or 1 as second; second[1] is -1',
  ],
  [
    'a lead at level 0',
    () => stats.weightedLead(design, [1, 0, 1, 0], [0, 1, 0, 0], { level: 0 }),
    'weightedLead requires level inside 0 and 1',
  ],
  [
    'a mean with a gap',
    () => stats.weightedMean(design, [4, Number.NaN, 3, 1], { level }),
    'weightedMean requires a number as values; values[1] is NaN',
  ],
  [
    'a mean at level 1',
    () => stats.weightedMean(design, weights, { level: 1 }),
    'weightedMean requires level inside 0 and 1',
  ],
  [
    'a missing label',
    () => stats.indicator(['A', ''], 'A'),
    'indicator requires a label for every respondent; labels[1] is missing',
  ],
  [
    'one replicate',
    () => replicated({ replicateWeights: [[1, 1]] }),
    'replicateDesign requires two replicates or more, each with a weight for every respondent',
  ],
  [
    'half a replicate',
    () => replicated({ replicateWeights: Float64Array.of(1, 1, 1, 1, 1) }),
    'replicateDesign requires two replicates or more, each with a weight for every respondent',
  ],
  [
    'a short replicate',
    () => replicated({ replicateWeights: [[1, 1], [1]] }),
    'replicateDesign requires replicateWeights[1] for each of the 2 respondents; 1 are given',
  ],
  [
    'a negative replicate weight',
    () => replicated({ replicateWeights: Float64Array.of(1, 1, 1, -1) }),
    'replicateDesign requires replicate weights from 0 to 1e+100; replicate 1 of respondent 1 is -1',
  ],
  [
    'a weight of 0 beside replicates',
    () => replicated({ weights: [1, 0] }),
    'replicateDesign requires weights from 1e-100 to 1e+100; weights[1] is 0',
  ],
  [
    'no scale',
    () => replicated({ type: 'bootstrap' }),
    'replicateDesign requires a scale above 0 for bootstrap',
  ],
  ['a scale of 0', () => replicated({ scale: 0 }), 'replicateDesign requires a scale above 0 for JK1'],
  [
    'Fay without ρ',
    () => replicated({ type: 'Fay' }),
    'replicateDesign requires fayRho from 0 to below 1, or a scale, for Fay',
  ],
  [
    'ρ of 1',
    () => replicated({ type: 'Fay', fayRho: 1 }),
    'replicateDesign requires fayRho from 0 to below 1, or a scale, for Fay',
  ],
  ['JKn without rscales', () => replicated({ type: 'JKn' }), 'replicateDesign requires rscales for JKn'],
  [
    'rscales for some',
    () => replicated({ rscales: [1] }),
    'replicateDesign requires rscales of at least 0, not all 0, one or one each of 2 replicates',
  ],
  [
    'rscales of 0',
    () => replicated({ rscales: 0 }),
    'replicateDesign requires rscales of at least 0, not all 0, one or one each of 2 replicates',
  ],
  ['df of 0', () => replicated({ df: 0 }), 'replicateDesign requires df whole and at least 1'],
  ['df of 2.5', () => replicated({ df: 2.5 }), 'replicateDesign requires df whole and at least 1'],
  [
    'a replicate without weight in the domain',
    () => stats.weightedProportion(replicated({}), [1, 0], { level, domain: [1, 0] }),
    'weightedProportion requires weight in the domain in every replicate; replicate 0 has none',
  ],
  [
    'weights whose squares vanish',
    () => stats.weightVariation([1e-200, 1e-200]),
    'weightVariation requires weights whose squares have a finite sum above 0',
  ],
  [
    'weights all 0',
    () => stats.weightVariation([0, 0]),
    'weightVariation requires weights of at least 0, not all 0',
  ],
  [
    'a rounding unit of 0',
    () => stats.impliedDesignEffectRange(0.03, 900, 0.95, 0),
    'impliedDesignEffectRange requires margin, n and roundingUnit above 0',
  ],
  [
    'an implied design effect at level 95',
    () => stats.impliedDesignEffectRange(0.03, 900, 95, 0.001),
    'impliedDesignEffectRange requires level inside 0 and 1',
  ],
  [
    'a likelihood at p 0',
    () => stats.likelihoodInterval(0, 100, 2),
    'likelihoodInterval requires p inside 0 and 1',
  ],
  [
    'a likelihood on nobody',
    () => stats.likelihoodInterval(0.5, 0, 2),
    'likelihoodInterval requires effectiveN and q above 0',
  ],
];

const figures = { p: 0.4, se: 0.02, n: 900, df: 58, level };
const ofFigures: [name: string, change: Partial<typeof figures>, condition: string][] = [
  ['a share above 1', { p: 1.1 }, 'p from 0 to 1'],
  ['a negative standard error', { se: -1 }, 'se of at least 0'],
  ['no respondents', { n: 0 }, 'n of at least 1'],
  ['negative degrees of freedom', { df: -1 }, 'df of at least 0'],
  ['a level of 1', { level: 1 }, 'level inside 0 and 1'],
];

describe('a respondent file is refused, with the row or stratum named, for', () => {
  test.each(refusals)('%s', (_call, run, message) => {
    expect(run).toThrow(new RangeError(message));
  });

  test('a convention that there is not', () => {
    const convention = 'mean' as stats.LonelyPsu;
    expect(() => stats.surveyDesign({ weights: [1, 1, 1], lonelyPsu: convention })).toThrow(
      "surveyDesign requires lonelyPsu 'fail', 'remove', 'average' or 'adjust'",
    );
  });

  test.each(ofFigures)('intervals from %s', (_name, change, condition) => {
    expect(() => stats.proportionIntervals({ ...figures, ...change })).toThrow(
      new RangeError(`proportionIntervals requires ${condition}`),
    );
  });
});

/**
 * The Chilean plebiscite survey of April and May 1988 (FLACSO/Chile; `Chile` of R's package carData), weighted so that
 * the ten cells of region and sex count alike. chile.json holds what R 4.2.2 with survey 4.1.1 makes of it; the calls
 * (`svydesign`, `svymean(deff = "replace")`, `svyciprop`, `confint`) are in chile.R beside it.
 */
import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';
import {
  indicator,
  kishDesignEffect,
  surveyDesign,
  weightedLead,
  weightedProportion,
  type SurveyColumns,
} from '@/lib/stats';
import { compare } from '../reference/compare';
import { kinds } from '../reference/tolerances';
import { readPublishedTable } from './published-entries';

const level = 0.95;
const expected = JSON.parse(
  readFileSync(fileURLToPath(new URL('./chile.json', import.meta.url)), 'utf8'),
) as Record<string, unknown>;

const table = readPublishedTable('Chile.csv');
const answered = (table.get('vote') ?? []).flatMap((vote, row) => (vote === 'NA' ? [] : [row]));
const column = (name: string) => answered.map((row) => table.get(name)?.[row] ?? '');
const [region, sex, vote] = [column('region'), column('sex'), column('vote')];
const place = column('population').map((population, row) => `${region[row]} ${population}`);
const cells = region.map((name, row) => `${name} ${sex[row]}`);
const sizes = new Map<string, number>();
for (const cell of cells) sizes.set(cell, (sizes.get(cell) ?? 0) + 1);
const weights = cells.map((cell) => cells.length / (sizes.size * (sizes.get(cell) ?? Number.NaN)));

/** The engine's figures under the names of chile.json. */
function figuresOf(columns: SurveyColumns, domain?: Uint8Array) {
  const design = surveyDesign(columns);
  const options = { level, ...(domain ? { domain } : {}) };
  const share = (answer: string) => {
    const { estimate, se, deff, effectiveN, ci } = weightedProportion(
      design,
      indicator(vote, answer),
      options,
    );
    const intervals = { mean_t: ci.meanT, logit_t: ci.logitT, beta: ci.kornGraubard };
    return { estimate, se, deff, effective_n: effectiveN, ...intervals };
  };
  const lead = weightedLead(design, indicator(vote, 'N'), indicator(vote, 'Y'), options);
  const { n, df, estimate, se } = lead;
  return { n, df, N: share('N'), Y: share('Y'), lead: { estimate, se } };
}

const clustered = { weights, stratum: region, psu: place };
const designs: Readonly<Record<string, SurveyColumns>> = {
  weights: { weights },
  stratified: { weights, stratum: region },
  clustered: { weights, psu: place },
  stratified_clustered_remove: { ...clustered, lonelyPsu: 'remove' },
  stratified_clustered_average: { ...clustered, lonelyPsu: 'average' },
  stratified_clustered_adjust: { ...clustered, lonelyPsu: 'adjust' },
};

describe('2,532 respondents who answered', () => {
  test('are as many as printed, and vote No 889 times and Yes 868 times', () => {
    expect(answered).toHaveLength(2532);
    const count = (answer: string) => indicator(vote, answer).reduce((sum, one) => sum + one, 0);
    expect([count('N'), count('Y'), count('U'), count('A')]).toEqual([889, 868, 588, 187]);
  });

  test.each(Object.entries(designs))('agree with R under the design %s', (name, columns) => {
    expect(compare(figuresOf(columns), expected[name], () => kinds.figure).faults).toEqual([]);
  });

  test('agree with R for the women among them', () => {
    const women = figuresOf({ weights, psu: place }, indicator(sex, 'F'));
    expect(compare(women, expected.women, () => kinds.figure).faults).toEqual([]);
  });

  test('have the design effect of Kish that R finds, which the clusters exceed', () => {
    const kish = kishDesignEffect(weights);
    expect(compare(kish, expected.kish_deff, () => kinds.figure).faults).toEqual([]);
    expect(figuresOf({ weights, psu: place }).N.deff).toBeGreaterThan(2 * kish);
  });

  test('are refused with clusters in strata of one, unless a convention for it is named', () => {
    expect(() => surveyDesign(clustered)).toThrow('surveyDesign requires two units or more in a stratum');
  });
});

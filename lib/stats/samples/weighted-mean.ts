import { isInside, required } from '../require';
import type { Column } from './columns';
import type { MeanIntervals } from './mean-intervals';
import { meanIntervals } from './mean-intervals';
import type { EstimateOptions, SampleDesign, SampleMean } from './sample-mean';
import { inDomain, readOutcome, sampleMean } from './sample-mean';
import { scratch } from './scratch';

export type WeightedMean = SampleMean & {
  readonly level: number;
  readonly ci: MeanIntervals;
};

const FN = 'weightedMean';

/**
 * The weighted mean of a number among the respondents, with the variance that the design of the sample brings.
 *
 * Use it for ratings and counts; shares have `weightedProportion`, whose intervals keep inside 0 and 1.
 *
 * @param design from `surveyDesign` or `replicateDesign`
 * @param values one a respondent, at most 1e100 in size; not looked at outside the domain
 * @param options.level confidence level, inside 0–1
 * @param options.domain 1 or true for the respondents the mean is about; everyone by default
 * @returns in the unit of values. Where all values are equal, or the design leaves no variance, se is 0, and deff
 *   and the intervals are null
 * @throws RangeError `weightedMean requires level inside 0 and 1`
 * @throws RangeError `weightedMean requires values for each of the <rows> respondents; <length> are given`
 * @throws RangeError `weightedMean requires a number as values; values[<row>] is <value>`
 * @throws RangeError `weightedMean requires a domain of 0 and 1; domain[<row>] is <value>`
 * @throws RangeError `weightedMean requires a respondent in the domain`
 * @throws RangeError `weightedMean requires weight in the domain in every replicate; replicate <r> has none`
 * @see R 4.2.2, survey 4.1.1 `svymean(deff = "replace")`
 * @example
 * weightedMean(surveyDesign({ weights: [1, 1, 1] }), [4, 6, 8], { level: 0.95 }).se; // => 1.1547005383792515
 * weightedMean(surveyDesign({ weights: [1, 1, 2] }), [4, 6, 8], { level: 0.95 }).estimate; // => 6.5
 */
export function weightedMean(
  design: SampleDesign,
  values: Column,
  { level, domain }: EstimateOptions,
): WeightedMean {
  required(isInside(level), FN, 'level inside 0 and 1');
  const members = inDomain(FN, design, domain);
  const memory = scratch(design, 'values', design.rows);
  const copy = readOutcome(FN, 'values', values, members, false, memory);
  const mean = sampleMean(FN, design, copy, members);
  return { ...mean, level, ci: meanIntervals(mean.estimate, mean.se, mean.df, level) };
}

import { isInside, required } from '../require';
import type { Column } from './columns';
import type { ProportionIntervals } from './proportion-intervals';
import { proportionIntervals } from './proportion-intervals';
import type { EstimateOptions, SampleDesign, SampleMean } from './sample-mean';
import { inDomain, readOutcome, sampleMean } from './sample-mean';
import { scratch } from './scratch';

export type WeightedProportion = SampleMean & {
  /** Size of a simple random sample with the same variance, p(1 − p)/se²; null where there is no variance. */
  readonly effectiveN: number | null;
  readonly level: number;
  readonly ci: ProportionIntervals;
};

const FN = 'weightedProportion';

/**
 * The weighted share of the respondents with an outcome, with the variance that the design of the sample brings.
 *
 * Use it on respondent files; a printed share with its sample size needs `wilsonInterval`. For a lead use
 * `weightedLead`, whose variance knows that the two shares come from the same people. A domain keeps all units
 * of the design: those without members count as 0. Cost: linear in respondents (times replicates).
 *
 * @param design from `surveyDesign` or `replicateDesign`
 * @param outcome 1 for respondents with the outcome, 0 for the rest; not looked at outside the domain
 * @param options.level confidence level, inside 0–1
 * @param options.domain 1 or true for the respondents the share is about; everyone by default
 * @returns proportions. Where everyone or nobody has the outcome, or the design leaves no variance, se is 0 and
 *   deff, effectiveN and all intervals are null. df is counted in the domain and may be 0: see
 *   `proportionIntervals`
 * @throws RangeError `weightedProportion requires level inside 0 and 1`
 * @throws RangeError `weightedProportion requires outcome for each of the <rows> respondents; <length> are given`
 *   (likewise domain)
 * @throws RangeError `weightedProportion requires 0 or 1 as outcome; outcome[<row>] is <value>`
 * @throws RangeError `weightedProportion requires a domain of 0 and 1; domain[<row>] is <value>`
 * @throws RangeError `weightedProportion requires a respondent in the domain`
 * @throws RangeError `weightedProportion requires weight in the domain in every replicate; replicate <r> has none`
 * @see R 4.2.2, survey 4.1.1 `svymean(deff = "replace")`, `svyciprop`, `degf`; Woodruff (1971), Journal of the
 *   American Statistical Association 66, 411–414 (from memory)
 * @example
 * weightedProportion(surveyDesign({ weights: [1, 3, 1] }), [1, 0, 1], { level: 0.95 }).estimate; // => 0.4
 * weightedProportion(surveyDesign({ weights: [2, 2, 2] }), [1, 0, 1], { level: 0.95 }).deff; // => 1
 */
export function weightedProportion(
  design: SampleDesign,
  outcome: Column,
  { level, domain }: EstimateOptions,
): WeightedProportion {
  required(isInside(level), FN, 'level inside 0 and 1');
  const members = inDomain(FN, design, domain);
  const values = readOutcome(FN, 'outcome', outcome, members, true, scratch(design, 'values', design.rows));
  const mean = sampleMean(FN, design, values, members);
  const { estimate: p, se, n, df } = mean;
  return {
    ...mean,
    effectiveN: se > 0 ? (p * (1 - p)) / (se * se) : null,
    level,
    ci: proportionIntervals({ p, se, n, df, level }),
  };
}

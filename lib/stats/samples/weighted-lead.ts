import { twoSidedP } from '../distributions/two-sided-p';
import { isInside, required } from '../require';
import type { Column } from './columns';
import { refuse } from './columns';
import type { MeanIntervals } from './mean-intervals';
import { meanIntervals } from './mean-intervals';
import type { EstimateOptions, SampleDesign, SampleMean } from './sample-mean';
import { inDomain, readOutcome, sampleMean } from './sample-mean';
import { scratch } from './scratch';

export type WeightedLead = SampleMean & {
  /** Weighted share of the first outcome. */
  readonly first: number;
  readonly second: number;
  /** Lead over its standard error; null where that is 0. */
  readonly z: number | null;
  readonly pNormal: number | null;
  /** Null also with 0 degrees of freedom. */
  readonly pT: number | null;
  readonly level: number;
  readonly ci: MeanIntervals;
};

const FN = 'weightedLead';

/**
 * The weighted share of one outcome less that of another among the same respondents: a lead, or a net score.
 *
 * Use it on respondent files; printed shares with a sample size need `leadStandardError`.
 *
 * @param design from `surveyDesign` or `replicateDesign`
 * @param first 1 for respondents with the first outcome, 0 for the rest; not looked at outside the domain
 * @param second likewise; nobody has both
 * @param options.level confidence level, inside 0–1
 * @param options.domain 1 or true for the respondents the lead is about; everyone by default
 * @returns `estimate` is the lead, −1 to 1. Without variance se is 0, and deff, z, the p-values and the
 *   intervals are null
 * @throws RangeError `weightedLead requires level inside 0 and 1`
 * @throws RangeError `weightedLead requires <name> for each of the <rows> respondents; <length> are given`
 * @throws RangeError `weightedLead requires 0 or 1 as <name>; <name>[<row>] is <value>` (first, second)
 * @throws RangeError `weightedLead requires outcomes that exclude each other; respondent <row> has both`
 * @throws RangeError `weightedLead requires a domain of 0 and 1; domain[<row>] is <value>`
 * @throws RangeError `weightedLead requires a respondent in the domain`
 * @throws RangeError `weightedLead requires weight in the domain in every replicate; replicate <r> has none`
 * @see R 4.2.2, survey 4.1.1 `svycontrast(svymean(~factor(vote), design), c(1, -1, 0))`
 * @example
 * weightedLead(surveyDesign({ weights: [1, 2, 2] }), [1, 0, 1], [0, 1, 0], { level: 0.95 }).estimate; // => 0.2
 * weightedLead(surveyDesign({ weights: [1, 1, 2] }), [1, 1, 0], [0, 0, 0], { level: 0.95 }).first; // => 0.5
 */
export function weightedLead(
  design: SampleDesign,
  first: Column,
  second: Column,
  { level, domain }: EstimateOptions,
): WeightedLead {
  required(isInside(level), FN, 'level inside 0 and 1');
  const members = inDomain(FN, design, domain);
  const values = readOutcome(FN, 'first', first, members, true, scratch(design, 'values', design.rows));
  const others = readOutcome(FN, 'second', second, members, true, scratch(design, 'others', design.rows));
  let ahead = 0;
  let behind = 0;
  for (let row = 0; row < design.rows; row += 1) {
    const weight = design.weights[row] as number;
    if (others[row] === 1) {
      if (values[row] === 1) refuse(FN, `outcomes that exclude each other; respondent ${row} has both`);
      behind += weight;
      values[row] = -1;
    } else if (values[row] === 1) ahead += weight;
  }
  const mean = sampleMean(FN, design, values, members);
  const { estimate, se, df, sumWeights } = mean;
  const z = se > 0 ? estimate / se : null;
  return {
    ...mean,
    first: ahead / sumWeights,
    second: behind / sumWeights,
    z,
    pNormal: z === null ? null : twoSidedP(z, null),
    pT: z === null || df < 1 ? null : twoSidedP(z, df),
    level,
    ci: meanIntervals(estimate, se, df, level),
  };
}

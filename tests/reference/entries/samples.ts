import {
  impliedDesignEffectRange,
  indicator,
  replicateDesign,
  surveyDesign,
  weightedLead,
  weightedProportion,
  weightVariation,
  type LonelyPsu,
  type MeanIntervals,
  type ProportionIntervals,
  type ReplicateType,
  type SampleDesign,
} from '@/lib/stats';
import { entry, numbers, type Entry, type Figures, type Table } from '../entry';

type SampleCase = {
  data: string;
  outcome: string;
  level: number;
  domain?: string;
};

type LinearizedCase = SampleCase & { design: string; lonely_psu?: LonelyPsu };

type ReplicateCase = SampleCase & {
  type: ReplicateType;
  replicates: number;
  scale: number;
  rscales: number | number[];
  mse: boolean;
};

const labels = (table: Table, column: string): readonly string[] => table.get(column) ?? [];

/** `approve` names a column of 0 and 1, `vote=A` an answer in a column of labels. */
function outcomeOf(table: Table, outcome: string): ArrayLike<number> {
  const [column = '', answer] = outcome.split('=');
  return answer === undefined ? numbers(table, column) : indicator(labels(table, column), answer);
}

function designOf(table: Table, { design, lonely_psu }: LinearizedCase): SampleDesign {
  const isStratified = design.includes('stratified');
  return surveyDesign({
    weights: numbers(table, 'weight'),
    ...(isStratified ? { stratum: labels(table, 'stratum') } : {}),
    ...(design.includes('clustered') ? { psu: labels(table, 'psu'), nest: isStratified } : {}),
    ...(design.endsWith('_fpc') ? { populationSize: numbers(table, 'fpc') } : {}),
    ...(lonely_psu ? { lonelyPsu: lonely_psu } : {}),
  });
}

const meanKeys = ({ normal, t }: MeanIntervals): Figures => ({ normal, t });

const shareKeys = (ci: ProportionIntervals): Figures => ({
  mean_normal: ci.meanNormal,
  mean_t: ci.meanT,
  logit_t: ci.logitT,
  logit_normal: ci.logitNormal,
  asin_t: ci.arcsineT,
  beta: ci.kornGraubard,
  beta_capped: ci.kornGraubardCapped,
  likelihood: ci.likelihood,
  wilson_effective_n: ci.wilson,
});

function estimatesOf(table: Table, design: SampleDesign, { outcome, level, domain }: SampleCase) {
  const options = { level, ...(domain ? { domain: indicator(labels(table, 'group'), domain) } : {}) };
  return outcome === 'lead'
    ? { lead: weightedLead(design, outcomeOf(table, 'vote=A'), outcomeOf(table, 'vote=B'), options) }
    : { share: weightedProportion(design, outcomeOf(table, outcome), options) };
}

export const samplesEntries: Record<string, Entry> = {
  kish_deff: entry<{ weights: number[] }>(({ weights }) => {
    const { n, sumWeights, sumSquaredWeights, deff, cvSquared, effectiveN } = weightVariation(weights);
    return {
      n,
      sum_weights: sumWeights,
      sum_squared_weights: sumSquaredWeights,
      deff,
      cv_squared: cvSquared,
      effective_n: effectiveN,
    };
  }),

  deff_from_margin: entry<{ margin: number; n: number; level: number; rounding_unit: number }>((input) => {
    const implied = impliedDesignEffectRange(input.margin, input.n, input.level, input.rounding_unit);
    return {
      deff: implied.deff,
      effective_n: implied.effectiveN,
      deff_low: implied.range[0],
      deff_high: implied.range[1],
      srs_margin: implied.simpleRandomMargin,
    };
  }),

  weighted_proportion: entry<LinearizedCase>((input, readTable): Figures => {
    const table = readTable(input.data);
    const { lead, share } = estimatesOf(table, designOf(table, input), input);
    if (lead) {
      return {
        n: lead.n,
        p_first: lead.first,
        p_second: lead.second,
        lead: lead.estimate,
        se: lead.se,
        z: lead.z,
        p_value_normal: lead.pNormal,
        df: lead.df,
        p_value_t: lead.pT,
        ci: meanKeys(lead.ci),
      };
    }
    return {
      n: share.n,
      sum_weights: share.sumWeights,
      estimate: share.estimate,
      se: share.se,
      df: share.df,
      deff: share.deff,
      kish_deff: share.kishDeff,
      effective_n: share.effectiveN,
      ci: shareKeys(share.ci),
    };
  }),

  replicate_weights: entry<ReplicateCase>((input, readTable): Figures => {
    const table = readTable(input.data);
    const design = replicateDesign({
      weights: numbers(table, 'weight'),
      replicateWeights: Array.from({ length: input.replicates }, (_, index) =>
        numbers(table, `rw${index + 1}`),
      ),
      type: input.type,
      mse: input.mse,
      scale: input.scale,
      rscales: input.rscales,
    });
    const { lead, share } = estimatesOf(table, design, input);
    const { n, estimate, se, df } = lead ?? share;
    return lead
      ? { n, estimate, se, df, z: lead.z, p_value_normal: lead.pNormal, ci: meanKeys(lead.ci) }
      : { n, estimate, se, df, effective_n: share.effectiveN, ci: shareKeys(share.ci) };
  }),
};

import { proportionIntervals, surveyDesign, weightedMean, weightedProportion } from '@/lib/stats';
import { numbers, type Figures, type ReadTable } from '../../reference/entry';
import { call, engine, figureOf, type Call } from './call';

type Sample = { data: string; outcome: string; level?: number };
const level = 0.95;

/** Samples of California schools (R package survey), flows of the Nile, and Australian polls. */
export const sampleAndSeriesCalls: Record<string, Call> = {
  survey_api_cluster_mean: call(({ data, outcome }: Sample, readTable) => {
    const mean = weightedMean(clusters(data, readTable), numbers(readTable(data), outcome), { level });
    return [mean.estimate, mean.se];
  }),
  survey_api_strat_mean: call(({ data, outcome }: Sample, readTable) => {
    const table = readTable(data);
    const design = surveyDesign({
      weights: numbers(table, 'weight'),
      stratum: table.get('stype') ?? [],
      populationSize: numbers(table, 'fpc'),
    });
    const mean = weightedMean(design, numbers(table, outcome), { level });
    return [mean.estimate, mean.se];
  }),
  survey_api_ell0: call(({ data, outcome }: Sample, readTable) => {
    const share = weightedProportion(clusters(data, readTable), numbers(readTable(data), outcome), { level });
    const { estimate, se, df, n, ci } = share;
    const again = proportionIntervals({ p: estimate, se, n, df, level });
    return {
      estimate,
      se,
      df,
      svyciprop_logit: ci.logitT,
      svyciprop_xlogit: ci.logitT,
      svyciprop_likelihood: ci.likelihood,
      svyciprop_asin: ci.arcsineT,
      svyciprop_beta: ci.kornGraubard,
      svyciprop_mean: ci.meanT,
      closed_form: {
        mean_normal: again.meanNormal,
        mean_t: again.meanT,
        logit_t: again.logitT,
        logit_normal: again.logitNormal,
        asin_t: again.arcsineT,
        beta: again.kornGraubard,
        beta_capped: again.kornGraubardCapped,
        likelihood: again.likelihood,
        wilson_effective_n: again.wilson,
      },
    };
  }),
  nile_local_level: call((input: Nile) => nile(input)),
  /** The flows are of the entry before; only the variances are repeated here. */
  nile_steady_state: call((input: Omit<Nile, 'share' | 'day'>, readTable) => {
    const flows = numbers(readTable('nile.csv'), 'flow');
    const figures = nile({ ...input, share: flows, day: flows.map((_, index) => index + 1) });
    const filtered = figures.filtered_variance;
    const last = Array.isArray(filtered) ? filtered.at(-1) : null;
    return [last ?? null, figureOf(figures, 'log_likelihood_flat')];
  }),
  /** The figures are given for every seventh day. */
  australia_alp_house_effects: call((input: Figures, readTable) => {
    const { day, smoothed_mean, smoothed_variance, ...rest } = engine('house_effects', input, readTable);
    const weekly = (list: unknown) =>
      Array.isArray(list) ? list.filter((_, index) => index % 7 === 0) : null;
    return {
      ...rest,
      day: weekly(day),
      smoothed_mean: weekly(smoothed_mean),
      smoothed_variance: weekly(smoothed_variance),
    };
  }),
};

type Nile = { share: number[]; day: number[]; variance: number; state_variance_per_day: number };

function nile({ share, day, variance, state_variance_per_day }: Nile): Figures {
  const figures = engine('local_level', {
    share,
    day,
    variance: share.map(() => variance),
    first_day: 1,
    last_day: share.length,
    state_variance_per_day,
  });
  /** Durbin and Koopman count the diffuse step as one more term. */
  const diffuseStep = Math.log(2 * Math.PI) / 2;
  return {
    ...figures,
    log_likelihood_durbin_koopman: figureOf(figures, 'log_likelihood_flat') - diffuseStep,
  };
}

function clusters(data: string, readTable: ReadTable) {
  const table = readTable(data);
  return surveyDesign({
    weights: numbers(table, 'weight'),
    psu: table.get('dnum') ?? [],
    populationSize: numbers(table, 'fpc'),
  });
}

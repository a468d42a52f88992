/** How close a number must come: near enough by either part, or both below `vanishing`. */
export type Tolerance = { relative: number; absolute: number; vanishing?: number; reason: string };

/** Of the accuracy asked of the engine and what R's own methods can promise, the looser. */
export const kinds = {
  count: {
    relative: 0,
    absolute: 0,
    reason: 'a sample size, a day or a count of degrees of freedom is right or wrong',
  },
  figure: {
    relative: 1e-9,
    absolute: 1e-12,
    reason:
      'the accuracy asked of statistics and intervals; R computes these by closed form or beta quantile',
  },
  statistic: {
    relative: 1e-9,
    absolute: 1e-10,
    reason:
      'near 0 with samples in the millions, R and the engine lose the same digits of x − n·p in two ways',
  },
  pValue: {
    relative: 1e-9,
    absolute: 0,
    vanishing: 1e-300,
    reason: 'a small p is compared by part of itself down to 1e-300; R’s exact tests are off by up to 8e-11',
  },
  quadrature: {
    relative: 1e-9,
    absolute: 1e-8,
    reason: 'R finds these by quadrature over the posterior, good to about 1e-8',
  },
  searched: {
    relative: 1e-6,
    absolute: 1e-12,
    reason: 'R finds the ends of a likelihood interval by a search',
  },
  smoothed: {
    relative: 1e-6,
    absolute: 1e-12,
    reason: 'R inverts a dense matrix, the engine filters: the accuracy asked of smoothed series',
  },
} as const satisfies Record<string, Tolerance>;

export type Kind = keyof typeof kinds;
type Row = Partial<Record<Kind, string>>;

/** Every field of every file, by its kind; a field of an object is `outer.inner`, an element of a list its list. */
const table: Readonly<Record<string, Row>> = {
  change_of_lead: {
    statistic: 'z',
    pValue: 'p_value',
    figure: 'lead_before lead_after change se margin interval',
  },
  change_of_share: {
    statistic: 'z z_pooled',
    pValue: 'p_value p_value_pooled',
    figure: 'change se margin pooled newcombe',
  },
  deff_from_margin: { figure: 'deff effective_n deff_low deff_high srs_margin' },
  deff_one_sample: {
    statistic: 'z',
    pValue: 'p_value',
    figure: 'effective_n se margin margin_at_half wilson clopper_pearson agresti_coull jeffreys',
  },
  deff_two_sample: {
    statistic: 'z_pooled z_unpooled',
    pValue: 'p_value_pooled p_value_unpooled',
    figure: 'effective_n1 effective_n2 difference pooled se_unpooled margin wald newcombe',
  },
  finite_population: {
    figure: 'factor margin_infinite margin factor_one_minus_f margin_one_minus_f se_survey_convention',
  },
  homogeneity: {
    count: 'df',
    pValue: 'p_value cochran_q_p_value',
    figure: 'pooled chi_square inverse_variance_mean cochran_q',
  },
  house_effects: {
    count: 'day',
    smoothed: 'smoothed_mean smoothed_variance house_effect house_effect_se',
    figure: 'log_likelihood_flat',
  },
  kish_deff: { count: 'n', figure: 'sum_weights sum_squared_weights deff cv_squared effective_n' },
  lead_one_sample: {
    statistic: 'z z_null',
    pValue:
      'p_value_two_sided p_value_one_sided probability_ahead_normal p_value_null_two_sided ' +
      'p_value_null_one_sided sign_test_p_two_sided sign_test_p_one_sided mcnemar_cc_p',
    figure: 'lead se margin_90 margin_95 margin_99 se_null',
  },
  local_level: {
    count: 'day',
    smoothed: 'smoothed_mean smoothed_variance filtered_mean filtered_variance',
    figure: 'log_likelihood_flat',
  },
  multiple_comparisons: { pValue: 'holm hochberg benjamini_hochberg bonferroni benjamini_yekutieli' },
  one_proportion_test: {
    statistic: 'z z_cc',
    pValue: 'p_value p_value_cc exact_p_value',
    figure: 'estimate',
  },
  overlapping_averages: {
    statistic: 'z z_pooled',
    pValue: 'p_value p_value_pooled',
    figure: 'average_before average_after change se pooled se_pooled se_if_independent correlation',
  },
  poll_accuracy: {
    statistic: 'A_z',
    pValue: 'A_p_value',
    figure:
      'mosteller_1 mosteller_2 mosteller_3 mosteller_3_renormalized mosteller_4 mosteller_5 ' +
      'mosteller_5_signed mosteller_6 root_mean_square_error A A_se A_multi B B_weighted',
  },
  posterior_lead: {
    quadrature: 'probability_lead_over_threshold credible_interval_lead probability_largest',
    figure: 'alpha probability_first_ahead_of_second mean_lead sd_lead credible_interval_first_share',
  },
  power_two_polls: {
    count: 'n_per_poll n_per_poll_unpooled',
    figure: 'power power_strict n_real n_real_unpooled detectable_increase detectable_decrease',
  },
  proportion_interval: {
    figure:
      'wald wald_truncated wilson wilson_cc clopper_pearson agresti_coull agresti_coull_truncated ' +
      'jeffreys jeffreys_raw',
  },
  replicate_weights: {
    count: 'n df',
    statistic: 'z',
    pValue: 'p_value_normal',
    searched: 'ci.likelihood',
    figure:
      'estimate se effective_n ci.mean_normal ci.mean_t ci.logit_t ci.logit_normal ci.asin_t ci.beta ' +
      'ci.beta_capped ci.wilson_effective_n ci.normal ci.t',
  },
  sample_size_lead: {
    count: 'n_per_poll',
    figure:
      'power power_null_variance n_real n_real_null_variance smallest_significant_lead ' +
      'smallest_significant_lead_null_variance',
  },
  sample_size_margin: { count: 'n_infinite n', figure: 'n_real_infinite n_real' },
  trend: {
    count: 'df df_departure',
    statistic: 'z',
    pValue: 'p_value',
    figure: 'pooled slope chi_square chi_square_departure',
  },
  two_proportion_test: {
    statistic: 'z_pooled z_unpooled z_pooled_cc',
    pValue: 'p_value_pooled p_value_unpooled p_value_pooled_cc fisher_p_value',
    figure: 'difference newcombe agresti_caffo wald',
  },
  weighted_proportion: {
    count: 'n df',
    statistic: 'z',
    pValue: 'p_value_normal p_value_t',
    searched: 'ci.likelihood',
    figure:
      'sum_weights estimate se deff kish_deff effective_n p_first p_second lead ci.mean_normal ci.mean_t ' +
      'ci.logit_t ci.logit_normal ci.asin_t ci.beta ci.beta_capped ci.wilson_effective_n ci.normal ci.t',
  },
  cases: {
    pValue: 'findings.p findings.pAdjusted findings.secondTests.p',
    figure:
      'base.deff base.deffRange base.nEff base.maximumMarginPp previousBase.deff previousBase.deffRange ' +
      'previousBase.nEff previousBase.maximumMarginPp findings.estimatePct findings.intervalPct ' +
      'findings.estimatePp findings.sePp findings.marginPp findings.intervalPp findings.z findings.alpha ' +
      'findings.roundingPp findings.secondTests.intervalPp findings.breakingDeff findings.breakingFactor ' +
      'findings.detectable80Pp findings.thresholdPct',
  },
  refused: {},
};

/** The tolerance of one field of one file; null where the table has no row for it. */
export function toleranceOf(file: string, field: string): Tolerance | null {
  const row = table[file] ?? {};
  const kind = kindNames.find((name) => row[name]?.split(' ').includes(field));
  return kind ? kinds[kind] : null;
}

const kindNames = Object.keys(kinds) as Kind[];

/** The files that the table knows, without `.json`. */
export const toleratedFiles = Object.keys(table);

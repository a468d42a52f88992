import * as stats from '@/lib/stats';
import { entry, type Entry, type Figures } from '../entry';

type Polls = { p?: number[]; shares?: number[][]; n: number[]; deff: number[] };

const sizesOf = ({ n, deff }: Polls) => n.map((size, poll) => ({ n: size, deff: deff[poll] ?? Number.NaN }));

const sharesOf = (polls: Polls & { p: number[] }) =>
  sizesOf(polls).map((sizes, poll) => ({ ...sizes, p: polls.p[poll] ?? Number.NaN }));

function homogeneity(polls: Polls): Figures {
  if (polls.p) {
    const of = stats.homogeneityOfShares(sharesOf({ ...polls, p: polls.p }));
    return {
      pooled: of.pooled,
      chi_square: of.chiSquare,
      df: of.df,
      p_value: of.pValue,
      inverse_variance_mean: of.inverseVarianceMean,
      cochran_q: of.cochranQ,
      cochran_q_p_value: of.cochranQPValue,
    };
  }
  const answers = sizesOf(polls).map((sizes, poll) => ({ ...sizes, shares: polls.shares?.[poll] ?? [] }));
  const of = stats.homogeneityOfAnswers(answers);
  return { pooled: of.pooled, chi_square: of.chiSquare, df: of.df, p_value: of.pValue };
}

type Planned = { target_power: number };

function powerTwoPolls({ target_power: power, ...plan }: stats.ChangePlan & Planned) {
  const now = stats.changePower(plan);
  const size = stats.sampleSizeForChange({ ...plan, power });
  const detectable = stats.detectableChange({ ...plan, power });
  return {
    power: now.power,
    power_strict: now.powerStrict,
    n_real: size.nReal,
    n_per_poll: size.nPerPoll,
    n_real_unpooled: size.nRealUnpooled,
    n_per_poll_unpooled: size.nPerPollUnpooled,
    detectable_increase: detectable.increase,
    detectable_decrease: detectable.decrease,
  };
}

function sampleSizeLead({ target_power: power, ...plan }: stats.LeadPlan & Planned) {
  const now = stats.leadPower(plan);
  const size = stats.sampleSizeForLead({ ...plan, power });
  const smallest = stats.smallestSignificantLead({ ...plan, together: plan.first + plan.second });
  return {
    power: now.power,
    power_null_variance: now.powerNullVariance,
    n_real: size.nReal,
    n_per_poll: size.nPerPoll,
    n_real_null_variance: size.nRealNullVariance,
    smallest_significant_lead: smallest.lead,
    smallest_significant_lead_null_variance: smallest.leadNullVariance,
  };
}

type Tracking = Omit<stats.TrackingAverages, 'waves'> & { wave_p: number[]; wave_n: number[] };

function overlappingAverages({ wave_p, wave_n, ...averages }: Tracking) {
  const waves = wave_p.map((p, wave) => ({ p, n: wave_n[wave] ?? Number.NaN }));
  const of = stats.changeOfOverlappingAverages({ ...averages, waves });
  return {
    average_before: of.before,
    average_after: of.after,
    change: of.change,
    se: of.se,
    z: of.z,
    p_value: of.pValue,
    pooled: of.pooled,
    se_pooled: of.sePooled,
    z_pooled: of.zPooled,
    p_value_pooled: of.pValuePooled,
    se_if_independent: of.seIfIndependent,
    correlation: of.correlation,
  };
}

type Result = { poll: number[]; result: number[]; n: number; deff: number };

function pollAccuracy({ poll, result, n, deff }: Result) {
  const errors = stats.mostellerMeasures(poll, result);
  const pair = stats.predictiveAccuracy(poll, result, n, deff);
  const all = stats.multiPartyAccuracy(poll, result);
  return {
    mosteller_1: errors.winnerError,
    mosteller_2: errors.winnerErrorDecided,
    mosteller_3: errors.meanAbsoluteError,
    mosteller_3_renormalized: errors.meanAbsoluteErrorDecided,
    mosteller_4: errors.meanRelativeError,
    mosteller_5: errors.leadError,
    mosteller_5_signed: errors.leadErrorSigned,
    mosteller_6: errors.largestError,
    root_mean_square_error: errors.rootMeanSquareError,
    A: pair.a,
    A_se: pair.se,
    A_z: pair.z,
    A_p_value: pair.pValue,
    A_multi: all.perCandidate,
    B: all.b,
    B_weighted: all.bWeighted,
  };
}

/** Sample sizes, power, rows of polls, posterior and accuracy. */
export const planningEntries: Record<string, Entry> = {
  sample_size_margin: entry((plan: stats.MarginPlan) => {
    const size = stats.sampleSizeForMargin(plan);
    return {
      n_real_infinite: size.nRealInfinite,
      n_infinite: size.nInfinite,
      n_real: size.nReal,
      n: size.n,
    };
  }),
  sample_size_lead: entry(sampleSizeLead),
  power_two_polls: entry(powerTwoPolls),
  homogeneity: entry(homogeneity),
  trend: entry((polls: Polls & { p: number[]; score: number[] }) => {
    const scored = sharesOf(polls).map((poll, at) => ({ ...poll, score: polls.score[at] ?? Number.NaN }));
    const of = stats.trendOfShares(scored);
    return {
      pooled: of.pooled,
      slope: of.slope,
      z: of.z,
      chi_square: of.chiSquare,
      df: of.df,
      p_value: of.pValue,
      chi_square_departure: of.chiSquareDeparture,
      df_departure: of.dfDeparture,
    };
  }),
  overlapping_averages: entry(overlappingAverages),
  posterior_lead: entry((question: stats.LeadPosteriorQuestion) => {
    const of = stats.leadPosterior(question);
    return {
      alpha: of.alpha,
      probability_first_ahead_of_second: of.firstAheadOfSecond,
      probability_lead_over_threshold: of.leadOverThreshold,
      mean_lead: of.meanLead,
      sd_lead: of.sdLead,
      credible_interval_lead: of.credibleLead,
      probability_largest: of.largest,
      credible_interval_first_share: of.credibleFirstShare,
    };
  }),
  poll_accuracy: entry(pollAccuracy),
};

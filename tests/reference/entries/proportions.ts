import {
  adjustBenjaminiHochberg,
  adjustBenjaminiYekutieli,
  adjustBonferroni,
  adjustHochberg,
  adjustHolm,
  agrestiCaffoInterval,
  agrestiCoullInterval,
  binomialTestP,
  changeOfLead,
  changeOfShare,
  clopperPearsonInterval,
  criticalValue,
  differenceEstimate,
  effectiveCounts,
  finitePopulationFactor,
  finitePopulationMargin,
  finitePopulationStandardError,
  fisherExactP,
  jeffreysInterval,
  leadEstimate,
  leadScoreTest,
  leadTest,
  maximumMargin,
  mcnemarCorrectedP,
  newcombeDifferenceInterval,
  oneProportionScoreTest,
  pooledTest,
  probabilityAheadNormal,
  shareEstimate,
  shareScoreTest,
  signTest,
  unpooledTest,
  waldInterval,
  wilsonCorrectedInterval,
  wilsonInterval,
  withinUnit,
  type Alternative,
} from '@/lib/stats';
import { entry, type Entry } from '../entry';

/** R's words for what a test looks for. */
type Asked = 'two.sided' | 'less' | 'greater';
const alternatives: Record<Asked, Alternative> = {
  'two.sided': 'two-sided',
  less: 'less',
  greater: 'greater',
};

const criticalAt = (level: number) => criticalValue(1 - level, null);

type OneProportion = { x: number; n: number; p0: number; alternative: Asked };

const oneProportionTest = entry<OneProportion>(({ x, n, p0, alternative }) => {
  const asked = alternatives[alternative];
  const plain = oneProportionScoreTest(x, n, p0, asked, 'none');
  const corrected = oneProportionScoreTest(x, n, p0, asked, 'continuity');
  return {
    estimate: x / n,
    z: plain.z,
    p_value: plain.p,
    z_cc: corrected.z,
    p_value_cc: corrected.p,
    exact_p_value: binomialTestP(x, n, p0, asked),
  };
});

const proportionInterval = entry<{ x: number; n: number; level: number }>(({ x, n, level }) => {
  const q = criticalAt(level);
  const wald = waldInterval(x / n, n, q);
  const agrestiCoull = agrestiCoullInterval(x, n, q);
  return {
    wald,
    wald_truncated: withinUnit(wald),
    wilson: wilsonInterval(x / n, n, q),
    wilson_cc: wilsonCorrectedInterval(x, n, q),
    clopper_pearson: clopperPearsonInterval(x, n, level),
    agresti_coull: agrestiCoull,
    agresti_coull_truncated: withinUnit(agrestiCoull),
    jeffreys: jeffreysInterval(x, n, level, 'modified'),
    jeffreys_raw: jeffreysInterval(x, n, level, 'raw'),
  };
});

type TwoProportions = {
  x1: number;
  n1: number;
  x2: number;
  n2: number;
  alternative: Asked;
  level: number;
};

const twoProportionTest = entry<TwoProportions>(({ x1, n1, x2, n2, alternative, level }) => {
  const asked = alternatives[alternative];
  const first = { p: x1 / n1, n: n1, deff: 1 };
  const second = { p: x2 / n2, n: n2, deff: 1 };
  const pooled = pooledTest(first, second, asked, 'none');
  const corrected = pooledTest(first, second, asked, 'continuity');
  const unpooled = unpooledTest(first, second, asked);
  const wald = differenceEstimate(first, second, level);
  return {
    difference: wald.estimate,
    z_pooled: pooled.z,
    p_value_pooled: pooled.p,
    z_unpooled: unpooled.z,
    p_value_unpooled: unpooled.p,
    z_pooled_cc: corrected.z,
    p_value_pooled_cc: corrected.p,
    fisher_p_value: fisherExactP(x1, n1, x2, n2, asked),
    newcombe: newcombeDifferenceInterval(first, second, level),
    agresti_caffo: agrestiCaffoInterval(x1, n1, x2, n2, level),
    wald: wald.interval,
  };
});

type OneShare = { p: number; n: number; deff: number; p0: number; alternative: Asked; level: number };

const deffOneSample = entry<OneShare>(({ p, n, deff, p0, alternative, level }) => {
  const share = { p, n, deff };
  const effective = effectiveCounts(share);
  const q = criticalAt(level);
  const { standardError, margin } = shareEstimate(share, level);
  const test = shareScoreTest(share, p0, alternatives[alternative]);
  return {
    effective_n: effective.n,
    se: standardError,
    margin,
    margin_at_half: maximumMargin(n, deff, q),
    z: test.z,
    p_value: test.p,
    wilson: wilsonInterval(p, effective.n, q),
    clopper_pearson: clopperPearsonInterval(effective.x, effective.n, level),
    agresti_coull: agrestiCoullInterval(effective.x, effective.n, q),
    jeffreys: jeffreysInterval(effective.x, effective.n, level, 'modified'),
  };
});

type TwoShares = {
  p1: number;
  n1: number;
  deff1: number;
  p2: number;
  n2: number;
  deff2: number;
  alternative: Asked;
  level: number;
};

const deffTwoSample = entry<TwoShares>(({ p1, n1, deff1, p2, n2, deff2, alternative, level }) => {
  const asked = alternatives[alternative];
  const first = { p: p1, n: n1, deff: deff1 };
  const second = { p: p2, n: n2, deff: deff2 };
  const pooled = pooledTest(first, second, asked, 'none');
  const unpooled = unpooledTest(first, second, asked);
  const wald = differenceEstimate(first, second, level);
  return {
    effective_n1: effectiveCounts(first).n,
    effective_n2: effectiveCounts(second).n,
    difference: wald.estimate,
    pooled: pooled.pooled,
    z_pooled: pooled.z,
    p_value_pooled: pooled.p,
    se_unpooled: unpooled.standardError,
    z_unpooled: unpooled.z,
    p_value_unpooled: unpooled.p,
    margin: wald.margin,
    wald: wald.interval,
    newcombe: newcombeDifferenceInterval(first, second, level),
  };
});

type OneLead = { n: number; deff: number } & ({ x1: number; x2: number } | { p1: number; p2: number });

const leadOneSample = entry<OneLead>((input) => {
  const { n, deff } = input;
  const counts = 'x1' in input ? input : null;
  const first = 'x1' in input ? input.x1 / n : input.p1;
  const second = 'x1' in input ? input.x2 / n : input.p2;
  const sample = { first, second, n, deff };
  const at95 = leadEstimate(sample, 0.95);
  const wald = leadTest(sample, 'two-sided');
  const score = leadScoreTest(sample, 'two-sided');
  return {
    lead: at95.estimate,
    se: at95.standardError,
    margin_90: leadEstimate(sample, 0.9).margin,
    margin_95: at95.margin,
    margin_99: leadEstimate(sample, 0.99).margin,
    z: wald.z,
    p_value_two_sided: wald.p,
    p_value_one_sided: leadTest(sample, 'greater').p,
    probability_ahead_normal: probabilityAheadNormal(sample),
    se_null: score.standardError,
    z_null: score.z,
    p_value_null_two_sided: score.p,
    p_value_null_one_sided: leadScoreTest(sample, 'greater').p,
    ...(counts && {
      sign_test_p_two_sided: signTest(counts.x1, counts.x2, 'two-sided'),
      sign_test_p_one_sided: signTest(counts.x1, counts.x2, 'greater'),
      mcnemar_cc_p: mcnemarCorrectedP(counts.x1, counts.x2),
    }),
  };
});

type ShareChange = {
  p_before: number;
  n_before: number;
  deff_before: number;
  p_after: number;
  n_after: number;
  deff_after: number;
  level: number;
};

const changeOfShareEntry = entry<ShareChange>((input) => {
  const before = { p: input.p_before, n: input.n_before, deff: input.deff_before };
  const after = { p: input.p_after, n: input.n_after, deff: input.deff_after };
  const change = changeOfShare(before, after, input.level);
  const pooled = pooledTest(after, before, 'two-sided', 'none');
  return {
    change: change.estimate,
    se: change.standardError,
    margin: change.margin,
    z: change.test.z,
    p_value: change.test.p,
    pooled: pooled.pooled,
    z_pooled: pooled.z,
    p_value_pooled: pooled.p,
    newcombe: newcombeDifferenceInterval(after, before, input.level),
  };
});

type LeadChange = {
  first_before: number;
  second_before: number;
  n_before: number;
  deff_before: number;
  first_after: number;
  second_after: number;
  n_after: number;
  deff_after: number;
  level: number;
};

const changeOfLeadEntry = entry<LeadChange>((input) => {
  const change = changeOfLead(
    { first: input.first_before, second: input.second_before, n: input.n_before, deff: input.deff_before },
    { first: input.first_after, second: input.second_after, n: input.n_after, deff: input.deff_after },
    input.level,
  );
  return {
    lead_before: change.leadBefore,
    lead_after: change.leadAfter,
    change: change.estimate,
    se: change.standardError,
    margin: change.margin,
    interval: change.interval,
    z: change.test.z,
    p_value: change.test.p,
  };
});

type Finite = { p: number; n: number; population: number; deff: number; level: number };

const finitePopulation = entry<Finite>(({ p, n, population, deff, level }) => {
  const share = { p, n, deff };
  return {
    factor: finitePopulationFactor(n, population, 'one-less'),
    margin_infinite: shareEstimate(share, level).margin,
    margin: finitePopulationMargin(share, population, level, 'one-less'),
    factor_one_minus_f: finitePopulationFactor(n, population, 'fraction'),
    margin_one_minus_f: finitePopulationMargin(share, population, level, 'fraction'),
    se_survey_convention: finitePopulationStandardError(share, population),
  };
});

const multipleComparisons = entry<{ p_values: (number | null)[] }>(({ p_values: pValues }) => ({
  holm: adjustHolm(pValues),
  hochberg: adjustHochberg(pValues),
  benjamini_hochberg: adjustBenjaminiHochberg(pValues),
  bonferroni: adjustBonferroni(pValues),
  benjamini_yekutieli: adjustBenjaminiYekutieli(pValues),
}));

export const proportionEntries: Record<string, Entry> = {
  one_proportion_test: oneProportionTest,
  proportion_interval: proportionInterval,
  two_proportion_test: twoProportionTest,
  deff_one_sample: deffOneSample,
  deff_two_sample: deffTwoSample,
  lead_one_sample: leadOneSample,
  change_of_share: changeOfShareEntry,
  change_of_lead: changeOfLeadEntry,
  finite_population: finitePopulation,
  multiple_comparisons: multipleComparisons,
};

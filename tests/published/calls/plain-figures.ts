import {
  criticalValue,
  kishDesignEffect,
  maximumMargin,
  normalQuantile,
  oneProportionScoreTest,
  shareStandardError,
  surveyDesign,
  weightedProportion,
} from '@/lib/stats';
import { call, endsOf, engine, figureOf, type Call } from './call';

const twoSided = { alternative: 'two.sided' };

/** Quantiles, margins, tests, plans, families and design effects of handbooks and manuals. */
export const plainCalls: Record<string, Call> = {
  normal_quantiles: call(({ level }: { level: number[] }) =>
    level.map((one) => criticalValue(1 - one, null)),
  ),
  margin_table_95: call(({ n, level }: { n: number[]; level: number }) =>
    n.map((size) => maximumMargin(size, 1, criticalValue(1 - level, null))),
  ),
  /** The paper's rule of thumb takes 2 for the quantile, and so 1/√n. */
  franklin_one_over_root_n: call(({ n }: { n: number[] }) => n.map((size) => maximumMargin(size, 1, 2))),
  nist_7_2_4: call((input: { x: number; n: number; p0: number; alternative: string }) =>
    figureOf(engine('one_proportion_test', input), 'z'),
  ),
  nist_7_2_4_2_sample_size: call(oneSampleSizes),
  smokers_homogeneity: call(({ x, n }: { x: number[]; n: number[] }) => {
    const figures = engine('homogeneity', { p: shares(x, n), n, deff: ones(n) });
    return [figureOf(figures, 'chi_square'), figureOf(figures, 'p_value')];
  }),
  smokers_trend: call(({ x, n, score }: { x: number[]; n: number[]; score: number[] }) => {
    const figures = engine('trend', { p: shares(x, n), n, deff: ones(n), score });
    return [figureOf(figures, 'chi_square'), figureOf(figures, 'p_value')];
  }),
  mendel_binomial: call(({ x, n, p0 }: { x: number; n: number; p0: number }) => [
    figureOf(engine('one_proportion_test', { x, n, p0, ...twoSided }), 'exact_p_value'),
    ...endsOf(engine('proportion_interval', { x, n, level: 0.95 }), 'clopper_pearson'),
  ]),
  power_prop_test_docs: call(
    ({ p1, p2, n, power, alpha }: { p1: number; p2: number; n: number; power: number; alpha: number }) => {
      const plan = engine('power_two_polls', { p1, p2, n, deff: 1, alpha, target_power: power, ...twoSided });
      return [figureOf(plan, 'power'), figureOf(plan, 'n_real')];
    },
  ),
  agresti_approval_matched: call((input: { x1: number; x2: number; n: number }) => {
    const figures = engine('lead_one_sample', { ...input, deff: 1 });
    return [figureOf(figures, 'lead'), figureOf(figures, 'se'), figureOf(figures, 'z_null') ** 2];
  }),
  benjamini_hochberg1995: call(({ p_values }: { p_values: number[] }) => {
    const adjusted = engine('multiple_comparisons', { p_values });
    return ['bonferroni', 'hochberg', 'benjamini_hochberg'].map((name) => {
      const list = adjusted[name];
      return Array.isArray(list) ? list.filter((p) => typeof p === 'number' && p <= 0.05).length : null;
    });
  }),
  kish_cluster_deff: call(clusteredDesignEffect),
  kish_weighting_deff: call(({ weights }: { weights: number[] }) => kishDesignEffect(weights)),
  /** Twice the error that a simple random sample of the size has: .035 against its standard error. */
  shirani_mehr2018: call(({ n, p }: { n: number; p: number }) => 0.035 / shareStandardError(p, n, 1)),
  chile_no_lead: (input) => engine('lead_one_sample', input),
};

const shares = (x: number[], n: number[]) => x.map((count, index) => count / (n[index] ?? Number.NaN));
const ones = (n: number[]) => n.map(() => 1);

type OneSample = { p0: number; delta: number; alpha: number; beta: number };

/**
 * The first size whose score test leaves room for the shift; then the first whose corrected test is moved as far by the
 * shift as the plain test of that size.
 */
function oneSampleSizes({ p0, delta, alpha, beta }: OneSample): number[] {
  const p1 = p0 + delta;
  const needed = (n: number) =>
    normalQuantile(1 - alpha) * shareStandardError(p0, n, 1) +
    normalQuantile(1 - beta) * shareStandardError(p1, n, 1);
  const moved = (n: number, correction: 'none' | 'continuity') =>
    oneProportionScoreTest(n * p1, n, p0, 'greater', correction).z ?? Number.NaN;
  let plain = 1;
  while (needed(plain) > delta) plain += 1;
  let corrected = plain;
  while (moved(corrected, 'continuity') < moved(plain, 'none')) corrected += 1;
  return [plain, corrected];
}

/**
 * A sample of 48 clusters of 21 whose homogeneity, by analysis of variance, is exactly .05: 7 clusters 2½ people
 * above half and 7 below, 17 each 3½. The engine's clustered variance has one degree of freedom fewer.
 */
function clusteredDesignEffect({ cluster_size: size }: { cluster_size: number }): number {
  const above = [...Array<number>(7).fill((size + 5) / 2), ...Array<number>(17).fill((size + 7) / 2)];
  const successes = [...above, ...above.map((count) => size - count)];
  const people = successes.flatMap((count, cluster) =>
    Array.from({ length: size }, (_, person) => ({ cluster, yes: person < count ? 1 : 0 })),
  );
  const design = surveyDesign({
    weights: people.map(() => 1),
    psu: people.map(({ cluster }) => cluster),
  });
  const { deff } = weightedProportion(
    design,
    people.map(({ yes }) => yes),
    { level: 0.95 },
  );
  if (deff === null) throw new TypeError('the clusters differ, so there is a design effect');
  const clusters = successes.length;
  return (deff * (clusters - 1) * size) / (clusters * size - 1);
}

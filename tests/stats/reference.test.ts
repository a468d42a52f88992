/**
 * Figures computed in R 4.2.2: prop.test, fisher.test, p.adjust, qbeta and closed forms, as each case's `source`
 * says. Only cases within the reach of the engine's functions (two-sided tests) are run; none is changed.
 */
import { describe, expect, test } from 'vitest';
import {
  clopperPearsonInterval,
  criticalValue,
  fisherExactP,
  holm,
  impliedDesignEffect,
  kishDesignEffect,
  leadNullStandardError,
  leadStandardError,
  maximumMargin,
  newcombeInterval,
  pooledStandardError,
  shareStandardError,
  twoSidedP,
  wilsonInterval,
} from '@/lib/stats';
import changeOfLead from '../reference/engine/change_of_lead.json';
import deffFromMargin from '../reference/engine/deff_from_margin.json';
import deffOneSample from '../reference/engine/deff_one_sample.json';
import deffTwoSample from '../reference/engine/deff_two_sample.json';
import kishDeff from '../reference/engine/kish_deff.json';
import leadOneSample from '../reference/engine/lead_one_sample.json';
import multipleComparisons from '../reference/engine/multiple_comparisons.json';
import oneProportionTest from '../reference/engine/one_proportion_test.json';
import proportionInterval from '../reference/engine/proportion_interval.json';
import twoProportionTest from '../reference/engine/two_proportion_test.json';
import { expectFigure, expectInterval, expectP } from '../support/reference';

const q = (level: number) => criticalValue(1 - level, null);
const twoSided = <Case extends { input: { alternative: string } }>(cases: Case[]) =>
  cases.filter((one) => one.input.alternative === 'two.sided');

describe('one proportion agrees with R 4.2.2', () => {
  test.each(twoSided(oneProportionTest))('$id', ({ id, input: { x, n, p0 }, expected }) => {
    const z = (x / n - p0) / shareStandardError(p0, n, 1);
    expect(Math.abs(z - expected.z)).toBeLessThan(1e-9 * Math.max(1, Math.abs(expected.z)));
    if (expected.z !== 0) expectP(twoSidedP(expected.z, null), expected.p_value, id);
  });

  test.each(deffOneSample)('$id', ({ id, input: { p, n, deff, p0, level, alternative }, expected }) => {
    const nEff = n / deff;
    expectFigure(q(level) * shareStandardError(p, n, deff), expected.margin, id);
    expectFigure(maximumMargin(n, deff, q(level)), expected.margin_at_half, id);
    expectInterval(wilsonInterval(p, nEff, q(level)), expected.wilson, `${id} wilson`);
    expectInterval(
      clopperPearsonInterval(Math.min(nEff, nEff * p), nEff, level),
      expected.clopper_pearson,
      id,
    );
    const z = (p - p0) / shareStandardError(p0, n, deff);
    expectFigure(z, expected.z, `${id} z`);
    if (alternative === 'two.sided') expectP(twoSidedP(z, null), expected.p_value, `${id} p`);
  });

  test.each(proportionInterval)('$id', ({ id, input: { x, n, level }, expected }) => {
    expectInterval(wilsonInterval(x / n, n, q(level)), expected.wilson, `${id} wilson`);
    expectInterval(clopperPearsonInterval(x, n, level), expected.clopper_pearson, `${id} exact`);
  });
});

describe('two proportions agree with R 4.2.2', () => {
  const cases = twoSided(twoProportionTest);
  test.each(cases)('$id', ({ id, input: { x1, n1, x2, n2, level }, expected }) => {
    const [p1, p2] = [x1 / n1, x2 / n2];
    const pooled = pooledStandardError(p1, n1, p2, n2);
    if (expected.z_pooled === null) expect(pooled).toBe(0);
    else expectFigure((p1 - p2) / pooled, expected.z_pooled, `${id} pooled`);
    expectP(fisherExactP(x1, n1, x2, n2), expected.fisher_p_value, `${id} Fisher`);
    expectInterval(newcombeInterval(p2, n2, p1, n1, q(level)), expected.newcombe, `${id} Newcombe`);
  });

  test.each(deffTwoSample)('$id', ({ id, input, expected }) => {
    const { p1, n1, deff1, p2, n2, deff2, level } = input;
    const error = Math.hypot(shareStandardError(p1, n1, deff1), shareStandardError(p2, n2, deff2));
    expectFigure(error, expected.se_unpooled, `${id} unpooled`);
    expectInterval(
      newcombeInterval(p2, n2 / deff2, p1, n1 / deff1, q(level)),
      expected.newcombe,
      `${id} Newcombe`,
    );
  });
});

describe('leads agree with R 4.2.2', () => {
  test.each(leadOneSample)('$id', ({ id, input, expected }) => {
    const { n, deff } = input;
    const a = 'x1' in input && typeof input.x1 === 'number' ? input.x1 / n : (input.p1 ?? 0);
    const b = 'x2' in input && typeof input.x2 === 'number' ? input.x2 / n : (input.p2 ?? 0);
    expectFigure(leadStandardError(a, b, n, deff), expected.se, `${id} se`);
    expectFigure(leadNullStandardError(a, b, n, deff), expected.se_null, `${id} null se`);
    expectFigure(q(0.99) * leadStandardError(a, b, n, deff), expected.margin_99, `${id} margin`);
    if (expected.z !== null) expectP(twoSidedP(expected.z, null), expected.p_value_two_sided, `${id} p`);
    if (expected.z_null !== null) {
      expectP(twoSidedP(expected.z_null, null), expected.p_value_null_two_sided, `${id} null p`);
    }
  });

  test.each(changeOfLead)('$id', ({ id, input, expected }) => {
    const before = leadStandardError(
      input.first_before,
      input.second_before,
      input.n_before,
      input.deff_before,
    );
    const after = leadStandardError(input.first_after, input.second_after, input.n_after, input.deff_after);
    expectFigure(Math.hypot(before, after), expected.se, `${id} se`);
    expectFigure(q(input.level) * Math.hypot(before, after), expected.margin, `${id} margin`);
    expectP(twoSidedP(expected.z, null), expected.p_value, `${id} p`);
  });
});

describe('design effects and families agree with R 4.2.2', () => {
  test.each(kishDeff)('$id', ({ id, input, expected }) => {
    expectFigure(kishDesignEffect(input.weights), expected.deff, id);
  });

  test.each(deffFromMargin)('$id', ({ id, input: { margin, n, level, rounding_unit }, expected }) => {
    expectFigure(impliedDesignEffect(margin, n, level), expected.deff, id);
    expectFigure(impliedDesignEffect(margin - rounding_unit / 2, n, level), expected.deff_low, `${id} low`);
    expectFigure(impliedDesignEffect(margin + rounding_unit / 2, n, level), expected.deff_high, `${id} high`);
  });

  test.each(multipleComparisons)('$id', ({ id, input, expected }) => {
    const pValues = (input.p_values as (number | null)[]).filter((p) => p !== null);
    const reference = (expected.holm as (number | null)[]).filter((p) => p !== null);
    holm(pValues, 0.05).forEach(({ pAdjusted }, index) => {
      expectFigure(pAdjusted, reference[index] ?? Number.NaN, `${id} at ${index}`);
    });
    expect(reference).toHaveLength(pValues.length);
  });
});

import { detectableDifference, holm, type HolmResult } from '@/lib/stats';
import { criticalAt } from './critical-at';
import type { Policy, SecondTest, TestFields } from './check-types';
import { pOfRatio, type Measured, type SecondResult } from './measured';
import { roundingAllowancePp } from './rounding-allowance';
import { judgeVerdict } from './verdict';

/** The test of one finding; `breaking` is the square of z over its critical value. */
export type Judged = { fields: TestFields; breaking: number | null };

/**
 * Tests the findings of one family together and judges each.
 *
 * @param family everything testable that the document asks of one kind, in order
 * @param policy the desk's policy, complete
 * @returns one judgement each, in the order given
 */
export function judgeFamily(family: readonly Measured[], policy: Policy): Judged[] {
  const primary = family.map((one) => pOfRatio(one.estimatePp / 100, one.standardError('chosen'), one.df));
  const ranked = holm(primary, 1 - policy.level);
  return family.map((one, index) => judgeOne(one, primary[index] ?? 1, ranked[index], policy));
}

function judgeOne(measured: Measured, p: number, rank: HolmResult | undefined, policy: Policy): Judged {
  if (!rank) throw new TypeError('judgeFamily requires a rank for every finding');
  const { estimatePp, df, standardError } = measured;
  const se = { chosen: standardError('chosen'), low: standardError('low'), high: standardError('high') };
  const critical = criticalAt(rank.alpha, df);
  const q = criticalAt(1 - policy.level, df);
  const roundingPp = roundingAllowancePp(measured.unitsPp);
  const secondTests = measured
    .secondTests(rank.alpha)
    .map((test) => ({ ...test, significant: agrees(test, rank.alpha, estimatePp) }) satisfies SecondTest);
  const { verdict, reasons } = judgeVerdict({
    isSignificant: rank.significant,
    p,
    alpha: rank.alpha,
    familyAlpha: 1 - policy.level,
    size: Math.abs(estimatePp) / 100,
    rounding: roundingPp / 100,
    critical,
    se,
    secondTestsAgree: secondTests.every((test) => test.significant),
    bases: measured.bases.map(({ basis }) => basis),
  });
  const z = zOf(estimatePp / 100, se.chosen);
  const [low, high] = measured.interval(q);
  const fields: TestFields = {
    estimatePp,
    sePp: 100 * se.chosen,
    marginPp: 100 * q * se.chosen,
    intervalPp: [100 * low, 100 * high],
    z,
    p,
    pAdjusted: rank.pAdjusted,
    alpha: rank.alpha,
    roundingPp,
    secondTests,
    verdict,
    reasons,
    detectable80Pp:
      verdict === 'does-not-hold' && se.chosen > 0
        ? detectableDifference(critical, 100 * se.high) + roundingPp
        : null,
    survivesTwiceError: verdict === 'holds' ? z === null || Math.abs(z) >= 2 * critical : null,
  };
  return { fields, breaking: z === null ? null : (z / critical) ** 2 };
}

/** The estimate in standard errors: 0 for no estimate without variance, null for any other without variance. */
function zOf(estimate: number, standardError: number): number | null {
  if (standardError === 0) return estimate === 0 ? 0 : null;
  return estimate / standardError;
}

function agrees(test: SecondResult, alpha: number, estimatePp: number): boolean {
  if (estimatePp === 0) return false;
  if (test.name !== 'newcombe') return test.p < alpha;
  const [low, high] = test.intervalPp;
  return estimatePp > 0 ? low > 0 : high < 0;
}

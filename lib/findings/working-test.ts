import { criticalAt } from './critical-at';
import type { Policy, SecondTest, TestFields } from './check-types';
import type { Measured } from './measured';
import { quantileStep } from './working-share';
import type { EstimateWriting } from './working-error';
import { figure, figures, inBrackets, yesOrNo, type WorkingStep } from './working-step';

/** Estimate, standard error, interval, test and second tests of a tested finding. */
export function testSteps(
  measured: Measured,
  fields: TestFields,
  writing: EstimateWriting,
  policy: Policy,
): WorkingStep[] {
  const { df } = measured;
  const { estimatePp, sePp } = fields;
  const q = criticalAt(1 - policy.level, df);
  return [
    { label: 'Estimate', ...writing.estimate, result: figure(estimatePp), unit: 'points' },
    { label: 'Standard error', ...writing.error('chosen'), result: figure(sePp), unit: 'points' },
    quantileStep(policy.level, df, q),
    {
      label: 'Margin',
      formula: 'q · SE',
      substituted: `${figure(q)} · ${figure(sePp)}`,
      result: figure(fields.marginPp),
      unit: 'points',
    },
    { ...intervalWriting(fields), result: figures(fields.intervalPp), unit: 'points' },
    statisticStep(fields),
    pStep(fields, df),
    {
      label: 'Level of this test in its family',
      formula: '(1 − level) / tests not ranked before it',
      substituted: `(1 − ${policy.level}) / ${Math.round((1 - policy.level) / fields.alpha)}`,
      result: figure(fields.alpha),
      unit: '',
    },
    {
      label: 'p adjusted for the family',
      formula: 'the largest of p · tests not ranked before, over it and all ranked before, at most 1',
      substituted: `from p = ${figure(fields.p)}`,
      result: figure(fields.pAdjusted),
      unit: '',
    },
    criticalStep(fields, df),
    roundingStep(measured, fields),
    ...fields.secondTests.map(secondStep),
  ];
}

function intervalWriting({ intervalPp, estimatePp, marginPp }: TestFields) {
  const label = `Interval`;
  const isSymmetric = Math.abs(intervalPp[1] - estimatePp - marginPp) < 1e-9;
  if (!isSymmetric) {
    return { label, formula: 'the interval of the share − p₀', substituted: 'see the share' };
  }
  return {
    label,
    formula: 'estimate ± margin',
    substituted: `${figure(estimatePp)} ± ${figure(marginPp)}`,
  };
}

function statisticStep({ estimatePp, sePp, z }: TestFields): WorkingStep {
  const label = 'Test statistic';
  if (sePp === 0) {
    const formula = 'without variance: 0 where the estimate is 0, else none';
    const substituted = `estimate ${figure(estimatePp)}, no variance`;
    return { label, formula, substituted, result: z === null ? 'none' : figure(z), unit: '' };
  }
  const substituted = `${inBrackets(estimatePp)} / ${figure(sePp)}`;
  return { label, formula: 'z = estimate / SE', substituted, result: figure(z ?? 0), unit: '' };
}

function pStep({ z, p }: TestFields, df: number | null): WorkingStep {
  const size = z === null ? 'no variance' : figure(Math.abs(z));
  return {
    label: 'p, two-sided',
    formula: df === null ? '2 · P(Z > |z|)' : '2 · P(T > |z|; df)',
    substituted: df === null ? `2 · P(Z > ${size})` : `2 · P(T > ${size}; ${df})`,
    result: figure(p),
    unit: '',
  };
}

function criticalStep({ alpha }: TestFields, df: number | null): WorkingStep {
  return {
    label: 'Critical value at that level',
    formula: df === null ? 'c = z(1 − α / 2)' : 'c = t(1 − α / 2; df)',
    substituted: df === null ? `z(1 − ${figure(alpha)} / 2)` : `t(1 − ${figure(alpha)} / 2; ${df})`,
    result: figure(criticalAt(alpha, df)),
    unit: '',
  };
}

function roundingStep({ unitsPp }: Measured, { roundingPp }: TestFields): WorkingStep {
  return {
    label: 'Rounding allowance',
    formula: 'r: holds 95% of the sum of the rounding errors, each within ± half a unit',
    substituted: `units of ${unitsPp.map(figure).join(', ')}`,
    result: figure(roundingPp),
    unit: 'points',
  };
}

const SECOND_WRITING: Record<SecondTest['name'], [label: string, formula: string]> = {
  score: ['Second test: score', 'z₀ = (a − b) / √(d · (a + b) / n), two-sided p'],
  'exact-sign': [
    'Second test: exact sign',
    '2 · I₀.₅(G, S + 1), G and S the larger and smaller effective count',
  ],
  pooled: ['Second test: pooled', 'z with both variances at the pooled share, two-sided p'],
  newcombe: ['Second test: hybrid score interval', 'excludes 0 at the level of this test'],
  fisher: [
    'Second test: Fisher, exact',
    'tables at most as probable as the observed one, on effective counts',
  ],
  'exact-binomial': ['Second test: exact binomial', '2 · the smaller binomial tail, on effective counts'],
};

function secondStep(test: SecondTest): WorkingStep {
  const [label, formula] = SECOND_WRITING[test.name];
  const substituted = `agrees: ${yesOrNo(test.significant)}`;
  return test.name === 'newcombe'
    ? { label, formula, substituted, result: figures(test.intervalPp), unit: 'points' }
    : { label, formula, substituted, result: figure(test.p), unit: '' };
}

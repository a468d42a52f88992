import { criticalAt } from './critical-at';
import type { Policy, TestFields, Verdict } from './check-types';
import type { Measured } from './measured';
import type { EstimateWriting } from './working-error';
import { figure, yesOrNo, type WorkingStep } from './working-step';

export const VERDICT_WORDS: Record<Verdict, string> = {
  holds: 'Holds',
  fragile: 'Fragile',
  'does-not-hold': 'Not shown',
  'cannot-be-tested': 'Cannot be tested',
};

/** The rules of the verdict one by one, and what stands beside it. */
export function verdictSteps(
  measured: Measured,
  fields: TestFields,
  writing: EstimateWriting,
  policy: Policy,
): WorkingStep[] {
  const ends: WorkingStep[] = (['low', 'high'] as const).map((end) => ({
    label: `Standard error at the ${end} end of the design effect`,
    ...writing.error(end),
    result: figure(100 * measured.standardError(end)),
    unit: 'points',
  }));
  const facts = {
    critical: criticalAt(fields.alpha, measured.df),
    low: 100 * measured.standardError('low'),
    high: 100 * measured.standardError('high'),
  };
  const rules = fields.verdict === 'does-not-hold' ? failedRules : passedRules;
  return [
    ...ends,
    significanceStep(fields),
    ...rules(fields, facts, measured, policy),
    {
      label: 'Verdict',
      formula: 'not shown if not significant; holds if every rule is met; else fragile',
      substituted: fields.reasons.length > 0 ? fields.reasons.join(', ') : 'no reasons',
      result: VERDICT_WORDS[fields.verdict],
      unit: '',
    },
  ];
}

type Facts = { critical: number; low: number; high: number };

function significanceStep({ p, alpha, verdict }: TestFields): WorkingStep {
  return {
    label: 'Significant',
    formula: 'p < α, and so is every better-ranked test of its family',
    substituted: `${figure(p)} < ${figure(alpha)}`,
    result: yesOrNo(verdict !== 'does-not-hold'),
    unit: '',
  };
}

function passedRules(fields: TestFields, { critical, high }: Facts, { bases }: Measured): WorkingStep[] {
  const size = Math.abs(fields.estimatePp);
  const rest = size - fields.roundingPp;
  const [s, r, c] = [figure(size), figure(fields.roundingPp), figure(critical)];
  const rule = (label: string, formula: string, substituted: string, met: boolean): WorkingStep => ({
    label,
    formula,
    substituted,
    result: yesOrNo(met),
    unit: '',
  });
  return [
    rule(
      'Survives rounding',
      '|estimate| − r > c · SE',
      `${s} − ${r} > ${c} · ${figure(fields.sePp)}`,
      rest > critical * fields.sePp,
    ),
    rule(
      'Survives the high design effect',
      '|estimate| > c · SE high',
      `${s} > ${c} · ${figure(high)}`,
      size > critical * high,
    ),
    rule(
      'Survives both together',
      '|estimate| − r > c · SE high',
      `${s} − ${r} > ${c} · ${figure(high)}`,
      rest > critical * high,
    ),
    rule(
      'Every second test agrees',
      'each significant, with the sign of the estimate',
      fields.secondTests.map(({ name }) => name).join(', ') || 'none applies',
      fields.secondTests.every(({ significant }) => significant),
    ),
    rule(
      'Probability samples only',
      'basis of every base is sampling',
      bases.map(({ basis }) => basis).join(', '),
      bases.every(({ basis }) => basis === 'sampling'),
    ),
    ...(fields.survivesTwiceError === null
      ? []
      : [
          rule(
            'Survives twice the sampling error',
            '|z| ≥ 2 · c',
            fields.z === null ? 'no variance' : `${figure(Math.abs(fields.z))} ≥ 2 · ${c}`,
            fields.survivesTwiceError,
          ),
        ]),
  ];
}

function failedRules(
  fields: TestFields,
  { critical, low, high }: Facts,
  { bases }: Measured,
  policy: Policy,
): WorkingStep[] {
  const [size, r, c] = [Math.abs(fields.estimatePp), figure(fields.roundingPp), figure(critical)];
  const isSampling = bases.every(({ basis }) => basis === 'sampling');
  return [
    {
      label: 'Would be significant if asked alone',
      formula: 'p < 1 − level',
      substituted: `${figure(fields.p)} < 1 − ${policy.level}`,
      result: yesOrNo(fields.p < 1 - policy.level),
      unit: '',
    },
    {
      label: 'Would hold at the low design effect',
      formula: 'p ≥ α, |estimate| > c · SE low, probability samples only',
      substituted: `${figure(fields.p)} ≥ ${figure(fields.alpha)}, ${figure(size)} > ${c} · ${figure(low)}`,
      result: yesOrNo(fields.p >= fields.alpha && size > critical * low && isSampling),
      unit: '',
    },
    ...(fields.detectable80Pp === null
      ? []
      : [
          {
            label: 'Difference found four times in five',
            formula: '(c + 0.841621) · SE high + r',
            substituted: `(${c} + 0.841621) · ${figure(high)} + ${r}`,
            result: figure(fields.detectable80Pp),
            unit: 'points' as const,
          },
        ]),
  ];
}

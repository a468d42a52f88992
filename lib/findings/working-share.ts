import { criticalAt } from './critical-at';
import type { BaseAnswer, Policy, ShareFinding } from './check-types';
import { figure, figures, inBrackets, type WorkingStep } from './working-step';

/** The interval and the maximum margin of a share; only what is printed where the base has no margin. */
export function shareSteps(
  finding: ShareFinding,
  { n, df }: { n: number | null; df: number | null },
  answer: BaseAnswer,
  policy: Policy,
): WorkingStep[] {
  const { estimatePct, intervalPct, method, option } = finding;
  const printed: WorkingStep = {
    label: 'Share as printed',
    formula: 'p',
    substituted: option,
    result: estimatePct === null ? 'not disclosed' : figure(estimatePct),
    unit: estimatePct === null ? '' : 'percent',
  };
  const { deff, nEff, maximumMarginPp } = answer;
  if (estimatePct === null || !intervalPct || nEff === null || deff === null || n === null) return [printed];

  const q = criticalAt(1 - policy.level, df);
  const interval =
    method === 'wilson' ? wilsonStep(estimatePct / 100, nEff, q) : exactStep(estimatePct / 100, nEff, policy);
  return [
    printed,
    quantileStep(policy.level, df, q),
    { ...interval, result: figures(intervalPct), unit: 'percent' },
    {
      label: 'Maximum margin of a share',
      formula: '100 · q · √(0.25 · d / n)',
      substituted: `100 · ${figure(q)} · √(0.25 · ${figure(deff)} / ${figure(n)})`,
      result: figure(maximumMarginPp ?? 0),
      unit: 'points',
    },
  ];
}

/** The quantile that intervals at the policy's level are made with. */
export function quantileStep(level: number, df: number | null, q: number): WorkingStep {
  return {
    label: 'Quantile for the interval',
    formula: df === null ? 'q = z((1 + level) / 2)' : 'q = t((1 + level) / 2; df)',
    substituted: df === null ? `z((1 + ${level}) / 2)` : `t((1 + ${level}) / 2; ${df})`,
    result: figure(q),
    unit: '',
  };
}

type IntervalStep = Omit<WorkingStep, 'result' | 'unit'>;

function wilsonStep(p: number, nEff: number, q: number): IntervalStep {
  const [share, size, quantile] = [figure(p), figure(nEff), figure(q)];
  return {
    label: 'Interval (score)',
    formula: '100 · (p + q² / (2 · nEff) ± q · √(p · (1 − p) / nEff + q² / (4 · nEff²))) / (1 + q² / nEff)',
    substituted: `100 · (${share} + ${quantile}² / (2 · ${size}) ± ${quantile} · √(${share} · (1 − ${share}) / ${size} + ${quantile}² / (4 · ${size}²))) / (1 + ${quantile}² / ${size})`,
  };
}

function exactStep(p: number, nEff: number, { level }: Policy): IntervalStep {
  const [count, size] = [inBrackets(nEff * p), figure(nEff)];
  return {
    label: 'Interval (exact, since a count is below 10)',
    formula:
      'beta quantiles: (1 − level) / 2 of Beta(x, nEff − x + 1), (1 + level) / 2 of Beta(x + 1, nEff − x)',
    substituted: `x = ${count}, nEff = ${size}, level = ${level}`,
  };
}

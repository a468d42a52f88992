import type { ChangeFinding, LeadChangeFinding, LeadFinding, Pair, ThresholdFinding } from './check-types';
import { proportionOf, type BaseFigures, type Sampled } from './base-figures';
import type { SampledBase } from './measure-change';
import { leadErrorAt } from './measure-lead';
import { deffAt, type DeffEnd } from './measured';
import { figure, inBrackets } from './working-step';

type Written = { formula: string; substituted: string };

/** How the estimate and its standard error are written for one kind of finding. */
export type EstimateWriting = { estimate: Written; error: (end: DeffEnd) => Written };

const percent = (base: BaseFigures, option: string) => figure(100 * proportionOf(base, option));

/** A lead on one base. */
export function writeLead({ pair }: Pick<LeadFinding, 'pair'>, one: SampledBase): EstimateWriting {
  return { estimate: leadEstimate(one.base, pair), error: (end) => leadError(one, pair, end) };
}

/** A share against a fixed value. */
export function writeThreshold(
  { option, thresholdPct }: Pick<ThresholdFinding, 'option' | 'thresholdPct'>,
  { base, sampled }: SampledBase,
): EstimateWriting {
  const p0 = figure(thresholdPct / 100);
  return {
    estimate: { formula: 'p − p₀', substituted: `${percent(base, option)} − ${figure(thresholdPct)}` },
    error: (end) => ({
      formula: '100 · √(d · p₀ · (1 − p₀) / n)',
      substituted: `100 · √(${shareVariance(p0, sampled, end)})`,
    }),
  };
}

/** The change of a share between two bases. */
export function writeChange(
  { option }: Pick<ChangeFinding, 'option'>,
  later: SampledBase,
  earlier: SampledBase,
): EstimateWriting {
  const variance = ({ base, sampled }: SampledBase, end: DeffEnd) =>
    shareVariance(figure(proportionOf(base, option)), sampled, end);
  return {
    estimate: {
      formula: 'p₂ − p₁',
      substituted: `${percent(later.base, option)} − ${percent(earlier.base, option)}`,
    },
    error: (end) => ({
      formula: '100 · √(d₁ · p₁ · (1 − p₁) / n₁ + d₂ · p₂ · (1 − p₂) / n₂)',
      substituted: `100 · √(${variance(earlier, end)} + ${variance(later, end)})`,
    }),
  };
}

/** The change of a lead between two bases. */
export function writeLeadChange(
  { pair }: Pick<LeadChangeFinding, 'pair'>,
  later: SampledBase,
  earlier: SampledBase,
): EstimateWriting {
  const error = (one: SampledBase, end: DeffEnd) =>
    figure(100 * leadErrorAt(one.base, one.sampled, pair, end));
  return {
    estimate: {
      formula: '(a₂ − b₂) − (a₁ − b₁)',
      substituted: `(${leadEstimate(later.base, pair).substituted}) − (${leadEstimate(earlier.base, pair).substituted})`,
    },
    error: (end) => ({
      formula: '√(SE₁² + SE₂²), each 100 · √(d · (a + b − (a − b)²) / n)',
      substituted: `√(${error(earlier, end)}² + ${error(later, end)}²)`,
    }),
  };
}

function leadEstimate(base: BaseFigures, [first, second]: Pair): Written {
  return { formula: 'a − b', substituted: `${percent(base, first)} − ${percent(base, second)}` };
}

function leadError({ base, sampled }: SampledBase, [first, second]: Pair, end: DeffEnd): Written {
  const [a, b] = [proportionOf(base, first), proportionOf(base, second)];
  const spread = `(${figure(a)} + ${figure(b)} − ${inBrackets(Number((a - b).toPrecision(12)))}²)`;
  return {
    formula: '100 · √(d · (a + b − (a − b)²) / n)',
    substituted: `100 · √(${figure(deffAt(sampled, end))} · ${spread} / ${figure(sampled.n)})`,
  };
}

function shareVariance(p: string, sampled: Sampled, end: DeffEnd): string {
  return `${figure(deffAt(sampled, end))} · ${p} · (1 − ${p}) / ${figure(sampled.n)}`;
}

import { criticalAt } from './critical-at';
import type { Base, BaseAnswer, DeffSource, Policy } from './check-types';
import { figure, figures, type WorkingStep } from './working-step';

/** Which base a step is about, where there are two. */
export type BaseRole = 'only' | 'this' | 'earlier' | 'group' | 'against' | 'whole';

export const ROLE_SUFFIX: Record<BaseRole, string> = {
  only: '',
  this: ', this release',
  earlier: ', earlier release',
  group: ', first group',
  against: ', second group',
  whole: ', whole sample',
};

const SOURCE_WORDS: Record<Exclude<DeffSource, 'implied'>, [formula: string, given: string]> = {
  design: ['computed from the design of the sample', 'as given'],
  kish: ['computed from the weights alone', 'as given'],
  stated: ['stated by the pollster', 'as given'],
  assumed: ['assumed by the policy of the desk', 'as the policy says'],
};

/** How the design effect of a base, its range and the effective sample size come about; none without a margin. */
export function baseSteps(base: Base, answer: BaseAnswer, policy: Policy, role: BaseRole): WorkingStep[] {
  const { deff, deffSource, deffRange, nEff, basis } = answer;
  if (deff === null || deffSource === null || deffRange === null || nEff === null || base.n === null)
    return [];
  const suffix = ROLE_SUFFIX[role];
  const stated = basis === 'modelled' ? base.modelledInterval : base.statedMargin;
  const steps =
    deffSource === 'implied' && stated
      ? impliedSteps(base.n, stated, answer, suffix)
      : givenSteps(deffSource === 'implied' ? 'stated' : deffSource, deff, policy, deffRange, suffix);
  return [
    ...steps,
    {
      label: `Effective sample size${suffix}`,
      formula: 'n / d',
      substituted: `${figure(base.n)} / ${figure(deff)}`,
      result: figure(nEff),
      unit: 'people',
    },
  ];
}

function impliedSteps(
  n: number,
  { pp, unit, level }: { pp: number; unit: number; level: number },
  { basis, deff, deffRange, notes }: BaseAnswer,
  suffix: string,
): WorkingStep[] {
  const z = figure(criticalAt(1 - level, null));
  const raised = deff === 1 && notes.includes('deff-below-one');
  const implied = (margin: number) => `(${figure(margin / 100)} / (${z} · √(0.25 / ${n})))²`;
  const source = basis === 'modelled' ? 'modelled interval' : 'stated margin';
  return [
    {
      label: `Design effect implied by the ${source}${suffix}`,
      formula: raised ? 'max(1, (m / (z · √(0.25 / n)))²)' : '(m / (z · √(0.25 / n)))²',
      substituted: raised ? `max(1, ${implied(pp)})` : implied(pp),
      result: figure(deff ?? 1),
      unit: '',
    },
    {
      label: `Range of the design effect${suffix}`,
      formula: 'the same at m ± half its rounding unit',
      substituted: `m from ${figure(pp - unit / 2)} to ${figure(pp + unit / 2)}`,
      result: figures(deffRange ?? [1, 1]),
      unit: '',
    },
  ];
}

function givenSteps(
  source: Exclude<DeffSource, 'implied'>,
  deff: number,
  policy: Policy,
  range: readonly [number, number],
  suffix: string,
): WorkingStep[] {
  const [formula, substituted] = SOURCE_WORDS[source];
  const [low, high] = policy.kishRange;
  const ofRange: Record<typeof source, [string, string]> = {
    design: ['d to d', 'as given'],
    stated: ['d to d', 'as given'],
    kish: ['low · d to high · d', `${figure(low)} · ${figure(deff)} to ${figure(high)} · ${figure(deff)}`],
    assumed: ['the range in the policy', 'as the policy says'],
  };
  return [
    { label: `Design effect${suffix}`, formula, substituted, result: figure(deff), unit: '' },
    {
      label: `Range of the design effect${suffix}`,
      formula: ofRange[source][0],
      substituted: ofRange[source][1],
      result: figures(range),
      unit: '',
    },
  ];
}

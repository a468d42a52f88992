import type { Policy, TestFields } from './check-types';
import { criticalAt } from './critical-at';
import type { Measured } from './measured';
import { figure, yesOrNo, type WorkingStep } from './working-step';

/** How far the design effect could rise; none where there is no variance. */
export function breakingSteps(
  fields: TestFields & { breakingDeff?: number | null; breakingFactor?: number | null },
  { df, bases }: Measured,
): WorkingStep[] {
  const { z, breakingDeff = null, breakingFactor = null } = fields;
  if (z === null) return [];
  const ratio = `(${figure(Math.abs(z))} / ${figure(criticalAt(fields.alpha, df))})²`;
  if (breakingDeff !== null) {
    return [
      {
        label: 'Design effect at which it would cease to be significant',
        formula: 'd · (z / c)²',
        substituted: `${figure(bases[0]?.deff.value ?? 1)} · ${ratio}`,
        result: figure(breakingDeff),
        unit: '',
      },
    ];
  }
  if (breakingFactor === null) return [];
  return [
    {
      label: 'Factor on both design effects at which it would cease to be significant',
      formula: '(z / c)²',
      substituted: ratio,
      result: figure(breakingFactor),
      unit: '',
    },
  ];
}

/** Whether a change that is not shown is shown to be small; none beside another verdict. */
export function littleSteps(
  fields: TestFields & { littleChanged: boolean },
  measured: Measured,
  earlierPct: number,
  policy: Policy,
): WorkingStep[] {
  if (fields.verdict !== 'does-not-hold') return [];
  const oneSided = criticalAt(2 * (1 - policy.level), measured.df);
  const [size, high] = [Math.abs(fields.estimatePp), 100 * measured.standardError('high')];
  return [
    {
      label: 'Little changed',
      formula: '|p₂ − p₁| + r + q₁ · SE high < the smaller of the margin of indifference and p₁ / 5',
      substituted: `${figure(size)} + ${figure(fields.roundingPp)} + ${figure(oneSided)} · ${figure(high)} < min(${figure(policy.indifferencePp)}, ${figure(earlierPct)} / 5)`,
      result: yesOrNo(fields.littleChanged),
      unit: '',
    },
  ];
}

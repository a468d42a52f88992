import type { WorkingStep } from '@/lib/findings/working-step';

const UNITS: Record<WorkingStep['unit'], string> = {
  '': '',
  points: ' points',
  percent: '%',
  people: ' people',
};

/** The worked calculation behind a finding: each step in symbols, then with its numbers, then what comes out. */
export function WorkingSteps({ steps }: { steps: readonly WorkingStep[] }) {
  return (
    <ol className="max-w-prose text-13">
      {steps.map(({ label, formula, substituted, result, unit }, at) => (
        <li key={`${at} ${label}`} className="border-t border-rule py-1.5 first:border-t-0">
          <span className="flex flex-wrap items-baseline justify-between gap-x-4">
            <span className="text-soft">{label}</span>
            <span className="font-semibold tabular-nums">
              {result}
              {UNITS[unit]}
            </span>
          </span>
          {formula === '' ? null : <span className="block tabular-nums">{formula}</span>}
          {substituted === '' || substituted === formula ? null : (
            <span className="block tabular-nums">= {substituted}</span>
          )}
        </li>
      ))}
    </ol>
  );
}

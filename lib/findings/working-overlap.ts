import type { WaveOverlap } from './judge-types';
import type { SampledBase } from './measure-change';
import { overlapDeffAt, waveShares, type Named } from './measure-overlap';
import type { TrackedWave } from './tracking-waves';
import { writeChange, writeLeadChange, type EstimateWriting } from './working-error';
import { figure, inBrackets, type WorkingStep } from './working-step';

/** A wave with the share of each name in it, 0–1. */
export type SharedWave = TrackedWave & { shares: number[] };

/** How the change between two averages with waves in common is written. */
export function writeOverlap(
  named: Named,
  later: SampledBase,
  earlier: SampledBase,
  waves: readonly SharedWave[],
): EstimateWriting {
  const [first, second] = named;
  const plain =
    second === undefined
      ? writeChange({ option: first }, later, earlier)
      : writeLeadChange({ pair: [first, second] }, later, earlier);
  const variance = second === undefined ? 'p · (1 − p)' : '(a + b − (a − b)²)';
  const terms = waves.filter(({ weightChange }) => Math.abs(weightChange) > 1e-12).map(termOf);
  return {
    estimate: plain.estimate,
    error: (end) => ({
      formula: `100 · √(d · Σ (w₂ − w₁)² · ${variance} / n), over the waves whose weight changes`,
      substituted: `100 · √(${figure(overlapDeffAt(earlier, later, end))} · (${terms.join(' + ')}))`,
    }),
  };
}

/** Which waves are compared, and the share that stands for those whose own is not known. */
export function overlapSteps(
  named: Named,
  later: SampledBase,
  earlier: SampledBase,
  overlap: WaveOverlap,
): WorkingStep[] {
  const { window, shared, interviews, shares } = overlap;
  const places = 2 * window - shared;
  const pooled = waveShares(earlier, later, named, { window, shared }, 0);
  const isKnown = named.every((name) => shares?.some(({ option }) => option === name));
  return [
    {
      label: 'Waves not shared',
      formula: '2 · (window − shared)',
      substituted: `2 · (${window} − ${shared})`,
      result: figure(2 * (window - shared)),
      unit: '',
    },
    {
      label: 'Interviews of a wave',
      formula: interviews ? 'as given, waves weighted by them' : 'taken as equal: n / window',
      substituted: interviews ? interviews.join(', ') : `of ${places} waves`,
      result: interviews
        ? 'as given'
        : `${figure(earlier.sampled.n / window)}, later ${figure(later.sampled.n / window)}`,
      unit: '',
    },
    ...(isKnown
      ? []
      : named.map((name, place): WorkingStep => ({
          label: `${name}, pooled over both averages`,
          formula: '(n₁ · p₁ + n₂ · p₂) / (n₁ + n₂)',
          substituted: 'stands for the share of every wave',
          result: figure(100 * (pooled[place] ?? 0)),
          unit: 'percent',
        }))),
  ];
}

function termOf({ weightChange, interviews, shares: [a = 0, b] }: SharedWave): string {
  const weight = `${figure(Math.abs(weightChange))}²`;
  const spread =
    b === undefined
      ? `${figure(a)} · (1 − ${figure(a)})`
      : `(${figure(a)} + ${figure(b)} − ${inBrackets(Number((a - b).toPrecision(12)))}²)`;
  return `${weight} · ${spread} / ${figure(interviews)}`;
}

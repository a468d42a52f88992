import type { Base, CheckDocument } from '@/lib/findings/check-types';

const NAMES = ['Alder', 'Brook', 'Calder', 'Dunmor', 'Undecided'];

function base(n: number, deff: number, pcts: readonly number[]): Base {
  const shares = pcts.map((pct, index) => ({ option: NAMES[index] ?? `Option ${index + 1}`, pct }));
  return {
    sampleSource: 'probability',
    n,
    design: 'weighted',
    deff: { source: 'design', value: deff },
    decimals: 0,
    shares,
  };
}

/** A release as desks get them: five answers, the wave before, the usual questions. */
export const exampleRelease: CheckDocument = {
  release: base(1012, 1.32, [44, 36, 8, 5, 7]),
  previous: base(1004, 1.4, [41, 38, 9, 5, 7]),
  pairs: [['Alder', 'Brook']],
  changes: ['Alder', 'Brook'],
  thresholds: [{ option: 'Alder', pct: 50 }],
};

/** The same with as many options as asked, every neighbouring pair and every change. */
export function releaseOf(options: number): CheckDocument {
  const names = Array.from({ length: options }, (_, index) => `Option ${index + 1}`);
  const baseOf = (n: number, shift: number): Base => ({
    ...base(n, 1.32, []),
    decimals: 2,
    shares: names.map((option, index) => ({
      option,
      pct: Math.round((10_000 * (index + shift)) / (0.5 * options * (options + 1 + 2 * shift))) / 100,
    })),
  });
  return {
    release: baseOf(4012, 2),
    previous: baseOf(4004, 1),
    pairs: names.slice(1).map((option, index) => [names[index] ?? '', option] as const),
    changes: names,
  };
}

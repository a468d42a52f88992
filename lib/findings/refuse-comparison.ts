import { CheckRefused } from './check-refused';
import type { QuestionBase, ReleaseDocument, WaveOverlap } from './judge-types';
import { refuseRepeated, UNKNOWN_OPTION } from './refuse-questions';

/**
 * Refuses a comparison whose outcome contradicts its differences, or whose waves do not fit its averages.
 *
 * @throws CheckRefused with the path of the field
 */
export function refuseFaultyComparison({ release, comparison, blocs = [] }: ReleaseDocument): void {
  if (!comparison) return;
  const { comparability, overlap, base } = comparison;
  if (comparability && comparability.comparable !== (comparability.differences.length === 0)) {
    throw new CheckRefused(
      'comparison.comparability.comparable',
      'Two releases compare where no difference is listed, and only there.',
    );
  }
  if (!overlap) return;
  refuseFaultyWaves(overlap, base, release);
  const names = new Set([...release.shares.map(({ option }) => option), ...blocs.map(({ name }) => name)]);
  const given = new Set<string>();
  (overlap.shares ?? []).forEach(({ option, pct }, index) => {
    const path = `comparison.overlap.shares[${index}]`;
    if (!names.has(option)) throw new CheckRefused(`${path}.option`, UNKNOWN_OPTION);
    refuseRepeated(given, option, path);
    refuseWrongLength(pct, overlap, `${path}.pct`);
  });
}

function refuseFaultyWaves(overlap: WaveOverlap, earlier: QuestionBase, later: QuestionBase): void {
  const { window, shared, interviews } = overlap;
  const path = 'comparison.overlap';
  if (shared > window) {
    throw new CheckRefused(`${path}.shared`, 'No more waves are shared than an average has.');
  }
  if (!interviews) return;
  refuseWrongLength(interviews, overlap, `${path}.interviews`);
  const sum = (counts: readonly number[]) => counts.reduce((all, count) => all + count, 0);
  const sums: [number, number | null][] = [
    [sum(interviews.slice(0, window)), earlier.n],
    [sum(interviews.slice(window - shared)), later.n],
  ];
  if (sums.some(([counted, n]) => n !== null && counted !== n)) {
    throw new CheckRefused(`${path}.interviews`, 'The waves of an average sum to its sample size.');
  }
}

function refuseWrongLength(list: readonly number[], { window, shared }: WaveOverlap, path: string): void {
  if (list.length !== 2 * window - shared) {
    throw new CheckRefused(path, 'Two averages have twice the window, less the shared, waves in all.');
  }
}

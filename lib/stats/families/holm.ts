import { isProportion, required } from '../require';
import { nearlyEqual } from '../nearly-equal';

const ZERO_FOR_RANKING = 1e-300;

export type HolmResult = {
  /** The error probability that this one is tested at. */
  alpha: number;
  /** p is below its alpha, and so is every better-ranked one's. */
  significant: boolean;
  pAdjusted: number;
};

/**
 * Holm's procedure: what several tests asked at once must each reach, so that one false alarm among all of them
 * stays as rare as alpha.
 *
 * p-values that differ by less than 1e-9 relatively, or are both below 1e-300, rank in the order given.
 *
 * @param pValues two-sided p-values 0–1, in any order
 * @param alpha error probability of the whole family, inside 0–1
 * @returns one entry for each p-value, in the order given; empty for none
 * @throws RangeError `holm requires p-values from 0 to 1`
 * @throws RangeError `holm requires alpha inside 0 and 1`
 * @see Holm (1979), Scandinavian Journal of Statistics 6, 65–70 (from memory); adjusted values as R 4.2.2
 *   `p.adjust(p, "holm")`
 * @example
 * holm([0.04, 0.01], 0.05).map((one) => one.pAdjusted); // => [0.04, 0.02]
 * holm([0.04, 0.03], 0.05).map((one) => one.significant); // => [false, false]
 */
export function holm(pValues: readonly number[], alpha: number): HolmResult[] {
  required(pValues.every(isProportion), 'holm', 'p-values from 0 to 1');
  required(alpha > 0 && alpha < 1, 'holm', 'alpha inside 0 and 1');
  const results = new Map<number, HolmResult>();
  let largest = 0;
  let allSignificant = true;
  rankedOrder(pValues).forEach(({ p, index }, rank) => {
    const remaining = pValues.length - rank;
    largest = Math.max(largest, Math.min(1, remaining * p));
    allSignificant &&= p < alpha / remaining;
    results.set(index, { alpha: alpha / remaining, significant: allSignificant, pAdjusted: largest });
  });
  return [...results].sort(([a], [b]) => a - b).map(([, result]) => result);
}

type Ranked = { p: number; index: number };

/** Ascending, then runs of values that count as equal put back into the order given. */
function rankedOrder(pValues: readonly number[]): Ranked[] {
  const ascending = pValues.map((p, index) => ({ p, index })).sort((a, b) => a.p - b.p || a.index - b.index);
  const runs: Ranked[][] = [];
  for (const one of ascending) {
    const run = runs.at(-1);
    const last = run?.at(-1);
    if (run && last && rankEqually(last.p, one.p)) run.push(one);
    else runs.push([one]);
  }
  return runs.flatMap((run) => run.sort((a, b) => a.index - b.index));
}

function rankEqually(a: number, b: number): boolean {
  return nearlyEqual(a, b) || (a < ZERO_FOR_RANKING && b < ZERO_FOR_RANKING);
}

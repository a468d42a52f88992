import { solveWeighed, type Level } from './solve-level';
import { weighPolls } from './weigh-polls';

/** Standard deviations, ascending, at which the restricted likelihood is looked at: of a day's step, and extra per poll. */
export type VarianceGrid = { readonly stateSds: readonly number[]; readonly extraSds: readonly number[] };

export type GridCounts = { readonly state: number; readonly extra: number };

/** Log likelihoods of a grid, one row per extra standard deviation. */
export type GridLikelihood = { readonly grid: VarianceGrid; readonly rows: readonly (readonly number[])[] };

const STEP = 4;
const SMALL = 0.1;
/** Below the maximum by more than this, a value of the profile has no weight that shows. */
const NEGLIGIBLE = 7;
const SPREAD = 2;
const MOST_ROUNDS = 8;

export function evaluateGrid(level: Level, grid: VarianceGrid): GridLikelihood {
  const rows = grid.extraSds.map((extraSd) => {
    weighPolls(level.arranged, extraSd * extraSd, level.weighed);
    return grid.stateSds.map((stateSd) => {
      solveWeighed(level, stateSd * stateSd);
      return level.logLikelihoodFlat;
    });
  });
  return { grid, rows };
}

/** A wide grid: 0, then steps of a factor from far below what the series can show up to twice its own spread. */
export function wideGrid(level: Level): VarianceGrid {
  const { value, sampling, days } = level.arranged;
  const count = value.length;
  const mean = value.reduce((sum, one) => sum + one / count, 0);
  const spread = Math.sqrt(value.reduce((sum, one) => sum + (one - mean) ** 2 / count, 0));
  const noise = Math.sqrt(sampling.reduce((sum, one) => sum + one / count, 0));
  const largest = 2 * Math.max(spread, noise);
  const dayCount = days.lastDay - days.firstDay + 1;
  return {
    stateSds: geometric((SMALL * largest) / Math.sqrt(count * dayCount), largest),
    extraSds: geometric(SMALL * Math.max(noise, largest / 100), largest),
  };
}

function geometric(smallest: number, largest: number): number[] {
  const values = [0];
  for (let value = smallest; value < largest; value *= STEP) values.push(value);
  return [...values, largest];
}

/**
 * The region of a grid that has weight, cut into equal steps. It is narrowed one standard deviation at a time, the
 * other held at its best, until the weight spreads over several steps of both.
 */
export function narrowGrid(level: Level, found: GridLikelihood, counts: GridCounts): VarianceGrid {
  let { stateSds, extraSds } = found.grid;
  let { stateSd, extraSd } = bestNode(found);
  let isSpread = false;
  for (let round = 0; round < MOST_ROUNDS && !isSpread; round += 1) {
    const alongState = evaluateGrid(level, { stateSds, extraSds: [extraSd] });
    ({ stateSd } = bestNode(alongState));
    const alongExtra = evaluateGrid(level, { stateSds: [stateSd], extraSds });
    ({ extraSd } = bestNode(alongExtra));
    const [firstState, lastState] = support(alongState.rows.flat());
    const [firstExtra, lastExtra] = support(alongExtra.rows.flat());
    isSpread = round > 0 && lastState - firstState >= SPREAD && lastExtra - firstExtra >= SPREAD;
    stateSds = equalSteps(stateSds, [firstState, lastState], counts.state);
    extraSds = equalSteps(extraSds, [firstExtra, lastExtra], counts.extra);
  }
  return { stateSds, extraSds };
}

function support(profile: readonly number[]): [first: number, last: number] {
  const best = Math.max(...profile);
  const counts = profile.map((value) => value > best - NEGLIGIBLE);
  return [counts.indexOf(true), counts.lastIndexOf(true)];
}

function equalSteps(values: readonly number[], [first, last]: [number, number], count: number): number[] {
  const low = values[Math.max(0, first - 1)]!;
  const high = values[Math.min(values.length - 1, last + 1)]!;
  return Array.from({ length: count }, (_, index) => low + ((high - low) * index) / (count - 1));
}

/** Where the likelihood of a grid is largest. */
export function bestNode({ grid, rows }: GridLikelihood): { stateSd: number; extraSd: number } {
  let best = { value: -Infinity, stateSd: 0, extraSd: 0 };
  rows.forEach((row, index) =>
    row.forEach((value, column) => {
      if (value <= best.value) return;
      best = { value, stateSd: grid.stateSds[column]!, extraSd: grid.extraSds[index]! };
    }),
  );
  return { stateSd: best.stateSd, extraSd: best.extraSd };
}

/** Weights of the nodes, which sum to 1: likelihood, flat in both standard deviations, by the trapezoidal rule. */
export function gridWeights({ rows }: GridLikelihood): number[][] {
  const best = Math.max(...rows.map((row) => Math.max(...row)));
  const edge = (index: number, count: number) => (index === 0 || index === count - 1 ? 0.5 : 1);
  const raw = rows.map((row, index) =>
    row.map((value, column) => Math.exp(value - best) * edge(index, rows.length) * edge(column, row.length)),
  );
  const sum = raw.reduce((total, row) => total + row.reduce((part, value) => part + value, 0), 0);
  return raw.map((row) => row.map((value) => value / sum));
}

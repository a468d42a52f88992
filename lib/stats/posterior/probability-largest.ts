import gammaLogpdf from '@stdlib/stats-base-dists-gamma-logpdf';
import { required } from '../require';
import { chebyshevPanel } from './chebyshev';

const PANEL = chebyshevPanel(20);
/** Of √G, whose standard deviation is about a half whatever alpha: beyond lies less than 1e-30. */
const REACH = 6;
/** The first panels are halved towards 0 so often that a fractional power there does no harm. */
const SMALLEST_EDGE = 2 ** -30;

/**
 * For each share of a Dirichlet distribution the probability that it is the largest of all.
 *
 * Shares are gamma variables over their sum, so the largest share is the largest gamma variable: the density of
 * each, times the distribution functions of the others, is integrated over panels of the square root.
 *
 * @param alpha two or more parameters of at least 1
 * @returns probabilities that sum to 1, exact to about 1e-11; those below 1e-20 may come as 0
 * @throws RangeError `probabilityLargest requires two or more alphas of at least 1`
 * @see R 4.2.2 quadrature over `dgamma` and `pgamma`
 * @example
 * probabilityLargest([41, 33, 11])[0]; // => 0.8254081...
 */
export function probabilityLargest(alpha: readonly number[]): number[] {
  const usable = alpha.every((one) => one >= 1 && Number.isFinite(one));
  required(usable && alpha.length >= 2, 'probabilityLargest', 'two or more alphas of at least 1');
  const reached = alpha.map(() => 0);
  const largest = alpha.map(() => 0);
  for (const [from, to] of panels(alpha)) {
    const densities = alpha.map((one) => densitiesIn(from, to, one));
    const functions = densities.map((values, option) => runningFrom(reached[option] ?? 0, values));
    densities.forEach((values, option) => {
      const others = functions.filter((_, other) => other !== option);
      const joint = values?.map((value, point) =>
        others.reduce((product, one) => product * at(one, point), value),
      );
      largest[option] = at(largest, option) + (joint ? whole(joint) : 0);
      reached[option] = at(functions[option] ?? [], PANEL.points.length - 1);
    });
  }
  const sum = largest.reduce((total, one) => total + one, 0);
  return largest.map((one) => one / sum);
}

/** Density of √G at the points of a panel, times half its width; null where it is negligible throughout. */
function densitiesIn(from: number, to: number, alpha: number): number[] | null {
  const [lowest, highest] = reachOf(alpha);
  if (to <= lowest || from >= highest) return null;
  return PANEL.points.map((point) => {
    const root = (from + to + (to - from) * point) / 2;
    return (to - from) * root * Math.exp(gammaLogpdf(root * root, alpha, 1));
  });
}

function reachOf(alpha: number): [lowest: number, highest: number] {
  return [Math.max(0, Math.sqrt(alpha) - REACH), Math.sqrt(alpha) + REACH];
}

/** Panels at most 1 wide over wherever some density is not negligible, ascending. */
function panels(alpha: readonly number[]): [from: number, to: number][] {
  const reaches = alpha.map(reachOf);
  const highest = Math.max(...reaches.map(([, end]) => end));
  const all: [number, number][] = [];
  const add = (from: number, to: number) => {
    if (reaches.some(([low, high]) => to > low && from < high)) all.push([from, to]);
  };
  let edge = Math.min(...reaches.map(([low]) => Math.floor(low)));
  if (edge === 0) {
    add(0, SMALLEST_EDGE);
    for (edge = SMALLEST_EDGE; edge < 1; edge *= 2) add(edge, 2 * edge);
  }
  for (; edge < highest; edge += 1) add(edge, edge + 1);
  return all;
}

function runningFrom(start: number, values: readonly number[] | null): number[] {
  return PANEL.running.map((row) => (values ? start + dot(row, values) : start));
}

function whole(values: readonly number[]): number {
  return dot(PANEL.running.at(-1) ?? [], values);
}

function dot(row: readonly number[], values: readonly number[]): number {
  return row.reduce((sum, weight, index) => sum + weight * at(values, index), 0);
}

function at(values: readonly number[], index: number): number {
  return values[index] ?? 0;
}

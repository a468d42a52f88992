import { criticalValue, roundingHalfWidth } from '@/lib/stats';
import { boundedMemo } from './bounded-memo';

const COVERAGE = 0.95;
/** roundingHalfWidth takes at most so many. */
const FEW = 4;
const BISECTIONS = 60;
/** One uniform alone has 0.84 of its normal bound, sums of several more. */
const LEAST_OF_BOUND = 0.8;
/** Beyond this the alternating terms cancel too many digits. */
const LARGEST_TERM = 1e3;

/**
 * How far the rounding of the printed figures in an estimate reaches with 95 percent probability.
 *
 * Each hides an error uniform within half its unit. Exact for up to four figures; for the many of a bloc exact while
 * the arithmetic keeps its digits, else the normal bound, which at 95 percent is never narrower.
 *
 * @param unitsPp rounding unit of each printed figure, in points, above 0, at least one
 * @returns half-width in points
 * @throws RangeError `roundingAllowancePp requires at least one unit, each above 0`
 * @example
 * roundingAllowancePp([1]); // => 0.475
 * roundingAllowancePp([1, 1]); // => 0.776393202250021
 * roundingAllowancePp([1, 1, 1, 1, 1]); // => 1.2538943...
 */
export function roundingAllowancePp(unitsPp: readonly number[]): number {
  if (unitsPp.length === 0 || !unitsPp.every((unit) => unit > 0 && unit < Infinity)) {
    throw new RangeError('roundingAllowancePp requires at least one unit, each above 0');
  }
  const [unit = 1] = unitsPp;
  if (unitsPp.length <= FEW && unitsPp.every((other) => other === unit)) {
    return (ofEqual(unitsPp.length) * unit) / 2;
  }
  return allowanceOf([...unitsPp].sort((a, b) => b - a).join(' '));
}

/** In half units: what scales with the unit. */
const ofEqual = boundedMemo((count: number) => roundingHalfWidth(Array(count).fill(1), COVERAGE), FEW);

const allowanceOf = boundedMemo((units: string) => {
  const unitsPp = units.split(' ').map(Number);
  if (unitsPp.length <= FEW) {
    return roundingHalfWidth(
      unitsPp.map((unit) => unit / 2),
      COVERAGE,
    );
  }
  return exactForMany(unitsPp) ?? normalBound(unitsPp);
}, 512);

function normalBound(unitsPp: readonly number[]): number {
  const variance = unitsPp.reduce((sum, unit) => sum + unit ** 2 / 12, 0);
  return criticalValue(1 - COVERAGE, null) * Math.sqrt(variance);
}

type Corner = { at: number; count: number };

/** By the closed form of the upper tail; null where its terms would cancel the digits. */
function exactForMany(unitsPp: readonly number[]): number | null {
  const largest = unitsPp[0] ?? 1;
  const widths = unitsPp.map((unit) => unit / largest);
  const scale = widths.reduce((product, width, index) => product * width * (index + 1), 1);
  const reach = widths.reduce((sum, width) => sum + width / 2, 0);
  const corners = signedCorners(widths, reach);
  const termsAt = (x: number) =>
    corners.map(({ at, count }) => (count * Math.max(0, reach - x - at) ** widths.length) / scale);

  let high = normalBound(widths);
  let low = LEAST_OF_BOUND * high;
  if (termsAt(low).some((term) => Math.abs(term) > LARGEST_TERM)) return null;
  for (let step = 0; step < BISECTIONS; step += 1) {
    const middle = (low + high) / 2;
    const tail = termsAt(middle).reduce((sum, term) => sum + term, 0);
    if (tail > (1 - COVERAGE) / 2) low = middle;
    else high = middle;
  }
  return ((low + high) / 2) * largest;
}

/** Sums of some of the widths, each counted with the sign of how many they are; those that no tail reaches left out. */
function signedCorners(widths: readonly number[], reach: number): Corner[] {
  const counts = new Map<number, number>([[0, 1]]);
  for (const width of widths) {
    for (const [at, count] of [...counts]) {
      const next = Number((at + width).toPrecision(12));
      if (next < reach) counts.set(next, (counts.get(next) ?? 0) - count);
    }
  }
  return [...counts].map(([at, count]) => ({ at, count }));
}

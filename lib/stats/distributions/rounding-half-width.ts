import { isInside, isPositive, required } from '../require';

/** Two-point Gauss–Legendre rule: exact for the cubic pieces that a sum of four uniforms is made of. */
const GAUSS = 1 / Math.sqrt(3);
const BISECTIONS = 60;

/**
 * How far the sum of several rounding errors reaches either way with the given probability.
 *
 * A number printed in whole percents hides an error uniform within half a unit; a lead hides two of them, the
 * change of a lead four. The distribution of their sum is computed exactly, also for unequal units.
 *
 * @param halfUnits half the rounding unit of each printed number, above 0, one to four of them
 * @param coverage probability, inside 0–1
 * @returns the half-width, in the unit of halfUnits
 * @throws RangeError `roundingHalfWidth requires one to four half units above 0`
 * @throws RangeError `roundingHalfWidth requires coverage inside 0 and 1`
 * @see the uniform and triangular distributions in closed form; four equal units checked by simulation
 * @example
 * roundingHalfWidth([0.5], 0.95); // => 0.475
 * roundingHalfWidth([0.5, 0.5], 0.95); // => 0.776393202250021
 * roundingHalfWidth([0.5, 0.5, 0.5, 0.5], 0.95); // => 1.1198...
 */
export function roundingHalfWidth(halfUnits: readonly number[], coverage: number): number {
  const count = halfUnits.length;
  required(
    count >= 1 && count <= 4 && halfUnits.every(isPositive),
    'roundingHalfWidth',
    'one to four half units above 0',
  );
  required(isInside(coverage), 'roundingHalfWidth', 'coverage inside 0 and 1');
  const widest = Math.max(...halfUnits);
  const scaled = halfUnits.map((half) => half / widest).sort((a, b) => b - a);
  const target = (1 + coverage) / 2;
  let low = 0;
  let high = scaled.reduce((sum, half) => sum + half, 0);
  for (let step = 0; step < BISECTIONS; step += 1) {
    const middle = (low + high) / 2;
    if (sumOfUniformsCdf(middle, scaled) < target) low = middle;
    else high = middle;
  }
  return ((low + high) / 2) * widest;
}

/** P(U₁ + … + U_k ≤ x), each U uniform within ± its half-width: the mean over the last of the rest's. */
function sumOfUniformsCdf(x: number, halfWidths: readonly number[]): number {
  const rest = halfWidths.slice(0, -1);
  const last = halfWidths.at(-1) ?? 0;
  if (rest.length === 0) return Math.min(1, Math.max(0, (x + last) / (2 * last)));

  const kinks = corners(rest)
    .map((corner) => x - corner)
    .filter((kink) => kink > -last && kink < last);
  const knots = [-last, ...kinks, last].sort((a, b) => a - b);
  let area = 0;
  for (let piece = 1; piece < knots.length; piece += 1) {
    const from = knots[piece - 1] ?? 0;
    const to = knots[piece] ?? 0;
    if (to === from) continue;
    const middle = (from + to) / 2;
    const half = (to - from) / 2;
    const left = sumOfUniformsCdf(x - middle + half * GAUSS, rest);
    const right = sumOfUniformsCdf(x - middle - half * GAUSS, rest);
    area += half * (left + right);
  }
  return area / (2 * last);
}

/** Where the polynomial pieces of the distribution meet: every sum with each half-width taken plus or minus. */
function corners(halfWidths: readonly number[]): number[] {
  return halfWidths.reduce<number[]>(
    (sums, half) => [...new Set(sums.flatMap((sum) => [sum - half, sum + half]))],
    [0],
  );
}

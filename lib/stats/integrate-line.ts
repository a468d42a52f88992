const NEGLIGIBLE = 1e-18;
const SETTLED = 1e-7;
const MOST_HALVINGS = 14;
const MOST_TERMS = 200_000;

/**
 * The integral over the whole line of a smooth function with one hump that dies out exponentially on both sides.
 *
 * The plain trapezoidal rule is what converges fastest here: each halving of the step at least squares the error,
 * so that two sums that agree to 1e-7 leave an error below rounding.
 *
 * @param term never negative
 * @param start a point where the function is not negligible
 * @param step a first step, about the width of the hump
 * @see Trefethen and Weideman (2014), SIAM Review 56, 385–458 (from memory)
 */
export function integrateLine(term: (u: number) => number, start: number, step: number): number {
  const right = walk(term, start, step);
  const left = walk(term, start, -step);
  let sum = term(start) + right.sum + left.sum;
  let total = sum * step;
  let gaps = right.steps + left.steps;
  let width = step;
  const from = start - left.steps * step;
  for (let halving = 0; halving < MOST_HALVINGS; halving += 1) {
    for (let gap = 0; gap < gaps; gap += 1) sum += term(from + (gap + 0.5) * width);
    width /= 2;
    gaps *= 2;
    const before = total;
    total = sum * width;
    if (Math.abs(total - before) <= SETTLED * total) break;
  }
  return total;
}

/** Goes on while the terms rise, or are not yet negligible beside the largest. */
function walk(term: (u: number) => number, start: number, step: number): { sum: number; steps: number } {
  let last = term(start);
  let largest = last;
  let sum = 0;
  let steps = 0;
  while (steps < MOST_TERMS) {
    steps += 1;
    const one = term(start + steps * step);
    sum += one;
    if (one <= last && one <= NEGLIGIBLE * largest) break;
    largest = Math.max(largest, one);
    last = one;
  }
  return { sum, steps };
}

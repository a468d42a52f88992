const EPSILON = 2 ** -52;
const MOST_STEPS = 200;

/**
 * Where a continuous function crosses 0 between two points at which its signs differ.
 *
 * Bisection that takes the step of inverse quadratic interpolation wherever that is safe: never slower than
 * halving, and a handful of calls for a smooth function.
 *
 * @param tolerance how close is close enough, at least 0; a few units in the last place are always enough
 * @returns a point that close to the crossing
 * @see Chandrupatla (1997), Advances in Engineering Software 28, 145–149 (from memory)
 */
export function findRoot(f: (x: number) => number, from: number, to: number, tolerance = 0): number {
  let [newest, opposite, older] = [to, from, from];
  let [atNewest, atOpposite] = [f(to), f(from)];
  let atOlder = atOpposite;
  let part = 0.5;
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const closest = Math.abs(atOpposite) < Math.abs(atNewest) ? opposite : newest;
    if (atNewest === 0 || atOpposite === 0) return closest;
    const width = Math.abs(opposite - newest);
    const smallest = (2 * EPSILON * Math.abs(closest) + tolerance / 2 + Number.MIN_VALUE) / width;
    if (smallest > 0.5) return closest;
    const next = newest + Math.min(1 - smallest, Math.max(smallest, part)) * (opposite - newest);
    const atNext = f(next);
    const sameSide = Math.sign(atNext) === Math.sign(atNewest);
    [older, atOlder] = sameSide ? [newest, atNewest] : [opposite, atOpposite];
    if (!sameSide) [opposite, atOpposite] = [newest, atNewest];
    [newest, atNewest] = [next, atNext];
    part = interpolated(newest, atNewest, opposite, atOpposite, older, atOlder);
  }
  return newest;
}

/** The part of the way from a to b at which the parabola through all three is 0; a half where it is not to be trusted. */
function interpolated(a: number, fa: number, b: number, fb: number, c: number, fc: number): number {
  const x = (a - b) / (c - b);
  const y = (fa - fb) / (fc - fb);
  if (!(y * y < x && (1 - y) ** 2 < 1 - x)) return 0.5;
  return (fa / (fb - fa)) * (fc / (fb - fc)) + ((c - a) / (b - a)) * (fa / (fc - fa)) * (fb / (fc - fb));
}

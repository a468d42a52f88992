import type { Level } from './solve-level';

/**
 * What the uncertainty of the house effects adds to the variance of the level, as products of the columns a with
 * their covariance C. On the way from a knot to the next they interpolate, so three numbers per knot serve every day.
 */
export type HouseUncertainty = {
  /** a'Ca of the filtered columns; of the filtered with the next knot's smoothed; of the smoothed. */
  readonly filtered: Float64Array;
  readonly across: Float64Array;
  readonly smoothed: Float64Array;
};

/** Null without houses. C·a is carried from knot to knot like the columns, so no product of matrices is needed. */
export function houseUncertainty(level: Level): HouseUncertainty | null {
  const { columns, houses, arranged, gains, weighed } = level;
  if (!columns || !houses) return null;
  const { groups } = columns;
  const { knotCells, cellHouse } = arranged;
  const knots = arranged.knotDay.length;
  const filtered = new Float64Array(knots);
  const across = new Float64Array(knots);
  const smoothed = new Float64Array(knots);
  const product = new Float64Array(groups);
  for (let knot = 0; knot < knots; knot += 1) {
    const here = knot * groups;
    const next = knot + 1 < knots ? here + groups : here;
    const kept = gains.keep[knot]!;
    const share = gains.gain[knot]! / (gains.weight[knot]! || 1);
    for (let group = 0; group < groups; group += 1) product[group]! *= kept;
    for (let cell = knotCells[knot]!; cell < knotCells[knot + 1]!; cell += 1) {
      const row = cellHouse[cell]! * groups;
      const weight = share * weighed.precision[cell]!;
      for (let group = 0; group < groups; group += 1)
        product[group]! += weight * houses.covariance[row + group]!;
    }
    let own = 0;
    let further = 0;
    for (let group = 0; group < groups; group += 1) {
      own += product[group]! * columns.filtered[here + group]!;
      further += product[group]! * columns.smoothed[next + group]!;
    }
    filtered[knot] = Math.max(0, own);
    across[knot] = further;
  }
  smoothed[knots - 1] = filtered[knots - 1]!;
  for (let knot = knots - 2; knot >= 0; knot -= 1) {
    const follow = gains.follow[knot]!;
    smoothed[knot] = betweenKnots(filtered[knot]!, across[knot]!, smoothed[knot + 1]!, follow);
  }
  return { filtered, across, smoothed };
}

/** The product for (1 − follow)·filtered + follow·next smoothed. */
export function betweenKnots(own: number, across: number, next: number, follow: number): number {
  const stay = 1 - follow;
  return Math.max(0, stay * stay * own + 2 * stay * follow * across + follow * follow * next);
}

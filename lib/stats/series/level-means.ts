import type { Arranged } from './arrange-polls';
import type { Gains } from './level-gains';
import type { Weighed } from './weigh-polls';

/** The level at each knot, given the values up to it and given all of them. */
export type Means = {
  readonly filtered: Float64Array;
  readonly smoothed: Float64Array;
  /** Weighted squares of the innovations and within knots. */
  squares: number;
};

export function makeMeans(arranged: Arranged): Means {
  const knots = arranged.knotDay.length;
  return { filtered: new Float64Array(knots), smoothed: new Float64Array(knots), squares: 0 };
}

/** Runs the values forward and back, less the effect of each house (the entry after the last house is 0). */
export function computeMeans(
  arranged: Arranged,
  weighed: Weighed,
  gains: Gains,
  effects: Float64Array,
  means: Means,
): void {
  const { knotCells, cellHouse, isExact, exactValue } = arranged;
  const { weight, gain, innovation, follow } = gains;
  const { filtered, smoothed } = means;
  const knots = filtered.length;
  let squares = weighed.squares;
  let level = 0;
  for (let knot = 0; knot < knots; knot += 1) {
    let total = 0;
    let mean = 0;
    for (let cell = knotCells[knot]!; cell < knotCells[knot + 1]!; cell += 1) {
      const precision = weighed.precision[cell]!;
      const value = weighed.mean[cell]! - effects[cellHouse[cell]!]!;
      if (total === 0) {
        total = precision;
        mean = value;
        continue;
      }
      const distance = value - mean;
      const inverse = 1 / (total + precision);
      mean += distance * precision * inverse;
      squares += distance * distance * precision * total * inverse;
      total += precision;
    }
    if (isExact[knot] === 1) {
      const surprise = exactValue[knot]! - level;
      squares += surprise * surprise * innovation[knot]!;
      level = exactValue[knot]!;
      squares += (mean - level) * (mean - level) * weight[knot]!;
    } else {
      const surprise = mean - level;
      squares += surprise * surprise * innovation[knot]!;
      level = knot === 0 ? mean : level + gain[knot]! * surprise;
    }
    filtered[knot] = level;
  }
  means.squares = squares;

  smoothed[knots - 1] = filtered[knots - 1]!;
  for (let knot = knots - 2; knot >= 0; knot -= 1) {
    smoothed[knot] = filtered[knot]! + follow[knot]! * (smoothed[knot + 1]! - filtered[knot]!);
  }
}

import type { Arranged } from './arrange-polls';
import type { Gains } from './level-gains';
import type { Means } from './level-means';
import type { Weighed } from './weigh-polls';

/**
 * Per knot and group (houses, then results) the part of the level that comes from that group's polls: if an effect
 * of 1 is taken off a house's polls, the smoothed level falls by its column. The columns of a knot sum to 1.
 */
export type Columns = {
  readonly groups: number;
  readonly filtered: Float64Array;
  readonly smoothed: Float64Array;
  /** Groups × groups: columns' weighted cross-products once the level is taken out. */
  readonly information: Float64Array;
  /** The same of each column with the values. */
  readonly score: Float64Array;
};

export function makeColumns(arranged: Arranged): Columns {
  const groups = arranged.houses + 1;
  const size = arranged.knotDay.length * groups;
  return {
    groups,
    filtered: new Float64Array(size),
    smoothed: new Float64Array(size),
    information: new Float64Array(groups * groups),
    score: new Float64Array(groups),
  };
}

/** Sends every column through the same filter as the values: linear in knots × groups and cells × groups. */
export function computeColumns(
  arranged: Arranged,
  weighed: Weighed,
  gains: Gains,
  means: Means,
  columns: Columns,
): void {
  filterColumns(arranged, weighed, gains, columns);
  const { groups, filtered, smoothed, information, score } = columns;
  const { knotCells, cellHouse } = arranged;
  const knots = gains.follow.length;
  information.fill(0);
  score.fill(0);
  for (let knot = knots - 1; knot >= 0; knot -= 1) {
    const here = knot * groups;
    const follow = knot === knots - 1 ? 0 : gains.follow[knot]!;
    const stay = 1 - follow;
    const next = knot === knots - 1 ? here : here + groups;
    for (let group = 0; group < groups; group += 1) {
      smoothed[here + group] = stay * filtered[here + group]! + follow * smoothed[next + group]!;
    }
    for (let cell = knotCells[knot]!; cell < knotCells[knot + 1]!; cell += 1) {
      const house = cellHouse[cell]!;
      const precision = weighed.precision[cell]!;
      const row = house * groups;
      for (let group = 0; group < groups; group += 1) {
        information[row + group]! -= precision * smoothed[here + group]!;
      }
      score[house]! += precision * (weighed.mean[cell]! - means.smoothed[knot]!);
    }
  }
  balance(information, groups);
}

function filterColumns(arranged: Arranged, weighed: Weighed, gains: Gains, columns: Columns): void {
  const { groups, filtered } = columns;
  const { knotCells, cellHouse, isExact } = arranged;
  const { weight, gain, keep } = gains;
  for (let knot = 0; knot < weight.length; knot += 1) {
    const here = knot * groups;
    const kept = keep[knot]!;
    if (kept === 0) filtered.fill(0, here, here + groups);
    else {
      for (let group = 0; group < groups; group += 1) {
        filtered[here + group] = kept * filtered[here - groups + group]!;
      }
    }
    if (isExact[knot] === 1) filtered[here + groups - 1] = 1;
    const share = gain[knot]! / (weight[knot]! || 1);
    for (let cell = knotCells[knot]!; cell < knotCells[knot + 1]!; cell += 1) {
      filtered[here + cellHouse[cell]!]! += share * weighed.precision[cell]!;
    }
  }
}

/**
 * Makes the matrix symmetric; the row of the results lacks exact ones, so their column stands for it. Rows sum to 0,
 * so the diagonal is taken from the rest of its row, which loses no digits.
 */
function balance(information: Float64Array, groups: number): void {
  for (let row = 0; row < groups; row += 1) {
    for (let column = 0; column < row; column += 1) {
      const above = information[column * groups + row]!;
      const below = row === groups - 1 ? above : information[row * groups + column]!;
      const both = (above + below) / 2;
      information[row * groups + column] = both;
      information[column * groups + row] = both;
    }
  }
  for (let row = 0; row < groups; row += 1) {
    let others = 0;
    for (let column = 0; column < groups; column += 1) {
      if (column !== row) others += information[row * groups + column]!;
    }
    information[row * groups + row] = -others;
  }
}

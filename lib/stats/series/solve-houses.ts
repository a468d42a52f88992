import type { Columns } from './house-columns';

/** The house effects by generalized least squares; the last entry stands for no house and is 0. */
export type Houses = {
  readonly effects: Float64Array;
  /** Groups × groups. */
  readonly covariance: Float64Array;
  /** log of the determinant of the information with one group fixed; the same whichever is fixed. */
  readonly logDeterminant: number;
};

/**
 * Solves for the effects with one group fixed at 0 (the results if there are any, else the best measured house), and
 * then moves them so that the reference houses sum to 0. Which house was fixed makes no difference.
 */
export function solveHouses(columns: Columns, isReference: readonly boolean[], isAnchored: boolean): Houses {
  const { groups, information, score } = columns;
  const houses = groups - 1;
  const fixed = isAnchored ? houses : largestDiagonal(information, groups, houses);
  const free = Array.from({ length: houses }, (_, house) => house).filter((house) => house !== fixed);
  const size = free.length;
  const factor = new Float64Array(size * size);
  const logDeterminant = factorize(information, groups, free, factor);
  const inverse = invert(factor, size);
  const effects = new Float64Array(groups);
  const covariance = new Float64Array(groups * groups);
  free.forEach((house, row) => {
    free.forEach((other, column) => {
      const entry = inverse[row * size + column]!;
      covariance[house * groups + other] = entry;
      effects[house]! += entry * score[other]!;
    });
  });
  if (!isAnchored) centre(effects, covariance, groups, isReference);
  return { effects, covariance, logDeterminant };
}

function largestDiagonal(information: Float64Array, groups: number, houses: number): number {
  let best = 0;
  for (let house = 1; house < houses; house += 1) {
    if (information[house * groups + house]! > information[best * groups + best]!) best = house;
  }
  return best;
}

/** Cholesky: lower factor of the free rows and columns; returns the log of their determinant. */
function factorize(
  information: Float64Array,
  groups: number,
  free: readonly number[],
  factor: Float64Array,
): number {
  const size = free.length;
  let logDeterminant = 0;
  for (let row = 0; row < size; row += 1) {
    for (let column = 0; column <= row; column += 1) {
      let rest = information[free[row]! * groups + free[column]!]!;
      for (let inner = 0; inner < column; inner += 1) {
        rest -= factor[row * size + inner]! * factor[column * size + inner]!;
      }
      if (column < row) factor[row * size + column] = rest / factor[column * size + column]!;
      else {
        factor[row * size + row] = Math.sqrt(rest);
        logDeterminant += Math.log(rest);
      }
    }
  }
  return logDeterminant;
}

/** Inverse of L·Lᵀ from its lower factor. */
function invert(factor: Float64Array, size: number): Float64Array {
  const lower = new Float64Array(size * size);
  for (let column = 0; column < size; column += 1) {
    for (let row = column; row < size; row += 1) {
      let rest = row === column ? 1 : 0;
      for (let inner = column; inner < row; inner += 1) {
        rest -= factor[row * size + inner]! * lower[inner * size + column]!;
      }
      lower[row * size + column] = rest / factor[row * size + row]!;
    }
  }
  const inverse = new Float64Array(size * size);
  for (let row = 0; row < size; row += 1) {
    for (let column = 0; column <= row; column += 1) {
      let sum = 0;
      for (let inner = row; inner < size; inner += 1) {
        sum += lower[inner * size + row]! * lower[inner * size + column]!;
      }
      inverse[row * size + column] = sum;
      inverse[column * size + row] = sum;
    }
  }
  return inverse;
}

/** Takes the mean of the reference houses off the effects, and off the covariance on both sides. */
function centre(
  effects: Float64Array,
  covariance: Float64Array,
  groups: number,
  isReference: readonly boolean[],
): void {
  const houses = groups - 1;
  const counted = isReference.filter(Boolean).length;
  const meanOf = (from: Float64Array, start: number, step: number) =>
    isReference.reduce((sum, yes, house) => (yes ? sum + from[start + house * step]! : sum), 0) / counted;
  const shift = (into: Float64Array, start: number, step: number) => {
    const mean = meanOf(into, start, step);
    for (let house = 0; house < houses; house += 1) into[start + house * step]! -= mean;
  };
  shift(effects, 0, 1);
  for (let row = 0; row < houses; row += 1) shift(covariance, row * groups, 1);
  for (let column = 0; column < houses; column += 1) shift(covariance, column, groups);
}

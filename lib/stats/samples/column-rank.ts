/**
 * A column whose part outside the earlier ones has fallen below this share of its length depends on them.
 * It is the tolerance of R's `degf` for replicate weights.
 */
export const RANK_TOLERANCE = 1e-5;

/** Below this share of what is left a norm is computed anew: subtracting has lost its digits. */
const WORN = 1e-6;

/**
 * How many columns of a matrix do not depend on the ones before them, as R's `qr` counts.
 *
 * It is the rule of LINPACK's DQRDC2: columns are taken from left to right by Householder reflections, and a
 * column with less than 1e-5 of its length left is set aside. Cost: rows × columns².
 *
 * @param matrix column after column; it is changed
 * @param rows length of a column
 * @see R 4.2.2 `qr(x, tol = 1e-5)$rank`
 */
export function columnRank(matrix: Float64Array, rows: number): number {
  const columns = matrix.length / rows;
  const lengths = Float64Array.from({ length: columns }, (_, column) =>
    tailNorm(matrix, column * rows, 0, rows),
  );
  const left = lengths.slice();
  let rank = 0;
  for (let column = 0; column < columns && rank < rows; column += 1) {
    if (!((left[column] ?? 0) >= (lengths[column] || 1) * RANK_TOLERANCE)) continue;
    reflect(matrix, rows, column, rank);
    for (let later = column + 1; later < columns; later += 1) {
      left[later] = remaining(matrix, later * rows, rank, rows, left[later] ?? 0);
    }
    rank += 1;
  }
  return rank;
}

/** Turns a column onto one axis, from `top` downwards, and every later column with it. */
export function reflect(matrix: Float64Array, rows: number, column: number, top: number): void {
  const start = column * rows;
  const norm = tailNorm(matrix, start, top, rows);
  if (norm === 0) return;
  const signed = (matrix[start + top] ?? 0) < 0 ? -norm : norm;
  for (let row = top; row < rows; row += 1) matrix[start + row] = (matrix[start + row] ?? 0) / signed;
  const pivot = 1 + (matrix[start + top] ?? 0);
  matrix[start + top] = pivot;
  for (let other = start + rows; other < matrix.length; other += rows) {
    let product = 0;
    for (let row = top; row < rows; row += 1) {
      product += (matrix[start + row] as number) * (matrix[other + row] as number);
    }
    const factor = -product / pivot;
    for (let row = top; row < rows; row += 1) {
      matrix[other + row] = (matrix[other + row] as number) + factor * (matrix[start + row] as number);
    }
  }
  matrix[start + top] = -signed;
  matrix.fill(0, start + top + 1, start + rows);
}

function remaining(matrix: Float64Array, start: number, top: number, rows: number, before: number): number {
  if (before === 0) return 0;
  const share = Math.max(0, 1 - ((matrix[start + top] ?? 0) / before) ** 2);
  return share < WORN ? tailNorm(matrix, start, top + 1, rows) : before * Math.sqrt(share);
}

function tailNorm(matrix: Float64Array, start: number, top: number, rows: number): number {
  let squares = 0;
  for (let row = top; row < rows; row += 1) squares += (matrix[start + row] ?? 0) ** 2;
  return Math.sqrt(squares);
}

import { columnRank, RANK_TOLERANCE, reflect } from './column-rank';

/** Rows of one unit differ by a factor; weights printed with nine digits blur it by 1e-8, far below the tolerance. */
const SAME_ROW = 1e-7;
/** Coarse, so that the blur seldom parts rows of one unit; what meets in one place is then compared exactly. */
const QUANTA = 2 ** 12;
/** The proof of full rank asks for ten times the tolerance, so that rounding cannot tip it. */
const MARGIN = 10;
const FOLDS = 2;
const BLOCK = 4;

/**
 * The rank of replicate weights, by R's rule, without a decomposition of the whole file where that can be spared.
 *
 * Three steps, each exact. Few rows are decomposed as they are. Many rows are first added up, with signs, into
 * twice as many rows as replicates: such a sum cannot lengthen a column's part outside the others by more than
 * the root of the rows added into one, so if it keeps enough of every column, all columns count. Else rows
 * that differ by a factor only (respondents of one unit) are made one, which leaves every length and angle
 * of the columns as it was, and what remains is decomposed in blocks.
 *
 * @param matrix all replicate weights of the first respondent, then all of the second, and so on
 * @param replicates number of columns
 * @param domain 1 for the rows that count; null for all
 * @see R 4.2.2 `qr(weights(design, "analysis"), tol = 1e-5)$rank`
 */
export function replicateRank(matrix: Float64Array, replicates: number, domain: Uint8Array | null): number {
  const rows = rowsOf(matrix.length / replicates, domain);
  if (rows.length <= BLOCK * replicates) return blockRank(matrix, replicates, rows, null);
  if (isSurelyFull(matrix, replicates, rows)) return replicates;
  const { representatives, factors } = mergedRows(matrix, replicates, rows);
  return blockRank(matrix, replicates, representatives, factors);
}

function rowsOf(count: number, domain: Uint8Array | null): Int32Array {
  const all = Int32Array.from({ length: count }, (_, row) => row);
  return domain ? all.filter((row) => domain[row] === 1) : all;
}

function isSurelyFull(matrix: Float64Array, replicates: number, rows: Int32Array): boolean {
  const folds = FOLDS * replicates;
  const folded = new Float64Array(folds * replicates);
  const squares = new Float64Array(replicates);
  rows.forEach((row, index) => {
    const target = (index % folds) * replicates;
    const sign = signOf(index);
    const start = row * replicates;
    for (let column = 0; column < replicates; column += 1) {
      const weight = matrix[start + column] as number;
      folded[target + column] = (folded[target + column] as number) + sign * weight;
      squares[column] = (squares[column] as number) + weight * weight;
    }
  });
  const columns = transposed(folded, folds, replicates);
  const needed = RANK_TOLERANCE * MARGIN * Math.sqrt(Math.ceil(rows.length / folds));
  for (let column = 0; column < replicates; column += 1) {
    reflect(columns, folds, column, column);
    const kept = Math.abs(columns[column * folds + column] ?? 0);
    if (!(kept > needed * Math.sqrt(squares[column] ?? 0))) return false;
  }
  return true;
}

/** A fixed, well mixed sequence of signs: sums without them would lose what strata have in common. */
function signOf(index: number): number {
  const mixed = Math.imul(index ^ (index >>> 15), 0x2c1b3c6d);
  return (Math.imul(mixed ^ (mixed >>> 12), 0x297a2d39) >>> 31) * 2 - 1;
}

function transposed(rowsFirst: Float64Array, rows: number, columns: number): Float64Array {
  const result = new Float64Array(rows * columns);
  for (let row = 0; row < rows; row += 1) {
    for (let column = 0; column < columns; column += 1) {
      result[column * rows + row] = rowsFirst[row * columns + column] ?? 0;
    }
  }
  return result;
}

/** One row for all that differ by a factor, lengthened so that it stands for the others too. */
function mergedRows(
  matrix: Float64Array,
  replicates: number,
  rows: Int32Array,
): { representatives: Int32Array; factors: Float64Array } {
  const representatives: number[] = [];
  const squares: number[] = [];
  const byHash = new Map<number, number[]>();
  for (const row of rows) {
    const largest = largestOf(matrix, row * replicates, replicates);
    if (largest === 0) continue;
    const hash = hashOf(matrix, row * replicates, replicates, largest);
    const candidates = byHash.get(hash) ?? [];
    if (candidates.length === 0) byHash.set(hash, candidates);
    const known = candidates.find((one) => isMultiple(matrix, replicates, representatives[one] ?? 0, row));
    if (known === undefined) {
      candidates.push(representatives.push(row) - 1);
      squares.push(1);
    } else {
      const factor = largest / largestOf(matrix, (representatives[known] ?? 0) * replicates, replicates);
      squares[known] = (squares[known] ?? 0) + factor * factor;
    }
  }
  return {
    representatives: Int32Array.from(representatives),
    factors: Float64Array.from(squares, Math.sqrt),
  };
}

function largestOf(matrix: Float64Array, start: number, replicates: number): number {
  let largest = 0;
  for (let column = 0; column < replicates; column += 1) {
    const weight = matrix[start + column] as number;
    if (weight > largest) largest = weight;
  }
  return largest;
}

function hashOf(matrix: Float64Array, start: number, replicates: number, largest: number): number {
  let hash = 0;
  for (let column = 0; column < replicates; column += 1) {
    const quantum = Math.round(((matrix[start + column] as number) / largest) * QUANTA);
    hash = Math.imul(hash ^ quantum, 0x01000193) ^ (hash >>> 13);
  }
  return hash;
}

function isMultiple(matrix: Float64Array, replicates: number, one: number, other: number): boolean {
  const from = one * replicates;
  const to = other * replicates;
  const factor = largestOf(matrix, to, replicates) / largestOf(matrix, from, replicates);
  for (let column = 0; column < replicates; column += 1) {
    const weight = matrix[to + column] as number;
    if (Math.abs((matrix[from + column] as number) * factor - weight) > SAME_ROW * weight) return false;
  }
  return true;
}

/** Decomposes the rows block by block, keeping a triangle: it has the lengths and angles of all rows so far. */
function blockRank(
  matrix: Float64Array,
  replicates: number,
  rows: Int32Array,
  factors: Float64Array | null,
): number {
  let triangle: Float64Array | null = null;
  let height = 0;
  for (let from = 0; from < rows.length; from += BLOCK * replicates) {
    const block = rows.subarray(from, from + BLOCK * replicates);
    const stacked: number = height + block.length;
    const columns: Float64Array = new Float64Array(stacked * replicates);
    for (let column = 0; column < replicates; column += 1) {
      const start = column * stacked;
      for (let row = 0; row < height; row += 1) columns[start + row] = triangle?.[column * height + row] ?? 0;
      block.forEach((row, index) => {
        const factor = factors?.[from + index] ?? 1;
        columns[start + height + index] = (matrix[row * replicates + column] ?? 0) * factor;
      });
    }
    if (from + block.length === rows.length) return columnRank(columns, stacked);
    for (let column = 0; column < replicates; column += 1) reflect(columns, stacked, column, column);
    triangle = topOf(columns, stacked, replicates);
    height = replicates;
  }
  return 0;
}

function topOf(columns: Float64Array, rows: number, kept: number): Float64Array {
  const top = new Float64Array(kept * kept);
  for (let column = 0; column < kept; column += 1) {
    top.set(columns.subarray(column * rows, column * rows + kept), column * kept);
  }
  return top;
}

/** Numbers, one a respondent, in the order of the file: an array or a typed array. */
export type Column = ArrayLike<number>;

/** Names or numbers of strata, units or answers, one a respondent, in the order of the file. */
export type Labels = ArrayLike<string | number>;

/** The outer limits of a weight: beyond them squares and sums leave the reach of the numbers. */
const LEAST_WEIGHT = 1e-100;
const LARGEST_WEIGHT = 1e100;

export function refuse(fn: string, condition: string): never {
  throw new RangeError(`${fn} requires ${condition}`);
}

export function sameLength(fn: string, name: string, column: ArrayLike<unknown>, rows: number): void {
  if (column.length !== rows) {
    refuse(fn, `${name} for each of the ${rows} respondents; ${column.length} are given`);
  }
}

/** A copy as numbers of one kind, into memory of the same length; what is not a number becomes NaN, never 0. */
export function copyNumbers(column: Column, copy: Float64Array): Float64Array {
  if (ArrayBuffer.isView(column)) {
    copy.set(column);
    return copy;
  }
  for (let row = 0; row < column.length; row += 1) {
    const value: unknown = column[row];
    copy[row] = typeof value === 'number' ? value : Number.NaN;
  }
  return copy;
}

/** A copy of the weights, each of them above 0. */
export function readWeights(fn: string, weights: Column): Float64Array {
  if (weights.length === 0) refuse(fn, 'at least one respondent');
  const copy = copyNumbers(weights, new Float64Array(weights.length));
  const faulty = copy.findIndex((weight) => !(weight >= LEAST_WEIGHT && weight <= LARGEST_WEIGHT));
  if (faulty >= 0) {
    const condition = `weights from ${LEAST_WEIGHT} to ${LARGEST_WEIGHT}`;
    refuse(fn, `${condition}; weights[${faulty}] is ${String(weights[faulty])}`);
  }
  return copy;
}

/** Numbers 0, 1, … in place of labels, in the order of their first appearance. */
export function readLabels(
  fn: string,
  name: string,
  labels: Labels,
): { indices: Int32Array; names: (string | number)[] } {
  const known = new Map<string | number, number>();
  const names: (string | number)[] = [];
  const indices = new Int32Array(labels.length);
  for (let row = 0; row < labels.length; row += 1) {
    const label = labels[row];
    if (isMissing(label)) refuse(fn, `a ${name} for every respondent; ${name}[${row}] is missing`);
    let index = known.get(label);
    if (index === undefined) {
      index = names.length;
      known.set(label, index);
      names.push(label);
    }
    indices[row] = index;
  }
  return { indices, names };
}

function isMissing(label: string | number | null | undefined): label is null | undefined {
  return label === undefined || label === null || label === '' || Number.isNaN(label);
}

/** Generalized least squares with full matrices: the slow second route to what the filter finds. */

type Matrix = number[][];
export type DensePoll = {
  readonly day: number;
  readonly value: number;
  readonly variance: number;
  readonly house?: string;
};

/** Columns of the house effects: one row per house, as in a contrast coding. */
export type Coding = { readonly houses: readonly string[]; readonly rows: Matrix };

const zeros = (rows: number, columns: number): Matrix =>
  Array.from({ length: rows }, () => new Array<number>(columns).fill(0));
const product = (a: Matrix, b: Matrix): Matrix =>
  a.map((row) => (b[0] ?? []).map((_, column) => row.reduce((sum, x, k) => sum + x * b[k]![column]!, 0)));
const transpose = (a: Matrix): Matrix => (a[0] ?? []).map((_, column) => a.map((row) => row[column]!));

/** Inverse by elimination with pivots, and the log of the absolute determinant. */
function invert(matrix: Matrix): { inverse: Matrix; logDeterminant: number } {
  const size = matrix.length;
  const work = matrix.map((row, i) => [...row, ...row.map((_, j) => (i === j ? 1 : 0))]);
  let logDeterminant = 0;
  for (let column = 0; column < size; column += 1) {
    let pivot = column;
    for (let row = column; row < size; row += 1) {
      if (Math.abs(work[row]![column]!) > Math.abs(work[pivot]![column]!)) pivot = row;
    }
    [work[column], work[pivot]] = [work[pivot]!, work[column]!];
    const lead = work[column]![column]!;
    logDeterminant += Math.log(Math.abs(lead));
    work[column] = work[column]!.map((x) => x / lead);
    for (let row = 0; row < size; row += 1) {
      const factor = work[row]![column]!;
      if (row !== column) work[row] = work[row]!.map((x, k) => x - factor * work[column]![k]!);
    }
  }
  return { inverse: work.map((row) => row.slice(size)), logDeterminant };
}

/** Contrasts that sum to 0 over the reference houses, the last of them minus the sum of the others. */
export function sumZero(houses: readonly string[], reference: readonly string[] = houses): Coding {
  const last = reference[reference.length - 1];
  const free = houses.filter((house) => house !== last);
  const rows = houses.map((house) =>
    free.map((column) => {
      if (house === last) return reference.includes(column) ? -1 : 0;
      return house === column ? 1 : 0;
    }),
  );
  return { houses, rows };
}

/** One column per house. */
export function ownColumns(houses: readonly string[]): Coding {
  return { houses, rows: houses.map((house) => houses.map((other) => (house === other ? 1 : 0))) };
}

export function denseGls(polls: readonly DensePoll[], stateVariance: number, coding: Coding) {
  const width = coding.rows[0]?.length ?? 0;
  const houseRow = (house: string | undefined) =>
    coding.rows[coding.houses.indexOf(house ?? '')] ?? new Array<number>(width).fill(0);
  const origin = Math.min(...polls.map((poll) => poll.day)) - 1;
  const shared = (a: number, b: number) => stateVariance * Math.min(a - origin, b - origin);
  const omega = polls.map((a, i) => polls.map((b, j) => shared(a.day, b.day) + (i === j ? a.variance : 0)));
  const { inverse, logDeterminant } = invert(omega);
  const design = polls.map((poll) => [1, ...houseRow(poll.house)]);
  const weighted = product(transpose(design), inverse);
  const { inverse: covariance, logDeterminant: information } = invert(product(weighted, design));
  const values = polls.map((poll) => [poll.value]);
  const beta = product(covariance, product(weighted, values));
  const residual = product(design, beta).map((row, i) => [values[i]![0]! - row[0]!]);
  const solved = product(inverse, residual);
  const squares = residual.reduce((sum, row, i) => sum + row[0]! * solved[i]![0]!, 0);
  const degrees = polls.length - 1 - width;

  /** Mean and variance of Σ weights·level(day) plus a combination of the effects, before the first poll included. */
  const estimate = (levels: readonly { day: number; weight: number }[], house?: string) => {
    const fixed = [
      levels.reduce((sum, one) => sum + one.weight, 0),
      ...(house ? houseRow(house) : zeros(1, width)[0]!),
    ];
    const covary = polls.map((poll) =>
      levels.reduce((sum, one) => sum + one.weight * walk(one.day, poll.day), 0),
    );
    const own = levels.reduce(
      (sum, a) => sum + levels.reduce((part, b) => part + a.weight * b.weight * walk(a.day, b.day), 0),
      0,
    );
    const gain = product([covary], inverse);
    const left = product(gain, design)[0]!.map((x, k) => fixed[k]! - x);
    const mean = fixed.reduce((sum, x, k) => sum + x * beta[k]![0]!, 0) + product(gain, residual)[0]![0]!;
    const variance =
      own -
      product(gain, transpose([covary]))[0]![0]! +
      product(product([left], covariance), transpose([left]))[0]![0]!;
    return { mean, variance };
  };
  /** Covariance of a walk that starts at 0 on the origin and runs both ways. */
  function walk(a: number, b: number): number {
    const [x, y] = [a - origin, b - origin];
    return x * y > 0 ? stateVariance * Math.min(Math.abs(x), Math.abs(y)) : 0;
  }

  return {
    level: (day: number) => estimate([{ day, weight: 1 }]),
    change: (from: number, to: number) =>
      estimate([
        { day: to, weight: 1 },
        { day: from, weight: -1 },
      ]),
    expected: (day: number, house?: string) => estimate([{ day, weight: 1 }], house),
    effect: (house: string) => estimate([], house),
    logLikelihoodFlat: -(degrees * Math.log(2 * Math.PI) + logDeterminant + information + squares) / 2,
  };
}

import { refuse } from './columns';
import type { ReplicateDesign } from './replicate-design';

const BATCH = 4;

/**
 * The variance of a weighted mean from its replicates: scale · Σ rscalesᵣ (θᵣ − centre)².
 *
 * @param fn the caller, named in refusals
 * @param design the sample
 * @param values 0 outside the domain
 * @param domain 1 for the respondents that count; null for all
 * @param estimate the weighted mean by the full-sample weights
 * @throws RangeError `<fn> requires weight in the domain in every replicate; replicate <replicate> has none`
 * @see R 4.2.2, survey 4.1.1 `svrVar`
 */
export function replicateVariance(
  fn: string,
  design: ReplicateDesign,
  values: Float64Array,
  domain: Uint8Array | null,
  estimate: number,
): number {
  const { matrix, replicates, scale, rscales, mse } = design;
  const sums = domain === null ? design.sums : weightedSums(matrix, replicates, Float64Array.from(domain));
  const thetas = weightedSums(matrix, replicates, values);
  let mean = 0;
  let used = 0;
  for (let replicate = 0; replicate < replicates; replicate += 1) {
    if (rscales[replicate] === 0) continue;
    const sum = sums[replicate] as number;
    if (sum === 0) refuse(fn, `weight in the domain in every replicate; replicate ${replicate} has none`);
    const theta = (thetas[replicate] as number) / sum;
    thetas[replicate] = theta;
    mean += theta;
    used += 1;
  }
  const centre = mse ? estimate : mean / used;
  let squares = 0;
  for (let replicate = 0; replicate < replicates; replicate += 1) {
    const rscale = rscales[replicate] as number;
    if (rscale > 0) squares += rscale * ((thetas[replicate] as number) - centre) ** 2;
  }
  return scale * squares;
}

/**
 * Σ of value × replicate weight in each replicate. Respondents whose value is 0 are passed over; the rest are
 * taken four at a time, always in the same order, so that equal inputs give equal sums to the last digit.
 */
export function weightedSums(
  matrix: Float64Array,
  replicates: number,
  values: ArrayLike<number>,
): Float64Array {
  const sums = new Float64Array(replicates);
  const batch = new Int32Array(BATCH);
  let filled = 0;
  for (let row = 0; row < values.length; row += 1) {
    if (values[row] === 0) continue;
    batch[filled] = row;
    filled += 1;
    if (filled < BATCH) continue;
    addFour(sums, matrix, batch, values);
    filled = 0;
  }
  for (const row of batch.subarray(0, filled)) {
    const value = values[row] as number;
    const start = row * replicates;
    for (let replicate = 0; replicate < replicates; replicate += 1) {
      sums[replicate] = (sums[replicate] as number) + value * (matrix[start + replicate] as number);
    }
  }
  return sums;
}

function addFour(
  sums: Float64Array,
  matrix: Float64Array,
  [first = 0, second = 0, third = 0, fourth = 0]: Int32Array,
  values: ArrayLike<number>,
): void {
  const replicates = sums.length;
  const [v1, v2] = [values[first] as number, values[second] as number];
  const [v3, v4] = [values[third] as number, values[fourth] as number];
  const [m1, m2, m3, m4] = [first * replicates, second * replicates, third * replicates, fourth * replicates];
  for (let replicate = 0; replicate < replicates; replicate += 1) {
    const one = v1 * (matrix[m1 + replicate] as number) + v2 * (matrix[m2 + replicate] as number);
    const other = v3 * (matrix[m3 + replicate] as number) + v4 * (matrix[m4 + replicate] as number);
    sums[replicate] = (sums[replicate] as number) + (one + other);
  }
}

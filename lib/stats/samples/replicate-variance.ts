import { refuse } from './columns';
import type { ReplicateDesign } from './replicate-design';

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
  const { replicates, scale, rscales, mse } = design;
  const sums = domain === null ? design.sums : sumsIn(design, domain);
  const thetas = weightedSums(design, values);
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

/** Respondents whose value is 0 are passed over: their weights need not be read. */
function weightedSums({ matrix, replicates, rows }: ReplicateDesign, values: Float64Array): Float64Array {
  const sums = new Float64Array(replicates);
  for (let row = 0; row < rows; row += 1) {
    const value = values[row] as number;
    if (value === 0) continue;
    const start = row * replicates;
    for (let replicate = 0; replicate < replicates; replicate += 1) {
      sums[replicate] = (sums[replicate] as number) + value * (matrix[start + replicate] as number);
    }
  }
  return sums;
}

function sumsIn({ matrix, replicates, rows }: ReplicateDesign, domain: Uint8Array): Float64Array {
  const sums = new Float64Array(replicates);
  for (let row = 0; row < rows; row += 1) {
    if (domain[row] === 0) continue;
    const start = row * replicates;
    for (let replicate = 0; replicate < replicates; replicate += 1) {
      sums[replicate] = (sums[replicate] as number) + (matrix[start + replicate] as number);
    }
  }
  return sums;
}

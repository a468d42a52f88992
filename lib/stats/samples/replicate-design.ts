import type { Column } from './columns';
import { copyNumbers, readWeights, refuse, sameLength } from './columns';
import { replicateRank } from './replicate-rank';
import { weightedSums } from './replicate-variance';

export type ReplicateType = 'JK1' | 'JKn' | 'BRR' | 'Fay' | 'bootstrap' | 'subbootstrap';

export type ReplicateColumns = {
  readonly weights: Column;
  readonly replicateWeights: readonly Column[] | Float64Array;
  readonly type: ReplicateType;
  readonly mse: boolean;
  readonly scale?: number;
  readonly rscales?: number | Column;
  readonly fayRho?: number;
  readonly df?: number;
};

/** A sample whose variance comes from replicate weights; made by `replicateDesign`, not to be changed. */
export type ReplicateDesign = {
  readonly method: 'replicates';
  readonly type: ReplicateType;
  readonly rows: number;
  readonly weights: Float64Array;
  readonly replicates: number;
  /** All replicate weights of the first respondent, then all of the second, and so on. */
  readonly matrix: Float64Array;
  /** The sum of the weights in each replicate. */
  readonly sums: Float64Array;
  readonly scale: number;
  readonly rscales: Float64Array;
  readonly mse: boolean;
  /** Degrees of freedom: stated, or the rank of the replicate weights less 1. */
  readonly df: number;
  /** Whether they were stated; then they hold in every domain. */
  readonly dfStated: boolean;
};

const FN = 'replicateDesign';
const LARGEST_WEIGHT = 1e100;

/**
 * A sample with replicate weights, checked once, for every estimate that is made on it.
 *
 * Use it where the file brings full (combined) replicate weights: their spread holds what the pollster's own
 * weighting does to the variance. V = scale · Σ rscalesᵣ (θᵣ − centre)². The centre is the estimate of the full
 * sample with `mse`, else the mean of the replicates; both are in use, so it must be said.
 * Cost: one pass over the replicate weights, and their rank unless `df` is stated.
 *
 * @param columns.weights the full-sample weights, one a respondent, 1e-100 to 1e100
 * @param columns.replicateWeights one column a replicate, or all of the first respondent, then all of the second
 *   in one Float64Array, which is kept and not copied; each 0 to 1e100, at least two replicates
 * @param columns.type how the replicates were made; it gives the default scale, JK1 (R − 1)/R, JKn 1, BRR 1/R,
 *   Fay 1/(R (1 − ρ)²), subbootstrap 1/(R − 1)
 * @param columns.mse whether replicates are compared with the full-sample estimate
 * @param columns.scale above 0; must be stated for `bootstrap`
 * @param columns.rscales one number of at least 0 for all replicates (default 1), or one each; must be stated for
 *   JKn. Replicates with 0 are left out
 * @param columns.fayRho Fay's coefficient, 0 or more and below 1; needed for Fay without a scale
 * @param columns.df degrees of freedom, whole, at least 1, where the pollster states them
 * @throws RangeError `replicateDesign requires at least one respondent`
 * @throws RangeError `replicateDesign requires weights from 1e-100 to 1e+100; weights[<row>] is <weight>`
 * @throws RangeError `replicateDesign requires two replicates or more, each with a weight for every respondent`
 * @throws RangeError `replicateDesign requires replicateWeights[<replicate>] for each of the <rows> respondents;
 *   <length> are given`
 * @throws RangeError `replicateDesign requires replicate weights from 0 to 1e+100; replicate <replicate> of
 *   respondent <row> is <weight>` (both counted from 0)
 * @throws RangeError `replicateDesign requires a scale above 0 for <type>`
 * @throws RangeError `replicateDesign requires fayRho from 0 to below 1, or a scale, for Fay`
 * @throws RangeError `replicateDesign requires rscales of at least 0, not all 0, one or one each of <n> replicates`
 * @throws RangeError `replicateDesign requires rscales for JKn`
 * @throws RangeError `replicateDesign requires df whole and at least 1`
 * @see R 4.2.2, survey 4.1.1 `svrepdesign(combined.weights = TRUE)`, `svrVar`, `degf`
 * @example
 * replicateDesign({
 *   weights: [1, 1, 1],
 *   replicateWeights: [[0, 1.5, 1.5], [1.5, 0, 1.5], [1.5, 1.5, 0]],
 *   type: 'JK1',
 *   mse: true,
 * }).df; // => 2
 */
export function replicateDesign(columns: ReplicateColumns): ReplicateDesign {
  const weights = readWeights(FN, columns.weights);
  const rows = weights.length;
  const matrix = rowByRow(columns.replicateWeights, rows);
  const replicates = matrix.length / rows;
  const sums = checkedSums(matrix, replicates);
  const { df } = columns;
  if (df !== undefined && !(Number.isInteger(df) && df >= 1)) refuse(FN, 'df whole and at least 1');
  return Object.freeze({
    method: 'replicates' as const,
    type: columns.type,
    rows,
    weights,
    replicates,
    matrix,
    sums,
    scale: scaleOf(columns, replicates),
    rscales: rscalesOf(columns, replicates),
    mse: columns.mse,
    df: df ?? replicateRank(matrix, replicates, null) - 1,
    dfStated: df !== undefined,
  });
}

function rowByRow(given: readonly Column[] | Float64Array, rows: number): Float64Array {
  const enough = given instanceof Float64Array ? given.length / rows : given.length;
  if (!(Number.isInteger(enough) && enough >= 2)) {
    refuse(FN, 'two replicates or more, each with a weight for every respondent');
  }
  if (given instanceof Float64Array) return given;
  const matrix = new Float64Array(rows * given.length);
  const copy = new Float64Array(rows);
  given.forEach((column, replicate) => {
    sameLength(FN, `replicateWeights[${replicate}]`, column, rows);
    copyNumbers(column, copy).forEach((weight, row) => {
      matrix[row * given.length + replicate] = weight;
    });
  });
  return matrix;
}

function checkedSums(matrix: Float64Array, replicates: number): Float64Array {
  for (let index = 0; index < matrix.length; index += 1) {
    const weight = matrix[index] as number;
    if (weight >= 0 && weight <= LARGEST_WEIGHT) continue;
    const where = `replicate ${index % replicates} of respondent ${Math.floor(index / replicates)}`;
    refuse(FN, `replicate weights from 0 to ${LARGEST_WEIGHT}; ${where} is ${weight}`);
  }
  return weightedSums(matrix, replicates, new Float64Array(matrix.length / replicates).fill(1));
}

function scaleOf({ type, scale, fayRho }: ReplicateColumns, replicates: number): number {
  const usual = scale ?? usualScale(type, replicates, fayRho);
  if (!(usual !== null && usual > 0 && Number.isFinite(usual))) refuse(FN, `a scale above 0 for ${type}`);
  return usual;
}

function usualScale(type: ReplicateType, replicates: number, fayRho: number | undefined): number | null {
  switch (type) {
    case 'JK1':
      return (replicates - 1) / replicates;
    case 'JKn':
      return 1;
    case 'BRR':
      return 1 / replicates;
    case 'Fay':
      if (!(fayRho !== undefined && fayRho >= 0 && fayRho < 1)) {
        refuse(FN, 'fayRho from 0 to below 1, or a scale, for Fay');
      }
      return 1 / (replicates * (1 - fayRho) ** 2);
    case 'subbootstrap':
      return 1 / (replicates - 1);
    case 'bootstrap':
      return null;
  }
}

function rscalesOf({ type, rscales }: ReplicateColumns, replicates: number): Float64Array {
  if (rscales === undefined && type === 'JKn') refuse(FN, 'rscales for JKn');
  const given = rscales ?? 1;
  const each =
    typeof given === 'number'
      ? new Float64Array(replicates).fill(given)
      : copyNumbers(given, new Float64Array(given.length));
  const usable = each.every((rscale) => rscale >= 0 && Number.isFinite(rscale));
  if (!(usable && each.length === replicates && each.some((rscale) => rscale > 0))) {
    refuse(FN, `rscales of at least 0, not all 0, one or one each of ${replicates} replicates`);
  }
  return each;
}

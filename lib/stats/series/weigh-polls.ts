import type { Arranged } from './arrange-polls';
import { LogProduct } from './log-product';

/** The observations of each cell as one: precision, mean; with what the likelihood loses by that. */
export type Weighed = {
  readonly precision: Float64Array;
  readonly mean: Float64Array;
  /** Sum of the logarithms of all variances, and of the weighted squares about the means of the cells. */
  logVariances: number;
  squares: number;
};

export function makeWeighed(arranged: Arranged): Weighed {
  const cells = arranged.cellHouse.length;
  return {
    precision: new Float64Array(cells),
    mean: new Float64Array(cells),
    logVariances: 0,
    squares: 0,
  };
}

/** Collapses the observations, with an extra variance of every poll (results have none). */
export function weighPolls(arranged: Arranged, extraVariance: number, weighed: Weighed): void {
  const { cellOf, value, sampling, isPoll } = arranged;
  const { precision, mean } = weighed;
  const variances = new LogProduct();
  let squares = 0;
  precision.fill(0);
  mean.fill(0);
  for (let index = 0; index < cellOf.length; index += 1) {
    const cell = cellOf[index]!;
    const variance = sampling[index]! + extraVariance * isPoll[index]!;
    const weight = 1 / variance;
    const total = precision[cell]! + weight;
    const share = weight / total;
    const distance = value[index]! - mean[cell]!;
    precision[cell] = total;
    mean[cell]! += distance * share;
    squares += weight * distance * distance * (1 - share);
    variances.times(variance);
  }
  weighed.logVariances = variances.log();
  weighed.squares = squares;
}

import type { Arranged } from './arrange-polls';
import { LogProduct } from './log-product';
import type { Weighed } from './weigh-polls';

/** What the filter does at each knot whatever the values are. */
export type Gains = {
  /** Precision of the knot's observations together (0 with an exact result alone). */
  readonly weight: Float64Array;
  /** Variance of the level given everything up to the knot. */
  readonly variance: Float64Array;
  /** How far the filtered mean moves to the knot's mean, and how much of the prediction it keeps. */
  readonly gain: Float64Array;
  readonly keep: Float64Array;
  /** 1 / variance of the innovation; 0 where the flat prior makes it infinite. */
  readonly innovation: Float64Array;
  /** How far the smoothed level follows the smoothed level of the next knot. */
  readonly follow: Float64Array;
  /** Variance of the random walk on the way to the next knot. */
  readonly drift: Float64Array;
  readonly smoothedVariance: Float64Array;
  /** log |Ω| + log 1'Ω⁻¹1 without the part of the single observations' variances. */
  logDeterminant: number;
};

export function makeGains(arranged: Arranged): Gains {
  const knots = () => new Float64Array(arranged.knotDay.length);
  return {
    weight: knots(),
    variance: knots(),
    gain: knots(),
    keep: knots(),
    innovation: knots(),
    follow: knots(),
    drift: knots(),
    smoothedVariance: knots(),
    logDeterminant: 0,
  };
}

/** Runs the variances forward and back; every step is a sum or quotient of positive numbers, so none can turn negative. */
export function computeGains(
  arranged: Arranged,
  weighed: Weighed,
  stateVariance: number,
  gains: Gains,
): void {
  const { knotDay, knotCells, isExact } = arranged;
  const { weight, variance, gain, keep, innovation, follow, drift, smoothedVariance } = gains;
  const cellPrecision = weighed.precision;
  const knots = knotDay.length;
  const factors = new LogProduct();
  let predicted = 0;
  for (let knot = 0; knot < knots; knot += 1) {
    let total = 0;
    for (let cell = knotCells[knot]!; cell < knotCells[knot + 1]!; cell += 1) total += cellPrecision[cell]!;
    weight[knot] = total;
    if (isExact[knot] === 1) {
      if (knot > 0) factors.times(predicted);
      innovation[knot] = knot > 0 ? 1 / predicted : 0;
      gain[knot] = 0;
      keep[knot] = 0;
      variance[knot] = 0;
    } else if (knot === 0) {
      factors.times(total);
      innovation[0] = 0;
      gain[0] = 1;
      keep[0] = 0;
      variance[0] = 1 / total;
    } else {
      const growth = 1 + total * predicted;
      const inverse = 1 / growth;
      factors.times(growth);
      innovation[knot] = total * inverse;
      gain[knot] = total * predicted * inverse;
      keep[knot] = inverse;
      variance[knot] = predicted * inverse;
    }
    drift[knot] = knot + 1 < knots ? stateVariance * (knotDay[knot + 1]! - knotDay[knot]!) : 0;
    predicted = variance[knot]! + drift[knot]!;
    follow[knot] = drift[knot] === 0 ? 1 : variance[knot]! / predicted;
  }
  gains.logDeterminant = factors.log();

  smoothedVariance[knots - 1] = variance[knots - 1]!;
  for (let knot = knots - 2; knot >= 0; knot -= 1) {
    const share = follow[knot]!;
    smoothedVariance[knot] = share * (drift[knot]! + share * smoothedVariance[knot + 1]!);
  }
}

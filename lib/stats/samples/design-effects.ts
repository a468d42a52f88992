import jstat from 'jstat';
import { isInside, isPositive, required } from '../require';
import { criticalValue } from '../distributions/critical-value';

/**
 * The design effect that unequal weights alone bring (Kish).
 *
 * It leaves out clustering, and overstates the cost of weighting to what is related with the answers.
 *
 * @param weights at least one, each at least 0, not all 0; a weight of 0 counts in the sample size
 * @returns n·Σw²/(Σw)², at least 1
 * @throws RangeError `kishDesignEffect requires weights of at least 0, not all 0`
 * @see Kish (1965), Survey Sampling (from memory); closed form in R 4.2.2 `n * sum(w^2) / sum(w)^2`
 * @example
 * kishDesignEffect([1, 1, 1, 1]); // => 1
 * kishDesignEffect([0.5, 2, 4, 1]); // => 1.5111111111
 */
export function kishDesignEffect(weights: readonly number[]): number {
  const usable = weights.every((weight) => weight >= 0 && Number.isFinite(weight));
  const sum = jstat.jStat.sum(weights);
  required(usable && sum > 0, 'kishDesignEffect', 'weights of at least 0, not all 0');
  return (weights.length * jstat.jStat.sumsqrd(weights)) / (sum * sum);
}

/**
 * The design effect that a stated margin of error implies, read as the margin of a share of 50 percent.
 *
 * @param margin half-width, proportion above 0
 * @param n sample size, above 0
 * @param level the level the margin was stated at, inside 0–1
 * @throws RangeError `impliedDesignEffect requires margin and n above 0`
 * @throws RangeError `impliedDesignEffect requires level inside 0 and 1`
 * @see closed form in R 4.2.2 `(margin / (qnorm((1 + level) / 2) * sqrt(0.25 / n)))^2`
 * @example
 * impliedDesignEffect(0.037, 1012, 0.95); // => 1.4426...
 */
export function impliedDesignEffect(margin: number, n: number, level: number): number {
  required(isPositive(margin) && isPositive(n), 'impliedDesignEffect', 'margin and n above 0');
  required(isInside(level), 'impliedDesignEffect', 'level inside 0 and 1');
  return (margin / (criticalValue(1 - level, null) * Math.sqrt(0.25 / n))) ** 2;
}

import type { Interval } from '../interval';
import { isInside, isPositive, required } from '../require';
import { criticalValue } from '../distributions/critical-value';

export type WeightVariation = {
  /** Number of weights, those of 0 included. */
  readonly n: number;
  readonly sumWeights: number;
  readonly sumSquaredWeights: number;
  /** Squared coefficient of variation of the weights, with the variance over n. */
  readonly cvSquared: number;
  /** Kish's design effect, n·Σw²/(Σw)² = 1 + cvSquared. */
  readonly deff: number;
  /** (Σw)²/Σw², which is n / deff. */
  readonly effectiveN: number;
};

export type ImpliedDesignEffect = {
  readonly deff: number;
  /** What the smallest and the largest margin that print like the stated one imply; the low end may be 0. */
  readonly range: Interval;
  readonly effectiveN: number;
  /** The margin that a simple random sample of this size would have at a share of 50 percent. */
  readonly simpleRandomMargin: number;
};

/**
 * How much a set of weights varies, and what this alone costs (Kish).
 *
 * Use it for the weights of a respondent file when nothing else of the design is known. It leaves out
 * clustering, and overstates the cost of weighting to what is related with the answers.
 *
 * @param weights at least one, each at least 0, not all 0; a weight of 0 counts in the sample size
 * @returns the sums, cv², design effect and effective size; the scale of the weights changes only the sums
 * @throws RangeError `weightVariation requires weights of at least 0, not all 0`
 * @throws RangeError `weightVariation requires weights whose squares have a finite sum above 0`
 * @see Kish (1965), Survey Sampling (from memory); closed form in R 4.2.2 `n * sum(w^2) / sum(w)^2`
 * @example
 * weightVariation([0.5, 2, 4, 1]).effectiveN; // => 2.6470588235294117
 * weightVariation([0, 1, 1, 2]).n; // => 4
 * weightVariation([3, 3, 3]).cvSquared; // => 0
 */
export function weightVariation(weights: ArrayLike<number>): WeightVariation {
  const n = weights.length;
  const { sum, largest } = sumAndLargest(weights, 'weightVariation');
  const mean = sum / n / largest;
  let squares = 0;
  let deviations = 0;
  for (let index = 0; index < n; index += 1) {
    const relative = (weights[index] ?? 0) / largest;
    squares += relative * relative;
    deviations += (relative - mean) * (relative - mean);
  }
  const sumSquaredWeights = squares * largest * largest;
  required(
    Number.isFinite(sum) && sumSquaredWeights > 0 && Number.isFinite(sumSquaredWeights),
    'weightVariation',
    'weights whose squares have a finite sum above 0',
  );
  const effectiveN = (n * mean * n * mean) / squares;
  const cvSquared = deviations / n / (mean * mean);
  return { n, sumWeights: sum, sumSquaredWeights, cvSquared, deff: n / effectiveN, effectiveN };
}

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
export function kishDesignEffect(weights: ArrayLike<number>): number {
  const { largest } = sumAndLargest(weights, 'kishDesignEffect');
  let sum = 0;
  let squares = 0;
  for (let index = 0; index < weights.length; index += 1) {
    const relative = (weights[index] ?? 0) / largest;
    sum += relative;
    squares += relative * relative;
  }
  return (weights.length * squares) / (sum * sum);
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

/**
 * The design effect that a stated margin implies, with the range that the rounding of the margin leaves open.
 *
 * Use it where the pollster states no design effect. A margin that is no wider than a simple random sample's
 * says nothing about weighting: compare with `simpleRandomMargin` first.
 *
 * @param margin half-width as printed, proportion above 0
 * @param n sample size, above 0
 * @param level the level the margin was stated at, inside 0–1
 * @param roundingUnit what the margin was rounded to, proportion above 0 (0.001 for a tenth of a point)
 * @returns range from margin ∓ half a unit; its low end is 0 where half a unit reaches the margin
 * @throws RangeError `impliedDesignEffectRange requires margin, n and roundingUnit above 0`
 * @throws RangeError `impliedDesignEffectRange requires level inside 0 and 1`
 * @see closed form in R 4.2.2 `(margin / (qnorm((1 + level) / 2) * sqrt(0.25 / n)))^2`
 * @example
 * impliedDesignEffectRange(0.037, 1012, 0.95, 0.001).range; // => [1.4038..., 1.4818...]
 * impliedDesignEffectRange(0.037, 1012, 0.95, 0.001).effectiveN; // => 701.5...
 */
export function impliedDesignEffectRange(
  margin: number,
  n: number,
  level: number,
  roundingUnit: number,
): ImpliedDesignEffect {
  required(
    isPositive(margin) && isPositive(n) && isPositive(roundingUnit),
    'impliedDesignEffectRange',
    'margin, n and roundingUnit above 0',
  );
  required(isInside(level), 'impliedDesignEffectRange', 'level inside 0 and 1');
  const simpleRandomMargin = criticalValue(1 - level, null) * Math.sqrt(0.25 / n);
  const deffAt = (half: number) => (half / simpleRandomMargin) ** 2;
  const deff = deffAt(margin);
  const range: Interval = [deffAt(Math.max(0, margin - roundingUnit / 2)), deffAt(margin + roundingUnit / 2)];
  return { deff, range, effectiveN: n / deff, simpleRandomMargin };
}

function sumAndLargest(weights: ArrayLike<number>, fn: string): { sum: number; largest: number } {
  let sum = 0;
  let largest = 0;
  let usable = true;
  for (let index = 0; index < weights.length; index += 1) {
    const weight = weights[index] ?? Number.NaN;
    usable = usable && weight >= 0 && Number.isFinite(weight);
    sum += weight;
    if (weight > largest) largest = weight;
  }
  required(usable && largest > 0, fn, 'weights of at least 0, not all 0');
  return { sum, largest };
}

import { isPositive, isProportion, required } from '../require';

/**
 * Standard error of a share in a sample with a design effect.
 *
 * @param p share, 0–1
 * @param n sample size, above 0
 * @param deff design effect, above 0
 * @returns proportion; 0 for a share of 0 or 1
 * @throws RangeError `shareStandardError requires p from 0 to 1`
 * @throws RangeError `shareStandardError requires n and deff above 0`
 * @see R 4.2.2 `sqrt(deff * p * (1 - p) / n)`
 * @example
 * shareStandardError(0.5, 1000, 1); // => 0.0158113...
 */
export function shareStandardError(p: number, n: number, deff: number): number {
  required(isProportion(p), 'shareStandardError', 'p from 0 to 1');
  required(isPositive(n) && isPositive(deff), 'shareStandardError', 'n and deff above 0');
  return Math.sqrt((deff * p * (1 - p)) / n);
}

/**
 * Standard error of the lead of one option over another in one sample (multinomial).
 *
 * The two shares come from the same people, so the errors do not simply add up as in two samples.
 *
 * @param a share of the first, 0–1
 * @param b share of the second, 0–1, a + b at most a rounding error above 1
 * @param n sample size, above 0
 * @param deff design effect, above 0
 * @throws RangeError `leadStandardError requires shares from 0 to 1`
 * @throws RangeError `leadStandardError requires n and deff above 0`
 * @see R 4.2.2 `sqrt(deff * (a + b - (a - b)^2) / n)`
 * @example
 * leadStandardError(0.47, 0.41, 1012, 1.4426); // => 0.0353454...
 */
export function leadStandardError(a: number, b: number, n: number, deff: number): number {
  required(isProportion(a) && isProportion(b), 'leadStandardError', 'shares from 0 to 1');
  required(isPositive(n) && isPositive(deff), 'leadStandardError', 'n and deff above 0');
  return Math.sqrt((deff * Math.max(0, a + b - (a - b) ** 2)) / n);
}

/**
 * Standard error of the lead if the truth were level: what the score test of a lead divides by.
 *
 * @param a share of the first, 0–1
 * @param b share of the second, 0–1
 * @param n sample size, above 0
 * @param deff design effect, above 0
 * @throws RangeError `leadNullStandardError requires shares from 0 to 1`
 * @throws RangeError `leadNullStandardError requires n and deff above 0`
 * @see R 4.2.2 `sqrt(deff * (a + b) / n)`; its square test is McNemar's without correction when deff = 1
 * @example
 * leadNullStandardError(0.47, 0.41, 1012, 1); // => 0.0294883...
 */
export function leadNullStandardError(a: number, b: number, n: number, deff: number): number {
  required(isProportion(a) && isProportion(b), 'leadNullStandardError', 'shares from 0 to 1');
  required(isPositive(n) && isPositive(deff), 'leadNullStandardError', 'n and deff above 0');
  return Math.sqrt((deff * (a + b)) / n);
}

/**
 * Standard error of the difference of two shares from two samples if both had one share (pooled).
 *
 * @param p1 first share, 0–1
 * @param n1 effective size of the first sample, above 0
 * @param p2 second share, 0–1
 * @param n2 effective size of the second sample, above 0
 * @throws RangeError `pooledStandardError requires shares from 0 to 1`
 * @throws RangeError `pooledStandardError requires sizes above 0`
 * @see R 4.2.2 `prop.test(correct = FALSE)` on effective counts
 * @example
 * pooledStandardError(0.44, 700, 0.47, 700); // => 0.0266176...
 */
export function pooledStandardError(p1: number, n1: number, p2: number, n2: number): number {
  required(isProportion(p1) && isProportion(p2), 'pooledStandardError', 'shares from 0 to 1');
  required(isPositive(n1) && isPositive(n2), 'pooledStandardError', 'sizes above 0');
  const pooled = Math.min(1, (n1 * p1 + n2 * p2) / (n1 + n2));
  return Math.sqrt(pooled * (1 - pooled) * (1 / n1 + 1 / n2));
}

/**
 * Half-width of the interval of a share at 50 percent, which no other share of the sample exceeds.
 *
 * @param n sample size, above 0
 * @param deff design effect, above 0
 * @param q critical value, above 0
 * @returns proportion
 * @throws RangeError `maximumMargin requires n, deff and q above 0`
 * @see common practice, no source
 * @example
 * maximumMargin(1000, 1, 1.959963984540054); // => 0.0309897...
 */
export function maximumMargin(n: number, deff: number, q: number): number {
  required([n, deff, q].every(isPositive), 'maximumMargin', 'n, deff and q above 0');
  return q * Math.sqrt((0.25 * deff) / n);
}

import type { Interval } from '../interval';
import { wilsonInterval } from './wilson-interval';

/**
 * Hybrid score interval of the difference p2 − p1 of two shares from two samples.
 *
 * @param p1 first share, 0–1
 * @param n1 effective size of the first sample, above 0
 * @param p2 second share, 0–1
 * @param n2 effective size of the second sample, above 0
 * @param z critical value of the normal distribution, above 0
 * @returns proportions inside −1 to 1
 * @throws RangeError as wilsonInterval does
 * @see Newcombe (1998), Statistics in Medicine 17, 873–890, method 10 (from memory); checked against closed forms
 *   computed in R 4.2.2
 * @example
 * newcombeInterval(0.44, 700, 0.47, 700, 1.959963984540054); // => [-0.0221..., 0.0818...]
 */
export function newcombeInterval(p1: number, n1: number, p2: number, n2: number, z: number): Interval {
  const [low1, high1] = wilsonInterval(p1, n1, z);
  const [low2, high2] = wilsonInterval(p2, n2, z);
  const difference = p2 - p1;
  return [difference - Math.hypot(p2 - low2, high1 - p1), difference + Math.hypot(high2 - p2, p1 - low1)];
}

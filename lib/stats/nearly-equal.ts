const RELATIVE = 1e-9;

/**
 * Whether two numbers differ by less than one part in a thousand million.
 *
 * Use it at decided limits (10 effective counts, 50, a minimum size), so that the last bits of a computation do
 * not choose the method. Not for tests of significance, which compare as they are.
 *
 * @param a any finite number
 * @param b any finite number
 * @returns true also for two zeros
 * @example
 * nearlyEqual(0.1 + 0.2, 0.3); // => true
 * nearlyEqual(10, 10.0001); // => false
 */
export function nearlyEqual(a: number, b: number): boolean {
  return a === b || Math.abs(a - b) < RELATIVE * Math.max(Math.abs(a), Math.abs(b));
}

/**
 * Whether a number lies below a limit, a number that is nearly equal to the limit not counting as below.
 *
 * @param value any finite number
 * @param limit the limit
 * @example
 * isBelow(9.9, 10); // => true
 * isBelow(9.99999999999, 10); // => false
 */
export function isBelow(value: number, limit: number): boolean {
  return value < limit && !nearlyEqual(value, limit);
}

/**
 * A number of zero or more, rounded to a whole one, halves upwards; what is nearly a half counts as one.
 *
 * @param value zero or more
 * @throws RangeError `roundHalfUp requires a number of at least 0`
 * @example
 * roundHalfUp(2.5); // => 3
 * roundHalfUp(2.4999999999999); // => 3
 * roundHalfUp(2.49); // => 2
 */
export function roundHalfUp(value: number): number {
  if (!(value >= 0)) throw new RangeError('roundHalfUp requires a number of at least 0');
  const half = Math.floor(value) + 0.5;
  return isBelow(value, half) ? Math.floor(value) : Math.floor(value) + 1;
}

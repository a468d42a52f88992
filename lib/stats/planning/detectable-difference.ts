import { isPositive, required } from '../require';

/** The normal quantile of 80 percent: a test finds such a difference four times in five. */
const POWER_80 = 0.8416212335729143;

/**
 * The true difference that a test with this standard error would have found four times in five.
 *
 * Use it beside "not shown", so that a poll too small to see a difference is not read as showing none.
 *
 * @param critical critical value of the test, above 0
 * @param standardError above 0
 * @returns in the unit of standardError
 * @throws RangeError `detectableDifference requires critical and standardError above 0`
 * @see normal approximation without the far tail; common practice, no source
 * @example
 * detectableDifference(1.959963984540054, 0.035); // => 0.0980554...
 */
export function detectableDifference(critical: number, standardError: number): number {
  required(
    isPositive(critical) && isPositive(standardError),
    'detectableDifference',
    'critical and standardError above 0',
  );
  return (critical + POWER_80) * standardError;
}

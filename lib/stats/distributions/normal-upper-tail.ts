import erfc from '@stdlib/math-base-special-erfc';
import jstat from 'jstat';
import { required } from '../require';

const JSTAT_REACH = 4;

/**
 * The probability that a standard normal variable exceeds z.
 *
 * Exact to about 1e-12 relative down to 1e-300: jstat up to |z| = 4, stdlib beyond, where jstat loses digits
 * (from about 4.25) and gives 0 from 8.3 on (measured).
 *
 * @param z any number
 * @throws RangeError `normalUpperTail requires a number`
 * @see R 4.2.2 `pnorm(z, lower.tail = FALSE)`
 * @example
 * normalUpperTail(0); // => 0.5
 * normalUpperTail(1.959963984540054); // => 0.025
 * normalUpperTail(10); // => 7.61985302416047e-24
 */
export function normalUpperTail(z: number): number {
  required(!Number.isNaN(z), 'normalUpperTail', 'a number');
  if (Math.abs(z) <= JSTAT_REACH) return jstat.jStat.normal.cdf(-z, 0, 1);
  return 0.5 * erfc(z / Math.SQRT2);
}

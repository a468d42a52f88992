import type { Alternative } from './alternative';
import { normalUpperTail } from './normal-upper-tail';
import { required } from '../require';

/**
 * The p-value of a statistic that is standard normal if there is no difference.
 *
 * Use a one-sided alternative only where it was chosen before the figures were seen.
 *
 * @param z any number; an infinite one is beyond every doubt
 * @param alternative 'two-sided', 'less' (z below 0 speaks for it) or 'greater' (z above 0 does)
 * @returns probability 0–1, with its digits down to 1e-300
 * @throws RangeError `normalP requires a number`
 * @see R 4.2.2 `2 * pnorm(-abs(z))`, `pnorm(z)`, `pnorm(z, lower.tail = FALSE)`
 * @example
 * normalP(1.5, 'two-sided'); // => 0.1336144...
 * normalP(1.5, 'greater'); // => 0.0668072...
 * normalP(1.5, 'less'); // => 0.9331927...
 */
export function normalP(z: number, alternative: Alternative): number {
  required(!Number.isNaN(z), 'normalP', 'a number');
  if (alternative === 'two-sided') return Math.min(1, 2 * normalUpperTail(Math.abs(z)));
  return normalUpperTail(alternative === 'greater' ? z : -z);
}

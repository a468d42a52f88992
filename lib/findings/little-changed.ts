import { criticalAt } from './critical-at';
import type { Policy, TestFields } from './check-types';
import type { Measured } from './measured';

const PART_OF_EARLIER = 1 / 5;

/**
 * Whether a change that is not shown is also shown to be small: two one-sided tests, with rounding and the high end
 * of the design effects allowed for, against the desk's margin of indifference or a fifth of the earlier share,
 * whichever is smaller. Usually out of reach at common sample sizes.
 *
 * @param measured the change
 * @param fields its judged test
 * @param earlierPct the earlier share in percent
 * @param policy the desk's policy, complete
 * @returns always false beside any verdict but `does-not-hold`
 */
export function littleChanged(
  measured: Measured,
  { verdict, estimatePp, roundingPp }: TestFields,
  earlierPct: number,
  policy: Policy,
): boolean {
  if (verdict !== 'does-not-hold') return false;
  const oneSided = criticalAt(2 * (1 - policy.level), measured.df);
  const reach = Math.abs(estimatePp) + roundingPp + oneSided * 100 * measured.standardError('high');
  return reach < Math.min(policy.indifferencePp, PART_OF_EARLIER * earlierPct);
}

import { normalUpperTail } from '../distributions/normal-upper-tail';
import { plannedCritical, type TestSides } from './sides';
import { requireSample, requireTwoPolls, unitErrorsOfChange } from './two-shares';

export type ChangePlan = {
  /** True share at the time of the first poll, 0–1. */
  p1: number;
  /** True share at the time of the second, 0–1. */
  p2: number;
  /** Size of each poll, above 0. */
  n: number;
  /** Design effect of each, above 0. */
  deff: number;
  /** Error probability of the test, inside 0–1. */
  alpha: number;
  alternative: TestSides;
};

export type ChangePower = {
  /** Probability of a significant result in the direction of the true change. */
  power: number;
  /** In either direction; the same as power in a one-sided test. */
  powerStrict: number;
};

/**
 * How often two polls of one size would show a true change of a share.
 *
 * Use it before the polls, or with a change that is worth knowing; with the change that was observed it says no
 * more than the p-value does.
 *
 * @returns probabilities; with p1 = p2 the probability of a false alarm
 * @throws RangeError `changePower requires p1 and p2 from 0 to 1, not both 0 or 1`
 * @throws RangeError `changePower requires n and deff above 0`
 * @throws RangeError `changePower requires alpha inside 0 and 1`
 * @throws RangeError `changePower requires alternative 'two.sided' or 'one.sided'`
 * @see R 4.2.2 `power.prop.test(n / deff, p1, p2, sig.level = alpha, strict = FALSE)`, and TRUE
 * @example
 * changePower({ p1: 0.48, p2: 0.53, n: 1000, deff: 1, alpha: 0.05, alternative: 'two.sided' }).power; // => 0.6089416...
 */
export function changePower({ p1, p2, n, deff, alpha, alternative }: ChangePlan): ChangePower {
  requireTwoPolls(p1, p2, 'changePower');
  requireSample(n, deff, 'changePower');
  const critical = plannedCritical(alpha, alternative, 'changePower');
  const { level, actual } = unitErrorsOfChange(p1, p2);
  const difference = Math.abs(p1 - p2) * Math.sqrt(n / deff);
  const power = normalUpperTail((critical * level - difference) / actual);
  const wrongWay =
    alternative === 'two.sided' ? normalUpperTail((critical * level + difference) / actual) : 0;
  return { power, powerStrict: power + wrongWay };
}

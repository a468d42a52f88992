import { criticalValue } from '../distributions/critical-value';
import { isInside, required } from '../require';

/** Whether a test looks in both directions or only in the one that was named beforehand. */
export type TestSides = 'two.sided' | 'one.sided';

/** The critical value of a planned test; the message names the function that was asked. */
export function plannedCritical(alpha: number, alternative: TestSides, fn: string): number {
  required(isInside(alpha), fn, 'alpha inside 0 and 1');
  required(
    alternative === 'two.sided' || alternative === 'one.sided',
    fn,
    "alternative 'two.sided' or 'one.sided'",
  );
  return criticalValueOf(alpha, alternative);
}

/** One-sided at alpha is two-sided at 2·alpha, which passes 1 from alpha = 0.5 on: there the sign turns. */
function criticalValueOf(alpha: number, alternative: TestSides): number {
  if (alternative === 'two.sided') return criticalValue(alpha, null);
  if (alpha === 0.5) return 0;
  return alpha < 0.5 ? criticalValue(2 * alpha, null) : -criticalValue(2 * (1 - alpha), null);
}

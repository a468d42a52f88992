import { normalP } from '../distributions/normal-p';
import { required } from '../require';

/**
 * McNemar's test with continuity correction, of the counts of the two options of a lead.
 *
 * Use it for unweighted counts; without the correction it is the score test of the lead, squared.
 *
 * @param first whole count of the first option, at least 0
 * @param second whole count of the second, at least 0
 * @returns two-sided probability 0–1; 1 for equal counts; null without any counts
 * @throws RangeError `mcnemarCorrectedP requires whole counts of at least 0`
 * @see McNemar (1947), Psychometrika 12, 153–157 (from memory); R 4.2.2
 *   `mcnemar.test(matrix(c(1, first, second, 1), 2), correct = TRUE)`
 * @example
 * mcnemarCorrectedP(60, 40); // => 0.0574331...
 * mcnemarCorrectedP(0, 0); // => null
 */
export function mcnemarCorrectedP(first: number, second: number): number | null {
  const whole = [first, second].every((count) => Number.isSafeInteger(count) && count >= 0);
  required(whole, 'mcnemarCorrectedP', 'whole counts of at least 0');
  if (first + second === 0) return null;
  const lessened = Math.max(0, Math.abs(first - second) - 1);
  return normalP(lessened / Math.sqrt(first + second), 'two-sided');
}

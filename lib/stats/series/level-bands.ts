import { criticalValue } from '../distributions/critical-value';
import type { Interval } from '../interval';
import { isInside, required } from '../require';
import { isValue } from './refuse-series';

/**
 * The band of a level: an interval for each day, widened by a floor that the desk sets.
 *
 * Polls cannot tell an error that all pollsters share. The floor is a standard deviation for it, added in squares to
 * what was estimated; say so beside the band. It belongs to levels, not to changes, in which a lasting error cancels.
 *
 * @param means level of each day
 * @param variances its variance, at least 0
 * @param confidence confidence level, inside 0–1
 * @param floorSd the desk's least standard deviation, at least 0, in the unit of the level
 * @returns an interval per day; of width 0 where variance and floor are 0
 * @throws RangeError `levelBands requires as many variances as means, of at least 0`
 * @throws RangeError `levelBands requires means that are finite numbers`
 * @throws RangeError `levelBands requires a confidence level inside 0 and 1`
 * @throws RangeError `levelBands requires a floor of at least 0`
 * @see common practice, no source
 * @example
 * levelBands([0.43], [0.0004], 0.95, 0.015); // => [[0.381..., 0.478...]]
 */
export function levelBands(
  means: readonly number[],
  variances: readonly number[],
  confidence: number,
  floorSd: number,
): Interval[] {
  const fn = 'levelBands';
  const variancesFit =
    means.length === variances.length && variances.every((one) => one >= 0 && isValue(one));
  required(variancesFit, fn, 'as many variances as means, of at least 0');
  required(means.every(isValue), fn, 'means that are finite numbers');
  required(isInside(confidence), fn, 'a confidence level inside 0 and 1');
  required(floorSd >= 0 && isValue(floorSd), fn, 'a floor of at least 0');
  const critical = criticalValue(1 - confidence, null);
  return means.map((mean, day) => {
    const half = critical * Math.sqrt(variances[day]! + floorSd * floorSd);
    return [mean - half, mean + half];
  });
}

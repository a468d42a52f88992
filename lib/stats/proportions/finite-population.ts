import { isInside, isPositive, required } from '../require';
import { criticalValue } from '../distributions/critical-value';
import { requireShares, type SampleShare } from './sample-share';

/**
 * Two ways to count what a sample leaves out: 'one-less' √((N − n)/(N − 1)), the exact variance of a count drawn without
 * replacement at a known share; 'fraction' √(1 − n/N), as estimates from a sample have it.
 */
export type PopulationConvention = 'one-less' | 'fraction';

/**
 * What a margin of error is multiplied by when the sample is a good part of the whole population.
 *
 * Use it for members, delegates, shareholders; with millions of voters it is 1 to every printed digit.
 *
 * @param n sample size, above 0 and at most population
 * @param population number of people, at least 1
 * @param convention which of the two forms
 * @returns 0–1; 0 for a census, also one of a single person
 * @throws RangeError `finitePopulationFactor requires population of at least 1`
 * @throws RangeError `finitePopulationFactor requires n above 0, at most population`
 * @see Cochran (1977), Sampling Techniques, chapter 2 (from memory); closed forms in R 4.2.2
 * @example
 * finitePopulationFactor(400, 1000, 'one-less'); // => 0.7749...
 * finitePopulationFactor(400, 1000, 'fraction'); // => 0.7745966...
 */
export function finitePopulationFactor(
  n: number,
  population: number,
  convention: PopulationConvention,
): number {
  requirePopulation('finitePopulationFactor', n, population);
  if (n === population) return 0;
  return convention === 'one-less'
    ? Math.sqrt((population - n) / (population - 1))
    : Math.sqrt(1 - n / population);
}

/**
 * The margin of error of a share in a sample that is a good part of the population.
 *
 * @param share share, sample size and design effect
 * @param population number of people, at least the sample size
 * @param level confidence level, inside 0–1
 * @param convention which form of the factor
 * @returns half-width, proportion; 0 for a census
 * @throws RangeError `finitePopulationMargin requires p from 0 to 1`
 * @throws RangeError `finitePopulationMargin requires n and deff above 0`
 * @throws RangeError `finitePopulationMargin requires population of at least 1`
 * @throws RangeError `finitePopulationMargin requires n above 0, at most population`
 * @throws RangeError `finitePopulationMargin requires level inside 0 and 1`
 * @see closed form in R 4.2.2
 * @example
 * finitePopulationMargin({ p: 0.5, n: 400, deff: 1 }, 1000, 0.95, 'one-less'); // => 0.0379...
 */
export function finitePopulationMargin(
  share: SampleShare,
  population: number,
  level: number,
  convention: PopulationConvention,
): number {
  requireShares('finitePopulationMargin', share);
  requirePopulation('finitePopulationMargin', share.n, population);
  required(isInside(level), 'finitePopulationMargin', 'level inside 0 and 1');
  const { p, n, deff } = share;
  const infinite = criticalValue(1 - level, null) * Math.sqrt((deff * p * (1 - p)) / n);
  return infinite * finitePopulationFactor(n, population, convention);
}

/**
 * The standard error of a share in a sample from a finite population, as survey software estimates it: divided by n − 1.
 *
 * @param share share, sample size and design effect
 * @param population number of people, at least the sample size
 * @returns proportion; 0 for a census; null for a sample of one person or fewer, which shows no variance
 * @throws RangeError `finitePopulationStandardError requires p from 0 to 1`
 * @throws RangeError `finitePopulationStandardError requires n and deff above 0`
 * @throws RangeError `finitePopulationStandardError requires population of at least 1`
 * @throws RangeError `finitePopulationStandardError requires n above 0, at most population`
 * @see R 4.2.2, survey 4.1.1 `svymean` on `svydesign(fpc =)`; closed form `sqrt(deff * p * (1 - p) / (n - 1) * (1 - n / N))`
 * @example
 * finitePopulationStandardError({ p: 0.5, n: 401, deff: 1 }, 802); // => 0.0176776...
 * finitePopulationStandardError({ p: 1, n: 1, deff: 1 }, 802); // => null
 */
export function finitePopulationStandardError(share: SampleShare, population: number): number | null {
  requireShares('finitePopulationStandardError', share);
  requirePopulation('finitePopulationStandardError', share.n, population);
  const { p, n, deff } = share;
  if (n === population) return 0;
  return n > 1 ? Math.sqrt(((deff * p * (1 - p)) / (n - 1)) * (1 - n / population)) : null;
}

function requirePopulation(fn: string, n: number, population: number): void {
  required(population >= 1 && isPositive(population), fn, 'population of at least 1');
  required(isPositive(n) && n <= population, fn, 'n above 0, at most population');
}

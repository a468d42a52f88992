import { inRankOrder, smallestToCome, type PValues } from './in-rank-order';

/**
 * Benjamini and Hochberg's adjusted p-values: below alpha, at most that part of what is found is false, on average.
 *
 * Use it to sift many subgroups for a closer look, where tests are independent or positively dependent; not for claims
 * that go to print, where one false alarm is one too many (adjustHolm).
 *
 * @param pValues p-values 0–1, in any order; null where a test could not be made
 * @returns in the order given, at most 1; null stays null and does not count as a test
 * @throws RangeError `adjustBenjaminiHochberg requires p-values from 0 to 1, or null`
 * @see Benjamini and Hochberg (1995), Journal of the Royal Statistical Society B 57, 289–300 (from memory);
 *   R 4.2.2 `p.adjust(p, "BH")`
 * @example
 * adjustBenjaminiHochberg([0.01, null, 0.04, 0.03]); // => [0.03, null, 0.04, 0.04]
 */
export function adjustBenjaminiHochberg(pValues: PValues): (number | null)[] {
  return inRankOrder('adjustBenjaminiHochberg', pValues, (ascending) => falseDiscovery(ascending, 1));
}

/**
 * Benjamini and Yekutieli's adjusted p-values: as Benjamini and Hochberg's, for tests of any dependence.
 *
 * @param pValues p-values 0–1, in any order; null where a test could not be made
 * @returns in the order given, at most 1; null stays null and does not count as a test
 * @throws RangeError `adjustBenjaminiYekutieli requires p-values from 0 to 1, or null`
 * @see Benjamini and Yekutieli (2001), Annals of Statistics 29, 1165–1188 (from memory); R 4.2.2 `p.adjust(p, "BY")`
 * @example
 * adjustBenjaminiYekutieli([0.01, null, 0.04]); // => [0.03, null, 0.06]
 */
export function adjustBenjaminiYekutieli(pValues: PValues): (number | null)[] {
  return inRankOrder('adjustBenjaminiYekutieli', pValues, (ascending) => {
    const harmonic = ascending.reduce((sum, _, rank) => sum + 1 / (rank + 1), 0);
    return falseDiscovery(ascending, harmonic);
  });
}

function falseDiscovery(ascending: readonly number[], factor: number): number[] {
  return smallestToCome(ascending.map((p, rank) => ((factor * ascending.length) / (rank + 1)) * p));
}

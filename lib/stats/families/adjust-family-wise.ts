import { inRankOrder, runningLargest, smallestToCome, type PValues } from './in-rank-order';

/**
 * Bonferroni's adjusted p-values: each times the number of tests.
 *
 * Use it where the number must be explained in one sentence; Holm finds at least as much and is as safe.
 *
 * @param pValues p-values 0–1, in any order; null where a test could not be made
 * @returns in the order given, at most 1; null stays null and does not count as a test
 * @throws RangeError `adjustBonferroni requires p-values from 0 to 1, or null`
 * @see R 4.2.2 `p.adjust(p, "bonferroni")`
 * @example
 * adjustBonferroni([0.01, null, 0.04]); // => [0.02, null, 0.08]
 */
export function adjustBonferroni(pValues: PValues): (number | null)[] {
  return inRankOrder('adjustBonferroni', pValues, (ascending) => ascending.map((p) => p * ascending.length));
}

/**
 * Holm's adjusted p-values: below alpha exactly where Holm's procedure finds a test significant.
 *
 * Use it for a family of any dependence, as in one poll's leads: one false alarm among all stays as rare as alpha.
 *
 * @param pValues p-values 0–1, in any order; null where a test could not be made
 * @returns in the order given, at most 1; null stays null and does not count as a test
 * @throws RangeError `adjustHolm requires p-values from 0 to 1, or null`
 * @see Holm (1979), Scandinavian Journal of Statistics 6, 65–70 (from memory); R 4.2.2 `p.adjust(p, "holm")`
 * @example
 * adjustHolm([0.04, null, 0.01]); // => [0.04, null, 0.02]
 */
export function adjustHolm(pValues: PValues): (number | null)[] {
  return inRankOrder('adjustHolm', pValues, (ascending) =>
    runningLargest(ascending.map((p, rank) => (ascending.length - rank) * p)),
  );
}

/**
 * Hochberg's adjusted p-values, never above Holm's.
 *
 * Use it only for tests that are independent or positively dependent. Leads of one poll are often negatively dependent:
 * there Holm.
 *
 * @param pValues p-values 0–1, in any order; null where a test could not be made
 * @returns in the order given, at most 1; null stays null and does not count as a test
 * @throws RangeError `adjustHochberg requires p-values from 0 to 1, or null`
 * @see Hochberg (1988), Biometrika 75, 800–802 (from memory); R 4.2.2 `p.adjust(p, "hochberg")`
 * @example
 * adjustHochberg([0.03, null, 0.04]); // => [0.04, null, 0.04]
 */
export function adjustHochberg(pValues: PValues): (number | null)[] {
  return inRankOrder('adjustHochberg', pValues, (ascending) =>
    smallestToCome(ascending.map((p, rank) => (ascending.length - rank) * p)),
  );
}

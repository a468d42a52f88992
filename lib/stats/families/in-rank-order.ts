import { isProportion, required } from '../require';

/** p-values of a family in the order asked; null where a test could not be made. */
export type PValues = readonly (number | null)[];

/**
 * Adjusts the p-values that are there, ascending, and puts each back in its place; null stays null and is not counted.
 *
 * @param fn the function that asks, for its refusal
 * @param pValues p-values 0–1 or null
 * @param adjust from the ascending ones to as many adjusted ones, not yet cut at 1
 */
export function inRankOrder(
  fn: string,
  pValues: PValues,
  adjust: (ascending: readonly number[]) => readonly number[],
): (number | null)[] {
  required(
    pValues.every((p) => p === null || isProportion(p)),
    fn,
    'p-values from 0 to 1, or null',
  );
  const ranked = pValues
    .flatMap((p, index) => (p === null ? [] : [{ p, index }]))
    .sort((a, b) => a.p - b.p || a.index - b.index);
  const adjusted = adjust(ranked.map(({ p }) => p));
  const results: (number | null)[] = pValues.map(() => null);
  ranked.forEach(({ index }, rank) => {
    results[index] = Math.min(1, adjusted[rank] ?? 1);
  });
  return results;
}

/** Each value, or the largest before it where that is larger. */
export function runningLargest(values: readonly number[]): number[] {
  let largest = 0;
  return values.map((value) => (largest = Math.max(largest, value)));
}

/** Each value, or the smallest after it where that is smaller. */
export function smallestToCome(values: readonly number[]): number[] {
  let smallest = Infinity;
  return values
    .map((_, index) => (smallest = Math.min(smallest, values.at(-1 - index) ?? smallest)))
    .reverse();
}

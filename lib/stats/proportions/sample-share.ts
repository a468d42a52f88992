import { isPositive, isProportion, required } from '../require';

/** A share measured on one sample: share 0–1, sample size above 0 and design effect above 0 (1 if there is none). */
export type SampleShare = { readonly p: number; readonly n: number; readonly deff: number };

/** Throws in the name of a function unless every share can be used. */
export function requireShares(fn: string, ...shares: readonly SampleShare[]): void {
  required(
    shares.every(({ p }) => isProportion(p)),
    fn,
    'p from 0 to 1',
  );
  required(
    shares.every(({ n, deff }) => isPositive(n) && isPositive(deff)),
    fn,
    'n and deff above 0',
  );
}

/**
 * The sample that a share is worth: as many people and answers as a simple random sample of the same precision has.
 *
 * Use it to ask an exact method about a weighted sample. Both numbers are real, not rounded.
 *
 * @param share share, sample size and design effect
 * @returns x, the count of the share, 0–n; n, the effective sample size
 * @throws RangeError `effectiveCounts requires p from 0 to 1`
 * @throws RangeError `effectiveCounts requires n and deff above 0`
 * @see Kish (1965), Survey Sampling (from memory); R 4.2.2 `n / deff`, `p * n / deff`
 * @example
 * effectiveCounts({ p: 0.4, n: 1000, deff: 1.25 }); // => { x: 320, n: 800 }
 */
export function effectiveCounts(share: SampleShare): { readonly x: number; readonly n: number } {
  requireShares('effectiveCounts', share);
  const n = share.n / share.deff;
  return { x: Math.min(n, share.p * n), n };
}

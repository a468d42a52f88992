/** So that a size that is whole but for its last bits is not raised by one person. */
const LAST_BITS = 1e-9;

/** The smallest whole sample that is at least the real one; 0 for 0. */
export function wholeSample(nReal: number): number {
  return Math.max(0, Math.ceil(nReal - LAST_BITS));
}

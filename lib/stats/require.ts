/** Throws `<fn> requires <condition>` unless the condition is met; NaN meets no comparison. */
export function required(met: boolean, fn: string, condition: string): void {
  if (!met) throw new RangeError(`${fn} requires ${condition}`);
}

export const isProportion = (value: number): boolean => value >= 0 && value <= 1;
export const isInside = (value: number): boolean => value > 0 && value < 1;
/** Sizes, design effects, critical values: beyond these limits their squares and quotients leave the range of a double. */
const LEAST = 1e-75;
const LARGEST = 1e75;
export const isPositive = (value: number): boolean => value >= LEAST && value <= LARGEST;

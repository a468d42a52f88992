export type PrintedNumber = { units: number; decimals: number };

/**
 * Reads a number as printed in a release, digit by digit: `47`, `47.0`, `47,5 %`. The decimals that are printed
 * are kept, since they say how far the number was rounded.
 * Returns null for anything else, and for more than six decimals.
 */
export function readPrintedNumber(text: string): PrintedNumber | null {
  const match = /^(\d{1,9})(?:[.,](\d{1,6}))?\s*%?$/.exec(text.trim());
  if (!match) return null;
  const [, whole, fraction = ''] = match;
  return { units: Number(`${whole}${fraction}`), decimals: fraction.length };
}

/** The same number in units of a finer last decimal. */
export function unitsAt(printed: PrintedNumber, decimals: number): number {
  return printed.units * 10 ** (decimals - printed.decimals);
}

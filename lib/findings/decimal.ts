/** A finite number as `digits × 10^−places`, exactly as its shortest decimal reads. */
function decimalOf(value: number): { digits: bigint; places: number } {
  const [mantissa = '0', exponent = '0'] = String(value).split('e');
  const [whole = '0', fraction = ''] = mantissa.split('.');
  const places = fraction.length - Number(exponent);
  const digits = BigInt(whole + fraction);
  return places >= 0 ? { digits, places } : { digits: digits * 10n ** BigInt(-places), places: 0 };
}

/**
 * How many decimals a number needs when written out.
 *
 * @param value a finite number
 * @example
 * decimalPlaces(5.5); // => 1
 * decimalPlaces(47); // => 0
 */
export function decimalPlaces(value: number): number {
  return decimalOf(value).places;
}

/**
 * Whether a number is a whole multiple of a unit in exact decimals, as 3.6 is of 0.1.
 *
 * @param value a finite number
 * @param unit above 0
 * @example
 * isMultipleOf(3.6, 0.1); // => true
 * isMultipleOf(3.6, 0.5); // => false
 */
export function isMultipleOf(value: number, unit: number): boolean {
  const a = decimalOf(value);
  const b = decimalOf(unit);
  const places = Math.max(a.places, b.places);
  const scaled = ({ digits, places: own }: typeof a) => digits * 10n ** BigInt(places - own);
  return scaled(a) % scaled(b) === 0n;
}

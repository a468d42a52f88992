/** One line of a worked calculation, for a person to follow with a pocket calculator. */
export type WorkingStep = {
  label: string;
  /** With symbols: `d · (z / c)²`. */
  formula: string;
  /** The same with the numbers in it; where the formula is plain arithmetic, it can be evaluated as it stands. */
  substituted: string;
  result: string;
  unit: '' | 'points' | 'percent' | 'people';
};

const DIGITS = 6;

/**
 * A number of a worked calculation: at most six significant digits, no closing zeros, U+2212 for a minus.
 *
 * @param value any finite number
 * @example
 * figure(3.5345555631722627); // => '3.53456'
 * figure(-0.5); // => '−0.5'
 */
export function figure(value: number): string {
  return String(Number(value.toPrecision(DIGITS))).replaceAll('-', '−');
}

/** Both ends of an interval. */
export function figures([low, high]: readonly [number, number]): string {
  return `${figure(low)} to ${figure(high)}`;
}

/** A number as a factor or subtrahend: in brackets where it is negative. */
export function inBrackets(value: number): string {
  return value < 0 ? `(${figure(value)})` : figure(value);
}

export const yesOrNo = (met: boolean): string => (met ? 'yes' : 'no');

/** Numbers as they are printed. The locale is always the caller's; a minus is U+2212. */

const MINUS = '\u2212';
const NO_BREAK_SPACE = '\u00a0';
const NARROW_NO_BREAK_SPACE = '\u202f';

const formatters = new Map<string, Intl.NumberFormat>();

/**
 * Rounds once, for print: halves go away from zero, so that A minus B and B minus A mirror each other.
 *
 * Compare unrounded numbers; use this on what is shown and on nothing else. A value within a few units of the
 * twelfth digit of a half counts as the half it was meant to be (1.005 is 1.01 to two decimals).
 *
 * @throws RangeError `roundHalfUp requires a finite value`
 * @throws RangeError `roundHalfUp requires 0 to 6 decimals`
 * @example roundHalfUp(-2.25, 1) // => -2.3
 */
export function roundHalfUp(value: number, decimals: number): number {
  if (!Number.isFinite(value)) throw new RangeError('roundHalfUp requires a finite value');
  if (!Number.isInteger(decimals) || decimals < 0 || decimals > 6) {
    throw new RangeError('roundHalfUp requires 0 to 6 decimals');
  }
  const scale = 10 ** decimals;
  const rounded = Math.round(Number((Math.abs(value) * scale).toPrecision(12))) / scale;
  return value < 0 && rounded !== 0 ? -rounded : rounded;
}

/** A whole number of people or interviews, grouped: 1,012. */
export function formatCount(count: number, locale: string): string {
  return formatterOf(locale, {}).format(roundHalfUp(count, 0)).replace('-', MINUS);
}

/**
 * A share as the release printed it: 470 units with one decimal is 47.0, with its zero.
 *
 * @example formatShare(470, 1, 'en-GB') // => '47.0'
 */
export function formatShare(units: number, decimals: number, locale: string): string {
  return formatPoints(units / 10 ** decimals, decimals, locale);
}

/** A number with exactly so many decimals and, where negative, a real minus: −2.2. */
export function formatPoints(value: number, decimals: number, locale: string): string {
  return fixed(value, decimals, locale, 'auto');
}

/** As `formatPoints`, with a plus before what is above zero: +8, −9, 0. */
export function formatSigned(value: number, decimals: number, locale: string): string {
  return fixed(value, decimals, locale, 'exceptZero');
}

/** At most so many decimals, without trailing zeros: a design effect of 1.4, 1.89 or 2. */
export function formatTrimmed(value: number, decimals: number, locale: string): string {
  return formatterOf(locale, { maximumFractionDigits: decimals })
    .format(roundHalfUp(value, decimals))
    .replace('-', MINUS);
}

/**
 * A percentage with its sign where the language puts it: 95% in English, with a no-break space before the sign in
 * languages that set one there, a narrow one in French. The value is in percent, already as it should be printed.
 *
 * @see CLDR, percent patterns per locale; DIN 5008 for German and the RAE's Ortografía for Spanish, from memory
 */
export function formatPercent(pct: number, decimals: number, locale: string): string {
  return formatterOf(locale, {
    style: 'percent',
    minimumFractionDigits: decimals,
    maximumFractionDigits: decimals,
  })
    .format(roundHalfUp(pct, decimals) / 100)
    .replace('-', MINUS)
    .replace(/[\u00a0\u202f](?=%)/, locale.split('-')[0] === 'fr' ? NARROW_NO_BREAK_SPACE : NO_BREAK_SPACE);
}

/** A p-value as printed: `p = 0.031`, or `p < 0.001` where three decimals would show none of it. */
export function formatP(p: number, locale: string): string {
  return p < 0.001 ? `p < ${fixed(0.001, 3, locale, 'auto')}` : `p = ${fixed(p, 3, locale, 'auto')}`;
}

function fixed(value: number, decimals: number, locale: string, signDisplay: 'auto' | 'exceptZero'): string {
  return formatterOf(locale, {
    signDisplay,
    minimumFractionDigits: decimals,
    maximumFractionDigits: decimals,
  })
    .format(roundHalfUp(value, decimals))
    .replace('-', MINUS);
}

function formatterOf(locale: string, options: Intl.NumberFormatOptions): Intl.NumberFormat {
  const key = locale + JSON.stringify(options);
  let formatter = formatters.get(key);
  if (!formatter) {
    formatter = new Intl.NumberFormat(locale, options);
    formatters.set(key, formatter);
  }
  return formatter;
}

/** How numbers, names and facts are written in an R script, so that nothing written can end a string or a comment. */

const LONGEST_LABEL = 120;
const REPLACEMENT = '\uFFFD';

/**
 * A text as a string of R, in ASCII alone: quotes and backslashes escaped, everything else outside ASCII's printable
 * characters by its number.
 *
 * R's strings hold neither a null nor half a surrogate pair; both become U+FFFD.
 *
 * @param text any text
 * @returns the literal with its quotes, on one line
 * @see R Language Definition, section 10.3.1, literal constants
 * @example
 * rString('Öst "A"'); // => '"\\u00d6st \\"A\\""'
 * rString('a\nb'); // => '"a\\u000ab"'
 */
export function rString(text: string): string {
  return `"${[...holdable(text)].map(rCharacter).join('')}"`;
}

/**
 * A number with all its digits, as R reads it.
 *
 * @param value any finite number
 * @throws RangeError `rNumber requires a finite number`
 * @example
 * rNumber(1.4); // => '1.4'
 * rNumber(1e21); // => '1e+21'
 */
export function rNumber(value: number): string {
  if (!Number.isFinite(value)) throw new RangeError('rNumber requires a finite number');
  return String(value);
}

/** Several numbers as a vector; what is not disclosed is NA. */
export function rNumbers(values: readonly (number | null)[]): string {
  return `c(${values.map((value) => (value === null ? 'NA' : rNumber(value))).join(', ')})`;
}

/** Several texts as a vector. */
export function rStrings(texts: readonly string[]): string {
  return `c(${texts.map(rString).join(', ')})`;
}

export const rLogical = (value: boolean): string => (value ? 'TRUE' : 'FALSE');

/**
 * The names that options go by in a script: short enough to read, possible in R, and distinct wherever the options
 * are. An ordinary name goes by itself.
 *
 * @param options names of options, repeats allowed
 * @returns for each option its label
 * @example
 * labelsOf(['Alder', 'Brook', 'Alder']).get('Brook'); // => 'Brook'
 */
export function labelsOf(options: readonly string[]): ReadonlyMap<string, string> {
  const labels = new Map<string, string>();
  const taken = new Set(options);
  for (const option of new Set(options)) {
    const label = shortened(holdable(option));
    let distinct = label;
    for (let number = 2; distinct !== option && taken.has(distinct); number += 1) {
      distinct = `${label} (${number})`;
    }
    taken.add(distinct);
    labels.set(option, distinct);
  }
  return labels;
}

function shortened(text: string): string {
  const characters = [...text];
  return characters.length > LONGEST_LABEL ? `${characters.slice(0, LONGEST_LABEL).join('')}...` : text;
}

function holdable(text: string): string {
  return [...text]
    .map((character) => (/^(\0|[\uD800-\uDFFF])$/.test(character) ? REPLACEMENT : character))
    .join('');
}

function rCharacter(character: string): string {
  if (character === '"' || character === '\\') return `\\${character}`;
  if (/^[ -~]$/.test(character)) return character;
  const code = (character.codePointAt(0) ?? 0).toString(16);
  return code.length > 4 ? `\\U${code.padStart(8, '0')}` : `\\u${code.padStart(4, '0')}`;
}

import Papa from 'papaparse';

export type PastedShare = {
  option: string;
  /** The share as printed, with a decimal point; empty where the table has none. */
  printed: string;
};

const NUMBER = String.raw`\d{1,3}(?:[.,]\d+)?\s*%?`;
const IS_NUMBER = new RegExp(`^${NUMBER}$`);
/** A name, white space, then the number at the end of the line. */
const BY_SPACES = new RegExp(String.raw`^(.*[^\s,;])\s+(${NUMBER}|[-–—])$`);
const NOTHING = /^([-–—*]|n\/?a)?$/i;

/**
 * Options and shares from two columns copied out of a spreadsheet, a web page or a text.
 *
 * Columns may be parted by tabs, semicolons, commas or white space; a heading line, percent signs, decimal commas,
 * empty lines and a closing total of 100 are seen through. Further columns are left out.
 *
 * @param text what was pasted
 * @returns the rows in order; empty where the text is no table of options and numbers
 * @example
 * parsePastedShares('Alder\t47,5 %\nBrook\t41,0 %'); // => [{ option: 'Alder', printed: '47.5' }, { option: 'Brook', printed: '41.0' }]
 */
export function parsePastedShares(text: string): PastedShare[] {
  const lines = text
    .replace(/^\uFEFF/, '')
    .replace(/[\u00a0\u2007\u202f]/g, ' ')
    .split(/\r\n|\r|\n/)
    .filter((line) => line.trim() !== '');
  const rows = cellsOf(lines).map(readRow);
  if (!rows.some((row) => row !== null && row.printed !== '')) return [];
  return withoutTotal(rows.filter((row, at): row is PastedShare => row !== null && !isHeading(row, at)));
}

function cellsOf(lines: string[]): string[][] {
  if (lines.some((line) => line.includes('\t'))) return split(lines, '\t');
  if (lines.some((line) => line.includes(';'))) return split(lines, ';');
  const bySpaces = lines.map((line) => BY_SPACES.exec(line.trim()));
  const isSpaced = bySpaces.some(Boolean) && bySpaces.every((match, at) => match !== null || at === 0);
  if (!isSpaced) return split(lines, ',');
  return bySpaces.map((match, at) => (match ? [match[1] ?? '', match[2] ?? ''] : [lines[at] ?? '', '']));
}

function split(lines: string[], delimiter: string): string[][] {
  return Papa.parse<string[]>(lines.join('\n'), { delimiter }).data;
}

/** The first cell with words, and the first number after it. */
function readRow(cells: string[]): PastedShare | null {
  const plain = cells.map((cell) => cell.trim().replace(/\s+/g, ' '));
  const at = plain.findIndex((cell) => cell !== '' && !IS_NUMBER.test(cell));
  const option = plain[at];
  if (option === undefined || NOTHING.test(option)) return null;
  const after = plain.slice(at + 1);
  const number = after.find((cell) => IS_NUMBER.test(cell)) ?? after.find((cell) => !NOTHING.test(cell));
  return { option, printed: asPrinted(number ?? '') };
}

function asPrinted(cell: string): string {
  return IS_NUMBER.test(cell) ? cell.replace(/\s*%$/, '').replace(',', '.') : cell;
}

/** A first line whose place for the number is empty or says something else. */
function isHeading({ printed }: PastedShare, at: number): boolean {
  return at === 0 && !IS_NUMBER.test(printed) && !/^<\s*\d/.test(printed);
}

function withoutTotal(rows: PastedShare[]): PastedShare[] {
  const last = rows.at(-1);
  const isTotal = last && /^(total|sum|all)$/i.test(last.option) && Number(last.printed) === 100;
  return isTotal ? rows.slice(0, -1) : rows;
}

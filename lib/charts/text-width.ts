const NARROW = new Set("iljtfrI.,:;'’‹›|!()[]  -");
const WIDE = new Set('mwMW%@…—');
const SIGNS = new Set('+−±=<>~');

/**
 * How wide a text may be, at most, in any face an embed can meet: on the safe side, so that labels never collide.
 *
 * @param text one line
 * @param fontPx its size
 * @example
 * textWidthPx('50', 100); // => 144
 */
export function textWidthPx(text: string, fontPx: number): number {
  let ems = 0;
  for (const char of text) ems += emsOf(char);
  return ems * fontPx;
}

function emsOf(char: string): number {
  if (NARROW.has(char)) return 0.4;
  if (WIDE.has(char)) return 1;
  if (SIGNS.has(char)) return 0.86;
  if (char >= '0' && char <= '9') return 0.72;
  if ((char.codePointAt(0) ?? 0) >= 0x2e80) return 1.1;
  return char !== char.toLowerCase() ? 0.78 : 0.64;
}

/** The text, cut with an ellipsis where it would be wider than allowed. */
export function fitText(text: string, maxPx: number, fontPx: number): string {
  if (textWidthPx(text, fontPx) <= maxPx) return text;
  const chars = [...text];
  while (chars.length > 0 && textWidthPx(`${chars.join('').trimEnd()}…`, fontPx) > maxPx) chars.pop();
  return chars.length > 0 ? `${chars.join('').trimEnd()}…` : '';
}

/** The text in lines no wider than allowed; a word that is wider alone is cut. */
export function wrapText(text: string, maxPx: number, fontPx: number): string[] {
  const lines: string[] = [];
  for (const word of text.split(' ')) {
    const last = lines.at(-1);
    const joined = last === undefined ? word : `${last} ${word}`;
    if (last !== undefined && textWidthPx(joined, fontPx) <= maxPx) lines[lines.length - 1] = joined;
    else lines.push(fitText(word, maxPx, fontPx));
  }
  return lines;
}

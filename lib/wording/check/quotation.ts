export type Span = { start: number; end: number };

/** What opens a quotation and what may close it: English, Spanish and French, German; German guillemets point inward. */
const CLOSERS: Record<string, string> = {
  '\u201c': '\u201d',
  '\u201e': '\u201c\u201d',
  '\u00ab': '\u00bb',
  '\u00bb': '\u00ab',
  '\u2039': '\u203a',
  '\u203a': '\u2039',
  '\u2018': '\u2019',
  '\u201a': '\u2018\u2019',
  '"': '"',
  "'": "'",
};
const LETTER = /[\p{L}\p{N}]/u;

/**
 * Where words stand in quotation marks, marks included, in the four languages' marks and the straight ones.
 *
 * An apostrophe is no mark: a single mark opens only after a space or a bracket and closes only after a word and
 * before none. A mark that is not closed within its paragraph quotes nothing, unless the next paragraph opens with
 * the same mark again, as long quotations do.
 */
export function quotationsOf(text: string): Span[] {
  const spans: Span[] = [];
  let start = 0;
  for (const paragraph of text.split('\n')) {
    spans.push(...quotationsIn(paragraph, text, start));
    start += paragraph.length + 1;
  }
  return spans;
}

function quotationsIn(paragraph: string, text: string, offset: number): Span[] {
  const spans: Span[] = [];
  const closedUpTo = new Map<string, number>();
  for (let at = 0; at < paragraph.length; at += 1) {
    const closers = CLOSERS[paragraph.charAt(at)];
    if (!closers || !opens(paragraph, at)) continue;
    // Where no closer was found once, there is none further on either.
    if (closedUpTo.get(closers) === -1) continue;
    const end = closerAfter(paragraph, at, closers);
    if (end < 0) closedUpTo.set(closers, -1);
    if (end >= 0) {
      spans.push({ start: offset + at, end: offset + end + 1 });
      at = end;
    } else if (goesOn(text, offset + paragraph.length, paragraph.charAt(at))) {
      spans.push({ start: offset + at, end: offset + paragraph.length });
      return spans;
    }
  }
  return spans;
}

const isSingle = (mark: string) => mark === "'" || mark === '\u2018' || mark === '\u2019';

function opens(text: string, at: number): boolean {
  const before = text.charAt(at - 1);
  return (
    !LETTER.test(before) && LETTER.test(text.slice(at + 1).match(/^[\s\u00a0\u202f\[(¿¡]*(.)/u)?.[1] ?? '')
  );
}

function closerAfter(text: string, opener: number, closers: string): number {
  for (let at = opener + 1; at < text.length; at += 1) {
    const mark = text.charAt(at);
    if (!closers.includes(mark)) continue;
    if (isSingle(mark) && (LETTER.test(text.charAt(at + 1)) || /\s/.test(text.charAt(at - 1)))) continue;
    return at;
  }
  return -1;
}

function goesOn(text: string, end: number, mark: string): boolean {
  const next = /^\n\s*/.exec(text.slice(end, end + 20));
  return mark !== '"' && mark !== "'" && next !== null && text.charAt(end + next[0].length) === mark;
}

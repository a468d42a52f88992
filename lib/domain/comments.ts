/** A passage of a line: offsets in its words, and those words. */
export type Passage = { start: number; end: number; quote: string };

/** Where the words that were commented on stand now. */
export type Anchor = { kind: 'placed'; start: number; end: number } | { kind: 'changed' };

/**
 * Finds a passage again in words that may have changed since: at its place, else where the same words stand nearest
 * to it. Words that are gone are told as changed, never placed on others.
 *
 * @param text the words of the line as they are now
 * @param passage offsets and words as they were when somebody commented on them
 * @example
 * anchorIn('In this poll Alder leads', { start: 0, end: 5, quote: 'Alder' }); // => { kind: 'placed', start: 13, end: 18 }
 * anchorIn('Brook leads', { start: 0, end: 5, quote: 'Alder' }); // => { kind: 'changed' }
 */
export function anchorIn(text: string, { start, quote }: Passage): Anchor {
  if (quote === '') return { kind: 'changed' };
  let nearest: number | null = null;
  for (let at = text.indexOf(quote); at !== -1; at = text.indexOf(quote, at + 1))
    if (nearest === null || Math.abs(at - start) < Math.abs(nearest - start)) nearest = at;
  return nearest === null
    ? { kind: 'changed' }
    : { kind: 'placed', start: nearest, end: nearest + quote.length };
}

export type MarkedPiece = { text: string; comments: number[] };

/**
 * Words cut where a passage begins or ends, each piece with the places in the list of the comments on it.
 *
 * @param text the words of the line
 * @param anchors one for each comment; changed ones mark nothing
 * @returns pieces that make up the text when put together
 * @example markedPieces('Alder leads', [{ kind: 'placed', start: 6, end: 11 }]) // => [{ text: 'Alder ', comments: [] }, { text: 'leads', comments: [0] }]
 */
export function markedPieces(text: string, anchors: readonly Anchor[]): MarkedPiece[] {
  const placed = anchors.flatMap((anchor, index) => (anchor.kind === 'placed' ? [{ ...anchor, index }] : []));
  const cuts = [...new Set([0, text.length, ...placed.flatMap(({ start, end }) => [start, end])])]
    .filter((cut) => cut >= 0 && cut <= text.length)
    .sort((a, b) => a - b);
  return cuts.slice(0, -1).map((from, place) => ({
    text: text.slice(from, cuts[place + 1]),
    comments: placed.filter(({ start, end }) => start <= from && from < end).map(({ index }) => index),
  }));
}

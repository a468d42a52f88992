const kept = new WeakMap<object, Map<string, Float64Array>>();

/**
 * Working memory that belongs to a design and is used again by every estimate on it.
 *
 * Fresh memory of a hundred thousand numbers costs several times what the arithmetic on it does (measured). An
 * estimate fills it, uses it and lets go of it before it returns; what it holds means nothing to the next one.
 *
 * @param owner the design; its memory goes when it goes
 * @param use which of its pieces
 * @param length of the piece, the same at every call
 */
export function scratch(owner: object, use: 'values' | 'others' | 'totals', length: number): Float64Array {
  const pieces = kept.get(owner) ?? new Map<string, Float64Array>();
  const piece = pieces.get(use) ?? new Float64Array(length);
  kept.set(owner, pieces.set(use, piece));
  return piece;
}

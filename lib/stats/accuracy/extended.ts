/**
 * A measure that a share of 0 can drive out of the numbers: `'Infinity'` or `'-Infinity'` where it has no bound,
 * null where it is 0/0 and says nothing. Written as text, since JSON has no such numbers; `Number('Infinity')`
 * gives the number back.
 */
export type Extended = number | 'Infinity' | '-Infinity' | null;

export function extended(value: number): Extended {
  if (Number.isNaN(value)) return null;
  if (Number.isFinite(value)) return value;
  return value > 0 ? 'Infinity' : '-Infinity';
}

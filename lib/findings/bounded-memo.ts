/**
 * A function that remembers its latest answers, so that a release asks for each quantile once.
 *
 * Only for pure functions of a number or a text. The memory is emptied when it is full and so never grows.
 *
 * @param compute a pure function that returns no undefined
 * @param limit answers kept at most, at least 1
 * @returns the same function, faster for what was asked before
 * @throws RangeError `boundedMemo requires a limit of at least 1`
 * @example
 * boundedMemo((n) => n * n, 2)(3); // => 9
 */
export function boundedMemo<Key extends string | number, Value>(
  compute: (key: Key) => Value,
  limit: number,
): (key: Key) => Value {
  if (!(limit >= 1)) throw new RangeError('boundedMemo requires a limit of at least 1');
  const known = new Map<Key, Value>();
  return (key) => {
    const before = known.get(key);
    if (before !== undefined) return before;
    const value = compute(key);
    if (known.size >= limit) known.clear();
    known.set(key, value);
    return value;
  };
}

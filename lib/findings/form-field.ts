/** Where in the release form a refusal of the engine belongs, by the path it names. */
const FIELDS: [RegExp, string][] = [
  [/^release\.shares\[(\d+)\]\.option/, 'shares.$1.option'],
  [/^release\.shares\[(\d+)\]/, 'shares.$1.printed'],
  [/^release\.shares$/, 'shares'],
  [/^release\.n$/, 'n.value'],
  [/^release\.deff\.(value|df|source)$/, 'deff.$1'],
  [/^release\.deff$/, 'deff.value'],
  [/^release\.statedMargin\.(pp|unit|level)$/, 'statedMargin.$1'],
  [/^release\.statedMargin$/, 'statedMargin.pp'],
  [/^release\.modelledInterval\.(pp|unit|level)$/, 'modelledInterval.$1'],
  [/^release\.modelledInterval$/, 'modelledInterval.pp'],
];

/**
 * The form field of a check document's path; the empty path is the whole form.
 *
 * @example
 * fieldOfCheckPath('release.shares[2].pct'); // => 'shares.2.printed'
 * fieldOfCheckPath('release.statedMargin.pp'); // => 'statedMargin.pp'
 */
export function fieldOfCheckPath(path: string): string {
  const [pattern, field] = FIELDS.find(([known]) => known.test(path)) ?? [];
  return pattern && field ? path.match(pattern)![0].replace(pattern, field) : '';
}

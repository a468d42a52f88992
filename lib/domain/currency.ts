/** Why words that were cleared are not the newest any more. */
export const STALE_REASONS = [
  'newer-release',
  'new-version',
  'source-corrected',
  'ladder',
  'shelf-life',
] as const;
export type StaleReason = (typeof STALE_REASONS)[number];

export type Stale =
  /** A later comparable release of the same series is out. */
  | { reason: 'newer-release'; releaseId: string; fieldStartOn: string; fieldEndOn: string }
  /** The release, or the one it was compared with, has a newer version. */
  | { reason: 'new-version'; part: 'release' | 'comparison' }
  /** The source was corrected, and nothing that these words or their chart show differs. */
  | { reason: 'source-corrected'; at: number }
  /** House style took these words off the verdict's rung. */
  | { reason: 'ladder'; words: string[] }
  /** From this day on: so many days after the field dates. */
  | { reason: 'shelf-life'; endedOn: string };

export type Currency = { isCurrent: boolean; reasons: Stale[] };

const DAY_MS = 86_400_000;

/**
 * The first day on which words are no longer current, so many days after the last interview.
 *
 * @example shelfEnd('2026-09-28', 5) // => '2026-10-03'
 */
export function shelfEnd(fieldEndOn: string, days: number): string {
  return new Date(Date.parse(`${fieldEndOn}T00:00:00Z`) + days * DAY_MS).toISOString().slice(0, 10);
}

/**
 * Verbs that stood on the rung of a verdict when words were cleared, stand in them, and are not on it any more.
 *
 * @param texts the cleared words
 * @param before the rung then
 * @param after the rung now
 * @example takenOffRung(['Alder leads Brook'], ['leads'], ['is ahead']) // => ['leads']
 */
export function takenOffRung(
  texts: readonly string[],
  before: readonly string[],
  after: readonly string[],
): string[] {
  return before.filter((verb) => !after.includes(verb) && texts.some((text) => says(text, verb)));
}

function says(text: string, verb: string): boolean {
  const escaped = verb.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
  return new RegExp(`(?<![\\p{L}\\p{N}])${escaped}(?![\\p{L}\\p{N}])`, 'iu').test(text);
}

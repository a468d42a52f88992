/** How long a filed sheet may wait before somebody has to be fetched. */
export const ESCALATES_AFTER_MS = 10 * 60_000;

/** Whether a second person has opened a filed sheet, and what follows where nobody has. */
export type Look =
  | { kind: 'looked-at'; at: number }
  | { kind: 'waiting'; escalatesAt: number }
  | { kind: 'escalated'; since: number };

/**
 * Where the clock of a filed sheet stands.
 *
 * @param filedAt when it was filed, in milliseconds UTC
 * @param firstLookAt when somebody who may be its second reader first opened it, or null
 * @param now the instant that is asked about
 * @example lookOf(0, null, 600000) // => { kind: 'escalated', since: 600000 }
 */
export function lookOf(filedAt: number, firstLookAt: number | null, now: number): Look {
  if (firstLookAt !== null) return { kind: 'looked-at', at: firstLookAt };
  const escalatesAt = filedAt + ESCALATES_AFTER_MS;
  return now < escalatesAt ? { kind: 'waiting', escalatesAt } : { kind: 'escalated', since: escalatesAt };
}

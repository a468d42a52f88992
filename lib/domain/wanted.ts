/** When a sheet is wanted: the instant, and the wall time and zone as they were typed. */
export type Wanted = { at: number; local: string; zone: string };

type Queued = { id: string; wanted: Wanted | null };

/**
 * The order of work: overdue first (the longest overdue on top), then the nearest time, then what nobody set a
 * time for, each as it came.
 *
 * @example inOrderOfWork([{ id: 'a', wanted: null }, { id: 'b', wanted: { at: 5, local: '', zone: '' } }])[0] // => { id: 'b', wanted: { at: 5, local: '', zone: '' } }
 */
export function inOrderOfWork<Item extends Queued>(items: readonly Item[]): Item[] {
  const timeOf = ({ wanted }: Item) => wanted?.at ?? Number.POSITIVE_INFINITY;
  return items
    .map((item, place) => ({ item, place }))
    .sort((a, b) => compare(timeOf(a.item), timeOf(b.item)) || a.place - b.place)
    .map(({ item }) => item);
}

const compare = (a: number, b: number) => (a === b ? 0 : a < b ? -1 : 1);

/**
 * How far off a time is, in words: "in 25 minutes", "1 hour 5 minutes ago", "now".
 *
 * @param at milliseconds UTC
 * @param now milliseconds UTC
 * @example spanInWords(3900000, 0) // => 'in 1 hour 5 minutes'
 */
export function spanInWords(at: number, now: number): string {
  const minutes = Math.floor(Math.abs(at - now) / 60_000);
  if (minutes === 0) return 'now';
  const days = Math.floor(minutes / 1440);
  const hours = Math.floor(minutes / 60) % 24;
  const parts =
    days > 0 ? [many(days, 'day'), many(hours, 'hour')] : [many(hours, 'hour'), many(minutes % 60, 'minute')];
  const span = parts.filter((part) => part !== '').join(' ');
  return at > now ? `in ${span}` : `${span} ago`;
}

const many = (count: number, unit: string) =>
  count === 0 ? '' : count === 1 ? `1 ${unit}` : `${count} ${unit}s`;

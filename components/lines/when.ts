import { formatInstant, formatTime } from '@/lib/format/date';

const LOCALE = 'en-GB';

/** An instant as briefly as it is clear: the time today, day and time before. */
export function when(at: number, now: number, zone: string): string {
  const [then, today] = [at, now].map((instant) => formatInstant(instant, zone, LOCALE));
  const time = formatTime(at, zone, LOCALE);
  if (dayOf(then) === dayOf(today)) return time;
  return then ?? time;
}

/** The same within a sentence: "at 09:31", "on 16 September 2026, 09:31". */
export function whenSaid(at: number, now: number, zone: string): string {
  const said = when(at, now, zone);
  return said.includes(',') ? `on ${said}` : `at ${said}`;
}

function dayOf(instant: string | undefined): string | undefined {
  return instant?.split(',')[0];
}

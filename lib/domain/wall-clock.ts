import { Temporal } from '@js-temporal/polyfill';

/** Whether a wall time lies in a night that may run over midnight; both ends `HH:MM`, the end not included. */
export function isWithinNight(time: string, from: string, to: string): boolean {
  return from <= to ? from <= time && time < to : time >= from || time < to;
}

/** The clock on the wall of a zone: `HH:MM`. */
export function wallTime(now: number, zone: string): string {
  const zoned = Temporal.Instant.fromEpochMilliseconds(now).toZonedDateTimeISO(zone);
  return zoned.toPlainTime().toString({ smallestUnit: 'minute' });
}

/** The day on the calendar of a zone: `YYYY-MM-DD`. */
export function dayInZone(now: number, zone: string): string {
  return Temporal.Instant.fromEpochMilliseconds(now).toZonedDateTimeISO(zone).toPlainDate().toString();
}

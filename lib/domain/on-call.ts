import { Temporal } from '@js-temporal/polyfill';

/** A turn of being on call: every week on one day, or on one date. It ends on the next day if its end is not later. */
export type Shift = {
  weekday: number | null;
  /** `YYYY-MM-DD`; null for a shift of every week. */
  onDay: string | null;
  /** Wall times `HH:MM` in `zone`. */
  fromTime: string;
  toTime: string;
  zone: string;
};

export type Turn = { from: number; to: number };

/**
 * The turn of a shift that runs at an instant, or null. Its length follows the clocks: a night in which they go
 * forward is an hour shorter, one in which they go back an hour longer. A wall time that does not exist that night
 * is moved on by the gap; of one that happens twice a turn begins and ends with the first.
 *
 * @param shift wall times, a weekday or a date, and an IANA zone
 * @param now milliseconds UTC
 * @example
 * const night = { weekday: 4, onDay: null, fromTime: '22:00', toTime: '06:00', zone: 'Etc/UTC' };
 * turnAt(night, Date.UTC(2026, 8, 17, 23, 0)); // => { from: 1789682400000, to: 1789711200000 }
 */
export function turnAt(shift: Shift, now: number): Turn | null {
  const today = Temporal.Instant.fromEpochMilliseconds(now).toZonedDateTimeISO(shift.zone).toPlainDate();
  const turns = [today.subtract({ days: 1 }), today]
    .filter((day) => beginsOn(shift, day))
    .map((day) => turnFrom(shift, day));
  return turns.find(({ from, to }) => from <= now && now < to) ?? null;
}

function beginsOn({ weekday, onDay }: Shift, day: Temporal.PlainDate): boolean {
  return onDay === null ? day.dayOfWeek === weekday : day.toString() === onDay;
}

function turnFrom({ fromTime, toTime, zone }: Shift, day: Temporal.PlainDate): Turn {
  const end = toTime <= fromTime ? day.add({ days: 1 }) : day;
  const at = (date: Temporal.PlainDate, time: string) =>
    date.toZonedDateTime({ timeZone: zone, plainTime: Temporal.PlainTime.from(time) }).epochMilliseconds;
  return { from: at(day, fromTime), to: at(end, toTime) };
}

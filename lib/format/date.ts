/**
 * Days and instants as they are printed. A day is `YYYY-MM-DD` without a zone; an instant is milliseconds UTC
 * and is shown in a zone that the caller names. Nothing here reads a clock.
 */

type DayStyle = { withYear: boolean };

const formatters = new Map<string, Intl.DateTimeFormat>();
const DAY = /^(\d{4})-(\d{2})-(\d{2})$/;

/**
 * One day: "14 September 2026", or "14 September" without its year.
 *
 * @throws RangeError `formatDay requires a day as YYYY-MM-DD`
 * @example formatDay('2026-09-14', 'en-GB') // => '14 September 2026'
 */
export function formatDay(day: string, locale: string, style: DayStyle = { withYear: true }): string {
  return written(dayFormatter(locale, style.withYear).formatToParts(utcOf(day, 'formatDay')), locale);
}

/**
 * Field dates as two ends, for languages that put a word before each: "del 14 al 17 de septiembre". Within a month
 * the start is its day alone, as the language writes it; of one day both ends are alike.
 *
 * @throws RangeError `formatDayEnds requires a day as YYYY-MM-DD`
 * @throws RangeError `formatDayEnds requires a start that is not after its end`
 * @example formatDayEnds('2026-09-01', '2026-09-17', 'fr-FR').start // => '1er'
 */
export function formatDayEnds(
  start: string,
  end: string,
  locale: string,
  style: DayStyle = { withYear: false },
): { start: string; end: string } {
  const from = utcOf(start, 'formatDayEnds');
  if (from > utcOf(end, 'formatDayEnds')) {
    throw new RangeError('formatDayEnds requires a start that is not after its end');
  }
  const crossesYear = start.slice(0, 4) !== end.slice(0, 4);
  const last = formatDay(end, locale, { withYear: style.withYear || crossesYear });
  if (start === end) return { start: last, end: last };
  if (start.slice(0, 7) !== end.slice(0, 7)) {
    return { start: formatDay(start, locale, { withYear: crossesYear }), end: last };
  }
  const whole = dayFormatter(locale, false).formatToParts(from);
  const at = whole.findIndex(({ type }) => type === 'day');
  const isPointed = whole[at + 1]?.value.startsWith('.') ?? false;
  return { start: written(whole.slice(at, at + 1), locale) + (isPointed ? '.' : ''), end: last };
}

/**
 * Field dates in the shortest form that is not ambiguous: "14–17 September", "28 August – 3 September". The
 * year is written when asked for, and always where the range crosses one.
 *
 * @throws RangeError `formatDayRange requires a day as YYYY-MM-DD`
 * @throws RangeError `formatDayRange requires a start that is not after its end`
 * @example formatDayRange('2026-09-14', '2026-09-17', 'en-GB') // => '14–17 September'
 */
export function formatDayRange(
  start: string,
  end: string,
  locale: string,
  style: DayStyle = { withYear: false },
): string {
  const from = utcOf(start, 'formatDayRange');
  const to = utcOf(end, 'formatDayRange');
  if (from > to) throw new RangeError('formatDayRange requires a start that is not after its end');
  const withYear = style.withYear || start.slice(0, 4) !== end.slice(0, 4);
  return closeDash(written(dayFormatter(locale, withYear).formatRangeToParts(from, to), locale));
}

/**
 * An instant as a clock on the wall of that zone showed it: "18 September 2026, 09:12".
 *
 * @throws RangeError where the zone is not an IANA time zone
 * @example formatInstant(Date.UTC(2026, 8, 18, 7, 12), 'Europe/Vienna', 'en-GB') // => '18 September 2026, 09:12'
 */
export function formatInstant(atMs: number, zone: string, locale: string): string {
  const day = cached(locale, { day: 'numeric', month: 'long', year: 'numeric', timeZone: zone });
  return `${day.format(atMs)}, ${formatTime(atMs, zone, locale)}`;
}

/**
 * The same with the seconds where it is no whole minute, for an hour that holds to the second.
 *
 * @throws RangeError where the zone is not an IANA time zone
 * @example formatExactInstant(Date.UTC(2026, 8, 18, 7, 12, 5), 'Europe/Vienna', 'en-GB') // => '18 September 2026, 09:12:05'
 */
export function formatExactInstant(atMs: number, zone: string, locale: string): string {
  const seconds = Math.floor((atMs % 60_000) / 1000);
  const whole = formatInstant(atMs, zone, locale);
  return seconds === 0 ? whole : `${whole}:${String(seconds).padStart(2, '0')}`;
}

/** The time of day alone, on 24 hours: "09:12". */
export function formatTime(atMs: number, zone: string, locale: string): string {
  const time = cached(locale, {
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
    timeZone: zone,
  });
  return time.format(atMs);
}

/** The first of a month is an ordinal in French alone, and no formatter knows it. */
function written(parts: readonly { type: string; value: string }[], locale: string): string {
  const isFrench = locale.split('-')[0] === 'fr';
  return parts
    .map(({ type, value }) => (isFrench && type === 'day' && value === '1' ? '1er' : value))
    .join('');
}

/** Beside a bare day of the month the dash stands close, between longer dates it keeps plain spaces. */
function closeDash(range: string): string {
  const [before = '', after] = range.split(/\s*–\s*/u);
  if (after === undefined) return range;
  const isClose = /^\d+(?:er|\.)?$/.test(before) || /^\d+(, \d{4})?$/.test(after);
  return isClose ? `${before}–${after}` : `${before} – ${after}`;
}

function dayFormatter(locale: string, withYear: boolean): Intl.DateTimeFormat {
  return cached(locale, {
    day: 'numeric',
    month: 'long',
    ...(withYear ? { year: 'numeric' as const } : {}),
    timeZone: 'UTC',
  });
}

function utcOf(day: string, caller: string): number {
  const parts = DAY.exec(day);
  const at = parts ? Date.UTC(Number(parts[1]), Number(parts[2]) - 1, Number(parts[3])) : NaN;
  if (Number.isNaN(at) || new Date(at).toISOString().slice(0, 10) !== day) {
    throw new RangeError(`${caller} requires a day as YYYY-MM-DD`);
  }
  return at;
}

function cached(locale: string, options: Intl.DateTimeFormatOptions): Intl.DateTimeFormat {
  const key = locale + JSON.stringify(options);
  let formatter = formatters.get(key);
  if (!formatter) {
    formatter = new Intl.DateTimeFormat(locale, options);
    formatters.set(key, formatter);
  }
  return formatter;
}

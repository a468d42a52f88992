import 'server-only';
import { Temporal } from '@js-temporal/polyfill';
import { AppError } from '@/lib/errors';

/** Where a refusal is told, and the words of it that name what the time is for. */
export type WallTimeWords = { local: string; zone: string; whole: string; inUtc: string };

/**
 * The instant of a wall time in a zone, in milliseconds.
 * @throws AppError `invalid` at the field of the time where it does not exist or happens twice, at that of the zone
 *   where there is no such zone
 */
export function wallInstant(local: string, zone: string, words: WallTimeWords): number {
  const refusal = (field: string, message: string, cause?: unknown) =>
    new AppError('invalid', words.whole, { fields: { [field]: message }, cause });
  const plain = orRefuse(
    () => Temporal.PlainDateTime.from(local, { overflow: 'reject' }),
    (cause) => refusal(words.local, 'There is no such date and time.', cause),
  );
  refuseUnlessZone(zone, (cause) => refusal(words.zone, 'There is no such time zone.', cause));
  const [earlier, later] = (['earlier', 'later'] as const).map((disambiguation) =>
    plain.toZonedDateTime(zone, { disambiguation }),
  ) as [Temporal.ZonedDateTime, Temporal.ZonedDateTime];
  if (earlier.epochMilliseconds === later.epochMilliseconds) return earlier.epochMilliseconds;
  const happensTwice = earlier.toPlainDateTime().equals(plain);
  throw refusal(
    words.local,
    happensTwice
      ? `The clocks go back then, and this time happens twice. ${words.inUtc}`
      : 'The clocks go forward then, and this time does not exist. Choose another.',
  );
}

/** The first instant of a day `YYYY-MM-DD` in a zone, which is not midnight where the clocks skip it. */
export function dayStart(day: string, zone: string): number {
  return Temporal.PlainDate.from(day).toZonedDateTime(zone).epochMilliseconds;
}

/** Only zones that screens can show too: a bare offset such as +05:00 is none to every reader of a zone. */
export function refuseUnlessZone(zone: string, refusal: (cause: unknown) => AppError): void {
  orRefuse(() => new Intl.DateTimeFormat('en', { timeZone: zone }), refusal);
}

function orRefuse<T>(read: () => T, refusal: (cause: unknown) => AppError): T {
  try {
    return read();
  } catch (cause) {
    throw refusal(cause);
  }
}

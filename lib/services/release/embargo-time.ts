import 'server-only';
import { Temporal } from '@js-temporal/polyfill';
import { AppError } from '@/lib/errors';

/**
 * The instant of a wall time in a zone, in milliseconds.
 * @throws AppError `invalid` at `embargo.local` where that wall time does not exist or happens twice, at
 *   `embargo.zone` where there is no such zone
 */
export function embargoInstant(local: string, zone: string): number {
  const plain = readLocal(local);
  refuseUnknownZone(zone);
  const [earlier, later] = (['earlier', 'later'] as const).map((disambiguation) =>
    plain.toZonedDateTime(zone, { disambiguation }),
  ) as [Temporal.ZonedDateTime, Temporal.ZonedDateTime];
  if (earlier.epochMilliseconds === later.epochMilliseconds) return earlier.epochMilliseconds;
  const happensTwice = earlier.toPlainDateTime().equals(plain);
  throw refusal(
    'embargo.local',
    happensTwice
      ? 'The clocks go back then, and this time happens twice. Give the embargo in UTC.'
      : 'The clocks go forward then, and this time does not exist. Choose another.',
  );
}

/** Only zones that screens can show too: a bare offset such as +05:00 is none to every reader of this zone. */
function refuseUnknownZone(zone: string): void {
  try {
    new Intl.DateTimeFormat('en', { timeZone: zone });
  } catch (cause) {
    throw refusal('embargo.zone', 'There is no such time zone.', cause);
  }
}

function readLocal(local: string): Temporal.PlainDateTime {
  try {
    return Temporal.PlainDateTime.from(local, { overflow: 'reject' });
  } catch (cause) {
    throw refusal('embargo.local', 'There is no such date and time.', cause);
  }
}

function refusal(field: string, message: string, cause?: unknown): AppError {
  return new AppError('invalid', 'The embargo needs another look.', { fields: { [field]: message }, cause });
}

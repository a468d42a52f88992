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
  const instants = (['earlier', 'later'] as const).map((disambiguation) => {
    try {
      return plain.toZonedDateTime(zone, { disambiguation });
    } catch (cause) {
      throw refusal('embargo.zone', 'There is no such time zone.', cause);
    }
  });
  const [earlier, later] = instants as [Temporal.ZonedDateTime, Temporal.ZonedDateTime];
  if (earlier.epochMilliseconds === later.epochMilliseconds) return earlier.epochMilliseconds;
  const happensTwice = earlier.toPlainDateTime().equals(plain);
  throw refusal(
    'embargo.local',
    happensTwice
      ? 'The clocks go back then, and this time happens twice. Give the embargo in UTC.'
      : 'The clocks go forward then, and this time does not exist. Choose another.',
  );
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

import 'server-only';
import { wallInstant } from '../wall-time';

/**
 * The instant of a wall time in a zone, in milliseconds.
 * @throws AppError `invalid` at `embargo.local` where that wall time does not exist or happens twice, at
 *   `embargo.zone` where there is no such zone
 */
export function embargoInstant(local: string, zone: string): number {
  return wallInstant(local, zone, {
    local: 'embargo.local',
    zone: 'embargo.zone',
    whole: 'The embargo needs another look.',
    inUtc: 'Give the embargo in UTC.',
  });
}

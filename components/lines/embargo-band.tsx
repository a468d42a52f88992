import { formatExactInstant } from '@/lib/format/date';
import { Band } from '../ui/band';

const LOCALE = 'en-GB';

export type Embargo = { isRunning: boolean; at: number; zone: string } | null;

/** Stands over everything that comes from a release under embargo. */
export function EmbargoBand({ embargo, isOnList }: { embargo: Embargo; isOnList?: boolean }) {
  if (!embargo?.isRunning) return null;
  return (
    <Band word="Embargo">
      Until <time dateTime={new Date(embargo.at).toISOString()}>{embargoEnd(embargo)}</time>. Nothing of it
      may be printed before.
      {isOnList === false ? ' You are not on its embargo list, so you cannot copy from it.' : null}
    </Band>
  );
}

/** Its end to the second, on the clocks it was given for, and in UTC where those differ. */
export function embargoEnd({ at, zone }: { at: number; zone: string }): string {
  const [there, utc] = [formatExactInstant(at, zone, LOCALE), formatExactInstant(at, 'UTC', LOCALE)];
  if (there === utc) return `${utc} UTC`;
  const [[day], [utcDay, utcTime]] = [there.split(', '), utc.split(', ')];
  return `${there} in ${zone} (${day === utcDay ? utcTime : utc} UTC)`;
}

import { Band } from '@/components/ui/band';
import { formatInstant, formatTime } from '@/lib/format/date';
import type { EmbargoView } from '@/lib/services/release/get-release';

/** Stands over the page while the embargo runs: its end on the clocks it was given for, and in UTC. */
export function EmbargoBand({ embargo }: { embargo: EmbargoView }) {
  return (
    <Band word="Embargo" label="Embargo">
      Until{' '}
      <time dateTime={new Date(embargo.at).toISOString()}>
        {formatInstant(embargo.at, embargo.zone, 'en-GB')}
      </time>{' '}
      in {embargo.zone} ({formatTime(embargo.at, 'UTC', 'en-GB')} UTC). Nothing of it may be printed before.
    </Band>
  );
}

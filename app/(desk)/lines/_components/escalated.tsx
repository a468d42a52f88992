import { CautionNote } from '@/components/ui/caution-note';
import type { QueueData } from './queue';

/** Filed sheets that nobody else has opened in time, and whom to fetch. */
export function Escalated({ data }: { data: QueueData }) {
  const late = data.sheets.filter(({ look }) => look?.kind === 'escalated').length;
  if (late === 0) return null;
  const names = new Intl.ListFormat('en-GB', { type: 'conjunction' }).format(data.onCall);
  return (
    <CautionNote
      title={
        late === 1
          ? 'One filed sheet was not opened by a second person within 10 minutes'
          : `${late} filed sheets were not opened by a second person within 10 minutes`
      }
    >
      <p>
        {data.onCall.length === 0 ? 'Nobody is on call now: fetch any editor.' : `On call now: ${names}.`}
      </p>
    </CautionNote>
  );
}

import { embargoEnd } from '@/components/lines/embargo-band';
import type { HistoryEntry } from '@/lib/services/history/list-history';

/** What stands over the sheet or embed of an entry as it is now, whatever was done then. */
export function EntryMarks({ marks }: { marks: HistoryEntry['marks'] }) {
  if (marks.length === 0) return null;
  return (
    <ul className="text-13 font-semibold text-caution">
      {marks.map((mark) => (
        <li key={mark.kind === 'barred' ? mark.jurisdiction : mark.kind}>
          {mark.kind === 'one-reader'
            ? 'Now: one reader'
            : `Now: barred in ${mark.jurisdiction} until ${embargoEnd({ at: mark.untilAt, zone: mark.zone })}`}
        </li>
      ))}
    </ul>
  );
}

import Link from 'next/link';
import { when } from '@/components/lines/when';
import { SectionHeading } from '@/components/ui/section-heading';
import { LINE_STATE_NAMES } from '@/lib/domain/sheet';
import { formatDayRange } from '@/lib/format/date';
import { WorkMarks } from './work-marks';
import type { OpenSheetItem } from '@/lib/services/sheet/list-open-sheets';

const LOCALE = 'en-GB';

/** One part of the queue; left out where nothing is in it. */
export function QueueGroup({
  title,
  sheets,
  now,
  zone,
}: {
  title: string;
  sheets: readonly OpenSheetItem[];
  now: number;
  zone: string;
}) {
  if (sheets.length === 0) return null;
  const id = `queue-${title.toLowerCase().replaceAll(' ', '-')}`;
  return (
    <section aria-labelledby={id} className="mb-8">
      <SectionHeading id={id}>
        {title} ({sheets.length})
      </SectionHeading>
      <ul className="border-t-[1.5px] border-ink">
        {sheets.map((sheet) => (
          <li key={sheet.id} className="border-b border-rule py-3">
            <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
              <Link href={`/lines/${sheet.id}`} className="min-w-0 font-serif text-18">
                {sheet.headline === '' ? 'A sheet without words yet' : sheet.headline}
              </Link>
              <span className="font-semibold">
                {sheet.isUnderEmbargo ? (
                  <span className="mr-3 border border-caution px-1.5 text-13 font-semibold text-caution">
                    EMBARGO
                  </span>
                ) : null}
                {LINE_STATE_NAMES[sheet.state]}
              </span>
            </div>
            <p className="text-soft">
              {sheet.race}, {sheet.pollster}, {formatDayRange(sheet.fieldStartOn, sheet.fieldEndOn, LOCALE)}.{' '}
              {standing(sheet, now, zone)}
            </p>
            <WorkMarks sheet={sheet} now={now} />
            {sheet.returned ? (
              <p className="mt-1 max-w-prose border-l-[3px] border-caution pl-3">
                {sheet.returned.by}, {when(sheet.returned.at, now, zone)}: “{sheet.returned.comment}”
              </p>
            ) : null}
          </li>
        ))}
      </ul>
    </section>
  );
}

function standing(sheet: OpenSheetItem, now: number, zone: string): string {
  if (sheet.filedBy === null || sheet.filedAt === null) return `Written by ${sheet.author}.`;
  const filed = `Filed by ${sheet.isFiledByMe ? 'you' : sheet.filedBy}, ${when(sheet.filedAt, now, zone)}.`;
  if (sheet.waitsFor === 'me') return filed;
  return sheet.isFiledByMe ? `${filed} Somebody else reads it.` : `${filed} It waits for an editor.`;
}

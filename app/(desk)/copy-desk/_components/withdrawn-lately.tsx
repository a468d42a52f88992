import Link from 'next/link';
import { SectionHeading } from '@/components/ui/section-heading';
import { formatDayRange, formatInstant } from '@/lib/format/date';
import type { Withdrawn } from '@/lib/services/copy/list-withdrawn';

/** Words that corrections took out of print in the last week: what must not run any more, and what to look for. */
export function WithdrawnLately({ withdrawn, zone }: { withdrawn: readonly Withdrawn[]; zone: string }) {
  if (withdrawn.length === 0) return null;
  return (
    <section aria-labelledby="withdrawn" className="mt-5 border-l-2 border-caution pl-4">
      <SectionHeading id="withdrawn">Withdrawn by a correction in the last week</SectionHeading>
      <ul>
        {withdrawn.map((one) => (
          <li key={one.sheetId} className="py-2">
            <p className="max-w-prose font-serif line-through decoration-1">{one.headline}</p>
            <p className="mt-1 max-w-prose text-13 text-soft">
              {one.race}, {one.pollster},{' '}
              {formatDayRange(one.fieldStartOn, one.fieldEndOn, 'en-GB', { withYear: true })}. Withdrawn{' '}
              {formatInstant(one.at, zone, 'en-GB')}. {one.whose}. {one.explanation}{' '}
              {one.isReplaced ? 'Its replacement is cleared.' : 'Nothing is cleared in its place yet.'}{' '}
              <Link href={`/history?entity=${one.sheetId}`}>
                History<span className="sr-only"> of {one.race}</span>
              </Link>
            </p>
          </li>
        ))}
      </ul>
    </section>
  );
}

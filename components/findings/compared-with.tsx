import type { ReactNode } from 'react';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { formatDayRange } from '@/lib/format/date';
import { comparisonReason, type ComparisonTold } from '@/lib/wording/comparison-words';

/** Which earlier release this one is compared with, and why that one or why none. */
export function ComparedWith({
  previous,
  told,
  linkTo,
}: {
  previous: ReleaseFacts | null;
  told: ComparisonTold;
  /** Makes the release a link where the page can lead there. */
  linkTo?: (previous: ReleaseFacts, name: string) => ReactNode;
}) {
  const name = previous ? nameOf(previous) : 'No earlier release';
  return (
    <div className="max-w-prose">
      <p className="font-semibold">{previous && linkTo ? linkTo(previous, name) : name}</p>
      {comparisonReason(told).map((sentence) => (
        <p key={sentence} className="mt-1 text-soft">
          {sentence}
        </p>
      ))}
    </div>
  );
}

function nameOf({ pollster, fieldStartOn, fieldEndOn }: ReleaseFacts): string {
  return `${pollster.name}, ${formatDayRange(fieldStartOn, fieldEndOn, 'en-GB', { withYear: true })}`;
}

import type { FactShare, ReleaseFacts } from '@/lib/domain/release-facts';
import { formatDayRange } from '@/lib/format/date';
import { formatShare } from '@/lib/format/number';
import { DataTable } from '../ui/data-table';

const LOCALE = 'en-GB';

/** Shares as printed, with who typed each. */
export function SharesTable({
  release,
  previous,
  enteredBy,
}: {
  release: ReleaseFacts;
  previous: ReleaseFacts | null;
  enteredBy: Record<string, string>;
}) {
  const columns = [
    { key: 'option', head: 'Option', rowHead: true, cell: (share: FactShare) => nameOf(share) },
    {
      key: 'share',
      head: previous ? 'This' : 'Share',
      numeric: true,
      cell: ({ units }: FactShare) => printed(units, release.decimals),
    },
    ...(previous
      ? [
          {
            key: 'earlier',
            head: (
              <>
                Earlier
                <span className="sr-only">
                  , {formatDayRange(previous.fieldStartOn, previous.fieldEndOn, LOCALE)}
                </span>
              </>
            ),
            numeric: true,
            cell: ({ option }: FactShare) => {
              const before = previous.shares.find((share) => share.option === option);
              return before ? printed(before.units, previous.decimals) : 'not asked';
            },
          },
        ]
      : []),
    { key: 'by', head: 'Typed by', cell: ({ option }: FactShare) => enteredBy[option] ?? 'not known' },
  ];
  return (
    <DataTable
      caption="Shares as printed, in percent"
      columns={columns}
      rows={release.shares}
      rowKey={({ option }) => option}
    />
  );
}

function nameOf({ option, isAnswer }: FactShare) {
  return isAnswer ? option : <span className="text-soft">{option}</span>;
}

function printed(units: number | null, decimals: number): string {
  return units === null ? 'not disclosed' : formatShare(units, decimals, LOCALE);
}

import { WorkingSteps } from '@/components/findings/working-steps';
import { type Column, DataTable } from '@/components/ui/data-table';
import { Details } from '@/components/ui/details';
import type { FactShare } from '@/lib/domain/release-facts';
import type { ShareFinding } from '@/lib/findings/check-types';
import { working } from '@/lib/findings/working';
import { formatPoints } from '@/lib/format/number';
import type { ReleaseView } from '@/lib/services/release/get-release';
import { columnHeads, printedShare } from './release-words';

type Shown = Pick<ReleaseView, 'facts' | 'previous' | 'answer' | 'document' | 'enteredBy'>;

/** Shares as printed, this release beside the one it is compared with, each with the range of its own. */
export function SharesTable({ view }: { view: Shown }) {
  const { facts, previous, answer, document } = view;
  const ranges = new Map(answer.findings.flatMap((one) => (one.kind === 'share' ? [[one.option, one]] : [])));
  const [now, before] = columnHeads(facts, previous);
  const earlier = new Map(previous?.shares.map((share) => [share.option, share]));
  const columns: Column<FactShare>[] = [
    {
      key: 'option',
      head: 'Option',
      rowHead: true,
      cell: ({ option, isAnswer }) => (
        <>
          {option}
          {isAnswer ? null : <span className="sr-only"> (not an answer)</span>}
        </>
      ),
    },
    {
      key: 'now',
      head: now,
      numeric: true,
      cell: ({ option, units }) => (
        <>
          <span className="block">{printedShare(units, facts.decimals)}</span>
          <Range finding={ranges.get(option)} />
        </>
      ),
    },
  ];
  if (previous)
    columns.push({
      key: 'before',
      head: before,
      numeric: true,
      cell: ({ option }) => printedShare(earlier.get(option)?.units ?? null, previous.decimals),
    });
  const hasRanges = [...ranges.values()].some(({ intervalPct }) => intervalPct);
  const typists = [...new Set(Object.values(view.enteredBy))];
  return (
    <>
      <DataTable
        caption="Shares as printed, in percent"
        columns={columns}
        rows={facts.shares}
        rowKey={({ option }) => option}
      />
      <p className="-mt-2 mb-2 text-13 text-soft">
        Typed by {typists.join(', ')}.
        {hasRanges ? ' Beneath each share: its range, from sampling error alone.' : ''}
      </p>
      <Details
        summary={hasRanges ? 'Working of the ranges' : 'Why no share has a range'}
        className="mb-5 text-13"
      >
        {answer.findings.map((finding, at) =>
          finding.kind === 'share' ? (
            <section key={finding.option} className="mb-3">
              <h3 className="font-semibold">{finding.option}</h3>
              <WorkingSteps steps={working(document, answer, at)} />
            </section>
          ) : null,
        )}
      </Details>
    </>
  );
}

function Range({ finding }: { finding: ShareFinding | undefined }) {
  if (!finding?.intervalPct) return null;
  const [low, high] = finding.intervalPct.map((end) => formatPoints(end, 1, 'en-GB'));
  return (
    <span className="block text-13 text-soft">
      {low}–{high}
    </span>
  );
}

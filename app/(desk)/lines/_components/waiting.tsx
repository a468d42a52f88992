import { PrintableLine } from '@/components/lines/printable-line';
import { SectionHeading } from '@/components/ui/section-heading';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { LastComment } from './last-comment';
import { lineCommentsOf } from './line-comments-of';
import { ReadingColumns } from './reading-columns';

/** A sheet that somebody else is writing. */
export function Waiting({ view, now, zone }: { view: SheetView; now: number; zone: string }) {
  return (
    <>
      <LastComment view={view} now={now} zone={zone} />
      <p className="mt-4">{view.author} is writing this. Nobody has agreed to these words yet.</p>
      <ReadingColumns
        view={view}
        head={
          <div className="reading-head">
            <SectionHeading>Words so far, marked against the draft</SectionHeading>
          </div>
        }
        line={({ kind, text, draft, knockedOut, marks }) => (
          <PrintableLine
            key={kind}
            {...{ kind, text, knockedOut, marks }}
            before={draft}
            lang={view.language}
            comments={lineCommentsOf(view.desk.comments, kind)}
          />
        )}
      />
    </>
  );
}

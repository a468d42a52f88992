import type { ReactNode } from 'react';
import type { LineKind } from '@/lib/domain/sheet';
import type { LineView, SheetView } from '@/lib/services/sheet/get-sheet';
import { SheetEvidence } from './sheet-columns';

/** Lines that stand around the claim and its caveat: long, and set in columns under both. */
const SMALL_PRINT: readonly LineKind[] = ['method-note', 'chart-title', 'alt-text', 'correction-notice'];

/**
 * Words and what they rest on, for reading: on a wide screen the claim, its test and its figures side by side with
 * the small print under them, so that all of it is seen at once.
 */
export function ReadingColumns({
  view,
  head,
  line,
  foot,
}: {
  view: SheetView;
  /** Over the words. */
  head: ReactNode;
  line: (line: LineView) => ReactNode;
  /** Under the words. */
  foot?: ReactNode;
}) {
  const [print, words] = [true, false].map((isSmall) =>
    view.lines.filter(({ kind }) => SMALL_PRINT.includes(kind) === isSmall),
  ) as [LineView[], LineView[]];
  return (
    <div className="reading">
      <div className="reading-words">
        {head}
        {words.map(line)}
      </div>
      <div className="reading-print">{print.map(line)}</div>
      {foot ? <div className="reading-foot">{foot}</div> : null}
      <SheetEvidence view={view} />
    </div>
  );
}

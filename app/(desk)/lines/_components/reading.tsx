'use client';

import { type ReactNode, useState } from 'react';
import { PrintableLine } from '@/components/lines/printable-line';
import { SectionHeading } from '@/components/ui/section-heading';
import { OverrideNote } from '@/components/wording-check/override-note';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { AGAINST, type Against, AgainstChoice } from './against-choice';
import { Changing } from './changing';
import { FiledBar } from './filed-bar';
import { lineCommentsOf } from './line-comments-of';
import { MovedNote } from './moved-note';
import { ReadingColumns } from './reading-columns';
import type { SheetActions } from './sheet-actions';

type Props = {
  view: SheetView;
  actions: SheetActions;
  /** Comments, times, what was done: for the bar. */
  folds: ReactNode;
  onDone: (words: string) => void;
};

/** A filed sheet as its second reader sees it: printable words beside all they rest on. */
export function Reading({ view, actions, folds, onDone }: Props) {
  const [isChanging, setChanging] = useState(false);
  const isAgain = view.isAuthor && view.notYours !== 'filer';
  const [against, setAgainst] = useState<Against>(isAgain ? 'filed' : 'draft');
  if (isChanging)
    return <Changing view={view} actions={actions} onDone={onDone} onLeave={() => setChanging(false)} />;
  const isThere = (one: Against) => one === 'draft' || view.lines.some((line) => line[one] !== null);
  return (
    <>
      <MovedNote view={view} />
      <OverrideNote override={view.override} />
      <ReadingColumns
        view={view}
        head={
          <div className="reading-head">
            <SectionHeading>
              {isAgain && against === 'filed' ? 'Marked against what you filed' : AGAINST[against]}
            </SectionHeading>
            <AgainstChoice value={against} isThere={isThere} onChange={setAgainst} />
          </div>
        }
        line={({ kind, text, draft, filed, cleared, knockedOut, marks }) => (
          <PrintableLine
            key={kind}
            kind={kind}
            text={text}
            before={{ draft, filed: filed ?? draft, cleared: cleared ?? '' }[against]}
            knockedOut={knockedOut}
            marks={marks}
            lang={view.language}
            comments={lineCommentsOf(view.desk.comments, kind)}
          />
        )}
      />
      <FiledBar
        view={view}
        actions={actions}
        folds={folds}
        onDone={onDone}
        onChange={() => setChanging(true)}
      />
    </>
  );
}

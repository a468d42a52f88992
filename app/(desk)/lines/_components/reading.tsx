'use client';

import { useState } from 'react';
import { PrintableLine } from '@/components/lines/printable-line';
import { SectionHeading } from '@/components/ui/section-heading';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { Changing } from './changing';
import { FiledBar } from './filed-bar';
import { MovedNote } from './moved-note';
import type { SheetActions } from './sheet-actions';
import { SheetColumns } from './sheet-columns';

type Props = { view: SheetView; actions: SheetActions; onDone: (words: string) => void };

/** A filed sheet as its second reader sees it: printable words beside all they rest on. */
export function Reading({ view, actions, onDone }: Props) {
  const [isChanging, setChanging] = useState(false);
  if (isChanging)
    return <Changing view={view} actions={actions} onDone={onDone} onLeave={() => setChanging(false)} />;
  const isAgain = view.isAuthor && view.notYours !== 'filer';
  return (
    <>
      <MovedNote view={view} />
      <SheetColumns view={view}>
        <div className="mb-2">
          <SectionHeading>
            {isAgain ? 'Marked against what you filed' : 'Marked against the draft'}
          </SectionHeading>
        </div>
        {view.lines.map(({ kind, text, draft, earlier, knockedOut, above }) => (
          <PrintableLine
            key={kind}
            kind={kind}
            text={text}
            before={isAgain ? (earlier ?? draft) : draft}
            knockedOut={knockedOut}
            above={above}
            verdict={view.finding.verdict}
          />
        ))}
      </SheetColumns>
      <FiledBar view={view} actions={actions} onDone={onDone} onChange={() => setChanging(true)} />
    </>
  );
}

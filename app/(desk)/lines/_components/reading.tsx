'use client';

import { useState } from 'react';
import { PrintableLine } from '@/components/lines/printable-line';
import { SectionHeading } from '@/components/ui/section-heading';
import { OverrideNote } from '@/components/wording-check/override-note';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { AGAINST, type Against, AgainstChoice } from './against-choice';
import { Changing } from './changing';
import { FiledBar } from './filed-bar';
import { MovedNote } from './moved-note';
import type { SheetActions } from './sheet-actions';
import { SheetColumns } from './sheet-columns';

type Props = { view: SheetView; actions: SheetActions; onDone: (words: string) => void };

/** A filed sheet as its second reader sees it: printable words beside all they rest on. */
export function Reading({ view, actions, onDone }: Props) {
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
      <SheetColumns view={view}>
        <div className="mb-2">
          <SectionHeading>
            {isAgain && against === 'filed' ? 'Marked against what you filed' : AGAINST[against]}
          </SectionHeading>
          <AgainstChoice value={against} isThere={isThere} onChange={setAgainst} />
        </div>
        {view.lines.map(({ kind, text, draft, filed, cleared, knockedOut, marks }) => (
          <PrintableLine
            key={kind}
            kind={kind}
            text={text}
            before={{ draft, filed: filed ?? draft, cleared: cleared ?? '' }[against]}
            knockedOut={knockedOut}
            marks={marks}
            lang={view.language}
          />
        ))}
      </SheetColumns>
      <FiledBar view={view} actions={actions} onDone={onDone} onChange={() => setChanging(true)} />
    </>
  );
}

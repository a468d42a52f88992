'use client';

import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { ActBar } from './act-bar';
import { RefusedNote } from './refused-note';
import { SendBackDialog } from './send-back-dialog';
import type { SheetActions } from './sheet-actions';
import { useAct } from './use-act';

/** What a reader of a filed sheet does next: agrees, sends it back, changes it, or learns why they cannot. */
export function FiledBar({
  view,
  actions,
  folds,
  onDone,
  onChange,
}: {
  view: SheetView;
  actions: SheetActions;
  folds: ReactNode;
  onDone: (words: string) => void;
  onChange: () => void;
}) {
  const clear = useAct(actions.clear, ({ outcome }) => onDone(OUTCOMES[outcome]));
  const back = useAct(actions.sendBack, () => onDone(isFiler ? 'Taken back.' : 'Sent back.'));
  const isFiler = view.notYours === 'filer';
  const isAgain = view.isAuthor && view.may.clear;
  const seen = { id: view.id, hash: view.hash ?? '' };
  const isBusy = clear.isPending || back.isPending;
  return (
    <>
      <RefusedNote failure={clear.failure ?? (isFiler ? back.failure : null)} />
      <ActBar
        actions={
          <>
            {view.may.change && !isBusy ? <Button onClick={onChange}>Change the words</Button> : null}
            {view.may.sendBack && isFiler ? (
              <Button
                pending={isBusy}
                pendingLabel="Taking back…"
                onClick={() => back.act({ ...seen, comment: 'Taken back by whoever filed it.' })}
              >
                Take back
              </Button>
            ) : null}
            {view.may.sendBack && !isFiler && !clear.isPending ? (
              <SendBackDialog
                author={view.author}
                back={back}
                seen={seen}
                kinds={view.lines.filter(({ knockedOut }) => !knockedOut).map(({ kind }) => kind)}
              />
            ) : null}
            {view.may.clear && !back.isPending ? (
              <Button
                tone="primary"
                pending={clear.isPending}
                pendingLabel="Clearing…"
                onClick={() => clear.act(seen)}
              >
                {isAgain ? 'Agree and clear' : 'Clear for publication'}
              </Button>
            ) : null}
          </>
        }
      >
        <p className="text-13">{wordsFor(view)}</p>
        {folds}
      </ActBar>
    </>
  );
}

const OUTCOMES = {
  cleared: 'Cleared for publication.',
  agreed: 'Agreed to. The words become printable with the correction that they wait for.',
  returned: 'Nothing was cleared: the evidence had changed, and the sheet went back to whoever filed it.',
};

function wordsFor(view: SheetView): string {
  if (view.notYours === 'filer') return 'You filed this; somebody else reads it.';
  if (view.notYours === 'needs-editor')
    return 'A reporter filed this, so an editor clears it: one of the two who agree is an editor.';
  if (view.isAuthor)
    return `${view.filer?.name ?? 'An editor'} changed your words and agrees to them. Clearing freezes this evidence.`;
  return 'Clearing freezes this evidence. A changed word needs two people again.';
}

'use client';

import { Button } from '@/components/ui/button';
import { NIGHT } from '@/lib/domain/as-printed';
import type { AsPrintedView } from '@/lib/services/sheet/get-as-printed';
import { ActBar } from './act-bar';
import type { AsPrintedActions } from './as-printed-screen';
import { DiscardDraft } from './discard-draft';
import { PullDialog } from './pull-dialog';
import { RefusedNote } from './refused-note';
import { SendBackDialog } from './send-back-dialog';
import { useAct } from './use-act';

/** What is done next with figures as printed, by whoever looks at them. */
export function AsPrintedBar({ view, actions }: { view: AsPrintedView; actions: AsPrintedActions }) {
  const file = useAct(actions.file);
  const alone = useAct(actions.alone);
  const clear = useAct(actions.clear);
  const back = useAct(actions.sendBack);
  const second = useAct(actions.second);
  const revise = useAct(actions.revise);
  const seen = { id: view.id, hash: view.hash ?? '' };
  const basis = { id: view.id, version: view.version, basisHash: view.basisHash };
  const { may } = view;
  const isBusy = [file, alone, clear, back, second, revise].some(({ isPending }) => isPending);
  const failure = [file, alone, clear, second, revise].find((one) => one.failure)?.failure ?? null;
  return (
    <>
      <RefusedNote failure={failure} />
      <ActBar
        actions={
          <>
            {may.write && view.acts.length === 0 ? (
              <DiscardDraft id={view.id} discard={actions.discard} keptAs={`leadline-sheet-${view.id}`} />
            ) : null}
            {may.write && view.alone === 'may' ? (
              <Button
                tone="caution"
                pending={alone.isPending}
                pendingLabel="Releasing…"
                onClick={() => alone.act(basis)}
              >
                Release alone, by the night rule
              </Button>
            ) : null}
            {may.write ? (
              <Button
                tone="primary"
                pending={file.isPending}
                pendingLabel="Filing…"
                onClick={() => file.act({ ...basis, lines: [] })}
              >
                File
              </Button>
            ) : null}
            {may.sendBack ? (
              <SendBackDialog
                author={view.author}
                back={back}
                seen={seen}
                kinds={view.lines.map(({ kind }) => kind)}
              />
            ) : null}
            {may.clear ? (
              <Button
                tone="primary"
                pending={isBusy}
                pendingLabel="Clearing…"
                onClick={() => clear.act(seen)}
              >
                Clear for publication
              </Button>
            ) : null}
            {may.pull ? <PullDialog view={view} pull={actions.pull} onDone={() => undefined} /> : null}
            {may.revise ? (
              <Button
                pending={revise.isPending}
                pendingLabel="Opening…"
                onClick={() => revise.act({ id: view.id, version: view.version })}
              >
                Start a new version
              </Button>
            ) : null}
            {view.maySecond ? (
              <Button
                tone="primary"
                pending={second.isPending}
                pendingLabel="Saving…"
                onClick={() => second.act(seen)}
              >
                I have read these words
              </Button>
            ) : null}
          </>
        }
      >
        {wordsFor(view)}
      </ActBar>
    </>
  );
}

function wordsFor({ state, alone, maySecond, notYours }: AsPrintedView): string {
  if (maySecond) return 'Your reading makes two. If something is wrong, pull it.';
  if (state === 'filed')
    return notYours === 'filer'
      ? 'You filed this; somebody else reads it.'
      : 'Two people agree before it is printed.';
  if (state === 'cleared') return 'These words are printable.';
  if (state === 'pulled') return 'These words were withdrawn. Nothing of them is served.';
  if (alone === 'may')
    return 'Somebody else reads it once it is filed. At night an editor may release it alone; it is marked “one reader” until a second has read it.';
  if (alone === 'not-night')
    return `Somebody else reads it once it is filed. An editor alone may release it between ${NIGHT.from} and ${NIGHT.to}.`;
  return 'Filing says that you agree to these words. Somebody else reads them before they are cleared.';
}

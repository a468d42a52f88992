'use client';

import { useState, useSyncExternalStore } from 'react';
import { LineFields } from '@/components/forms/sheet/line-fields';
import { findUnsaved, forgetUnsaved } from '@/components/forms/sheet/unsaved-words';
import { useAutosave } from '@/components/forms/sheet/use-autosave';
import { sameLines, useLines } from '@/components/forms/sheet/use-lines';
import { OverrideField } from '@/components/wording-check/override-field';
import { Button } from '@/components/ui/button';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { ActBar } from './act-bar';
import { AddLine } from './add-line';
import { DiscardDraft } from './discard-draft';
import { LastComment } from './last-comment';
import { lineCommentsOf } from './line-comments-of';
import { RefusedNote } from './refused-note';
import { SaveStatus } from './save-status';
import type { SheetActions } from './sheet-actions';
import { SheetColumns } from './sheet-columns';
import { UnsavedNote } from './unsaved-note';
import { useAct } from './use-act';
import { useOverride } from './use-override';
import { draftsOf, isAtField, writtenLines } from './written-lines';

type Props = {
  view: SheetView;
  actions: SheetActions;
  person: string;
  now: number;
  zone: string;
  onDone: (words: string) => void;
};

const never = () => () => undefined;

/** The sheet while its author or an editor writes it. */
export function Writing({ view, actions, person, now, zone, onDone }: Props) {
  const keptAs = `leadline-sheet-${person}-${view.id}`;
  const { lines, change, replace } = useLines(writtenLines(view.lines));
  const [isOffered, setOffered] = useState(true);
  const isHydrated = useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
  const [unsaved] = useState(() => (typeof localStorage === 'undefined' ? null : findUnsaved(keptAs)));
  const { saving, save, version } = useAutosave({ id: view.id, version: view.version, keptAs }, lines);
  const { act, isPending, failure, attempt } = useAct(actions.file, () => onDone('Filed.'));
  const { marks, override, field } = useOverride(view, lines);
  const [isFiling, setFiling] = useState(false);

  const file = async () => {
    setFiling(true);
    if (await save())
      await act({ id: view.id, version: version.current, basisHash: view.basisHash, lines, override });
    setFiling(false);
  };
  const isOffer =
    isHydrated && isOffered && unsaved !== null && !sameLines(unsaved, writtenLines(view.lines));

  return (
    <>
      <LastComment view={view} now={now} zone={zone} />
      {isOffer ? (
        <UnsavedNote
          onTake={() => {
            replace(unsaved);
            setOffered(false);
          }}
          onDrop={() => {
            forgetUnsaved(keptAs);
            setOffered(false);
          }}
        />
      ) : null}
      <SheetColumns view={view}>
        <LineFields
          lines={lines}
          drafts={draftsOf(view.lines)}
          lang={view.language}
          marks={marks}
          comments={(kind) => lineCommentsOf(view.desk.comments, kind)}
          errors={failure?.fields ?? {}}
          attempt={attempt}
          onChange={change}
        />
        <AddLine view={view} add={actions.add} save={save} version={version} onDone={onDone} />
      </SheetColumns>
      <OverrideField {...field} error={failure?.fields['override.reason']} />
      <RefusedNote failure={isAtField(failure, lines) ? null : failure} />
      <ActBar
        actions={
          <>
            {view.acts.length === 0 ? (
              <DiscardDraft id={view.id} discard={actions.discard} keptAs={keptAs} />
            ) : null}
            <Button tone="primary" pending={isPending || isFiling} pendingLabel="Filing…" onClick={file}>
              {view.agreesAnew ? 'Agree and file again' : 'File'}
            </Button>
          </>
        }
      >
        {view.agreesAnew
          ? 'Filing says that you agree to these words on the evidence as it is now; somebody else reads them again.'
          : 'Filing says that you agree to these words. Somebody else reads them before they are cleared.'}
        <SaveStatus saving={saving} zone={zone} onRetry={save} />
      </ActBar>
    </>
  );
}

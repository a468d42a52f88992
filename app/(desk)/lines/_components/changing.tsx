'use client';

import { LineFields } from '@/components/forms/sheet/line-fields';
import { sameLines, useLines } from '@/components/forms/sheet/use-lines';
import { OverrideField } from '@/components/wording-check/override-field';
import { Button } from '@/components/ui/button';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { ActBar } from './act-bar';
import { lineCommentsOf } from './line-comments-of';
import { MovedNote } from './moved-note';
import { RefusedNote } from './refused-note';
import type { SheetActions } from './sheet-actions';
import { SheetColumns } from './sheet-columns';
import { useAct } from './use-act';
import { useOverride } from './use-override';
import { draftsOf, isAtField, writtenLines } from './written-lines';

/** An editor changes filed words; saving them is filing them as the editor's own. */
export function Changing({
  view,
  actions,
  onDone,
  onLeave,
}: {
  view: SheetView;
  actions: SheetActions;
  onDone: (words: string) => void;
  onLeave: () => void;
}) {
  const { lines, change } = useLines(writtenLines(view.lines));
  const { act, isPending, failure, attempt } = useAct(actions.change, () =>
    onDone(`Filed as yours. ${view.author} agrees to it, or another reader.`),
  );
  const { marks, override, field } = useOverride(view, lines);
  const isSame = sameLines(lines, writtenLines(view.lines));
  const file = () => act({ id: view.id, version: view.version, basisHash: view.basisHash, lines, override });
  return (
    <>
      <MovedNote view={view} />
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
      </SheetColumns>
      <OverrideField {...field} error={failure?.fields['override.reason']} />
      <RefusedNote failure={isAtField(failure, lines) ? null : failure} />
      <ActBar
        actions={
          <>
            {isPending ? null : <Button onClick={onLeave}>Leave the words as filed</Button>}
            <Button
              tone="primary"
              pending={isPending}
              pendingLabel="Filing…"
              disabled={isSame}
              onClick={file}
            >
              File the changed words
            </Button>
          </>
        }
      >
        {isSame
          ? 'Nothing is changed yet.'
          : `You agree to the changed words by filing them; ${view.author} gives the second agreement.`}
      </ActBar>
    </>
  );
}

import { type RefObject, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Select } from '@/components/ui/select';
import { LINE_KIND_NAMES } from '@/lib/domain/sheet';
import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { RefusedNote } from './refused-note';
import type { SheetActions } from './sheet-actions';
import { useAct } from './use-act';

/** Asks for one more kind of line. What is being typed is saved first, since the page is drawn anew. */
export function AddLine({
  view,
  add,
  save,
  version,
  onDone,
}: {
  view: SheetView;
  add: SheetActions['add'];
  save: () => Promise<boolean>;
  version: RefObject<number>;
  onDone: (words: string) => void;
}) {
  const [kind, setKind] = useState('');
  const chosen = view.addable.find((one) => one === kind);
  const { act, isPending, failure } = useAct(add, () => {
    onDone(`Added: ${chosen ? LINE_KIND_NAMES[chosen].toLowerCase() : 'the line'}.`);
  });
  if (view.addable.length === 0) return null;

  const submit = async () => {
    if (chosen && (await save())) await act({ id: view.id, version: version.current, kind: chosen });
  };
  return (
    <div className="no-print mb-5">
      <div className="flex flex-wrap items-end gap-2">
        <Select
          id="add-line"
          label="Add a line"
          empty="Choose a kind of line"
          choices={view.addable.map((value) => ({ value, label: LINE_KIND_NAMES[value] }))}
          value={kind}
          fieldClassName="mb-0!"
          onChange={(event) => setKind(event.target.value)}
        />
        <Button pending={isPending} pendingLabel="Adding…" disabled={!chosen} onClick={submit}>
          Add
        </Button>
      </div>
      {failure ? <RefusedNote failure={failure} /> : null}
    </div>
  );
}

'use client';

import type { SheetView } from '@/lib/services/sheet/get-sheet';
import { ReasonDialog } from './reason-dialog';
import type { SheetActions } from './sheet-actions';
import { useAct } from './use-act';

export function PullDialog({
  view,
  pull,
  onDone,
}: {
  view: SheetView;
  pull: SheetActions['pull'];
  onDone: (words: string) => void;
}) {
  const { act, isPending, failure } = useAct(pull, () => onDone('Pulled. Nothing of it is served any more.'));
  return (
    <ReasonDialog
      word="Pull"
      pendingWord="Pulling…"
      tone="caution"
      title="Pull the cleared words"
      label="Why are they withdrawn?"
      hint="The copy desk loses the words at once, and the embed says that the chart was withdrawn. This reason stays with the desk."
      field="reason"
      act={(reason) => act({ id: view.id, reason })}
      isPending={isPending}
      failure={failure}
    />
  );
}

'use client';

import { ReasonDialog } from '../../../_components/reason-dialog';
import { RefusedNote } from './refused-note';
import type { SheetActions } from './sheet-actions';
import { useAct } from './use-act';

export function PullDialog({
  view,
  pull,
  onDone,
}: {
  view: { id: string };
  pull: SheetActions['pull'];
  onDone: (words: string) => void;
}) {
  const { act, isPending, failure } = useAct(pull, () => onDone('Pulled. Nothing of it is served any more.'));
  return (
    <ReasonDialog
      id="pull-reason"
      opener="Pull"
      openerTone="caution"
      decide="Pull"
      tone="caution"
      keep="Keep them"
      pendingWord="Pulling…"
      title="Pull the cleared words"
      label="Why are they withdrawn?"
      hint="The copy desk loses the words at once, and the embed says that the chart was withdrawn. This reason stays with the desk."
      maxLength={2000}
      error={failure?.fields.reason}
      refusal={<RefusedNote failure={failure?.code === 'invalid' ? null : failure} />}
      act={(reason) => act({ id: view.id, reason })}
      isPending={isPending}
    />
  );
}

import { isTakenBack } from '@/components/lines/taken-back';
import { CautionNote } from '@/components/ui/caution-note';
import { whenSaid } from '@/components/lines/when';
import type { SheetView } from '@/lib/services/sheet/get-sheet';

/** Why a sheet came back, for as long as it is being written again. */
export function LastComment({ view, now, zone }: { view: SheetView; now: number; zone: string }) {
  const last = view.acts.at(-1);
  if (!last || (last.act !== 'sent-back' && last.act !== 'returned')) return null;
  if (isTakenBack(view.acts)) return null;
  const at = whenSaid(last.at, now, zone);
  if (last.act === 'returned')
    return (
      <CautionNote title="The evidence changed after this was filed">
        <p>
          {last.person} would have cleared it {at}, but figures, policy, house style or the comparison are no
          longer those that it was filed on. Nothing was cleared. Read it against the evidence as it is now.
        </p>
      </CautionNote>
    );
  return (
    <CautionNote title={`${last.person} sent this back ${at}`}>
      <p>“{last.comment}”</p>
    </CautionNote>
  );
}

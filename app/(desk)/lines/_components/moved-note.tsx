import { CautionNote } from '@/components/ui/caution-note';
import type { SheetView } from '@/lib/services/sheet/get-sheet';

/** Figures, policy, house style or comparison changed since filing. */
export function MovedNote({ view }: { view: SheetView }) {
  if (!view.hasMoved) return null;
  return (
    <CautionNote title="The evidence changed since this was filed">
      <p>
        What stands beside the words is as it is now. Clearing does not clear it: it goes back to{' '}
        {view.filer?.name ?? 'its filer'}, who agrees anew with one key.
      </p>
    </CautionNote>
  );
}

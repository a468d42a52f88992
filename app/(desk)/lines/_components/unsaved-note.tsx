import { Button } from '@/components/ui/button';
import { CautionNote } from '@/components/ui/caution-note';

/** Words typed here before that could not be saved then. */
export function UnsavedNote({ onTake, onDrop }: { onTake: () => void; onDrop: () => void }) {
  return (
    <CautionNote title="Words you typed here before were not saved">
      <p>This browser kept them. Putting them back replaces what stands in the lines below.</p>
      <p className="mt-2 flex flex-wrap gap-2">
        <Button onClick={onTake}>Put them back</Button>
        <Button onClick={onDrop}>Drop them</Button>
      </p>
    </CautionNote>
  );
}

'use client';

import { useEffect } from 'react';
import { Button } from '../../ui/button';
import { CautionNote } from '../../ui/caution-note';

/** Two versions of the draft: nothing is kept over either until the writer says which. */
export function DraftConflict({ onKeep, onLoad }: { onKeep: () => void; onLoad: () => void }) {
  useEffect(() => {
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, []);
  return (
    <CautionNote title="This draft was changed in another tab">
      <p className="mb-3">
        What is typed here is not saved until you choose. The version you do not choose is set aside in this
        tab and can be brought back.
      </p>
      <div className="flex flex-wrap gap-3">
        <Button onClick={onKeep}>Keep what is typed here</Button>
        <Button onClick={onLoad}>Load the other one</Button>
      </div>
    </CautionNote>
  );
}

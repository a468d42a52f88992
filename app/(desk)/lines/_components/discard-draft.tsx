'use client';

import { useState } from 'react';
import { forgetUnsaved } from '@/components/forms/sheet/unsaved-words';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { ErrorSummary } from '@/components/ui/error-summary';
import { loadPage } from '../../../_components/load-page';
import { faultsOf, useAction } from '../../../_components/use-action';
import type { SheetActions } from './sheet-actions';

/** Throws away a draft that nobody filed yet, after asking once. */
export function DiscardDraft({
  id,
  discard,
  keptAs,
}: {
  id: string;
  discard: SheetActions['discard'];
  /** Where the browser keeps words of it that were not saved. */
  keptAs: string;
}) {
  const [isOpen, setOpen] = useState(false);
  const { run, isPending, failure, attempt } = useAction(discard);

  const confirm = async () => {
    if (isPending || !(await run({ id })).ok) return;
    forgetUnsaved(keptAs);
    loadPage('/lines');
  };

  return (
    <>
      <Button onClick={() => setOpen(true)}>Discard the draft</Button>
      <Dialog isOpen={isOpen} onClose={() => setOpen(false)} title="Discard this draft?">
        <ErrorSummary faults={faultsOf(failure, {})} attempt={attempt} title="Nothing was discarded" />
        <p>Its words leave the list and stay only in the history. A filed sheet cannot be discarded.</p>
        <div className="mt-4 flex flex-wrap gap-3">
          <Button onClick={() => setOpen(false)}>Keep it</Button>
          <Button tone="caution" pending={isPending} pendingLabel="Discarding…" onClick={confirm}>
            Discard the draft
          </Button>
        </div>
      </Dialog>
    </>
  );
}

'use client';

import { useState } from 'react';
import { formatTime } from '@/lib/format/date';
import { Button } from '../../ui/button';
import { CopyStatus } from '../../ui/copy-status';
import { Dialog } from '../../ui/dialog';
import type { DraftStatus } from './use-draft';

/** Says when the draft was last kept, and throws it away on a second word. */
export function DraftLine({
  status,
  restoredAt,
  onDiscard,
}: {
  status: DraftStatus;
  /** When the draft that the form opened with was kept. */
  restoredAt: number | null;
  onDiscard: () => Promise<void>;
}) {
  const [isAsking, setIsAsking] = useState(false);
  const [isPending, setIsPending] = useState(false);
  const hasDraft = restoredAt !== null || status.kind !== 'idle';
  return (
    <div className="mb-4 flex flex-wrap items-center gap-x-5 gap-y-1">
      <CopyStatus message={wordsFor(status, restoredAt)} isFault={status.kind === 'failed'} />
      {hasDraft ? (
        <button type="button" className="min-h-6 text-13 underline" onClick={() => setIsAsking(true)}>
          Discard this draft
        </button>
      ) : null}
      <Dialog isOpen={isAsking} onClose={() => setIsAsking(false)} title="Discard this draft?">
        <p className="mb-4">Everything typed into this form goes. Releases that are logged stay.</p>
        <div className="flex flex-wrap gap-3">
          <Button
            tone="caution"
            pending={isPending}
            onClick={async () => {
              setIsPending(true);
              await onDiscard();
              setIsPending(false);
              setIsAsking(false);
            }}
          >
            Discard the draft
          </Button>
          <Button onClick={() => setIsAsking(false)}>Keep it</Button>
        </div>
      </Dialog>
    </div>
  );
}

function wordsFor(status: DraftStatus, restoredAt: number | null): string {
  switch (status.kind) {
    case 'idle':
      return restoredAt === null
        ? 'What you type is kept as a draft.'
        : `Your draft of ${clock(restoredAt)} is back.`;
    case 'saving':
      return 'Saving…';
    case 'saved':
      return `Saved ${clock(status.at)}`;
    case 'failed':
      return `Not saved: ${status.message}`;
  }
}

/** The reader's own clock. */
function clock(at: number): string {
  return formatTime(at, Intl.DateTimeFormat().resolvedOptions().timeZone, 'en-GB');
}

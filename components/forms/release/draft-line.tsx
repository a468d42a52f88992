'use client';

import { useEffect, useRef, useState } from 'react';
import { formatTime } from '@/lib/format/date';
import { Button } from '../../ui/button';
import { CopyStatus } from '../../ui/copy-status';
import { Dialog } from '../../ui/dialog';
import { fieldId } from './field-path';
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
  /** Answers whether the draft is gone. */
  onDiscard: () => Promise<boolean>;
}) {
  const [isAsking, setIsAsking] = useState(false);
  const [isPending, setIsPending] = useState(false);
  const keep = useRef<HTMLButtonElement>(null);
  const isGone = useRef(false);
  const hasDraft = restoredAt !== null || status.kind !== 'idle';

  useEffect(() => {
    if (isAsking) keep.current?.focus();
    else if (isGone.current) document.getElementById(fieldId('race.id'))?.focus();
    isGone.current = false;
  }, [isAsking]);

  return (
    <div className="mb-4 flex flex-wrap items-center gap-x-5 gap-y-1">
      <CopyStatus
        message={wordsFor(status, restoredAt)}
        isFault={status.kind === 'failed' || status.kind === 'conflict'}
      />
      {hasDraft ? (
        <button type="button" className="min-h-6 text-13 underline" onClick={() => setIsAsking(true)}>
          Discard this draft
        </button>
      ) : null}
      <Dialog isOpen={isAsking} onClose={() => setIsAsking(false)} title="Discard this draft?">
        <p className="mb-4">Everything typed into this form goes. Releases that are logged stay.</p>
        <div className="flex flex-wrap gap-3">
          <Button ref={keep} onClick={() => setIsAsking(false)}>
            Keep it
          </Button>
          <Button
            tone="caution"
            pending={isPending}
            onClick={async () => {
              setIsPending(true);
              isGone.current = await onDiscard();
              setIsPending(false);
              setIsAsking(false);
            }}
          >
            Discard the draft
          </Button>
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
    case 'conflict':
      return 'Not saved: this draft was changed in another tab.';
    case 'failed':
      return `Not saved: ${status.message}`;
  }
}

/** The reader's own clock. */
function clock(at: number): string {
  return formatTime(at, Intl.DateTimeFormat().resolvedOptions().timeZone, 'en-GB');
}

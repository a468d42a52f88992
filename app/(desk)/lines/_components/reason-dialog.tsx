'use client';

import { type FormEvent, useEffect, useState } from 'react';
import { Button, type ButtonTone } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextArea } from '@/components/ui/text-area';
import type { ActionFailure } from '@/lib/errors';
import { RefusedNote } from './refused-note';

/** An act that needs a reason: a button, and the dialog that asks for it. */
export function ReasonDialog({
  word,
  pendingWord,
  title,
  label,
  hint,
  field,
  tone = 'plain',
  act,
  isPending,
  failure,
}: {
  /** On the button that opens it and the one that does it. */
  word: string;
  pendingWord: string;
  title: string;
  label: string;
  hint: string;
  /** The field of the service that the text belongs to. */
  field: string;
  tone?: ButtonTone;
  act: (reason: string) => Promise<boolean>;
  isPending: boolean;
  failure: ActionFailure | null;
}) {
  const [isOpen, setOpen] = useState(false);
  const id = `reason-${field}`;

  // After the dialog has opened and taken focus itself.
  useEffect(() => {
    if (isOpen) document.getElementById(id)?.focus();
  }, [isOpen, id]);

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const reason = new FormData(event.currentTarget).get('reason');
    if (await act(typeof reason === 'string' ? reason : '')) setOpen(false);
  };

  return (
    <>
      <Button tone={tone} pending={isPending} pendingLabel={pendingWord} onClick={() => setOpen(true)}>
        {word}
      </Button>
      <Dialog isOpen={isOpen} onClose={() => setOpen(false)} title={title}>
        <form method="post" noValidate onSubmit={submit}>
          <RefusedNote failure={failure?.code === 'invalid' ? null : failure} />
          <TextArea
            id={id}
            name="reason"
            label={label}
            hint={hint}
            rows={4}
            maxLength={2000}
            required
            error={failure?.fields[field]}
          />
          <Button
            type="submit"
            tone={tone === 'plain' ? 'primary' : tone}
            pending={isPending}
            pendingLabel={pendingWord}
          >
            {word}
          </Button>
        </form>
      </Dialog>
    </>
  );
}

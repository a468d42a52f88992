'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, type ReactNode, useState } from 'react';
import { Button, type ButtonTone } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { ErrorSummary } from '@/components/ui/error-summary';
import { TextArea } from '@/components/ui/text-area';
import type { ActionResult } from '@/lib/errors';
import { faultsOf, useAction } from '../../../../_components/use-action';

/** A decision that needs a written reason: a button, and a dialog that asks for it. */
export function ReasonDialog({
  id,
  opener,
  title,
  label,
  hint,
  decide,
  tone = 'primary',
  action,
  children,
}: {
  id: string;
  opener: string;
  title: string;
  label: string;
  hint?: string;
  decide: string;
  tone?: ButtonTone;
  action: (reason: string, form: FormData) => Promise<ActionResult<void>>;
  /** Before the reason: what is decided. */
  children: ReactNode;
}) {
  const router = useRouter();
  const [isOpen, setOpen] = useState(false);
  const { run, isPending, failure, attempt, forget } = useAction((form: FormData) =>
    action(String(form.get('reason') ?? ''), form),
  );

  const close = () => {
    setOpen(false);
    forget();
  };

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const result = await run(new FormData(event.currentTarget));
    if (!result.ok) return;
    close();
    router.refresh();
  };

  return (
    <>
      <Button onClick={() => setOpen(true)}>{opener}</Button>
      <Dialog isOpen={isOpen} onClose={close} title={title}>
        <form method="post" noValidate onSubmit={submit}>
          <ErrorSummary
            faults={faultsOf(failure, { reason: id })}
            attempt={attempt}
            title="Nothing was changed"
          />
          {children}
          <TextArea
            id={id}
            name="reason"
            label={label}
            hint={hint}
            required
            maxLength={1000}
            error={failure?.fields.reason}
          />
          <Button type="submit" tone={tone} pending={isPending}>
            {decide}
          </Button>
        </form>
      </Dialog>
    </>
  );
}

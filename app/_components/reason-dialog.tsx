'use client';

import { type FormEvent, type ReactNode, useEffect, useRef, useState } from 'react';
import { Button, type ButtonTone } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextArea } from '@/components/ui/text-area';

/** An act that needs a written reason: a button, and the dialog that asks for it and can be left without acting. */
export function ReasonDialog({
  id,
  opener,
  openerTone = 'plain',
  title,
  label,
  hint,
  decide,
  tone = 'primary',
  keep = 'Back',
  pendingWord,
  maxLength,
  error,
  refusal,
  isPending,
  act,
  onClose,
  children,
}: {
  /** Of the field of the reason. */
  id: string;
  opener: string;
  openerTone?: ButtonTone;
  title: string;
  label: string;
  hint?: string;
  decide: string;
  tone?: ButtonTone;
  /** On the button that leaves everything as it is. */
  keep?: string;
  pendingWord?: string;
  maxLength: number;
  /** What is wrong with the reason itself. */
  error?: string;
  /** Why nothing was done, on top of the form. */
  refusal: ReactNode;
  isPending: boolean;
  /** True once it is done, which closes the dialog. */
  act: (reason: string, form: FormData) => Promise<boolean>;
  onClose?: () => void;
  /** Before the reason: what is decided. */
  children?: ReactNode;
}) {
  const [isOpen, setOpen] = useState(false);
  const form = useRef<HTMLFormElement>(null);

  // After the dialog has opened and taken focus itself.
  useEffect(() => {
    if (isOpen) form.current?.querySelector<HTMLElement>('input:checked, textarea')?.focus();
  }, [isOpen]);

  const close = () => {
    setOpen(false);
    onClose?.();
  };

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const given = new FormData(event.currentTarget);
    const reason = given.get('reason');
    if (await act(typeof reason === 'string' ? reason : '', given)) close();
  };

  return (
    <>
      <Button tone={openerTone} pending={isPending} pendingLabel={pendingWord} onClick={() => setOpen(true)}>
        {opener}
      </Button>
      <Dialog isOpen={isOpen} onClose={close} title={title}>
        <form ref={form} method="post" noValidate onSubmit={submit}>
          {refusal}
          {children}
          <TextArea
            id={id}
            name="reason"
            label={label}
            hint={hint}
            rows={4}
            maxLength={maxLength}
            required
            error={error}
          />
          <div className="flex flex-wrap gap-3">
            <Button onClick={close}>{keep}</Button>
            <Button type="submit" tone={tone} pending={isPending} pendingLabel={pendingWord}>
              {decide}
            </Button>
          </div>
        </form>
      </Dialog>
    </>
  );
}

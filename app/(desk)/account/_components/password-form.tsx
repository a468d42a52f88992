'use client';

import type { FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { ErrorSummary } from '@/components/ui/error-summary';
import type { ActionResult } from '@/lib/errors';
import { loadPage } from '../../../_components/load-page';
import { PasswordField } from '../../../_components/password-field';
import { faultsOf, useAction } from '../../../_components/use-action';

type Input = { current: string; next: string };

const FIELDS = { current: 'current', next: 'next' };

export function PasswordForm({ change }: { change: (input: Input) => Promise<ActionResult<void>> }) {
  const { run, isPending, failure, attempt } = useAction(change);

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    const text = (name: string) => String(form.get(name) ?? '');
    const result = await run({ current: text('current'), next: text('next') });
    if (result.ok) loadPage('/sign-in?notice=password');
  };

  return (
    <form method="post" noValidate onSubmit={submit} className="mt-2 max-w-[26rem]">
      <ErrorSummary
        faults={faultsOf(failure, FIELDS)}
        attempt={attempt}
        title="The password was not changed"
      />
      <PasswordField
        id="current"
        name="current"
        label="Current password"
        autoComplete="current-password"
        required
        error={failure?.fields.current}
      />
      <PasswordField
        id="next"
        name="next"
        label="New password"
        hint="At least 15 characters. A few unrelated words are easy to keep in mind and hard to guess."
        autoComplete="new-password"
        required
        error={failure?.fields.next}
      />
      <Button type="submit" tone="primary" pending={isPending} pendingLabel="Changing…">
        Change the password
      </Button>
      <p className="field-hint mt-2">Every session of yours ends, this one too: you sign in again.</p>
    </form>
  );
}

'use client';

import type { FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { ErrorSummary } from '@/components/ui/error-summary';
import { TextInput } from '@/components/ui/text-input';
import type { ActionResult } from '@/lib/errors';
import { loadPage } from '../../_components/load-page';
import { PasswordField } from '../../_components/password-field';
import { faultsOf, useAction } from '../../_components/use-action';

type Input = { code: string; password: string };

const FIELDS = { code: 'code', password: 'password' };

export function InvitationForm({ redeem }: { redeem: (input: Input) => Promise<ActionResult<unknown>> }) {
  const { run, isPending, failure, attempt } = useAction(redeem);

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    const input = { code: String(form.get('code') ?? ''), password: String(form.get('password') ?? '') };
    if ((await run(input)).ok) loadPage('/sign-in?notice=invitation');
  };

  return (
    <form method="post" noValidate onSubmit={submit} className="mt-5 max-w-[26rem]">
      <ErrorSummary faults={faultsOf(failure, FIELDS)} attempt={attempt} title="No password was set" />
      <TextInput
        id="code"
        name="code"
        label="Sign-in code"
        hint="Four groups of five; capitals, spaces and dashes do not matter."
        autoComplete="one-time-code"
        autoCapitalize="characters"
        spellCheck={false}
        required
        maxLength={100}
        error={failure?.fields.code}
      />
      <PasswordField
        id="password"
        name="password"
        label="New password"
        hint="At least 15 characters. A few unrelated words are easy to keep in mind and hard to guess."
        autoComplete="new-password"
        required
        error={failure?.fields.password}
      />
      <Button type="submit" tone="primary" pending={isPending} pendingLabel="Setting…">
        Set the password
      </Button>
    </form>
  );
}

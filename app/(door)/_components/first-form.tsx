'use client';

import type { FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { ErrorSummary } from '@/components/ui/error-summary';
import { TextInput } from '@/components/ui/text-input';
import type { ActionResult } from '@/lib/errors';
import { loadPage } from '../../_components/load-page';
import { PasswordField } from '../../_components/password-field';
import { faultsOf, useAction } from '../../_components/use-action';

type Input = { code: string; name: string; email: string; password: string };

const FIELDS = { code: 'code', name: 'name', email: 'email', password: 'password' };

export function FirstForm({ create }: { create: (input: Input) => Promise<ActionResult<unknown>> }) {
  const { run, isPending, failure, attempt } = useAction(create);

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    const text = (name: string) => String(form.get(name) ?? '');
    const input = {
      code: text('code'),
      name: text('name'),
      email: text('email'),
      password: text('password'),
    };
    if ((await run(input)).ok) loadPage('/sign-in?notice=first');
  };

  return (
    <form method="post" noValidate onSubmit={submit} className="mt-5 max-w-[26rem]">
      <ErrorSummary faults={faultsOf(failure, FIELDS)} attempt={attempt} title="No account was made" />
      <TextInput
        id="code"
        name="code"
        label="Code from the console"
        hint="Printed where Leadline was started, new at every start. Capitals, spaces and dashes do not matter."
        autoComplete="one-time-code"
        spellCheck={false}
        required
        maxLength={100}
        error={failure?.fields.code}
      />
      <TextInput
        id="name"
        name="name"
        label="Your name"
        hint="As it should stand beside what you log, file and clear."
        autoComplete="name"
        required
        maxLength={80}
        error={failure?.fields.name}
      />
      <TextInput
        id="email"
        name="email"
        type="email"
        label="Email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        required
        maxLength={200}
        error={failure?.fields.email}
      />
      <PasswordField
        id="password"
        name="password"
        label="Password"
        hint="At least 15 characters. A few unrelated words are easy to keep in mind and hard to guess."
        autoComplete="new-password"
        required
        error={failure?.fields.password}
      />
      <Button type="submit" tone="primary" pending={isPending} pendingLabel="Making the account…">
        Make the account
      </Button>
    </form>
  );
}

'use client';

import { signIn } from 'next-auth/react';
import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { ErrorSummary, type FieldFault } from '@/components/ui/error-summary';
import { TextInput } from '@/components/ui/text-input';
import { loadPage } from '../../_components/load-page';
import { PasswordField } from '../../_components/password-field';

const REFUSED =
  'This email and password do not open a desk. Check both, or ask an administrator for a new code.';
const THROTTLED = 'Too many tries. Wait a quarter of an hour, then try again.';
const NO_ANSWER = 'Leadline did not answer. Try again in a moment.';

/** Every refusal reads the same, so that nobody learns here who has an account. */
export function SignInForm() {
  const [isPending, setPending] = useState(false);
  const [faults, setFaults] = useState<FieldFault[]>([]);
  const [attempt, setAttempt] = useState(0);
  const errorOf = (fieldId: string) => faults.find((fault) => fault.fieldId === fieldId)?.message;

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (isPending) return;
    const form = new FormData(event.currentTarget);
    const [email, password] = [String(form.get('email') ?? ''), String(form.get('password') ?? '')];
    const missing = missingFrom(email, password);
    setAttempt((count) => count + 1);
    setFaults(missing);
    if (missing.length > 0) return;
    setPending(true);
    const fault = await tryToSignIn(email, password);
    if (fault === null) return loadPage('/');
    setPending(false);
    setFaults([{ message: fault }]);
    setAttempt((count) => count + 1);
  };

  return (
    // A form that is sent before its script runs must not put the password into the address.
    <form method="post" noValidate onSubmit={submit} className="mt-5 max-w-[26rem]">
      <ErrorSummary faults={faults} attempt={attempt} title="You are not signed in" />
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
        error={errorOf('email')}
      />
      <PasswordField
        id="password"
        name="password"
        label="Password"
        autoComplete="current-password"
        required
        error={errorOf('password')}
      />
      <Button type="submit" tone="primary" pending={isPending} pendingLabel="Signing in…">
        Sign in
      </Button>
    </form>
  );
}

function missingFrom(email: string, password: string): FieldFault[] {
  const faults: FieldFault[] = [];
  if (email.trim() === '') faults.push({ fieldId: 'email', message: 'Type your email address.' });
  if (password === '') faults.push({ fieldId: 'password', message: 'Type your password.' });
  return faults;
}

/** Null when the session is open, else what to tell. */
async function tryToSignIn(email: string, password: string): Promise<string | null> {
  try {
    const result = await signIn('credentials', { redirect: false, email, password });
    if (result?.ok && !result.error) return null;
    if (result?.error === 'throttled') return THROTTLED;
    return result?.error === 'CredentialsSignin' ? REFUSED : NO_ANSWER;
  } catch {
    return NO_ANSWER;
  }
}

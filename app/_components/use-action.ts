'use client';

import { useState } from 'react';
import type { FieldFault } from '@/components/ui/error-summary';
import type { ActionFailure, ActionResult } from '@/lib/errors';

const NO_ANSWER: ActionFailure = {
  ok: false,
  code: 'unknown',
  message: 'Leadline did not answer. Nothing was changed, as far as this page knows; look, then try again.',
  fields: {},
};

/** Runs a server action once at a time and keeps its last refusal for the form to show. */
export function useAction<Input, Value>(action: (input: Input) => Promise<ActionResult<Value>>) {
  const [isPending, setPending] = useState(false);
  const [failure, setFailure] = useState<ActionFailure | null>(null);
  const [attempt, setAttempt] = useState(0);

  const run = async (input: Input): Promise<ActionResult<Value>> => {
    setPending(true);
    const result = await action(input).catch((): ActionFailure => NO_ANSWER);
    setPending(false);
    setFailure(result.ok ? null : result);
    setAttempt((count) => count + 1);
    return result;
  };

  return { run, isPending, failure, attempt, forget: () => setFailure(null) };
}

/** What an error summary lists: each field's message, or the message of the whole. */
export function faultsOf(failure: ActionFailure | null, fieldIds: Record<string, string>): FieldFault[] {
  if (!failure) return [];
  const faults = Object.entries(fieldIds).flatMap(([field, fieldId]) => {
    const message = failure.fields[field];
    return message ? [{ message, fieldId }] : [];
  });
  return faults.length > 0 ? faults : [{ message: failure.message }];
}

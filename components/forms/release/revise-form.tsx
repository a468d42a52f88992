'use client';

import { useCallback, useState } from 'react';
import { Button } from '../../ui/button';
import { CautionNote } from '../../ui/caution-note';
import type { FormChoices } from './form-choices';
import type { ReleaseForm } from './form-values';
import { type Answer, type Refusal, ReleaseFields } from './release-fields';
import { useLeaveWarning } from './use-leave-warning';
import { useReleaseForm } from './use-release-form';

export type ReviseRelease = (input: unknown) => Promise<Answer<unknown>>;

const UNSENT: Refusal = {
  ok: false,
  code: 'unreachable',
  message:
    'The figures could not be sent: Leadline cannot be reached, or was renewed meanwhile. What you typed is still on this page; send it again.',
  fields: {},
};

/** A release on file, changed in the same form. No draft of it is kept: the browser asks before it goes. */
export function ReviseForm({
  choices,
  personId,
  stored,
  submit,
}: {
  choices: FormChoices;
  personId: string;
  stored: { id: string; version: number; number: number; values: ReleaseForm };
  submit: ReviseRelease;
}) {
  const { id, version, number } = stored;
  const form = useReleaseForm(stored.values, choices.policy);
  const { getValues } = form;
  useLeaveWarning(
    useCallback(() => getValues(), [getValues]),
    stored.values,
  );
  const [isStale, setIsStale] = useState(false);

  async function send(release: ReleaseForm): Promise<Answer<{ id: string }>> {
    const answer = await submit({ id, version, release }).catch(() => UNSENT);
    setIsStale(!answer.ok && answer.code === 'conflict');
    return answer.ok ? { ok: true, value: { id } } : answer;
  }

  return (
    <ReleaseFields
      form={form}
      choices={choices}
      personId={personId}
      releaseId={id}
      lead={isStale ? <Stale /> : null}
      send={{ label: `Save as version ${number + 1}`, pendingLabel: 'Saving…' }}
      submit={send}
    />
  );
}

function Stale() {
  return (
    <CautionNote title="Nothing was saved">
      <p className="mb-3">
        Something changed since this page was opened. Reloading shows the release as it is now; what you typed
        here goes.
      </p>
      <Button onClick={() => window.location.reload()}>Reload the page</Button>
    </CautionNote>
  );
}

'use client';

import { useCallback, useEffect, useState } from 'react';
import { DraftLine } from './draft-line';
import type { FormChoices } from './form-choices';
import { emptyReleaseForm, type ReleaseForm } from './form-values';
import { type Answer, type Refusal, ReleaseFields } from './release-fields';
import { newSubmissionKey } from './submission-key';
import { useDraft } from './use-draft';
import { useReleaseForm } from './use-release-form';

export type SubmitRelease = (input: unknown) => Promise<Answer<{ id: string }>>;

const UNSENT: Refusal = {
  ok: false,
  code: 'unreachable',
  message:
    'The release could not be sent: Leadline cannot be reached, or was renewed meanwhile. What you typed is still here and in the draft; reload the page if it happens again.',
  fields: {},
};

/** A new release: kept as a draft while it is typed, and sent under a key of its own. */
export function LogFields({
  choices,
  personId,
  submit,
  initial,
}: {
  choices: FormChoices;
  personId: string;
  submit: SubmitRelease;
  initial: { values: ReleaseForm; savedAt: number | null };
}) {
  const form = useReleaseForm(initial.values);
  const [submissionKey, setSubmissionKey] = useState(newSubmissionKey);
  const [restoredAt, setRestoredAt] = useState(initial.savedAt);
  const { getValues, subscribe } = form;
  const draft = useDraft(useCallback(() => getValues(), [getValues]));
  const { changed } = draft;
  useEffect(() => subscribe({ formState: { values: true }, callback: changed }), [subscribe, changed]);

  async function send(release: ReleaseForm) {
    await draft.stop();
    const answer = await submit({ submissionKey, release }).catch(() => UNSENT);
    if (!answer.ok) draft.resume();
    return answer;
  }

  async function discard() {
    if (!(await draft.discard())) return;
    form.reset(emptyReleaseForm());
    setSubmissionKey(newSubmissionKey());
    setRestoredAt(null);
  }

  return (
    <ReleaseFields
      form={form}
      choices={choices}
      personId={personId}
      lead={<DraftLine status={draft.status} restoredAt={restoredAt} onDiscard={discard} />}
      send={{ label: 'Log the release', pendingLabel: 'Logging…' }}
      submit={send}
    />
  );
}

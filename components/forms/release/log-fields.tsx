'use client';

import { useCallback, useEffect, useState } from 'react';
import { Button } from '../../ui/button';
import { DraftConflict } from './draft-conflict';
import type { KeptDraft } from './draft-exchange';
import { DraftLine } from './draft-line';
import type { FormChoices } from './form-choices';
import { emptyReleaseForm, type ReleaseForm, reviveReleaseForm } from './form-values';
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
  const form = useReleaseForm(initial.values, choices.policy);
  const [submissionKey, setSubmissionKey] = useState(newSubmissionKey);
  const [restoredAt, setRestoredAt] = useState(initial.savedAt);
  /** The version of two that was not chosen. */
  const [aside, setAside] = useState<ReleaseForm | null>(null);
  const { getValues, subscribe } = form;
  const draft = useDraft(
    useCallback(() => getValues(), [getValues]),
    initial.savedAt,
  );
  const { changed } = draft;
  useEffect(() => subscribe({ formState: { values: true }, callback: changed }), [subscribe, changed]);

  async function send(release: ReleaseForm) {
    await draft.stop();
    const answer = await submit({ submissionKey, release }).catch(() => UNSENT);
    if (!answer.ok) draft.resume();
    return answer;
  }

  async function discard() {
    const isGone = await draft.discard(() => form.reset(emptyReleaseForm()));
    if (!isGone) return false;
    setSubmissionKey(newSubmissionKey());
    setRestoredAt(null);
    setAside(null);
    return true;
  }

  function keepTyped(other: KeptDraft) {
    setAside(reviveReleaseForm(other.body));
    draft.settle(other);
  }

  function loadOther(other: KeptDraft) {
    swapFor(reviveReleaseForm(other.body));
    draft.settle(other);
  }

  function swapFor(values: ReleaseForm) {
    setAside(structuredClone(getValues()));
    form.reset(values);
  }

  const { status } = draft;
  return (
    <ReleaseFields
      form={form}
      choices={choices}
      personId={personId}
      lead={
        <>
          <DraftLine status={status} restoredAt={restoredAt} onDiscard={discard} />
          {status.kind === 'conflict' ? (
            <DraftConflict onKeep={() => keepTyped(status.other)} onLoad={() => loadOther(status.other)} />
          ) : null}
          {aside && status.kind !== 'conflict' ? <SetAside onBack={() => swapFor(aside)} /> : null}
        </>
      }
      send={{ label: 'Log the release', pendingLabel: 'Logging…' }}
      submit={send}
    />
  );
}

function SetAside({ onBack }: { onBack: () => void }) {
  return (
    <p className="mb-4 text-13 text-soft">
      The other version of this draft is set aside in this tab.{' '}
      <Button className="ml-2" onClick={onBack}>
        Swap the two versions
      </Button>
    </p>
  );
}

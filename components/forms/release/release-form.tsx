'use client';

import { useState } from 'react';
import useSWR from 'swr';
import { Button } from '../../ui/button';
import { CautionNote } from '../../ui/caution-note';
import { Loading } from '../../ui/loading';
import { draftIn, DRAFTS_URL } from './draft-exchange';
import { fetchJson } from './fetch-json';
import type { FormChoices } from './form-choices';
import { emptyReleaseForm, type ReleaseForm as Values, reviveReleaseForm } from './form-values';
import { LogFields, type SubmitRelease } from './log-fields';
import { newSubmissionKey } from './submission-key';

/** Logging a release: what was typed before comes back first, then the form opens on it. */
export function ReleaseForm({
  choices,
  personId,
  submit,
}: {
  choices: FormChoices;
  personId: string;
  submit: SubmitRelease;
}) {
  // Fetched anew whenever the form opens: one fetched before is older than what was typed since.
  const [opening] = useState(newSubmissionKey);
  const { data, error, isLoading, mutate } = useSWR([DRAFTS_URL, personId, opening], readDraft, {
    revalidateOnFocus: false,
    revalidateOnReconnect: false,
    revalidateIfStale: false,
    shouldRetryOnError: false,
    dedupingInterval: 0,
  });
  if (error instanceof Error)
    return (
      <CautionNote title="What you typed before could not be fetched">
        <p className="mb-3">{error.message} It is kept; nothing new is typed over it until it is here.</p>
        <Button onClick={() => void mutate()}>Try again</Button>
      </CautionNote>
    );
  if (isLoading || !data) return <Loading label="Fetching what you typed before…" lines={8} />;
  return <LogFields choices={choices} personId={personId} submit={submit} initial={data} />;
}

export type Initial = { values: Values; savedAt: number | null };

async function readDraft([url]: string[]): Promise<Initial> {
  const kept = draftIn(await fetchJson(url ?? DRAFTS_URL, { method: 'GET' }));
  if (!kept) return { values: emptyReleaseForm(), savedAt: null };
  return { values: reviveReleaseForm(kept.body), savedAt: kept.savedAt };
}

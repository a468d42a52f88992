'use client';

import useSWR from 'swr';
import { Button } from '../../ui/button';
import { CautionNote } from '../../ui/caution-note';
import { Loading } from '../../ui/loading';
import { fetchJson } from './fetch-json';
import type { FormChoices } from './form-choices';
import { emptyReleaseForm, type ReleaseForm as Values, reviveReleaseForm } from './form-values';
import { LogFields, type SubmitRelease } from './log-fields';
import { DRAFTS_URL } from './use-draft';

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
  const { data, error, isLoading, mutate } = useSWR([DRAFTS_URL, personId], readDraft, {
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
  const kept = await fetchJson(url ?? DRAFTS_URL, { method: 'GET' });
  if (typeof kept !== 'object' || kept === null || !('body' in kept))
    return { values: emptyReleaseForm(), savedAt: null };
  const savedAt = 'savedAt' in kept && typeof kept.savedAt === 'number' ? kept.savedAt : null;
  return { values: reviveReleaseForm(kept.body), savedAt };
}

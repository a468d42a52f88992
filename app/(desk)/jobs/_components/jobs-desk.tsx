'use client';

import useSWR from 'swr';
import { fetchJson } from '@/components/forms/release/fetch-json';
import { Button } from '@/components/ui/button';
import { CautionNote } from '@/components/ui/caution-note';
import { EmptyState } from '@/components/ui/empty-state';
import { Loading } from '@/components/ui/loading';
import { NextBar } from '@/components/ui/next-bar';
import { formatTime } from '@/lib/format/date';
import type { JobsView } from '@/lib/services/jobs/list-jobs';
import type { JobActs } from './job-act';
import { processWords } from './job-words';
import { DeadJobs, EndedJobs, RunningJobs, WaitingJobs } from './job-tables';

const EVERY_MS = 2000;

/** The work behind the screens, which refreshes itself; the key names the person, so that nobody is shown another's. */
export function JobsDesk({
  initial,
  person,
  zone,
  acts,
  everyMs = EVERY_MS,
}: {
  /** What the page was made with; without it the list is loaded first. */
  initial?: JobsView;
  person: string;
  zone: string;
  acts: JobActs;
  everyMs?: number;
}) {
  const { data, error, isValidating, mutate } = useSWR<JobsView, Error>(
    ['/api/v1/jobs', person],
    ([url]: [string, string]) => fetchJson(url, { method: 'GET' }) as Promise<JobsView>,
    { fallbackData: initial, refreshInterval: everyMs, shouldRetryOnError: false, keepPreviousData: true },
  );
  return (
    <>
      {error ? (
        <CautionNote title="This page may be old">
          <p>
            {error.message}{' '}
            {data ? `Last read ${formatTime(data.readAt, zone, 'en-GB')}.` : 'It was not read yet.'}
          </p>
          <Button
            className="mt-2"
            pending={isValidating}
            pendingLabel="Reading…"
            onClick={() => void mutate()}
          >
            Read it again
          </Button>
        </CautionNote>
      ) : null}
      {data ? (
        <Work data={data} zone={zone} acts={acts} onDone={() => void mutate()} />
      ) : error ? null : (
        <Loading label="Reading the jobs…" />
      )}
    </>
  );
}

function Work({
  data,
  zone,
  acts,
  onDone,
}: {
  data: JobsView;
  zone: string;
  acts: JobActs;
  onDone: () => void;
}) {
  const { running, waiting, dead, ended, nDead } = data;
  const tables = { zone, now: data.readAt, acts, onDone };
  return (
    <>
      <NextBar label="State of the process">
        <strong>{summaryOf(data)}</strong> {processWords(data, zone)}
        {data.isDemo ? ' Caches are stood in for in this demo: nothing leaves this machine.' : ''}
      </NextBar>
      {data.process.state === 'answering' ? null : (
        <CautionNote title="Nothing is being done now">
          <p>
            Figures, words and embeds are served all the same, and embargoes and bans end by the clock. What
            stands below waits until the process is back: it is started again by itself; where that does not
            help, restart Leadline and look at what it printed.
          </p>
        </CautionNote>
      )}
      {running.length + waiting.length + dead.length + ended.length === 0 ? (
        <EmptyState title="There is no work, and there has been none">
          <p>
            Jobs come from what people do: an embargo that ends, words that reach the end of their shelf life,
            a new policy under which every finding is computed anew.
          </p>
        </EmptyState>
      ) : null}
      <DeadJobs jobs={dead} total={nDead} {...tables} />
      <RunningJobs jobs={running} {...tables} />
      <WaitingJobs jobs={waiting} total={data.nWaiting} {...tables} />
      <EndedJobs jobs={ended} {...tables} />
    </>
  );
}

function summaryOf({ running, nWaiting, nDead }: JobsView): string {
  const words = [
    running.length === 0 ? 'Nothing runs now' : `${running.length} running`,
    nWaiting === 0 ? 'nothing waits' : `${nWaiting} waiting`,
    ...(nDead === 0 ? [] : [`${nDead} given up`]),
  ];
  return `${words.join(', ')}.`;
}

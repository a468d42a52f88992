'use client';

import Link from 'next/link';
import useSWR from 'swr';
import { fetchJson } from '@/components/forms/release/fetch-json';
import { Button } from '@/components/ui/button';
import { CautionNote } from '@/components/ui/caution-note';
import { EmptyState } from '@/components/ui/empty-state';
import { Loading } from '@/components/ui/loading';
import { formatTime } from '@/lib/format/date';
import type { OpenSheetItem } from '@/lib/services/sheet/list-open-sheets';
import { Escalated } from './escalated';
import { QueueGroup } from './queue-group';
import { useNews } from './use-news';

export type QueueData = { sheets: OpenSheetItem[]; onCall: string[]; readAt: number };

const EVERY_MS = 10_000;

const GROUPS = [
  { waitsFor: 'me', title: 'Waiting for you' },
  { waitsFor: 'nobody', title: 'Being written' },
  { waitsFor: 'others', title: 'Waiting for others' },
] as const;

/** The queue, which refreshes itself; the key names the person, so that nobody is shown another's. */
export function Queue({
  initial,
  person,
  zone,
  everyMs = EVERY_MS,
}: {
  /** What the page was made with; without it the list is loaded first. */
  initial?: QueueData;
  person: string;
  zone: string;
  everyMs?: number;
}) {
  const { data, error, isValidating, mutate } = useSWR<QueueData, Error>(
    ['/api/desk/queue', person],
    ([url]: [string, string]) => fetchJson(url, { method: 'GET' }) as Promise<QueueData>,
    {
      fallbackData: initial,
      refreshInterval: everyMs,
      revalidateOnFocus: true,
      shouldRetryOnError: false,
      keepPreviousData: true,
    },
  );
  const news = useNews(data?.sheets);
  return (
    <div className="mt-6">
      <p role="status" className="sr-only">
        {news}
      </p>
      {error ? (
        <CautionNote title="The list may be old">
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
      {data ? <Groups data={data} zone={zone} /> : error ? null : <Loading label="Reading the queue…" />}
    </div>
  );
}

function Groups({ data, zone }: { data: QueueData; zone: string }) {
  if (data.sheets.length === 0)
    return (
      <EmptyState title="Nothing is being written, and nothing waits">
        <p>
          Sheets stand here from their first draft until two people have agreed to them. Draft one from a{' '}
          <Link href="/releases">release</Link>; cleared ones are on the{' '}
          <Link href="/copy-desk">copy desk</Link>.
        </p>
      </EmptyState>
    );
  return (
    <>
      <Escalated data={data} />
      {GROUPS.map(({ waitsFor, title }) => (
        <QueueGroup
          key={waitsFor}
          title={title}
          sheets={data.sheets.filter((sheet) => sheet.waitsFor === waitsFor)}
          now={data.readAt}
          zone={zone}
        />
      ))}
    </>
  );
}

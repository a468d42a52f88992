'use client';

import useSWR from 'swr';
import { fetchJson } from '@/components/forms/release/fetch-json';
import type { Present } from '@/lib/services/sheet/presence';

const EVERY_MS = 15_000;

/** Says that this page is open, and who else has the same sheet open. Nobody is locked out. */
export function PresenceNote({
  id,
  person,
  doing,
  everyMs = EVERY_MS,
}: {
  id: string;
  /** Public id of whoever looks: no answer of one person is shown to another. */
  person: string;
  doing: 'reading' | 'writing';
  everyMs?: number;
}) {
  const { data } = useSWR<Present, Error>(
    [`/api/desk/sheets/${id}/presence`, person, doing],
    ([url]: [string, string, string]) =>
      fetchJson(url, { method: 'POST', body: { doing } }) as Promise<Present>,
    { refreshInterval: everyMs, revalidateOnFocus: true, shouldRetryOnError: false, keepPreviousData: true },
  );
  return (
    <p role="status" className="mt-2 text-13 font-semibold text-caution empty:hidden">
      {data ? presentWords(data.others) : ''}
    </p>
  );
}

/** "Marten Reed is reading this sheet too, and Isolde Varn is writing on it." */
export function presentWords(others: Present['others']): string {
  const said = others.map(({ name, doing }) =>
    doing === 'writing' ? `${name} is writing on this sheet now` : `${name} has this sheet open too`,
  );
  return said.length === 0 ? '' : `${new Intl.ListFormat('en-GB').format(said)}.`;
}

import { useEffect, useMemo, useState } from 'react';
import useSWR from 'swr';
import type { Compared, ComparisonQuery } from './comparison-query';
import { fetchJson } from './fetch-json';

const WAIT_MS = 350;
export const COMPARISON_URL = '/api/desk/comparison';

export type ComparisonState =
  | { kind: 'not-asked' }
  | { kind: 'asking' }
  | { kind: 'failed'; message: string }
  | { kind: 'answered'; compared: Compared };

/** Which earlier release the form's release is compared with; asked again a moment after the last change. */
export function useComparison(query: ComparisonQuery | null, personId: string): ComparisonState {
  const wanted = query && JSON.stringify(query);
  const settled = useSettled(wanted);
  const key = settled === null || wanted === null ? null : [COMPARISON_URL, personId, settled];
  const { data, error } = useSWR(key, ask, { keepPreviousData: true, revalidateOnFocus: false });
  const isAsked = wanted !== null;
  const message = error instanceof Error ? error.message : null;
  return useMemo(() => {
    if (!isAsked) return { kind: 'not-asked' };
    if (message !== null) return { kind: 'failed', message };
    return data ? { kind: 'answered', compared: data } : { kind: 'asking' };
  }, [isAsked, message, data]);
}

async function ask([url, , query]: [string, string, string] | string[]): Promise<Compared> {
  return (await fetchJson(url ?? COMPARISON_URL, {
    method: 'POST',
    body: JSON.parse(query ?? 'null') as unknown,
  })) as Compared;
}

/** The value once it has stood still. */
function useSettled(value: string | null): string | null {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), WAIT_MS);
    return () => clearTimeout(timer);
  }, [value]);
  return settled;
}

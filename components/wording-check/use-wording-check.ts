import { useEffect, useRef, useState } from 'react';
import useSWRMutation from 'swr/mutation';
import type { TextPart, WordingCheck, WordingLanguage } from '@/lib/wording/check/types';
import { fetchJson, Refused } from '../forms/release/fetch-json';

export const WORDING_CHECK_URL = '/api/v1/wording-check';
const WAIT_MS = 350;

export type Asked = { text: string; language: WordingLanguage; part: TextPart; releases: readonly string[] };
export type Answered = WordingCheck & {
  /** What was asked: the text that the offsets of the marks are in. */
  asked: Asked;
  releases: { pollster: string; race: string; fieldStartOn: string; fieldEndOn: string }[];
};

export type CheckState = {
  answer: Answered | null;
  /** The answer is that of an earlier text; the newest is being asked. */
  isBehind: boolean;
  failure: { message: string; status: number } | null;
  again: () => void;
};

/** Marks of a text, asked of the server a moment after the last key; the newest question wins. */
export function useWordingCheck(asked: Asked, personId: string): CheckState {
  const [answer, setAnswer] = useState<Answered | null>(null);
  const [failure, setFailure] = useState<CheckState['failure']>(null);
  const [attempt, setAttempt] = useState(0);
  const { trigger } = useSWRMutation([WORDING_CHECK_URL, personId], ask);
  const newest = useRef('');
  const wanted = asked.text.trim() === '' ? null : JSON.stringify(asked);

  useEffect(() => {
    newest.current = wanted ?? '';
    if (wanted === null) return;
    const timer = setTimeout(() => {
      const isNewest = () => newest.current === wanted;
      trigger(wanted, { throwOnError: true })
        .then((found) => {
          if (!isNewest()) return;
          setAnswer(found);
          setFailure(null);
        })
        .catch((error: unknown) => {
          if (isNewest()) setFailure(failureOf(error));
        });
    }, WAIT_MS);
    return () => clearTimeout(timer);
  }, [wanted, attempt, trigger]);

  return {
    answer: wanted === null ? null : answer,
    isBehind: wanted !== null && failure === null && (!answer || JSON.stringify(answer.asked) !== wanted),
    failure: wanted === null ? null : failure,
    again: () => {
      setFailure(null);
      setAttempt((count) => count + 1);
    },
  };
}

function failureOf(error: unknown) {
  return error instanceof Refused
    ? { message: error.message, status: error.status }
    : { message: 'This browser could not ask.', status: 0 };
}

async function ask([url]: readonly string[], { arg }: { arg: string }): Promise<Answered> {
  const asked = JSON.parse(arg) as Asked;
  const found = (await fetchJson(url ?? WORDING_CHECK_URL, { method: 'POST', body: asked })) as Omit<
    Answered,
    'asked'
  >;
  return { ...found, asked };
}

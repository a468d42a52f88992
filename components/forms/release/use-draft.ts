import { useCallback, useEffect, useRef, useState } from 'react';
import { fetchJson, Refused } from './fetch-json';

export const DRAFTS_URL = '/api/desk/drafts';
const WAIT_MS = 700;

export type DraftStatus =
  { kind: 'idle' } | { kind: 'saving' } | { kind: 'saved'; at: number } | { kind: 'failed'; message: string };

/**
 * Keeps what is typed: a moment after the last change, when the page is left, and again when the window comes
 * back after a failure. Nothing typed is ever taken away, whatever the answer.
 *
 * @param read the whole form as it stands
 */
export function useDraft(read: () => unknown) {
  const [status, setStatus] = useState<DraftStatus>({ kind: 'idle' });
  const timer = useRef<ReturnType<typeof setTimeout> | null>(null);
  const running = useRef<Promise<void>>(Promise.resolve());
  const isDirty = useRef(false);
  const isStopped = useRef(false);

  const send = useCallback(
    async (keepalive: boolean) => {
      if (isStopped.current || !isDirty.current) return;
      isDirty.current = false;
      setStatus({ kind: 'saving' });
      try {
        const body = { body: JSON.stringify(read()) };
        const answer = await fetchJson(DRAFTS_URL, { method: 'PUT', body, keepalive });
        setStatus({ kind: 'saved', at: savedAtOf(answer) });
      } catch (error) {
        isDirty.current = true;
        setStatus({ kind: 'failed', message: wordsFor(error) });
      }
    },
    [read],
  );

  /** One save after the other, so that an older one never lands on top of a newer one. */
  const save = useCallback(
    (keepalive = false) => {
      if (timer.current) clearTimeout(timer.current);
      running.current = keepalive ? send(true) : running.current.then(() => send(false));
      return running.current;
    },
    [send],
  );

  const changed = useCallback(() => {
    if (isStopped.current) return;
    isDirty.current = true;
    if (timer.current) clearTimeout(timer.current);
    timer.current = setTimeout(() => void save(), WAIT_MS);
  }, [save]);

  useEffect(() => {
    const leave = () => void save(true);
    const hide = () => document.visibilityState === 'hidden' && leave();
    const retry = () => void save();
    window.addEventListener('pagehide', leave);
    document.addEventListener('visibilitychange', hide);
    window.addEventListener('focus', retry);
    window.addEventListener('online', retry);
    return () => {
      window.removeEventListener('pagehide', leave);
      document.removeEventListener('visibilitychange', hide);
      window.removeEventListener('focus', retry);
      window.removeEventListener('online', retry);
      leave();
    };
  }, [save]);

  /** Before the form is sent: no save may follow that one and bring the draft back. */
  const stop = useCallback(async () => {
    isStopped.current = true;
    if (timer.current) clearTimeout(timer.current);
    await running.current;
  }, []);

  const resume = useCallback(() => {
    isStopped.current = false;
    changed();
  }, [changed]);

  const discard = useCallback(async () => {
    await stop();
    try {
      await fetchJson(DRAFTS_URL, { method: 'DELETE', body: {} });
      isDirty.current = false;
      setStatus({ kind: 'idle' });
      return true;
    } catch (error) {
      setStatus({ kind: 'failed', message: wordsFor(error) });
      return false;
    } finally {
      isStopped.current = false;
    }
  }, [stop]);

  return { status, changed, stop, resume, discard };
}

function savedAtOf(answer: unknown): number {
  const isSaved = typeof answer === 'object' && answer !== null && 'savedAt' in answer;
  return isSaved && typeof answer.savedAt === 'number' ? answer.savedAt : 0;
}

function wordsFor(error: unknown): string {
  if (error instanceof Refused && error.status === 401)
    return 'your session has ended. Sign in in another tab; what you typed stays here.';
  return error instanceof Refused ? error.message : 'this browser could not send it.';
}

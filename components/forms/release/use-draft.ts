import { useCallback, useEffect, useRef, useState } from 'react';
import { draftExchange, type Kept, type KeptDraft } from './draft-exchange';
import { Refused } from './fetch-json';

const WAIT_MS = 700;

export type DraftStatus = { kind: 'idle' } | { kind: 'saving' } | Kept | { kind: 'failed'; message: string };

/**
 * Keeps what is typed: a moment after the last change, when the page is left, and again when the window comes
 * back after a failure. Nothing typed is ever taken away, whatever the answer.
 *
 * @param read the whole form as it stands
 * @param basedOn when the draft that the form opened with was kept
 */
export function useDraft(read: () => unknown, basedOn: number | null) {
  const [status, setStatus] = useState<DraftStatus>({ kind: 'idle' });
  const [exchange] = useState(() => draftExchange(basedOn));
  const timer = useRef<ReturnType<typeof setTimeout> | null>(null);
  const running = useRef<Promise<void>>(Promise.resolve());
  const isDirty = useRef(false);
  const isStopped = useRef(false);
  const isContested = useRef(false);

  const send = useCallback(
    async (keepalive: boolean) => {
      if (isStopped.current || isContested.current || !isDirty.current) return;
      isDirty.current = false;
      setStatus({ kind: 'saving' });
      try {
        const kept = await exchange.save(JSON.stringify(read()), keepalive);
        isContested.current = kept.kind === 'conflict';
        setStatus(kept);
      } catch (error) {
        isDirty.current = true;
        setStatus({ kind: 'failed', message: wordsFor(error) });
      }
    },
    [read, exchange],
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

  /** The writer has seen the other version: what now stands in the form replaces it. */
  const settle = useCallback(
    (other: KeptDraft) => {
      exchange.adopt(other);
      isContested.current = false;
      isDirty.current = true;
      void save();
    },
    [exchange, save],
  );

  /** @param clear empties the form, which is not typing and is not kept */
  const discard = useCallback(
    async (clear: () => void) => {
      await stop();
      try {
        await exchange.remove();
        isDirty.current = false;
        isContested.current = false;
        clear();
        setStatus({ kind: 'idle' });
        return true;
      } catch (error) {
        setStatus({ kind: 'failed', message: wordsFor(error) });
        return false;
      } finally {
        isStopped.current = false;
      }
    },
    [stop, exchange],
  );

  return { status, changed, stop, resume, settle, discard };
}

function wordsFor(error: unknown): string {
  if (error instanceof Refused && error.status === 401)
    return 'your session has ended. Sign in in another tab; what you typed stays here.';
  return error instanceof Refused ? error.message : 'this browser could not send it.';
}

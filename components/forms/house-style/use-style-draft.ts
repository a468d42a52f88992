import { useCallback, useEffect, useRef, useState } from 'react';
import { fetchJson, Refused } from '../release/fetch-json';

export type Fault = { message: string; place: { start: number; end: number } | null; phrase: string | null };
export type Faults = Record<string, Fault[]>;
export type SaveStatus =
  | { kind: 'idle' }
  | { kind: 'saving' }
  | { kind: 'saved' }
  | { kind: 'failed'; message: string }
  | { kind: 'conflict'; message: string };

const WAIT_MS = 700;

/**
 * Sends each decision a moment after it was typed, one save after the other. Nothing typed is taken away, whatever
 * the answer; what could not be sent is sent again when the window comes back.
 */
export function useStyleDraft(id: string, first: { version: number; faults: Faults }) {
  const [faults, setFaults] = useState(first.faults);
  const [status, setStatus] = useState<SaveStatus>({ kind: 'idle' });
  const [savedAt, setSavedAt] = useState(0);
  const version = useRef(first.version);
  const waiting = useRef(new Map<string, unknown>());
  const timer = useRef<ReturnType<typeof setTimeout> | null>(null);
  const running = useRef<Promise<void>>(Promise.resolve());
  const isContested = useRef(false);

  const send = useCallback(
    async (keepalive: boolean) => {
      if (isContested.current || waiting.current.size === 0) return;
      const sent = new Map(waiting.current);
      waiting.current.clear();
      setStatus({ kind: 'saving' });
      const changes = [...sent].map(([path, value]) => ({ path, value }));
      const body = { version: version.current, changes };
      try {
        const answer = savedIn(
          await fetchJson(`/api/desk/house-style/${id}`, { method: 'PUT', body, keepalive }),
        );
        version.current = answer.version;
        setFaults((before) => ({ ...before, ...faultsOf(sent, answer.faults, waiting.current) }));
        setStatus({ kind: 'saved' });
        setSavedAt((count) => count + 1);
      } catch (error) {
        for (const [path, value] of sent) if (!waiting.current.has(path)) waiting.current.set(path, value);
        isContested.current = error instanceof Refused && error.status === 409;
        const message = error instanceof Error ? error.message : 'It could not be sent.';
        setStatus({ kind: isContested.current ? 'conflict' : 'failed', message });
      }
    },
    [id],
  );

  const save = useCallback(
    (keepalive = false) => {
      if (timer.current) clearTimeout(timer.current);
      running.current = keepalive ? send(true) : running.current.then(() => send(false));
      return running.current;
    },
    [send],
  );

  const decide = useCallback(
    (path: string, value: unknown) => {
      waiting.current.set(path, value);
      if (timer.current) clearTimeout(timer.current);
      timer.current = setTimeout(() => void save(), WAIT_MS);
    },
    [save],
  );

  useEffect(() => {
    const leave = () => void save(true);
    const retry = () => void save();
    window.addEventListener('pagehide', leave);
    window.addEventListener('focus', retry);
    window.addEventListener('online', retry);
    return () => {
      window.removeEventListener('pagehide', leave);
      window.removeEventListener('focus', retry);
      window.removeEventListener('online', retry);
      leave();
    };
  }, [save]);

  /** Everything typed so far, saved; then the version that an act names. */
  const settle = useCallback(async () => {
    await save();
    return version.current;
  }, [save]);

  return { faults, status, savedAt, decide, settle };
}

function faultsOf(sent: Map<string, unknown>, found: Faults, newer: Map<string, unknown>): Faults {
  const settled = [...sent.keys()].filter((path) => !newer.has(path));
  return Object.fromEntries(settled.map((path) => [path, found[path] ?? []]));
}

function savedIn(answer: unknown): { version: number; faults: Faults } {
  const { version, faults } = answer as { version: number; faults: Faults };
  return { version, faults };
}

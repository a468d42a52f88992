import { useCallback, useEffect, useRef, useState } from 'react';
import { fetchJson, Refused } from '../release/fetch-json';
import { forgetUnsaved, keepUnsaved } from './unsaved-words';
import { sameLines, type WrittenLine } from './use-lines';

export type Saving =
  | { kind: 'saved'; at: number | null }
  | { kind: 'saving' }
  /** Not saved now; tried again with the next change. */
  | { kind: 'failed'; message: string }
  /** Never saved any more from this page: somebody else moved the sheet on, or it may not be written here. */
  | { kind: 'stopped'; message: string };

const PAUSE_MS = 900;
const FINAL = [403, 404, 409];

/**
 * Saves words a moment after they were typed, one save at a time, each from the version that the last one gave.
 * Until a change is saved it is kept in this browser too.
 */
export function useAutosave(sheet: { id: string; version: number; keptAs: string }, lines: WrittenLine[]) {
  const { id, keptAs } = sheet;
  const [saving, setSaving] = useState<Saving>({ kind: 'saved', at: null });
  const version = useRef(sheet.version);
  const saved = useRef(lines);
  const newest = useRef(lines);
  const running = useRef<Promise<boolean>>(Promise.resolve(true));
  const isStopped = useRef(false);
  const isKept = useRef(false);

  /** Saves now what is not saved yet; false where it could not. */
  const save = useCallback(() => {
    const step = async (): Promise<boolean> => {
      const sent = newest.current;
      if (isStopped.current) return false;
      if (sameLines(sent, saved.current)) return true;
      setSaving({ kind: 'saving' });
      try {
        version.current = await send(id, version.current, sent);
      } catch (error) {
        isStopped.current = error instanceof Refused && FINAL.includes(error.status);
        const message = wordsFor(error);
        setSaving({ kind: isStopped.current ? 'stopped' : 'failed', message });
        return false;
      }
      saved.current = sent;
      if (!sameLines(sent, newest.current)) return step();
      forgetUnsaved(keptAs);
      isKept.current = false;
      setSaving({ kind: 'saved', at: Date.now() });
      return true;
    };
    running.current = running.current.then(step);
    return running.current;
  }, [id, keptAs]);

  useEffect(() => {
    newest.current = lines;
    const isSame = sameLines(lines, saved.current);
    if (isSame && isKept.current) forgetUnsaved(keptAs);
    isKept.current = !isSame;
    if (isSame) return;
    keepUnsaved(keptAs, lines);
    const timer = setTimeout(() => void save(), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [lines, keptAs, save]);

  useEffect(() => {
    const leave = () => void save();
    window.addEventListener('pagehide', leave);
    window.addEventListener('online', leave);
    return () => {
      window.removeEventListener('pagehide', leave);
      window.removeEventListener('online', leave);
    };
  }, [save]);

  return { saving, save, version };
}

function wordsFor(error: unknown): string {
  if (error instanceof Refused && error.status === 401)
    return 'Your session has ended. Sign in again in another tab, then press “Save now” here.';
  return error instanceof Refused ? error.message : 'This browser could not send it.';
}

async function send(id: string, version: number, lines: WrittenLine[]): Promise<number> {
  const answer = await fetchJson(`/api/desk/sheets/${id}`, {
    method: 'PUT',
    body: { version, lines },
    keepalive: true,
  });
  const next = typeof answer === 'object' && answer !== null && 'version' in answer ? answer.version : null;
  if (typeof next !== 'number') throw new Refused(0, 'Leadline gave no answer that this page understands.');
  return next;
}

import { fetchJson, Refused } from './fetch-json';

export const DRAFTS_URL = '/api/desk/drafts';

export type KeptDraft = { body: unknown; savedAt: number };
export type Kept = { kind: 'saved'; at: number } | { kind: 'conflict'; other: KeptDraft };

/**
 * The draft of one tab and the one that is kept: each save says which draft it was typed on, and a draft of another
 * tab comes back instead of being replaced.
 *
 * @param basedOn when the draft that the form opened with was kept; null where there was none
 */
export function draftExchange(basedOn: number | null) {
  let base = basedOn;
  /** Sent, and perhaps kept, though no answer came. */
  let unanswered: string[] = [];

  async function put(body: string, keepalive: boolean): Promise<Kept> {
    unanswered = [...unanswered, body];
    const answer = await fetchJson(DRAFTS_URL, { method: 'PUT', body: { body, basedOn: base }, keepalive });
    unanswered = [];
    const at = savedAtOf(answer);
    base = Math.max(base ?? 0, at);
    return { kind: 'saved', at };
  }

  /** @throws Refused where it could be neither kept nor compared */
  async function save(body: string, keepalive: boolean): Promise<Kept> {
    try {
      return await put(body, keepalive);
    } catch (error) {
      if (!(error instanceof Refused && error.status === 409)) throw error;
      const other = draftIn(await fetchJson(DRAFTS_URL, { method: 'GET' }));
      const isOurs = !other || other.savedAt === base || unanswered.includes(JSON.stringify(other.body));
      if (!isOurs) return { kind: 'conflict', other };
      base = other?.savedAt ?? null;
      return put(body, false);
    }
  }

  /** What is typed from now on is typed on that one. */
  function adopt({ savedAt }: KeptDraft): void {
    base = savedAt;
  }

  async function remove(): Promise<void> {
    await fetchJson(DRAFTS_URL, { method: 'DELETE', body: {} });
    base = null;
    unanswered = [];
  }

  return { save, adopt, remove };
}

/** The draft in an answer of the handler, where there is one. */
export function draftIn(answer: unknown): KeptDraft | null {
  if (typeof answer !== 'object' || answer === null || !('body' in answer)) return null;
  return { body: answer.body, savedAt: savedAtOf(answer) };
}

function savedAtOf(answer: unknown): number {
  const isSaved = typeof answer === 'object' && answer !== null && 'savedAt' in answer;
  return isSaved && typeof answer.savedAt === 'number' ? answer.savedAt : 0;
}

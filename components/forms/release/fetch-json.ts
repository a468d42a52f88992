/** A refusal of one of our own handlers, as its problem+json tells it. */
export class Refused extends Error {
  override readonly name = 'Refused';

  constructor(
    readonly status: number,
    message: string,
  ) {
    super(message);
  }
}

const UNREACHABLE = 'Leadline cannot be reached.';

/** Asks one of our own handlers. @throws Refused with a sentence for whoever is reading */
export async function fetchJson(url: string, init: { method: string; body?: unknown; keepalive?: boolean }) {
  const response = await fetch(url, {
    method: init.method,
    cache: 'no-store',
    ...(init.keepalive ? { keepalive: true } : {}),
    ...(init.body === undefined
      ? {}
      : { headers: { 'Content-Type': 'application/json' }, body: JSON.stringify(init.body) }),
  }).catch(() => {
    throw new Refused(0, UNREACHABLE);
  });
  const answer: unknown = await response.json().catch(() => null);
  if (response.ok) return answer;
  throw new Refused(response.status, detailOf(answer) ?? 'Leadline could not answer.');
}

function detailOf(answer: unknown): string | null {
  const isProblem = typeof answer === 'object' && answer !== null && 'detail' in answer;
  return isProblem && typeof answer.detail === 'string' ? answer.detail : null;
}

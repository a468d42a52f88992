import { http, HttpResponse, type RequestHandler } from 'msw';
import { FAKE_PURGE_URL } from '@/lib/env';
import { openJournal } from './journal';

export type Purged = { key: string; urls: string[]; at: string };

/** A cache before the embeds: takes lists of addresses, each request once by its Idempotency-Key. */
export function purgeReceiver(dataFolder: string): RequestHandler {
  const journal = openJournal<Purged>(dataFolder, 'purge');
  return http.post(FAKE_PURGE_URL, async ({ request }) => {
    const key = request.headers.get('idempotency-key');
    const body: unknown = await request.json().catch(() => null);
    const urls = typeof body === 'object' && body !== null && 'urls' in body ? body.urls : null;
    if (!key || !Array.isArray(urls) || !urls.every((url) => typeof url === 'string' && URL.canParse(url)))
      return HttpResponse.json({ error: 'an Idempotency-Key and { urls } are needed' }, { status: 400 });
    if (journal.read().some((entry) => entry.key === key)) return new HttpResponse(null, { status: 200 });
    journal.append({ key, urls: urls as string[], at: new Date().toISOString() });
    return new HttpResponse(null, { status: 202 });
  });
}

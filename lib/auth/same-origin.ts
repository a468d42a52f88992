import 'server-only';
import { readEnv } from '@/lib/env';
import { AppError } from '@/lib/errors';

type Headers = { get(name: string): string | null };

/**
 * Refuses a request that another site made with our cookie. Fetch metadata decides where the browser sends it,
 * else the Origin header must be ours; a request with neither is refused.
 * @throws AppError `forbidden`
 */
export function sameOrigin(headers: Headers): void {
  const site = headers.get('sec-fetch-site');
  const isOurs = site === null ? headers.get('origin') === readEnv().LEADLINE_ORIGIN : site === 'same-origin';
  if (!isOurs) throw new AppError('forbidden', 'This request did not come from Leadline itself.');
}

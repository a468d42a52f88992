import { answerEmbed } from '@/lib/services/embed/answer';

/** The front answers here before Next does; `next dev` has no front. */
export function GET(request: Request): Response {
  const { pathname, searchParams } = new URL(request.url);
  const { status, headers, body } = answerEmbed({
    path: pathname,
    query: searchParams,
    headers: Object.fromEntries(request.headers),
  });
  return new Response(body === null ? null : Buffer.from(body), { status, headers });
}

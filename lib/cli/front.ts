import type { IncomingMessage, RequestListener, ServerResponse } from 'node:http';
import type { EmbedAnswer, EmbedRequest } from '@/lib/services/embed/answer';
import { rewriteForwarded } from './forwarded';

export type FrontOptions = {
  origin: URL;
  isTrusted: (address: string) => boolean;
  answerEmbed: (request: EmbedRequest) => EmbedAnswer | Promise<EmbedAnswer>;
  next: (request: IncomingMessage, response: ServerResponse) => unknown;
};

const methods = new Set(['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS']);
const year = 365 * 24 * 60 * 60;

/**
 * Stands before Next: public charts are answered here, because thousands of article pages may ask at
 * once and a route handler costs about a millisecond each; everything else is handed on.
 */
export function createFront({ origin, isTrusted, answerEmbed, next }: FrontOptions): RequestListener {
  return async (request, response) => {
    try {
      if (origin.protocol === 'https:') {
        response.setHeader('Strict-Transport-Security', `max-age=${year}; includeSubDomains`);
      }
      if (!methods.has(request.method ?? '')) return refuse(response, 405, [...methods].join(', '));
      const url = addressOf(request);
      if (!url) return refuse(response, 400);
      if (isEmbedPath(url.pathname)) return await serveEmbed(request, response, url, answerEmbed);
      rewriteForwarded(request, origin, isTrusted);
      await next(request, response);
    } catch (error) {
      process.stderr.write(`${error instanceof Error ? error.stack : String(error)}\n`);
      if (response.headersSent) response.destroy();
      else refuse(response, 500);
    }
  };
}

export function isEmbedPath(path: string): boolean {
  return path === '/oembed' || path.startsWith('/embed/');
}

function addressOf(request: IncomingMessage): URL | null {
  const target = request.url ?? '';
  return target.startsWith('/') && URL.canParse(target, 'http://front')
    ? new URL(`http://front${target}`)
    : null;
}

async function serveEmbed(
  request: IncomingMessage,
  response: ServerResponse,
  url: URL,
  answerEmbed: FrontOptions['answerEmbed'],
): Promise<void> {
  if (request.method !== 'GET' && request.method !== 'HEAD') return refuse(response, 405, 'GET, HEAD');
  const answer = await answerEmbed({
    path: url.pathname,
    query: url.searchParams,
    headers: singleHeaders(request),
  });
  const body = answer.body === null ? null : Buffer.from(answer.body);
  const length = answer.status === 304 || body === null ? {} : { 'Content-Length': body.byteLength };
  response.writeHead(answer.status, { ...answer.headers, ...length });
  response.end(request.method === 'HEAD' || answer.status === 304 ? undefined : (body ?? undefined));
}

function singleHeaders(request: IncomingMessage): Record<string, string | undefined> {
  return Object.fromEntries(
    Object.entries(request.headers).map(([name, value]) => [
      name,
      Array.isArray(value) ? value.join(', ') : value,
    ]),
  );
}

const sentences: Record<number, string> = {
  400: 'This address cannot be read.',
  405: 'This method is not answered here.',
  500: 'Something went wrong here. It has been noted.',
};

function refuse(response: ServerResponse, status: number, allow?: string): void {
  response.writeHead(status, {
    'Content-Type': 'text/plain; charset=utf-8',
    'Cache-Control': 'no-store',
    'X-Content-Type-Options': 'nosniff',
    ...(allow ? { Allow: allow } : {}),
  });
  response.end(sentences[status]);
}

import 'server-only';
import type { Actor } from '@/lib/domain/roles';
import { AppError, toProblem } from '@/lib/errors';
import { requestContext } from '@/lib/services/account/request-context';
import { requireActor } from './actor';
import { sameOrigin } from './same-origin';

type Ctx = ReturnType<typeof requestContext>;
type Params = Record<string, string>;
type Read = (actor: Actor, params: Params, ctx: Ctx, query: URLSearchParams) => unknown;
type Write = (actor: Actor, body: unknown, ctx: Ctx, params: Params) => unknown;
type RouteContext = { params: Promise<Params> };

const MAX_BODY = 512 * 1024;
const HEADERS = { 'Cache-Control': 'private, no-store' };

/** A GET handler for signed-in people: session, service, JSON; every refusal is problem+json. */
export function readRoute(read: Read) {
  return (request: Request, context: RouteContext) =>
    answer(async () => {
      const query = new URL(request.url).searchParams;
      return read(await requireActor(), await context.params, requestContext(), query);
    });
}

/**
 * A handler that changes something: only from our own pages, only JSON, only so large. Who asks is read again once
 * the body is there, since a slow one can outlast a session or a role.
 */
export function writeRoute(write: Write) {
  return (request: Request, context: RouteContext) =>
    answer(async () => {
      sameOrigin(request.headers);
      await requireActor();
      const body = await readJson(request);
      return write(await requireActor(), body, requestContext(), await context.params);
    });
}

async function answer(run: () => Promise<unknown>): Promise<Response> {
  try {
    return Response.json((await run()) ?? null, { headers: HEADERS });
  } catch (error) {
    const { status, body } = toProblem(error);
    if (status === 500) console.error(error);
    return Response.json(body, {
      status,
      headers: { ...HEADERS, 'Content-Type': 'application/problem+json' },
    });
  }
}

/** Reads a JSON body, counting bytes as they come. @throws AppError `too-large`, `invalid` */
export async function readJson(request: Request, maxBytes: number = MAX_BODY): Promise<unknown> {
  const type = request.headers.get('content-type') ?? '';
  if (!/^application\/json\b/i.test(type))
    throw new AppError('invalid', 'Send the body as application/json.');
  const chunks: Uint8Array[] = [];
  let size = 0;
  for await (const chunk of request.body ?? []) {
    size += chunk.byteLength;
    if (size > maxBytes) throw new AppError('too-large', 'This is more than can be sent at once.');
    chunks.push(chunk);
  }
  try {
    return JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(Buffer.concat(chunks)));
  } catch (cause) {
    throw new AppError('invalid', 'The body is not JSON.', { cause });
  }
}

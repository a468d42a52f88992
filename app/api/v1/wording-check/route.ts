import { requireActor } from '@/lib/auth/actor';
import { readJson } from '@/lib/auth/desk-route';
import { sameOrigin } from '@/lib/auth/same-origin';
import { AppError, toProblem } from '@/lib/errors';
import { requestContext } from '@/lib/services/account/request-context';
import { checkText } from '@/lib/services/wording-check/check-text';

/** The longest text in the widest letters, and five releases that come with it. */
const MAX_BODY = 256 * 1024;
const NO_STORE = { 'Cache-Control': 'private, no-store' };

/** Marks what a text says beyond its figures. A refusal is a 422 whose extra member `error` names the field. */
export async function POST(request: Request): Promise<Response> {
  try {
    sameOrigin(request.headers);
    await requireActor();
    const input = await readJson(request, MAX_BODY);
    // Read again once the body is there: a slow one can outlast a session or a role.
    const outcome = checkText(await requireActor(), input, requestContext());
    if (outcome.kind === 'answer') return Response.json(outcome.answer, { headers: NO_STORE });
    if (outcome.kind === 'refused')
      return problem(new AppError('invalid', outcome.error.message), { error: outcome.error });
    const seconds = String(Math.ceil(outcome.retryAfterMs / 1000));
    return problem(
      new AppError('too-many', `Too many checks at once. Try again in ${seconds} seconds.`),
      {},
      { 'Retry-After': seconds },
    );
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    const { code, message } = error;
    return problem(error, code === 'invalid' ? { error: { path: '', message } } : {});
  }
}

function problem(error: AppError, more: object = {}, headers: Record<string, string> = {}): Response {
  const { status, body } = toProblem(error);
  return Response.json(
    { ...body, ...more },
    { status, headers: { ...NO_STORE, ...headers, 'Content-Type': 'application/problem+json' } },
  );
}

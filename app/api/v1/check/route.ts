import { requireActor } from '@/lib/auth/actor';
import { readJson } from '@/lib/auth/desk-route';
import { sameOrigin } from '@/lib/auth/same-origin';
import { AppError, toProblem } from '@/lib/errors';
import type { CheckRefusal } from '@/lib/findings/check-types';
import { requestContext } from '@/lib/services/account/request-context';
import { checkPoll } from '@/lib/services/check/check-poll';

const MAX_BODY = 64 * 1024;
const NO_STORE = { 'Cache-Control': 'private, no-store' };

/** Answers a check document. A refusal is a 422 whose extra member `error` names the field. */
export async function POST(request: Request): Promise<Response> {
  try {
    sameOrigin(request.headers);
    const actor = await requireActor();
    const document = await readJson(request, MAX_BODY);
    const outcome = checkPoll(actor, document, requestContext());
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
    return problem(error, notJson(error));
  }
}

/** A body that is no JSON is a fault of the document as a whole: the empty path. */
function notJson({ code, message }: AppError): { error?: CheckRefusal } {
  return code === 'invalid' ? { error: { path: '', message } } : {};
}

function problem(error: AppError, more: object = {}, headers: Record<string, string> = {}): Response {
  const { status, body } = toProblem(error);
  return Response.json(
    { ...body, ...more },
    { status, headers: { ...NO_STORE, ...headers, 'Content-Type': 'application/problem+json' } },
  );
}

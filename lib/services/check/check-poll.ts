import 'server-only';
import type { Actor } from '@/lib/domain/roles';
import { check } from '@/lib/findings/check';
import { CheckRefused } from '@/lib/findings/check-refused';
import type { CheckAnswer, CheckRefusal } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import type { Ctx } from '../context';
import { tokenBuckets } from './token-bucket';

const take = tokenBuckets({ capacity: 60, perMinute: 60 });

export type CheckOutcome =
  | { kind: 'answer'; answer: CheckAnswer }
  | { kind: 'refused'; error: CheckRefusal }
  | { kind: 'too-many'; retryAfterMs: number };

/**
 * Answers one check document. It reads and writes nothing of the desk, so whoever is signed in may ask.
 *
 * @param document parsed JSON
 */
export function checkPoll(actor: Actor, document: unknown, ctx: Pick<Ctx, 'now'>): CheckOutcome {
  const retryAfterMs = take(actor.personId, ctx.now);
  if (retryAfterMs > 0) return { kind: 'too-many', retryAfterMs };
  try {
    return { kind: 'answer', answer: check(parseCheckDocument(document)) };
  } catch (error) {
    if (!(error instanceof CheckRefused)) throw error;
    return { kind: 'refused', error: error.toRefusal() };
  }
}

import 'server-only';
import type { Actor } from '@/lib/domain/roles';
import { check } from '@/lib/findings/check';
import { CheckRefused } from '@/lib/findings/check-refused';
import type { CheckAnswer, CheckDocument, CheckRefusal } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import type { Ctx } from '../context';
import { tokenBuckets } from './token-bucket';

const take = tokenBuckets({ capacity: 60, perMinute: 60 });
const QUESTIONS_PER_TOKEN = 50;

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
    const parsed = parseCheckDocument(document);
    const waitMs = take(actor.personId, ctx.now, moreTokens(parsed));
    return waitMs > 0
      ? { kind: 'too-many', retryAfterMs: waitMs }
      : { kind: 'answer', answer: check(parsed) };
  } catch (error) {
    if (!(error instanceof CheckRefused)) throw error;
    return { kind: 'refused', error: error.toRefusal() };
  }
}

/** What a document costs beside its first token: one that asks thousands of questions takes seconds to answer. */
function moreTokens({ pairs = [], changes = [], thresholds = [] }: CheckDocument): number {
  return Math.floor((pairs.length + changes.length + thresholds.length) / QUESTIONS_PER_TOKEN);
}

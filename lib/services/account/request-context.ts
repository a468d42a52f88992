import 'server-only';
import { getDb } from '@/db/client';
import type { Ctx } from '../context';

/** The database and the time of one request. Here the clock is read, once. */
export function requestContext(): Ctx {
  return { db: getDb(), now: Date.now() };
}

import 'server-only';
import type { Tx } from '@/db/client';
import type { JobPayload } from '@/lib/domain/jobs';
import { readEnv } from '@/lib/env';
import { enqueueIn } from './enqueue';

/**
 * Asks caches to forget embeds, inside the change that makes them old. Without the address of a cache nothing is asked.
 * @param event what happened to them, as part of the key: once for each
 */
export function enqueuePurgeIn(
  tx: Tx,
  payload: JobPayload<'purge-embeds'>,
  event: string,
  now: number,
  { runAt = now, releaseId }: { runAt?: number; releaseId?: number } = {},
): void {
  if (readEnv().LEADLINE_PURGE_URL === undefined) return;
  const idempotencyKey = `purge-embeds:${payload.of}:${payload.id}:${event}`;
  enqueueIn(tx, { kind: 'purge-embeds', payload, idempotencyKey, runAt, releaseId }, now);
}

import 'server-only';
import type { Tx } from '@/db/client';
import { findLatestPolicy } from '@/db/queries/desk';
import { ENGINE_VERSION } from '@/lib/findings/engine-version';
import { enqueueIn } from './enqueue';

/** Has what every release supports computed anew, once for each policy and engine. */
export function enqueueRecomputeIn(tx: Tx, now: number, askedBy?: number): void {
  const payload = { policy: findLatestPolicy(tx)!.id, engine: ENGINE_VERSION };
  const idempotencyKey = `recompute-findings:${payload.policy}:${payload.engine}`;
  enqueueIn(tx, { kind: 'recompute-findings', payload, idempotencyKey, askedBy }, now);
}

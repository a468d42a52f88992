import 'server-only';
import type { Tx } from '@/db/client';
import { enqueueIn } from './enqueue';

/** What follows when an embargo ends, at its hour, or at once where somebody lifts it before. */
export function enqueueEmbargoEndIn(
  tx: Tx,
  release: { id: number; publicId: string },
  runAt: number,
  now: number,
): void {
  const payload = { release: release.publicId };
  const idempotencyKey = `embargo-ended:${release.publicId}`;
  enqueueIn(tx, { kind: 'embargo-ended', payload, idempotencyKey, runAt, releaseId: release.id }, now);
}

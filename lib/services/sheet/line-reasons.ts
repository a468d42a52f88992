import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { insertLineReason } from '@/db/queries/comments';
import { LINE_KINDS } from '@/lib/domain/sheet';
import { AppError } from '@/lib/errors';
import type { NewestLine } from './sheet-state';

/** Why single lines go back, at most one reason a line. */
export const lineReasons = z
  .array(
    z.strictObject({
      kind: z.enum(LINE_KINDS),
      reason: z.string().trim().min(3, 'Say what should change.').max(500, 'At most 500 characters.'),
    }),
  )
  .max(LINE_KINDS.length)
  .refine((lines) => new Set(lines.map(({ kind }) => kind)).size === lines.length, 'One reason a line.');
export type LineReasons = z.output<typeof lineReasons>;

export function storeLineReasons(
  tx: Tx,
  clearingId: number,
  kept: readonly NewestLine[],
  reasons: LineReasons,
): void {
  for (const { kind, reason } of reasons) {
    const found = kept.find(({ line }) => line.kind === kind);
    if (!found) throw new AppError('invalid', 'This sheet has no such line.');
    insertLineReason(tx, { clearingId, lineVersionId: found.version.id, reason });
  }
}

import { vi } from 'vitest';
import type { SheetActions } from '@/app/(desk)/lines/_components/sheet-actions';
import type { ActionFailure, ErrorCode, FieldErrors } from '@/lib/errors';

const filed = { ok: true as const, value: { hash: 'a'.repeat(64), version: 9 } };

/** What the page hands to the screen, each answering as the services do when all goes well. */
export function sheetActs() {
  return {
    add: vi.fn<SheetActions['add']>().mockResolvedValue({ ok: true, value: { version: 9 } }),
    file: vi.fn<SheetActions['file']>().mockResolvedValue(filed),
    change: vi.fn<SheetActions['change']>().mockResolvedValue(filed),
    clear: vi.fn<SheetActions['clear']>().mockResolvedValue({ ok: true, value: { outcome: 'cleared' } }),
    sendBack: vi.fn<SheetActions['sendBack']>().mockResolvedValue({ ok: true, value: undefined }),
    pull: vi.fn<SheetActions['pull']>().mockResolvedValue({ ok: true, value: undefined }),
    revise: vi.fn<SheetActions['revise']>().mockResolvedValue({ ok: true, value: { version: 9 } }),
    discard: vi.fn<SheetActions['discard']>().mockResolvedValue({ ok: true, value: undefined }),
    comment: vi.fn<SheetActions['comment']>().mockResolvedValue({ ok: true, value: { id: 'comment' } }),
    settle: vi.fn<SheetActions['settle']>().mockResolvedValue({ ok: true, value: undefined }),
    terms: vi.fn<SheetActions['terms']>().mockResolvedValue({ ok: true, value: undefined }),
    review: vi.fn<SheetActions['review']>().mockResolvedValue({ ok: true, value: undefined }),
    embed: vi.fn<SheetActions['embed']>().mockResolvedValue({ ok: true, value: { id: 'embed' } }),
  };
}

export function refused(
  message: string,
  code: ErrorCode = 'conflict',
  fields: FieldErrors = {},
): ActionFailure {
  return { ok: false, code, message, fields };
}

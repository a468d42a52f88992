import { check } from '@/lib/findings/check';
import { CheckRefused } from '@/lib/findings/check-refused';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import type { Entry, Figures } from '../entry';

/** The answer to a check document, without the version of the engine that gave it. */
function answer(document: Figures): Figures {
  const { base, previousBase, findings } = check(parseCheckDocument(document));
  return { base, previousBase, findings } as unknown as Figures;
}

/** Where a check document is refused; null where it is answered. */
function refusedAt(document: Figures): Figures {
  try {
    check(parseCheckDocument(document));
  } catch (error) {
    if (error instanceof CheckRefused) return { path: error.path };
    throw error;
  }
  return { path: null };
}

export const findingsEntries: Record<string, Entry> = { cases: answer, refused: refusedAt };

import { check } from '@/lib/findings/check';
import { CheckRefused } from '@/lib/findings/check-refused';
import type { CheckAnswer, CheckDocument } from '@/lib/findings/check-types';
import { fieldOfCheckPath } from '@/lib/findings/form-field';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import type { ReleaseForm } from './form-values';
import { type LiveAround, type LiveDocument, liveDocument } from './live-document';

export type LiveFindings =
  | { kind: 'nothing' }
  /** The engine will not answer: at which field of the form, and why. */
  | { kind: 'refused'; field: string; message: string; leftOut: string[] }
  | {
      kind: 'answer';
      document: CheckDocument;
      answer: CheckAnswer;
      leftOut: string[];
      sizeGap: string | null;
    };

/** What the numbers typed so far support, by the same code that the service uses. */
export function liveFindings(values: ReleaseForm, around: LiveAround): LiveFindings {
  return judged(liveDocument(values, around));
}

/** The costly half, for a caller that knows whether anything that counts has changed. */
export function judged(live: LiveDocument | null): LiveFindings {
  if (!live) return { kind: 'nothing' };
  const { leftOut, rows, sizeGap } = live;
  try {
    const document = parseCheckDocument(live.document);
    return { kind: 'answer', document, answer: check(document), leftOut, sizeGap };
  } catch (error) {
    if (!(error instanceof CheckRefused)) throw error;
    return { kind: 'refused', field: formFieldOf(error.path, rows), message: error.message, leftOut };
  }
}

/** Where in the form a refusal belongs: the document has fewer rows than the form where some say nothing yet. */
export function formFieldOf(path: string, rows: readonly number[]): string {
  return fieldOfCheckPath(path).replace(/^shares\.(\d+)/, (_, row) => `shares.${rows[Number(row)] ?? row}`);
}

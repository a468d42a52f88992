import 'server-only';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { AppError } from '@/lib/errors';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import { CheckRefused } from '@/lib/findings/check-refused';
import { fieldOfCheckPath } from '@/lib/findings/form-field';
import type { Policy } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';

/** Refuses, at the form's field, figures that the engine would refuse. */
export function refuseImpossibleFigures(facts: ReleaseFacts, policy: Policy): void {
  try {
    parseCheckDocument(checkDocumentOf(facts, null, policy));
  } catch (error) {
    if (!(error instanceof CheckRefused)) throw error;
    throw new AppError('invalid', 'Some fields need another look.', {
      fields: { [fieldOfCheckPath(error.path)]: error.message },
      cause: error,
    });
  }
}

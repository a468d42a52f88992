import { checkDocumentSchema } from './check-schema';
import type { CheckDocument } from './check-types';
import { refuseFaultyBase } from './refuse-base';
import { refuseFaultyPolicy } from './refuse-policy';
import { refuseFaultyQuestions } from './refuse-questions';
import { refusalOf } from './refusal-of';
import { resolvePolicy } from './policy';

/**
 * Reads a check document from outside: strict about keys, kinds and ranges, never clamping.
 *
 * @param input anything, such as parsed JSON or the values of a form
 * @returns the document, ready for check
 * @throws CheckRefused with the path of the field (`release.shares[2].pct`) and a message for a reporter; with
 *   several faults, one of them
 * @example
 * parseCheckDocument({
 *   release: {
 *     sampleSource: 'probability', n: 1012, design: 'weighted', decimals: 0,
 *     shares: [{ option: 'Alder', pct: 47 }],
 *   },
 * }).release.n; // => 1012
 */
export function parseCheckDocument(input: unknown): CheckDocument {
  const result = checkDocumentSchema.safeParse(input);
  if (!result.success) throw refusalOf(result.error);
  const document: CheckDocument = result.data;
  refuseFaultyPolicy(document.policy);
  const policy = resolvePolicy(document.policy);
  refuseFaultyBase(document.release, 'release', policy);
  if (document.previous) refuseFaultyBase(document.previous, 'previous', policy);
  refuseFaultyQuestions(document);
  return document;
}

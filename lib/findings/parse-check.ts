import type { ZodError } from 'zod';
import { CheckRefused } from './check-refused';
import { checkDocumentSchema } from './check-schema';
import type { CheckDocument } from './check-types';
import { refuseFaultyBase } from './refuse-base';
import { refuseFaultyPolicy } from './refuse-policy';
import { refuseFaultyQuestions } from './refuse-questions';
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

/** Faults anywhere in these are told of the whole field. */
const TOLD_WHOLE = /^(policy\.assumed\.\w+\.range|policy\.kishRange)\b.*$/;
const PAIR_NOT_OF_TWO = /^(pairs\[\d+\])\[\d+\]$/;

function refusalOf(error: ZodError): CheckRefused {
  const [issue] = error.issues;
  if (!issue) throw new TypeError('refusalOf requires an issue');
  if (issue.code === 'unrecognized_keys') {
    return new CheckRefused(
      pathOf([...issue.path, ...issue.keys.slice(0, 1)]),
      'This key is not known here.',
    );
  }
  const path = pathOf(issue.path).replace(TOLD_WHOLE, '$1');
  const isMissing = issue.code === 'invalid_type' && issue.input === undefined && issue.path.length > 0;
  if (isMissing && PAIR_NOT_OF_TWO.test(path)) {
    return new CheckRefused(path.replace(PAIR_NOT_OF_TWO, '$1'), 'A pair names two options.');
  }
  return new CheckRefused(path, issue.message);
}

function pathOf(keys: readonly PropertyKey[]): string {
  return keys.reduce<string>((path, key) => {
    if (typeof key === 'number') return `${path}[${key}]`;
    return path === '' ? String(key) : `${path}.${String(key)}`;
  }, '');
}

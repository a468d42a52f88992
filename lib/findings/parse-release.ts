import type { ReleaseDocument } from './judge-types';
import { releaseDocumentSchema } from './judge-schema';
import { resolvePolicy } from './policy';
import { refusalOf } from './refusal-of';
import { refuseFaultyBlocs } from './refuse-blocs';
import { refuseFaultyComparison } from './refuse-comparison';
import { refuseFaultyPolicy } from './refuse-policy';
import { refuseFaultyAsked } from './refuse-asked';
import { refuseFaultyQuestionBase } from './refuse-question-base';
import { refuseFaultySubgroups } from './refuse-subgroups';

/**
 * Reads a release document from outside: strict about keys, kinds and ranges, never clamping, as for a check document.
 *
 * @param input anything, such as parsed JSON or the values of a form
 * @returns the document, ready for judgeRelease
 * @throws CheckRefused with the path of the field (`subgroups[0].gaps[1].against`) and a message for a reporter;
 *   with several faults, one of them
 * @example
 * parseReleaseDocument({
 *   release: {
 *     sampleSource: 'probability', n: 1012, design: 'weighted', decimals: 0,
 *     shares: [{ option: 'Alder', pct: 47 }, { option: 'Brook', pct: 41 }],
 *   },
 *   netScores: [{ approve: 'Alder', disapprove: 'Brook' }],
 * }).netScores.length; // => 1
 */
export function parseReleaseDocument(input: unknown): ReleaseDocument {
  const result = releaseDocumentSchema.safeParse(input);
  if (!result.success) throw refusalOf(result.error);
  const document: ReleaseDocument = result.data;
  refuseFaultyPolicy(document.policy);
  const policy = resolvePolicy(document.policy);
  refuseFaultyQuestionBase(document.release, 'release', policy);
  if (document.comparison) refuseFaultyQuestionBase(document.comparison.base, 'comparison.base', policy);
  refuseFaultyBlocs(document);
  refuseFaultyAsked(document);
  refuseFaultyComparison(document);
  refuseFaultySubgroups(document.subgroups ?? [], policy);
  return document;
}

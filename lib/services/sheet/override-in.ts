import 'server-only';
import type { EvidenceRow } from '@/db/queries/clearing';
import type { WordingOverride } from '@/lib/domain/wording-override';
import type { EvidenceBody } from './evidence-body';

/** The reason that words were filed with against the wording check; part of what both people agree to. */
export function overrideIn(evidence: EvidenceRow | null): WordingOverride | null {
  if (!evidence) return null;
  const body = JSON.parse(evidence.bytes.toString('utf8')) as Pick<EvidenceBody, 'wordingOverride'>;
  return body.wordingOverride ?? null;
}

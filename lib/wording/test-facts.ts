import type { CheckAnswer } from '@/lib/findings/check-types';
import type { DraftFinding, TestedDraft } from './draft-finding';

/** How many findings were tested together with this one: changes and changes of leads are one family. */
export function familySize(finding: DraftFinding, answer: CheckAnswer): number {
  if (finding.verdict !== 'cannot-be-tested' && finding.trace) return finding.trace.family.size;
  const familyOf = (kind: string) => (kind === 'lead-change' ? 'change' : kind);
  return answer.findings.filter(
    (one) =>
      one.kind !== 'share' &&
      one.verdict !== 'cannot-be-tested' &&
      familyOf(one.kind) === familyOf(finding.kind),
  ).length;
}

/**
 * Whether the design effect at which the result turns is worth telling: beyond the one in use for a finding that
 * passes; below it, and not below 1, for one that does not (a sample is rarely worth more than a random one).
 */
export function isPlausibleBreaking(finding: TestedDraft, answer: CheckAnswer): boolean {
  const [breaking, used, lowest] =
    'breakingDeff' in finding
      ? [finding.breakingDeff, answer.base.deff ?? 0, 1]
      : [finding.breakingFactor, 1, 1 / Math.min(answer.base.deff ?? 1, answer.previousBase?.deff ?? 1)];
  if (breaking === null) return false;
  return finding.verdict === 'does-not-hold' ? breaking < used && breaking >= lowest : breaking > used;
}

import type { CheckAnswer, Finding } from './check-types';

/**
 * A key that names what a finding is about, to find it again in another answer.
 *
 * @param finding any finding; only its kind and names count
 * @returns for example `lead:Alder|Brook`; a `|` or `\` within a name is escaped by `\`
 * @example
 * claimKey({ kind: 'lead', pair: ['Alder', 'Brook'] }); // => 'lead:Alder|Brook'
 * claimKey({ kind: 'threshold', option: 'Brook', thresholdPct: 50 }); // => 'threshold:Brook|50'
 */
export function claimKey(finding: Finding): string {
  return keyOf(finding.kind, namesOf(finding));
}

/** The key of a kind of finding about these names. */
export function keyOf(kind: string, names: readonly string[]): string {
  return `${kind}:${names.map(escaped).join('|')}`;
}

/**
 * The finding that a key names.
 *
 * @param answer any answer
 * @param key as claimKey made it
 * @returns the finding and its place in the answer, or null where the answer has none such
 */
export function findClaim(answer: CheckAnswer, key: string): { finding: Finding; index: number } | null {
  const index = answer.findings.findIndex((finding) => claimKey(finding) === key);
  const finding = answer.findings[index];
  return finding ? { finding, index } : null;
}

function namesOf(finding: Finding): readonly string[] {
  if (finding.kind === 'lead' || finding.kind === 'lead-change') return finding.pair;
  if (finding.kind === 'threshold') return [finding.option, String(finding.thresholdPct)];
  return [finding.option];
}

function escaped(name: string): string {
  return name.replace(/[\\|]/g, '\\$&');
}

import 'server-only';
import type { Conn } from '@/db/client';
import { replaceFindingIndex } from '@/db/queries/finding-index';
import { claimKey } from '@/lib/findings/claim-key';
import type { Computed } from './compute-findings';

/** Writes the derived row per finding that lists read. Never shown as a number, never evidence. */
export function indexFindings(conn: Conn, versionId: number, computed: Computed): void {
  const rows = computed.answer.findings.flatMap((finding) => {
    if (finding.kind === 'share') return [];
    const tested = finding.verdict === 'cannot-be-tested' ? null : finding;
    return {
      releaseVersionId: versionId,
      policyVersion: computed.settings.policy.version,
      engine: computed.answer.engine,
      findingKey: claimKey(finding),
      verdict: finding.verdict,
      z: tested?.z ?? null,
      p: tested?.p ?? null,
    };
  });
  replaceFindingIndex(conn, versionId, rows);
}

import 'server-only';
import type { Conn } from '@/db/client';
import { replaceFindingIndex } from '@/db/queries/finding-index';
import { listVersionsOfSeries } from '@/db/queries/release';
import { claimKey } from '@/lib/findings/claim-key';
import { type Computed, computeFindings } from './compute-findings';

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

/**
 * Writes anew what lists know of a race by one pollster, from the field dates given on: another release to compare
 * with changes what the later ones support.
 */
export function reindexSeries(
  conn: Conn,
  series: { raceId: number; pollsterId: number; from: string },
  now: number,
): void {
  for (const { version } of listVersionsOfSeries(conn, series.raceId, series.pollsterId, null))
    if (version.fieldEndOn >= series.from)
      indexFindings(conn, version.id, computeFindings(conn, version.id, now));
}

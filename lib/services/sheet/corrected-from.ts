import 'server-only';
import type { Conn } from '@/db/client';
import { findEvidence, findLastAct } from '@/db/queries/clearing';
import { findWholeVersionByPublicId } from '@/db/queries/release';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { dayInZone } from '@/lib/domain/wall-clock';
import { readEnv } from '@/lib/env';
import { findClaim } from '@/lib/findings/claim-key';
import type { Corrected } from '@/lib/wording/draft-input';
import type { EvidenceBody } from './evidence-body';

/**
 * What a correction notice of this sheet tells: the evidence of the words cleared last, where they were pulled or where
 * a release under them has a newer version since. Undefined where nothing printed is put right.
 */
export function correctedFrom(
  conn: Conn,
  sheetId: number,
  facts: ReleaseFacts,
  previous: ReleaseFacts | null,
): Corrected | undefined {
  const cleared = findLastAct(conn, sheetId, 'cleared');
  const evidence = cleared?.evidenceId ? findEvidence(conn, cleared.evidenceId) : null;
  if (!cleared || !evidence) return undefined;
  const body = JSON.parse(evidence.bytes.toString('utf8')) as EvidenceBody;
  const finding = findClaim(body.answer, body.claimKey)?.finding;
  if (!finding || finding.kind === 'share') return undefined;
  const before = body.comparison.release;
  const moved = [
    facts.versionId === body.release.versionId ? null : facts,
    previous && previous.releaseId === before?.releaseId && previous.versionId !== before.versionId
      ? previous
      : null,
  ].find((one) => one !== null);
  const pulled = findLastAct(conn, sheetId, 'pulled');
  const pulledAt = pulled && pulled.id > cleared.id ? pulled.at : null;
  // A day that stays the same however often the notice is drafted.
  const at = pulledAt ?? (moved && findWholeVersionByPublicId(conn, moved.versionId)?.version.createdAt);
  if (at === undefined) return undefined;
  const was = { finding, release: body.release, previous: before };
  return { was, on: dayInZone(at, readEnv().LEADLINE_ZONE) };
}

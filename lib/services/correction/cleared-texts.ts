import 'server-only';
import type { Conn } from '@/db/client';
import { findEvidence } from '@/db/queries/clearing';
import type { LineText } from '@/lib/domain/sheet';
import type { EvidenceBody } from '../sheet/evidence-body';

/** The words that were cleared on one evidence. */
export function clearedTexts(conn: Conn, evidenceId: number): LineText[] {
  const body: Pick<EvidenceBody, 'texts'> = JSON.parse(
    findEvidence(conn, evidenceId)!.bytes.toString('utf8'),
  );
  return body.texts;
}

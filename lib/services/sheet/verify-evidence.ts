import 'server-only';
import type { Db } from '@/db/client';
import { findEvidence, listEvidenceIds } from '@/db/queries/clearing';
import { canonicalJson } from '@/lib/security/canonical';
import { sha256 } from '@/lib/security/ids';
import type { EvidenceBody } from './evidence-body';

/** One frozen engine: a document in, its answer out. */
export type FrozenEngine = {
  parseCheckDocument: (input: unknown) => EvidenceBody['document'];
  check: (document: EvidenceBody['document']) => EvidenceBody['answer'];
};

/**
 * Re-runs every evidence on the engine version it names. Each problem is one line; none means that every stored
 * byte fits its hash and every number comes out the same.
 */
export async function verifyEvidence(
  db: Db,
  engineOf: (version: string) => Promise<FrozenEngine>,
): Promise<{ checked: number; problems: string[] }> {
  const problems: string[] = [];
  const ids = listEvidenceIds(db);
  for (const id of ids) {
    const row = findEvidence(db, id)!;
    if (sha256(row.bytes) !== row.hash) {
      problems.push(`evidence ${row.publicId} does not fit its hash`);
      continue;
    }
    const body = JSON.parse(row.bytes.toString('utf8')) as EvidenceBody;
    if (body.engine !== row.engine)
      problems.push(`evidence ${row.publicId} names another engine than its row`);
    const engine = await engineOf(body.engine);
    const answer = engine.check(engine.parseCheckDocument(body.document));
    if (canonicalJson(answer) !== canonicalJson(body.answer))
      problems.push(`evidence ${row.publicId} comes out differently on engine ${body.engine}`);
  }
  return { checked: ids.length, problems };
}
